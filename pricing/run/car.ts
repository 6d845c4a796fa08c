import type { Facts } from '../../shared/facts';
import type { FloorPoint, Room } from './perimeter';

export type CarAt = NonNullable<Facts['carAt']>;

/** A middling car, 16 ft by 6 ft 2 in. Source: common practice, no source. */
const LENGTH_FT = 16;
const HALF_WIDTH_FT = 6 / 2 + 1 / 12;
/** From the back wall to the bumper that faces it. Source: common practice, no source. */
const STANDS_OFF_FT = 3;
/** From a bumper to the charge port behind the near wheel. Source: common practice, no source. */
const PORT_IN_FT = 3;

/** A car from above. */
export interface CarOutline { readonly leftFt: number; readonly rightFt: number; readonly backFt: number; readonly frontFt: number }

/** Where the car stands: 3 ft from the back wall, or in the middle where the garage is too short for that; inside the side walls. */
export function carOutline(room: Room, { centerXFt }: CarAt): CarOutline {
  const centerFt = Math.min(Math.max(centerXFt, HALF_WIDTH_FT), Math.max(HALF_WIDTH_FT, room.widthFt - HALF_WIDTH_FT));
  const backFt = Math.max(0, Math.min(STANDS_OFF_FT, (room.depthFt - LENGTH_FT) / 2));
  return { leftFt: centerFt - HALF_WIDTH_FT, rightFt: centerFt + HALF_WIDTH_FT, backFt, frontFt: backFt + LENGTH_FT };
}

/** Where the charge port is, on the car's side. Left and right are the driver's. */
export function chargePort(room: Room, carAt: CarAt): FloorPoint {
  const car = carOutline(room, carAt);
  const noseIn = carAt.parked === 'nose_in';
  const onNose = carAt.portCorner === 'front_left' || carAt.portCorner === 'front_right';
  const driversLeft = carAt.portCorner === 'front_left' || carAt.portCorner === 'rear_left';
  return {
    // Nose in, the driver faces the back wall, so the driver's left is the room's left.
    xFt: driversLeft === noseIn ? car.leftFt : car.rightFt,
    yFt: onNose === noseIn ? car.backFt + PORT_IN_FT : car.frontFt - PORT_IN_FT,
  };
}
