import type { PlanDrawing } from '../../shared/quote';

export interface PointFt { readonly x: number; readonly y: number }
export type Wall = PlanDrawing['charger']['wall'];

/** Origin: the inner corner back left. x to the right, y towards the front wall with the garage door. */
export function onWall(room: PlanDrawing['room'], wall: Wall, alongFt: number): PointFt {
  if (wall === 'back') return { x: alongFt, y: 0 };
  if (wall === 'front') return { x: alongFt, y: room.depthFt };
  return { x: wall === 'left' ? 0 : room.widthFt, y: alongFt };
}

/** The same place moved into the room by `byFt`, and kept in it. */
export const inside = (room: PlanDrawing['room'], { x, y }: PointFt, byFt: number): PointFt => ({
  x: Math.min(room.widthFt - byFt, Math.max(byFt, x)),
  y: Math.min(room.depthFt - byFt, Math.max(byFt, y)),
});

/** The walls that a place lies on. */
export const wallsAt = (room: PlanDrawing['room'], { x, y }: PointFt): readonly Wall[] => {
  const near = (a: number, b: number) => Math.abs(a - b) < 0.3;
  return ([near(y, 0) && 'back', near(x, room.widthFt) && 'right', near(y, room.depthFt) && 'front', near(x, 0) && 'left'] as const).filter((wall): wall is Wall => wall !== false);
};

/** The run seen from above: one point for each corner. */
export function runFromAbove(run: NonNullable<PlanDrawing['run']>): readonly PointFt[] {
  const points: PointFt[] = [];
  for (const { xFt: x, yFt: y } of run.points) {
    const last = points.at(-1);
    if (last && Math.hypot(last.x - x, last.y - y) < 0.05) continue;
    const before = points.at(-2);
    const straight = before && last && Math.abs((last.x - before.x) * (y - last.y) - (last.y - before.y) * (x - last.x)) < 0.01;
    if (straight) points.pop();
    points.push({ x, y });
  }
  return points;
}

/** A line through points with its corners rounded by quarter sweeps of radius `r` (as far as the parts are long enough). */
export function swept(points: readonly PointFt[], r: number): string {
  const at = ({ x, y }: PointFt) => `${x.toFixed(1)} ${y.toFixed(1)}`;
  const toward = (from: PointFt, to: PointFt, by: number): PointFt => {
    const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
    return { x: from.x + ((to.x - from.x) / length) * by, y: from.y + ((to.y - from.y) / length) * by };
  };
  return points
    .map((point, index) => {
      const [before, next] = [points[index - 1], points[index + 1]];
      if (!before) return `M${at(point)}`;
      if (!next) return `L${at(point)}`;
      const room = Math.min(r, Math.hypot(point.x - before.x, point.y - before.y) / 2, Math.hypot(next.x - point.x, next.y - point.y) / 2);
      return `L${at(toward(point, before, room))}Q${at(point)} ${at(toward(point, next, room))}`;
    })
    .join('');
}

/** How far along each wall the run goes: for the dimension lines. */
export function runOnWalls(room: PlanDrawing['room'], points: readonly PointFt[]): readonly { readonly wall: Wall; readonly fromFt: number; readonly toFt: number }[] {
  return points.slice(1).flatMap((point, index) => {
    const before = points[index];
    const wall = before && wallsAt(room, before).find((entry) => wallsAt(room, point).includes(entry));
    if (!before || !wall) return [];
    const [a, b] = wall === 'back' || wall === 'front' ? [before.x, point.x] : [before.y, point.y];
    return Math.abs(a - b) < 1 ? [] : [{ wall, fromFt: Math.min(a, b), toFt: Math.max(a, b) }];
  });
}
