import { Circle, ClipPath, Defs, G, Path, Rect } from 'react-native-svg';
import type { PlanDrawing } from '../../shared/quote';
import { feetInWords } from '../../shared/units';
import { colors } from '../theme/tokens';
import { cableWay, carBox, portPlace } from './car-place';
import { inside, onWall, swept } from './plan-geometry';
import { PlanText } from './plan-text';
import type { View } from './plan-view';

interface Props { readonly plan: PlanDrawing; readonly view: View }

/** Cable kept slack, ft: taken off the reach. */
export const SLACK_FT = 3;

/** Where the cable gets to, tinted, its edge dotted; clipped to the room. */
export function Reach({ plan, view, clipId }: Props & { readonly clipId: string }) {
  const { room, charger, cable } = plan;
  const { left, top, scale } = view;
  const center = view.px(onWall(room, charger.wall, charger.alongFt));
  const r = Math.max(0, plan.cableLengthFt - SLACK_FT) * scale;
  return (
    <G>
      <Defs><ClipPath id={clipId}><Rect x={left} y={top} width={room.widthFt * scale} height={room.depthFt * scale} /></ClipPath></Defs>
      <G clipPath={`url(#${clipId})`}>
        <Circle cx={center.x} cy={center.y} r={r} fill={colors.lake} fillOpacity={0.05} stroke={cable.reaches ? colors.lake : colors.stop} strokeWidth={2} strokeDasharray="1 6" strokeLinecap="round" />
      </G>
    </G>
  );
}

/** What the arc means, where there is room for the words beside the car. */
export function ReachWords({ plan, view }: Props) {
  const { room, charger, cable } = plan;
  const box = carBox(plan);
  const at = onWall(room, charger.wall, charger.alongFt);
  const reach = plan.cableLengthFt - SLACK_FT;
  const onLeft = box.left >= room.widthFt - box.right;
  const [from, to] = onLeft ? [Math.max(0.8, at.x - reach), box.left] : [box.right, Math.min(room.widthFt - 0.8, at.x + reach)];
  if (view.compact || (to - from) * view.scale < 76) return null;
  const { x, y } = view.px({ x: (from + to) / 2, y: Math.min(room.depthFt - 5, Math.max(5, at.y)) });
  const tone = cable.reaches ? 'lake' : 'stop';
  return (
    <G>
      <PlanText x={x} y={y - 4} color={tone} halo>{cable.reaches ? `${feetInWords(plan.cableLengthFt)} cable` : `${feetInWords(cable.shortFt)} short`}</PlanText>
      <PlanText x={x} y={y + 13} color={tone} weight={500} halo>{cable.reaches ? 'reaches here' : 'of cable'}</PlanText>
    </G>
  );
}

/** The car from above, its nose where it stands, with the charge port as a ring and the cable to it. */
export function Car({ plan, view }: Props) {
  const box = carBox(plan);
  const { x, y } = view.px({ x: box.left, y: box.back });
  const [w, h] = [(box.right - box.left) * view.scale, (box.front - box.back) * view.scale];
  const [left, right] = [x, x + w];
  // Drawn with its nose to the back wall; turned round its middle when backed in.
  const turn = `rotate(${plan.car.parked === 'back_in' ? 180 : 0} ${x + w / 2} ${y + h / 2})`;
  // Between the windows, whichever way it stands.
  const middle = y + h * (plan.car.parked === 'back_in' ? 0.37 : 0.6);
  const line = { stroke: colors.lake, strokeWidth: view.compact ? 1.4 : 2 } as const;
  return (
    <G>
      <G transform={turn}>
        <Path d={`M${left} ${y + h * 0.16}C${left} ${y + h * 0.04} ${left + w * 0.18} ${y} ${x + w / 2} ${y}C${right - w * 0.18} ${y} ${right} ${y + h * 0.04} ${right} ${y + h * 0.16}V${y + h * 0.9}Q${right} ${y + h} ${right - w * 0.2} ${y + h}H${left + w * 0.2}Q${left} ${y + h} ${left} ${y + h * 0.9}Z`} fill={colors.planCar} {...line} />
        <Path d={`M${left + w * 0.13} ${y + h * 0.33}Q${x + w / 2} ${y + h * 0.23} ${right - w * 0.13} ${y + h * 0.33}L${right - w * 0.2} ${y + h * 0.43}Q${x + w / 2} ${y + h * 0.37} ${left + w * 0.2} ${y + h * 0.43}Z`} fill={colors.white} {...line} strokeWidth={1.4} />
        <Path d={`M${left + w * 0.22} ${y + h * 0.8}H${right - w * 0.22}L${right - w * 0.17} ${y + h * 0.89}Q${x + w / 2} ${y + h * 0.93} ${left + w * 0.17} ${y + h * 0.89}Z`} fill={colors.white} {...line} strokeWidth={1.4} />
        <Path d={`M${left} ${y + h * 0.35}l-${w * 0.05} -${h * 0.012}v${h * 0.03}zM${right} ${y + h * 0.35}l${w * 0.05} -${h * 0.012}v${h * 0.03}z`} fill={colors.lake} />
      </G>
      {view.compact ? null : (
        <G>
          <PlanText x={x + w / 2} y={middle} color="lake">Your car</PlanText>
          <PlanText x={x + w / 2} y={middle + 18} color="ink2" weight={500}>{plan.car.parked === 'nose_in' ? 'nose in' : 'back in'}</PlanText>
        </G>
      )}
    </G>
  );
}

/** The cable from the charger to the port: round the car where it must; in the stop color when it is too short. */
export function Cable({ plan, view }: Props) {
  const { room, charger, cable } = plan;
  const way = cableWay(plan, inside(room, onWall(room, charger.wall, charger.alongFt), 0.8)).map(view.px);
  const port = view.px(portPlace(plan));
  const tone = cable.reaches ? colors.lake : colors.stop;
  const ring = { stroke: colors.lake, strokeWidth: view.compact ? 2 : 3 } as const;
  const [first, last] = [way[0], way.at(-1)];
  const hangs = way.length === 2 && first && last
    ? `M${first.x} ${first.y}Q${first.x} ${(first.y + last.y) / 2} ${last.x} ${last.y}`
    : swept(way, view.scale);
  return (
    <G>
      <Path d={hangs} fill="none" stroke={tone} strokeWidth={view.compact ? 2 : 2.6} strokeLinecap="round" {...(cable.reaches ? {} : { strokeDasharray: '6 5' })} />
      <Circle cx={port.x} cy={port.y} r={view.compact ? 4 : 8} fill={colors.white} {...ring} />
    </G>
  );
}
