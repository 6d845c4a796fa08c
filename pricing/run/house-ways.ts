import type { KnownFacts } from '../known-facts';
import { ABOVE_CEILING_FT, acrossFt, atticPoints, dropLegs } from './garage-ways';
import { cableCover, cableLegs, fishingPatches, insideLeg, type Garage, type InsideLeg } from './inside-leg';
import { floorPoint, type Spot } from './perimeter';
import { runPlan, type RunDraft, type RunPlan } from './run-plan';
import { runHeightFt } from './wall-route';

/** One step, feet. Source: the question in the wizard says so. */
export const PACE_FT = 2.5;
/** From one floor to the next. Source: common practice, no source. */
export const FLOOR_FT = 9;
/** A panel in the house: its top at 5 ft under a ceiling of 8.5 ft. Source: common practice, no source. */
const RISE_IN_HOUSE_FT = 3.5;
/** From a panel's bottom to the floor, and from a floor to where a cable hangs below it. Source: common practice, no source. */
export const DOWN_TO_FLOOR_FT = 2.5;
export const BELOW_FLOOR_FT = 1;
/** From a basement panel's top to the joists. Source: common practice, no source. */
export const RISE_TO_JOISTS_FT = 3;
/** From a panel outdoors to a pipe under the eaves. Source: common practice, no source. */
export const RISE_TO_EAVES_FT = 3;

/** Counted feet from the panel to the garage, or to the charger outdoors. */
export const paceFt = (known: KnownFacts): number => known.pacesToPanel * PACE_FT;

/** The wire comes in beside the door to the house; without a known door in the middle of the back wall. */
export function entrySpot({ known, room }: Garage): Spot {
  const door = known.openings.find(({ wall }) => wall !== 'front');
  return door ? { wall: door.wall, alongFt: Math.max(0, door.alongFt - 0.5) } : { wall: 'back', alongFt: room.widthFt / 2 };
}

/** Every way from a panel elsewhere at the house into an attached garage. */
export function houseWays(garage: Garage): RunPlan[] {
  const { known } = garage;
  const entry = entrySpot(garage);
  const high = runHeightFt(known.ceilingFt);
  const fromAbove = insideLeg(garage, entry, { bottomFt: high, topFt: high }, false);
  const fromBelow = insideLeg(garage, entry, { bottomFt: 0, topFt: 0 }, known.wallFinish !== 'bare_studs');
  const ways: (RunPlan | null)[] = [];
  if (known.panelPlace === 'basement') {
    ways.push(fromBelow && joistsInPipe(garage, fromBelow), fromBelow && joists(garage, fromBelow));
  } else {
    if (known.panelPlace === 'next_room') ways.push(fromAbove && nextRoom(garage, fromAbove));
    else ways.push(fromAbove && outsideWall(garage, fromAbove, 'EMT'), fromAbove && outsideWall(garage, fromAbove, 'PVC40'));
    if (known.panelPlace !== 'outside') ways.push(fromAbove && finishedWall(garage, fromAbove));
    if (known.atticAbove) ways.push(attic(garage, entry));
    if (known.crawlBelow) ways.push(fromBelow && crawl(garage, fromBelow));
  }
  return ways.filter((way) => way !== null);
}

/** Goes through the wall of the garage, which may be masonry, and through `others` framed ones. */
const through = (known: KnownFacts, others = 0): Pick<RunPlan, 'wallPenetrations' | 'masonryCores'> =>
  known.wallFinish === 'masonry' ? { wallPenetrations: others, masonryCores: 1 } : { wallPenetrations: 1 + others, masonryCores: 0 };

const floorsUpFt = (known: KnownFacts): number => known.floorsBetween * FLOOR_FT;
/** Joists of a basement are one floor up already. */
const floorsAboveJoistsFt = (known: KnownFacts): number => Math.max(0, known.floorsBetween - 1) * FLOOR_FT;

const pipeInside = (inside: InsideLeg) => ({ way: 'surface' as const, levelFt: inside.route.levelFt, upDownFt: inside.upDownFt });

/** What a cable's part inside the garage asks for besides the cable. */
function cableInside({ known }: Garage, inside: InsideLeg): Pick<RunDraft, 'patches' | 'paint' | 'points' | 'oddities'> {
  const cover = cableCover(known);
  return {
    points: inside.points, oddities: inside.oddities, paint: known.paintRun && cover === 'surface',
    patches: cover === 'finished_wall' ? fishingPatches(inside.route.levelFt, inside.route.path.length - 2) : 0,
  };
}

const nextRoom = (garage: Garage, inside: InsideLeg): RunPlan => runPlan({
  method: 'EMT', way: 'surface', methodWords: 'Metal pipe (EMT) along the walls of both rooms',
  legs: [{ way: 'surface', levelFt: paceFt(garage.known), upDownFt: RISE_IN_HOUSE_FT + floorsUpFt(garage.known) }, pipeInside(inside)],
  // Up at the panel and through the wall.
  bends90: 2 + inside.bends90, points: inside.points, oddities: inside.oddities, paint: garage.known.paintRun, ...through(garage.known),
});

const outsideWall = (garage: Garage, inside: InsideLeg, method: 'EMT' | 'PVC40'): RunPlan => runPlan({
  method, way: 'outside_wall', methodWords: method === 'EMT' ? 'Metal pipe (EMT) along the outside wall' : 'Plastic pipe (PVC) along the outside wall',
  legs: [{ way: 'outside_wall', levelFt: paceFt(garage.known), upDownFt: RISE_TO_EAVES_FT + floorsUpFt(garage.known) }, pipeInside(inside)],
  // Up at the panel, round a corner of the house, and through the wall.
  bends90: 3 + inside.bends90, points: inside.points, oddities: inside.oddities, paint: garage.known.paintRun,
  ...through(garage.known, garage.known.panelPlace === 'outside' ? 0 : 1),
});

function finishedWall(garage: Garage, inside: InsideLeg): RunPlan {
  const rest = cableInside(garage, inside);
  const levelFt = paceFt(garage.known);
  return runPlan({
    method: 'NM_B', way: 'finished_wall', methodWords: 'Cable inside the walls of the house', bends90: 0,
    legs: [{ way: 'finished_wall', levelFt, upDownFt: RISE_IN_HOUSE_FT + floorsUpFt(garage.known) }, ...cableLegs(garage, inside, inside.route.levelFt)],
    ...rest, patches: fishingPatches(levelFt, 1) + (rest.patches ?? 0), ...through(garage.known, garage.known.floorsBetween),
  });
}

function attic(garage: Garage, entry: Spot): RunPlan {
  const { known, room, charger } = garage;
  const start = floorPoint(room, entry);
  return runPlan({
    method: 'NM_B', way: 'attic', methodWords: 'Cable through the attic', bends90: 0,
    legs: [
      { way: 'finished_wall', levelFt: 0, upDownFt: RISE_IN_HOUSE_FT + floorsUpFt(known) },
      { way: 'attic', levelFt: paceFt(known) + acrossFt(start, floorPoint(room, charger)), upDownFt: 2 * ABOVE_CEILING_FT },
      ...dropLegs(garage),
    ],
    points: atticPoints(garage, start), wallPenetrations: 2 + known.floorsBetween, paint: known.paintRun && cableCover(known) === 'surface',
  });
}

const crawl = (garage: Garage, inside: InsideLeg): RunPlan => runPlan({
  method: 'NM_B', way: 'crawl', methodWords: 'Cable through the crawl space', bends90: 0,
  legs: [
    { way: 'finished_wall', levelFt: 0, upDownFt: DOWN_TO_FLOOR_FT + floorsUpFt(garage.known) },
    { way: 'crawl', levelFt: paceFt(garage.known), upDownFt: 2 * BELOW_FLOOR_FT },
    ...cableLegs(garage, inside, inside.route.levelFt),
  ],
  ...cableInside(garage, inside), ...through(garage.known, 1 + garage.known.floorsBetween),
});

const joists = (garage: Garage, inside: InsideLeg): RunPlan => runPlan({
  method: 'NM_B', way: 'joists', methodWords: 'Cable along the basement ceiling', bends90: 0,
  legs: [
    { way: 'joists', levelFt: paceFt(garage.known), upDownFt: RISE_TO_JOISTS_FT + floorsAboveJoistsFt(garage.known) + BELOW_FLOOR_FT },
    ...cableLegs(garage, inside, inside.route.levelFt),
  ],
  ...cableInside(garage, inside), ...through(garage.known),
});

const joistsInPipe = (garage: Garage, inside: InsideLeg): RunPlan => runPlan({
  method: 'EMT', way: 'surface', methodWords: 'Metal pipe (EMT) along the basement ceiling and the garage walls',
  legs: [
    { way: 'joists', levelFt: paceFt(garage.known), upDownFt: RISE_TO_JOISTS_FT + floorsAboveJoistsFt(garage.known) + BELOW_FLOOR_FT },
    pipeInside(inside),
  ],
  // Up at the panel, through the wall and up out of it.
  bends90: 3 + inside.bends90, points: inside.points, oddities: inside.oddities, paint: garage.known.paintRun, ...through(garage.known),
});
