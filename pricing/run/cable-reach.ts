import { carOutline, chargePort, type CarAt, type CarOutline } from './car';
import { floorPoint, type FloorPoint, type Room, type Spot } from './perimeter';

/** Kept slack, so that the cable can hang and be plugged. Source: the plan's legend says so; invented for the demo. */
const SLACK_FT = 3;

/** Whether the charger's cable gets to the port. Feet, slack counted in. */
export interface CableReach {
  readonly reaches: boolean;
  /** The shorter of the two ways round the car. */
  readonly usedFt: number;
  /** Missing feet, whole, rounded up; 0 when it reaches. */
  readonly shortFt: number;
  /** Both ways round the car, shorter first. */
  readonly waysFt: readonly [number, number];
}

const distanceFt = (a: FloorPoint, b: FloorPoint): number => Math.hypot(a.xFt - b.xFt, a.yFt - b.yFt);

/** True when a straight line runs through the car and not only along its side. Clips the line to the car's outline. */
function throughCar(car: CarOutline, a: FloorPoint, b: FloorPoint): boolean {
  let [from, to] = [0, 1];
  const clip = (start: number, change: number, low: number, high: number) => {
    if (change === 0) {
      if (start <= low || start >= high) to = -1;
      return;
    }
    const [first, second] = [(low - start) / change, (high - start) / change];
    from = Math.max(from, Math.min(first, second));
    to = Math.min(to, Math.max(first, second));
  };
  clip(a.xFt, b.xFt - a.xFt, car.leftFt, car.rightFt);
  clip(a.yFt, b.yFt - a.yFt, car.backFt, car.frontFt);
  return to - from > 1e-9;
}

/** Shortest way from the port to the charger that goes round the car's corners in the given order. */
function roundFt(car: CarOutline, port: FloorPoint, charger: FloorPoint, order: readonly FloorPoint[]): number {
  let [best, walkedFt, here] = [Infinity, 0, port];
  for (const corner of [null, ...order]) {
    if (corner !== null) {
      walkedFt += distanceFt(here, corner);
      here = corner;
    }
    if (!throughCar(car, here, charger)) best = Math.min(best, walkedFt + distanceFt(here, charger));
  }
  // A car longer than its garage covers the charger's place; then the straight line has to do.
  return Number.isFinite(best) ? best : distanceFt(port, charger);
}

/** How much of the cable it takes to get from the charger to the port, round the car, with slack kept. */
export function cableReach(room: Room, carAt: CarAt, chargerAt: Spot, cableLengthFt: number): CableReach {
  const car = carOutline(room, carAt);
  const port = chargePort(room, carAt);
  const charger = floorPoint(room, chargerAt);
  const [left, right] = [car.leftFt, car.rightFt];
  const onLeft = port.xFt === left;
  // From the port's side: past the back of the car to the other side, or past its front.
  const [near, far] = onLeft ? [left, right] : [right, left];
  const pastBack = [{ xFt: near, yFt: car.backFt }, { xFt: far, yFt: car.backFt }, { xFt: far, yFt: car.frontFt }];
  const pastFront = [{ xFt: near, yFt: car.frontFt }, { xFt: far, yFt: car.frontFt }, { xFt: far, yFt: car.backFt }];
  const ways = [roundFt(car, port, charger, pastBack), roundFt(car, port, charger, pastFront)].sort((a, b) => a - b);
  const waysFt = ways.map((feet) => Math.round((feet + SLACK_FT) * 10) / 10) as [number, number];
  const usedFt = waysFt[0];
  return { reaches: usedFt <= cableLengthFt, usedFt, shortFt: Math.max(0, Math.ceil(usedFt - cableLengthFt)), waysFt };
}

/** What to do about a cable that is too short, or null when it reaches. Parking the other way is offered only where that is enough. */
export function cableWords(room: Room, carAt: CarAt, chargerAt: Spot, cableLengthFt: number): string | null {
  const { reaches, shortFt } = cableReach(room, carAt, chargerAt, cableLengthFt);
  if (reaches) return null;
  const turned: CarAt = { ...carAt, parked: carAt.parked === 'nose_in' ? 'back_in' : 'nose_in' };
  const turning = carAt.parked === 'nose_in' ? 'back the car in' : 'park nose in';
  const helps = cableReach(room, turned, chargerAt, cableLengthFt).reaches;
  return `The cable is ${shortFt}\u00a0ft short. Move the charger${helps ? `, or ${turning}` : ''}.`;
}
