import type { KnownFacts } from '../known-facts';
import type { RunLeg, RunWay } from './legs';
import { above, floorPoint, type Point, type Room, type Spot } from './perimeter';
import { DOOR_HEAD_FT, wallRoute, type WallRoute } from './wall-route';

/** A garage with everything that a run in it has to know. */
export interface Garage { readonly known: KnownFacts; readonly room: Room; readonly charger: Spot & { readonly heightFt: number } }

/** The part of a run inside the garage. */
export interface InsideLeg {
  readonly route: WallRoute;
  readonly upDownFt: number;
  /** Feet of the verticals that are below the height of a door head, where a cable wants protection. */
  readonly lowFt: number;
  readonly bends90: number;
  readonly points: readonly Point[];
  readonly oddities: readonly string[];
}

/** The garage of a home whose charger hangs in it; null when the plan lacks it. */
export function garageOf(known: KnownFacts): Garage | null {
  const { chargerAt, room } = known;
  if (chargerAt === null) return null;
  return { known, room, charger: { wall: chargerAt.wall, alongFt: chargerAt.alongFt, heightFt: chargerAt.heightIn / 12 } };
}

/** Between which a wire may leave, feet. */
export interface Heights { readonly bottomFt: number; readonly topFt: number }

/** Feet of a vertical between two heights that lie below the height of a door head. */
const belowDoorHead = (fromFt: number, toFt: number): number =>
  Math.abs(Math.min(fromFt, DOOR_HEAD_FT) - Math.min(toFt, DOOR_HEAD_FT));

/**
 * Along the walls from a spot to the charger: up to the run's height, along, down; or straight across between neighbors.
 * @param from heights between which the wire may leave, e.g. the bottom and top of a panel; up goes from the top.
 * @param mayGoLow false where a cable must not cross studs low.
 * @returns null when the garage door bars the way.
 */
export function insideLeg(garage: Garage, start: Spot, from: Heights, mayGoLow: boolean): InsideLeg | null {
  const { known, room, charger } = garage;
  const route = wallRoute({ room, ceilingFt: known.ceilingFt, openings: known.openings, garageDoor: known.garageDoor }, start, charger);
  if (route === null) return null;
  const low = route.low && mayGoLow;
  const startFt = low ? Math.min(from.topFt, Math.max(from.bottomFt, charger.heightFt)) : from.topFt;
  const levelAtFt = low ? charger.heightFt : route.heightFt;
  const riseFt = Math.abs(levelAtFt - startFt);
  const dropFt = Math.abs(levelAtFt - charger.heightFt);
  const turns = route.path.length - 2;
  // Out of a panel's side, up or down, and on: two bends. Up out of its top, or along from above: one.
  const riseBends = riseFt === 0 ? 0 : low && from.bottomFt < from.topFt ? 2 : 1;
  const points: Point[] = [];
  if (riseFt > 0) points.push(above(floorPoint(room, start), startFt));
  for (const point of route.path) points.push(above(point, levelAtFt));
  if (dropFt > 0) points.push(above(floorPoint(room, charger), charger.heightFt));
  return {
    route, points, upDownFt: riseFt + dropFt, bends90: turns + riseBends + (dropFt > 0 ? 1 : 0),
    lowFt: low ? riseFt : belowDoorHead(startFt, levelAtFt) + belowDoorHead(levelAtFt, charger.heightFt),
    oddities: odditiesOf(route, low),
  };
}

function odditiesOf(route: WallRoute, low: boolean): string[] {
  const oddities: string[] = [];
  if (route.overGarageDoor) oddities.push('Goes up over the garage door');
  if (route.overDoor) oddities.push('Goes up over a door or window');
  if (route.longWay) oddities.push('Goes the longer way round: the garage door’s track bars the shorter one');
  if (low) oddities.push('Goes straight across, no need to go up');
  return oddities;
}

/**
 * What a cable's part inside the garage is made of: open studs above door height and a pipe below on bare studs; inside the wall
 * where it is to be hidden in drywall; otherwise in a pipe all the way.
 */
export function cableLegs(garage: Garage, inside: Pick<InsideLeg, 'upDownFt' | 'lowFt'>, levelFt: number): RunLeg[] {
  const cover = cableCover(garage.known);
  if (cover !== 'open_studs') return [{ way: cover, levelFt, upDownFt: inside.upDownFt }];
  return [{ way: 'open_studs', levelFt, upDownFt: inside.upDownFt - inside.lowFt }, { way: 'surface', levelFt: 0, upDownFt: inside.lowFt }];
}

/** Where a cable goes on this garage's walls; `surface` is in a protecting pipe. NEC 2023 334.15; door height common practice. */
export function cableCover(known: KnownFacts): Extract<RunWay, 'open_studs' | 'finished_wall' | 'surface'> {
  if (known.wallFinish === 'bare_studs') return 'open_studs';
  return known.wallFinish === 'drywall' && known.runLook === 'hidden' ? 'finished_wall' : 'surface';
}

/** Openings to fish a cable along a finished wall: one every 8 ft and one at each corner. Source: invented for the demo. */
export const fishingPatches = (levelFt: number, turns: number): number => Math.ceil(levelFt / 8) + turns;
