import type { KnownFacts } from '../known-facts';
import { BELOW_FLOOR_FT, DOWN_TO_FLOOR_FT, FLOOR_FT, RISE_TO_EAVES_FT, RISE_TO_JOISTS_FT, paceFt } from './house-ways';
import { fishingPatches, garageOf, insideLeg } from './inside-leg';
import { runPlan, type RunPlan } from './run-plan';

/** Height of a charger on an outside wall when no plan says another, feet. Source: common practice, no source. */
const CHARGER_HEIGHT_FT = 45 / 12;
const EAVES_FT = 8;
/** Neighbors on an outside wall are joined straight across. Source: invented for the demo. */
const NEIGHBORS_FT = 6;
const PANEL_TOP_FT = 5;
/** Cover over a plastic pipe, feet. NEC 2023 Table 300.5(A), general: PVC, 18 in. */
export const PVC_COVER_FT = 1.5;

/** Every way to a charger on the outside wall at a carport or driveway. */
export function outdoorWays(known: KnownFacts): RunPlan[] {
  const ways = [outsideWall(known, 'PVC80'), outsideWall(known, 'EMT')];
  if (known.panelPlace === 'basement') ways.push(joists(known));
  else if (known.panelPlace !== 'outside') ways.push(finishedWall(known));
  if (known.crawlBelow && known.panelPlace !== 'basement') ways.push(crawl(known));
  return ways;
}

/** Schedule 80 where a car can touch the pipe: NEC 2023 352.12(C). */
function outsideWall(known: KnownFacts, method: 'PVC80' | 'EMT'): RunPlan {
  const levelFt = paceFt(known);
  const low = levelFt <= NEIGHBORS_FT && known.floorsBetween === 0;
  const overEavesFt = RISE_TO_EAVES_FT + known.floorsBetween * FLOOR_FT + EAVES_FT - CHARGER_HEIGHT_FT;
  const upDownFt = low ? PANEL_TOP_FT - CHARGER_HEIGHT_FT : overEavesFt;
  return runPlan({
    method, way: 'outside_wall', outdoor: true, paint: known.paintRun,
    methodWords: method === 'EMT' ? 'Metal pipe (EMT) along the outside wall' : 'Heavy plastic pipe (PVC) along the outside wall',
    legs: [{ way: 'outside_wall', levelFt, upDownFt }], points: [],
    // Up, along and down; round a corner of the house when it is not next to the panel.
    bends90: low ? 2 : 3, wallPenetrations: known.panelPlace === 'outside' ? 0 : 1,
    oddities: low ? ['Goes straight across, no need to go up'] : [],
  });
}

const finishedWall = (known: KnownFacts): RunPlan => runPlan({
  method: 'NM_B', way: 'finished_wall', methodWords: 'Cable inside the walls of the house', outdoor: true, bends90: 0, points: [],
  legs: [{ way: 'finished_wall', levelFt: paceFt(known), upDownFt: PANEL_TOP_FT - CHARGER_HEIGHT_FT + known.floorsBetween * FLOOR_FT }],
  patches: fishingPatches(paceFt(known), 1), wallPenetrations: 1 + known.floorsBetween,
});

/** Up from below the floor inside the outer wall, and out behind the charger. */
const upToCharger = { way: 'finished_wall', levelFt: 0, upDownFt: CHARGER_HEIGHT_FT } as const;

const crawl = (known: KnownFacts): RunPlan => runPlan({
  method: 'NM_B', way: 'crawl', methodWords: 'Cable through the crawl space', outdoor: true, bends90: 0, points: [],
  legs: [
    { way: 'finished_wall', levelFt: 0, upDownFt: DOWN_TO_FLOOR_FT + known.floorsBetween * FLOOR_FT },
    { way: 'crawl', levelFt: paceFt(known), upDownFt: 2 * BELOW_FLOOR_FT }, upToCharger,
  ],
  wallPenetrations: 3 + known.floorsBetween,
});

const joists = (known: KnownFacts): RunPlan => runPlan({
  method: 'NM_B', way: 'joists', methodWords: 'Cable along the basement ceiling', outdoor: true, bends90: 0, points: [],
  legs: [
    { way: 'joists', levelFt: paceFt(known), upDownFt: RISE_TO_JOISTS_FT + Math.max(0, known.floorsBetween - 1) * FLOOR_FT + BELOW_FLOOR_FT },
    upToCharger,
  ],
  wallPenetrations: 2,
});

/** Across the yard to a detached garage, up its back wall and along to the charger. A visit decides; the length is a help for it. */
export function yardWays(known: KnownFacts): RunPlan[] {
  const garage = garageOf(known);
  const inside = garage && insideLeg(garage, { wall: 'back', alongFt: garage.room.widthFt / 2 }, { bottomFt: 0, topFt: 0 }, true);
  if (!inside) return [];
  return [runPlan({
    method: 'PVC40', way: 'underground', methodWords: 'Plastic pipe (PVC) under the yard',
    legs: [
      { way: 'outside_wall', levelFt: 0, upDownFt: PANEL_TOP_FT },
      { way: 'underground', levelFt: known.trenchFt, upDownFt: 2 * PVC_COVER_FT },
      { way: 'surface', levelFt: inside.route.levelFt, upDownFt: inside.upDownFt },
    ],
    // Down into the trench and up out of it.
    bends90: 2 + inside.bends90, points: inside.points, paint: known.paintRun, trenchFt: known.trenchFt, wallPenetrations: 1,
    oddities: [...inside.oddities, ...(known.surfaceOver === 'paved' ? ['Goes under paving'] : [])],
  })];
}
