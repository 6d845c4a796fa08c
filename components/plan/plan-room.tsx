import { G, Line, Path, Rect } from 'react-native-svg';
import type { PlanDrawing } from '../../shared/quote';
import { feetInWords } from '../../shared/units';
import { colors } from '../theme/tokens';
import { PlanText } from './plan-text';
import { onWallBox, type View } from './plan-view';

interface Props { readonly plan: PlanDrawing; readonly view: View }

/** The floor with its 1 ft grid, heavier each 5 ft. */
export function Floor({ plan: { room }, view }: Props) {
  const { left, top, scale } = view;
  const [width, depth] = [room.widthFt * scale, room.depthFt * scale];
  const lines = (lengthFt: number) => Array.from({ length: Math.max(0, Math.ceil(lengthFt) - 1) }, (_, index) => index + 1);
  const stroke = (ft: number) =>
    (ft % 5 === 0 ? { stroke: colors.planGrid5, strokeWidth: 1.2 } : { stroke: colors.planGrid, strokeWidth: 1 });
  return (
    <G>
      <Rect x={left} y={top} width={width} height={depth} fill={colors.card} />
      {lines(room.widthFt).map((ft) => <Line key={`x${ft}`} x1={left + ft * scale} x2={left + ft * scale} y1={top} y2={top + depth} {...stroke(ft)} />)}
      {lines(room.depthFt).map((ft) => <Line key={`y${ft}`} x1={left} x2={left + width} y1={top + ft * scale} y2={top + ft * scale} {...stroke(ft)} />)}
    </G>
  );
}

/** Walls 6 in. thick, with the garage door dashed in its gap and the house door on its swing. */
export function Walls({ plan, view }: Props) {
  const { room, garageDoor, houseDoor } = plan;
  const { left, top, scale, wallPx, compact } = view;
  const [right, bottom] = [left + room.widthFt * scale, top + room.depthFt * scale];
  const half = wallPx / 2;
  const door = garageDoor && onWallBox(view, room, 'front', garageDoor.alongFt, garageDoor.widthFt);
  return (
    <G>
      <Path d={`M${left - half} ${top - half}H${right + half}V${bottom + half}H${left - half}Z`} fill="none" stroke={colors.ink} strokeWidth={wallPx} />
      {door ? (
        <G>
          <Rect {...door} y={door.y - 0.5} height={door.height + 1} fill={colors.paper} />
          {[0.3, 0.85].map((share) => (
            <Line key={share} x1={door.x} x2={door.x + door.width} y1={door.y + wallPx * share} y2={door.y + wallPx * share} stroke={colors.ink2} strokeWidth={1.4} strokeDasharray="6 4" />
          ))}
          {compact ? null : <PlanText x={left + Math.min(room.widthFt * scale * 0.32, door.x - left + door.width / 2)} y={bottom - 10} halo weight={500} color="ink2">{`garage door ${feetInWords(garageDoor.widthFt)}`}</PlanText>}
        </G>
      ) : null}
      {houseDoor ? <HouseDoor plan={plan} view={view} door={houseDoor} /> : null}
    </G>
  );
}

/** The gap, the leaf standing open into the room, and the quarter circle it swings through. */
function HouseDoor({ plan: { room }, view, door }: Props & { door: NonNullable<PlanDrawing['houseDoor']> }) {
  const gap = onWallBox(view, room, door.wall, door.alongFt, door.widthFt, 0.5);
  const leaf = door.widthFt * view.scale;
  const back = door.wall === 'back';
  const face = back ? view.top : door.wall === 'left' ? view.left : view.left + room.widthFt * view.scale;
  const into = door.wall === 'right' ? -1 : 1;
  const [x, y] = back ? [gap.x + gap.width, face] : [face, gap.y + gap.height];
  const tip = back ? { x, y: y + leaf } : { x: x + into * leaf, y };
  const start = back ? { x: x - leaf, y } : { x, y: y - leaf };
  const sweep = back ? 0 : door.wall === 'left' ? 1 : 0;
  const words = back ? { x: gap.x + gap.width / 2, y: y + leaf + 16 } : { x: x + into * Math.max(leaf * 0.72, 36), y: y + 18 };
  return (
    <G>
      <Rect {...gap} fill={colors.paper} />
      <Path d={`M${start.x} ${start.y}A${leaf} ${leaf} 0 0 ${sweep} ${tip.x} ${tip.y}`} fill="none" stroke={colors.ink2} strokeWidth={1.2} strokeDasharray="4 3" />
      <Line x1={x} y1={y} x2={tip.x} y2={tip.y} stroke={colors.ink2} strokeWidth={1.6} />
      {view.compact ? null : <PlanText {...words} halo weight={500} color="ink2">to house</PlanText>}
    </G>
  );
}
