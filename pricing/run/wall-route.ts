import { corners, feetOnward, feetRound, floorPoint, perimeterFt, type FloorPoint, type Room, type Spot } from './perimeter';

/** An opening in a wall; `alongFt` is its near edge. */
export interface Opening extends Spot { readonly widthFt: number }
/** Walls to go along: the room, its ceiling, its doors and windows, and the garage door. */
export interface Walls {
  readonly room: Room;
  readonly ceilingFt: number;
  readonly openings: readonly Opening[];
  readonly garageDoor: { readonly alongFt: number; readonly widthFt: number } | null;
}

/** A way along the walls between two spots, at one height. */
export interface WallRoute {
  readonly levelFt: number;
  readonly heightFt: number;
  /** Straight across at the charger's height, without going up. */
  readonly low: boolean;
  /** From the first spot to the second, with the corners between. */
  readonly path: readonly FloorPoint[];
  readonly overDoor: boolean;
  readonly overGarageDoor: boolean;
  /** True when the other way round is shorter and the garage door bars it. */
  readonly longWay: boolean;
}

/** Below the ceiling, so that straps and a hand fit. Source: common practice, no source. */
const UNDER_CEILING_FT = 0.5;
/** An 80 in. door with its trim. Source: common practice, no source. */
export const DOOR_HEAD_FT = 7;
/** A 7 ft garage door with 18 in. for its springs and track. Source: common practice, no source. */
export const GARAGE_DOOR_HEAD_FT = 8.5;
/** Neighbors this close are joined straight across. Source: invented for the demo. */
const NEIGHBORS_FT = 6;
/** Less than this is rounding, not crossing. */
const TOUCH_FT = 1e-6;

/** Height at which a run goes along the walls: just below the ceiling, at least over a house door. Feet. */
export const runHeightFt = (ceilingFt: number): number => Math.min(ceilingFt, Math.max(ceilingFt - UNDER_CEILING_FT, DOOR_HEAD_FT));

/** True when an opening lies on the way from `start` over `feet`, going onward. Touching an edge is not crossing. */
function crosses(room: Room, opening: Opening, start: number, feet: number): boolean {
  const nearEdge = feetRound(room, opening);
  const farEdge = feetRound(room, { wall: opening.wall, alongFt: opening.alongFt + opening.widthFt });
  // Going round, the front and left walls are met from their far end.
  const farFirst = opening.wall === 'left' || opening.wall === 'front';
  const [first, second] = farFirst ? [farEdge, nearEdge] : [nearEdge, farEdge];
  const width = feetOnward(room, first, second);
  const gap = feetOnward(room, start, first);
  return gap < feet - TOUCH_FT || gap + width > perimeterFt(room) + TOUCH_FT;
}

/** One way round: its feet, and whether it meets a door. */
interface Round { readonly levelFt: number; readonly overDoor: boolean; readonly overGarageDoor: boolean }

function round({ room, openings, garageDoor }: Walls, from: Spot, to: Spot): Round {
  const start = feetRound(room, from);
  const levelFt = feetOnward(room, start, feetRound(room, to));
  let overDoor = false;
  for (const opening of openings) overDoor ||= crosses(room, opening, start, levelFt);
  const door: Opening | null = garageDoor && { wall: 'front', alongFt: garageDoor.alongFt, widthFt: garageDoor.widthFt };
  return { levelFt, overDoor, overGarageDoor: door !== null && crosses(room, door, start, levelFt) };
}

const passes = (way: Round, heightFt: number): boolean => !way.overGarageDoor || heightFt >= GARAGE_DOOR_HEAD_FT;

/** The spots and the corners between them, going the way of `feetRound`. */
function pathOnward(room: Room, from: Spot, to: Spot): FloorPoint[] {
  const start = feetRound(room, from);
  const levelFt = feetOnward(room, start, feetRound(room, to));
  const turns = corners(room);
  const next = Math.max(0, turns.findIndex(({ at }) => at > start));
  const path = [floorPoint(room, from)];
  for (let step = 0; step < turns.length; step += 1) {
    const corner = turns[(next + step) % turns.length];
    const after = corner ? feetOnward(room, start, corner.at) : 0;
    if (corner && after > 0 && after < levelFt) path.push(corner.point);
  }
  path.push(floorPoint(room, to));
  return path;
}

/**
 * The shorter way round the room that can be built: over doors and windows, over the garage door only where its springs and track
 * leave room. Neighbors without a door between are joined straight across.
 * @returns null when the garage door bars both ways, which happens only to a thing that hangs on it.
 */
export function wallRoute(walls: Walls, from: Spot, to: Spot): WallRoute | null {
  const heightFt = runHeightFt(walls.ceilingFt);
  const onward = round(walls, from, to);
  const back = round(walls, to, from);
  const [near, far] = onward.levelFt <= back.levelFt ? [onward, back] : [back, onward];
  const way = passes(near, heightFt) ? near : passes(far, heightFt) ? far : null;
  if (way === null) return null;
  const { levelFt, overDoor, overGarageDoor } = way;
  const path = way === onward ? pathOnward(walls.room, from, to) : pathOnward(walls.room, to, from).reverse();
  const low = levelFt <= NEIGHBORS_FT && !overDoor && !overGarageDoor;
  return { levelFt, heightFt, low, path, overDoor, overGarageDoor, longWay: way === far };
}
