import { G, Line, Rect } from 'react-native-svg';
import type { PlanDrawing } from '../../shared/quote';
import { feetInWords } from '../../shared/units';
import { Conduit } from '../drawings/conduit';
import { colors } from '../theme/tokens';
import { inside, onWall, runFromAbove, runOnWalls, swept, type PointFt, type Wall } from './plan-geometry';
import { PlanText } from './plan-text';
import { onWallBox, type View } from './plan-view';

interface Props { readonly plan: PlanDrawing; readonly view: View }

const STRAP_EACH_FT = 4;

/** The copper run from panel to charger, strapped, each corner a sweep. */
export function Run({ plan, view }: Props) {
  const { room, run } = plan;
  if (!run) return null;
  const width = Math.max(view.compact ? 4 : 7, view.scale * 0.36);
  const inset = (width / 2 + (view.compact ? 1 : 4)) / view.scale;
  const way = runFromAbove(run).map((point) => view.px(inside(room, point, inset)));
  return (
    <G>
      <Conduit d={swept(way, width * 1.7)} width={width} />
      {view.compact ? null : straps(way, width, view.scale).map(({ x, y, upright }) => (
        <Line key={`${x.toFixed()}-${y.toFixed()}`} x1={x - (upright ? 0 : width * 0.9)} x2={x + (upright ? 0 : width * 0.9)} y1={y - (upright ? width * 0.9 : 0)} y2={y + (upright ? width * 0.9 : 0)} stroke={colors.ink} strokeWidth={2} />
      ))}
    </G>
  );
}

/** Where straps sit: evenly, at most four feet apart, none in a corner. */
function straps(way: readonly PointFt[], width: number, scale: number): readonly (PointFt & { readonly upright: boolean })[] {
  return way.slice(1).flatMap((to, index) => {
    const from = way[index];
    if (!from) return [];
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    const count = Math.floor(Math.max(0, length - 3 * width) / (STRAP_EACH_FT * scale)) + (length > 6 * width ? 1 : 0);
    return Array.from({ length: count }, (_, strap) => {
      const share = (strap + 1) / (count + 1);
      const [byX, byY] = [to.x - from.x, to.y - from.y];
      return { x: from.x + byX * share, y: from.y + byY * share, upright: Math.abs(byX) > Math.abs(byY) };
    });
  });
}

/** Panel and charger on their walls. */
export function Fittings({ plan, view }: Props) {
  const { room, panel, charger } = plan;
  const [panelHalf, chargerHalf] = [0.9, view.compact ? 0.5 : 0.62];
  const box = (wall: Wall, alongFt: number, halfFt: number, depthPx: number) => {
    const onIt = onWallBox(view, room, wall, alongFt - halfFt, 2 * halfFt);
    const deep = Math.max(depthPx, view.wallPx * 0.9);
    if (wall === 'back') return { ...onIt, y: view.top, height: deep };
    if (wall === 'front') return { ...onIt, y: onIt.y - deep, height: deep };
    return { ...onIt, x: wall === 'left' ? view.left : onIt.x - deep, width: deep };
  };
  const white = { stroke: colors.white, strokeWidth: view.compact ? 1 : 2, rx: view.compact ? 2 : 4 } as const;
  const label = panel && view.px(inside(room, onWall(room, panel.wall, panel.alongFt), 1.9));
  // On a side wall the words start at the wall; on the others they stay clear of the corners.
  const labelX = !label ? 0 : panel?.wall === 'left' || panel?.wall === 'right' ? label.x : Math.max(view.left + 44, Math.min(view.left + room.widthFt * view.scale - 44, label.x));
  const side = panel?.wall === 'left' ? 'start' : panel?.wall === 'right' ? 'end' : 'middle';
  return (
    <G>
      {panel ? <Rect {...box(panel.wall, panel.alongFt, panelHalf, view.scale * 0.75)} fill={colors.spruce} {...white} /> : null}
      <Rect {...box(charger.wall, charger.alongFt, chargerHalf, view.scale * 0.95)} fill={colors.copper} {...white} />
      {panel && label && !view.compact ? (
        <G>
          <PlanText x={labelX} y={label.y} anchor={side} weight={800} halo>Panel</PlanText>
          <PlanText x={labelX} y={label.y + 17} anchor={side} weight={500} color="ink2" halo>{`top at ${feetInWords(panel.topIn / 12)}`}</PlanText>
        </G>
      ) : null}
    </G>
  );
}

/** Dimension lines outside of the walls: the room's in ink, the run's in copper. */
export function Dimensions({ plan: { room, run }, view }: Props) {
  if (view.compact) return null;
  const runs = run ? runOnWalls(room, runFromAbove(run)) : [];
  const taken = new Set(runs.map((part) => part.wall));
  return (
    <G>
      <Dimension view={view} room={room} wall={taken.has('front') && !taken.has('back') ? 'back' : 'front'} fromFt={0} toFt={room.widthFt} color="ink2" />
      <Dimension view={view} room={room} wall={taken.has('left') && !taken.has('right') ? 'right' : 'left'} fromFt={0} toFt={room.depthFt} color="ink2" />
      {runs.filter((part) => part.wall === 'back' || part.wall === 'right' || !taken.has(part.wall === 'front' ? 'back' : 'right')).map((part) => (
        <Dimension key={`${part.wall}${part.fromFt}`} view={view} room={room} {...part} color="copper" />
      ))}
    </G>
  );
}

function Dimension({ view, room, wall, fromFt, toFt, color }: { view: View; room: PlanDrawing['room']; wall: Wall; fromFt: number; toFt: number; color: 'ink2' | 'copper' }) {
  const off = view.wallPx + 17;
  const level = wall === 'back' || wall === 'front';
  const outward = wall === 'back' || wall === 'left' ? -off : off;
  const shift = ({ x, y }: PointFt): PointFt => (level ? { x, y: y + outward } : { x: x + outward, y });
  const [a, b] = [fromFt, toFt].map((ft) => shift(view.px(onWall(room, wall, ft)))) as [PointFt, PointFt];
  const middle = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
  const words = feetInWords(toFt - fromFt);
  const half = words.length * 3.8 + 6;
  const stroke = { stroke: colors[color], strokeWidth: 1.3 } as const;
  const [byX, byY] = level ? [half, 0] : [0, half];
  const [near, far] = [{ x: middle.x - byX, y: middle.y - byY }, { x: middle.x + byX, y: middle.y + byY }];
  return (
    <G>
      <Line x1={a.x} y1={a.y} x2={near.x} y2={near.y} {...stroke} />
      <Line x1={far.x} y1={far.y} x2={b.x} y2={b.y} {...stroke} />
      {[a, b].map(({ x, y }, end) => <Line key={end} x1={x - 4} y1={y + 4} x2={x + 4} y2={y - 4} {...stroke} strokeWidth={2} />)}
      <PlanText x={middle.x + (level ? 0 : 4.5)} y={middle.y + (level ? 4.5 : 0)} color={color} weight={800} turn={level ? 0 : -90}>
        {words}
      </PlanText>
    </G>
  );
}
