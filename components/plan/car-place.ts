import type { PlanDrawing } from '../../shared/quote';
import type { PointFt } from './plan-geometry';

/** The middling car that the server measures cables against; a test holds these and its own together. */
const LENGTH_FT = 16;
const HALF_WIDTH_FT = 37 / 12;
const STANDS_OFF_FT = 3;
const PORT_IN_FT = 3;

export interface CarBox { readonly left: number; readonly right: number; readonly back: number; readonly front: number }

/** Where the car stands in the room, ft. */
export function carBox({ room, car }: PlanDrawing): CarBox {
  const center = Math.min(Math.max(car.centerXFt, HALF_WIDTH_FT), Math.max(HALF_WIDTH_FT, room.widthFt - HALF_WIDTH_FT));
  const back = Math.max(0, Math.min(STANDS_OFF_FT, (room.depthFt - LENGTH_FT) / 2));
  return { left: center - HALF_WIDTH_FT, right: center + HALF_WIDTH_FT, back, front: back + LENGTH_FT };
}

/** The charge port on the car's side. Left and right are the driver's; nose in, the driver faces the back wall. */
export function portPlace(plan: PlanDrawing): PointFt {
  const box = carBox(plan);
  const noseIn = plan.car.parked === 'nose_in';
  const driversLeft = plan.car.portCorner.endsWith('left');
  const onNose = plan.car.portCorner.startsWith('front');
  return { x: driversLeft === noseIn ? box.left : box.right, y: onNose === noseIn ? box.back + PORT_IN_FT : box.front - PORT_IN_FT };
}

/** True when the straight line between two places runs through the car, not only along its side. */
function crosses(box: CarBox, a: PointFt, b: PointFt): boolean {
  // Sampling is plenty for a drawing: every half per cent of the line.
  return Array.from({ length: 199 }, (_, index) => (index + 1) / 200).some((share) => {
    const [x, y] = [a.x + (b.x - a.x) * share, a.y + (b.y - a.y) * share];
    return x > box.left + 0.02 && x < box.right - 0.02 && y > box.back + 0.02 && y < box.front - 0.02;
  });
}

/** The cable's way from the charger to the port: straight, or round the car by the shorter side. */
export function cableWay(plan: PlanDrawing, charger: PointFt): readonly PointFt[] {
  const box = carBox(plan);
  const port = portPlace(plan);
  if (!crosses(box, charger, port)) return [charger, port];
  const [near, far] = port.x === box.left ? [box.left, box.right] : [box.right, box.left];
  const ways = [[box.back, box.front], [box.front, box.back]].map(([first = 0, second = 0]) => {
    const corners = [{ x: near, y: first }, { x: far, y: first }, { x: far, y: second }];
    const needed = corners.findIndex((corner) => !crosses(box, corner, charger));
    return [charger, ...corners.slice(0, needed + 1).reverse(), port];
  });
  const length = (way: readonly PointFt[]) =>
    way.slice(1).reduce((sum, point, index) => sum + Math.hypot(point.x - (way[index]?.x ?? 0), point.y - (way[index]?.y ?? 0)), 0);
  return ways.reduce((best, way) => (length(way) < length(best) ? way : best));
}
