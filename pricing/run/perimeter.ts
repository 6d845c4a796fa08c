import type { Wall } from '../../shared/facts';

export interface Room { readonly widthFt: number; readonly depthFt: number }
/** `alongFt`: from the left corner on the back and front walls, from the back wall on the left and right walls. */
export interface Spot { readonly wall: Wall; readonly alongFt: number }
export interface FloorPoint { readonly xFt: number; readonly yFt: number }
/** A place in the garage: origin at the inner back-left corner, x to the right, y to the garage door, z up; feet. */
export interface Point extends FloorPoint { readonly zFt: number }

/** The place at a height above a floor point. */
export const above = ({ xFt, yFt }: FloorPoint, zFt: number): Point => ({ xFt, yFt, zFt });

/** Inner length of a wall, feet. */
export const wallLengthFt = (room: Room, wall: Wall): number => (wall === 'back' || wall === 'front' ? room.widthFt : room.depthFt);

/** Feet all the way round the room. */
export const perimeterFt = (room: Room): number => 2 * (room.widthFt + room.depthFt);

/** A spot as feet along the walls from the back-left corner: back wall first, then right, front, left. Held inside its wall. */
export function feetRound(room: Room, { wall, alongFt }: Spot): number {
  const { widthFt, depthFt } = room;
  const along = Math.min(Math.max(0, alongFt), wallLengthFt(room, wall));
  switch (wall) {
    case 'back': return along;
    case 'right': return widthFt + along;
    case 'front': return widthFt + depthFt + (widthFt - along);
    case 'left': return (perimeterFt(room) - along) % perimeterFt(room);
  }
}

/** Where the spot is on the floor plan. */
export function floorPoint(room: Room, { wall, alongFt }: Spot): FloorPoint {
  const along = Math.min(Math.max(0, alongFt), wallLengthFt(room, wall));
  switch (wall) {
    case 'back': return { xFt: along, yFt: 0 };
    case 'right': return { xFt: room.widthFt, yFt: along };
    case 'front': return { xFt: along, yFt: room.depthFt };
    case 'left': return { xFt: 0, yFt: along };
  }
}

/** The four corners in the order of `feetRound`, with their feet round. */
export const corners = ({ widthFt, depthFt }: Room): readonly { readonly at: number; readonly point: FloorPoint }[] => [
  { at: 0, point: { xFt: 0, yFt: 0 } },
  { at: widthFt, point: { xFt: widthFt, yFt: 0 } },
  { at: widthFt + depthFt, point: { xFt: widthFt, yFt: depthFt } },
  { at: 2 * widthFt + depthFt, point: { xFt: 0, yFt: depthFt } },
];

/** Feet from one place to another going the way of `feetRound`. */
export const feetOnward = (room: Room, from: number, to: number): number => {
  const feet = to - from;
  return feet < 0 ? feet + perimeterFt(room) : feet;
};
