import { useState } from 'react';
import { View } from 'react-native';
import Svg, { Line, Path, Rect } from 'react-native-svg';
import type { PlanDrawing } from '../../shared/quote';
import { feetInWords, inchesInWords } from '../../shared/units';
import { Conduit } from '../drawings/conduit';
import { colors, radius } from '../theme/tokens';
import { PlanText } from './plan-text';

/** Highest place of the charger's reach off the floor, in. The form's own limit. */
const HIGHEST_IN = 60;
const HEIGHT_PX = 112;
const FLOOR_PX = 104;

/** The charger's wall from the side: where the conduit comes down, how high the charger hangs, and the limit. */
export function SideView({ plan }: { readonly plan: PlanDrawing }) {
  const [widthPx, setWidthPx] = useState(340);
  const { charger, run } = plan;
  const runFt = run && run.points.length > 0 ? Math.max(...run.points.map((point) => point.zFt)) : null;
  const perFt = (FLOOR_PX - 12) / Math.max(plan.ceilingFt, (runFt ?? 0) + 0.5);
  const up = (ft: number) => FLOOR_PX - ft * perFt;
  const x = widthPx * 0.37;
  const charged = up(charger.heightIn / 12);
  const tooHigh = charger.heightIn > HIGHEST_IN;
  const words = `Side view: ${runFt === null ? '' : `conduit at ${feetInWords(runFt)}, `}charger ${inchesInWords(charger.heightIn)} off the floor, ${inchesInWords(HIGHEST_IN)} at most.`;
  return (
    <View role="img" aria-label={words} onLayout={(event) => setWidthPx(event.nativeEvent.layout.width || widthPx)} style={{ height: HEIGHT_PX, borderRadius: radius.small, overflow: 'hidden', backgroundColor: colors.elevation }}>
      <Svg width={widthPx} height={HEIGHT_PX} viewBox={`0 0 ${widthPx} ${HEIGHT_PX}`} aria-hidden>
        <Line x1={0} x2={widthPx} y1={up(HIGHEST_IN / 12)} y2={up(HIGHEST_IN / 12)} stroke={colors.stop} strokeWidth={1.6} strokeDasharray="6 4" />
        <PlanText x={widthPx - 6} y={up(HIGHEST_IN / 12) - 5} anchor="end" size={12} color="stop">{`${inchesInWords(HIGHEST_IN)} at most`}</PlanText>
        {runFt === null ? null : (
          <>
            <Conduit d={`M-4 ${up(runFt)}H${x - 9}Q${x} ${up(runFt)} ${x} ${up(runFt) + 9}V${charged}`} width={7} />
            <PlanText x={8} y={up(runFt) + 18} anchor="start" size={12} weight={600} color="ink2">{`conduit at ${feetInWords(runFt)}`}</PlanText>
          </>
        )}
        <Rect x={x - 9} y={charged - 8} width={18} height={20} rx={5} fill={tooHigh ? colors.stop : colors.spruce} />
        <Path d={`M${x + 18} ${charged}h14M${x + 25} ${charged}V${FLOOR_PX}M${x + 20} ${FLOOR_PX}h10`} fill="none" stroke={colors.lake} strokeWidth={1.6} />
        <PlanText x={x + 36} y={(charged + FLOOR_PX) / 2 + 5} anchor="start" color={tooHigh ? 'stop' : 'lake'}>{inchesInWords(charger.heightIn)}</PlanText>
        <Line x1={0} x2={widthPx} y1={FLOOR_PX + 1.5} y2={FLOOR_PX + 1.5} stroke={colors.ink} strokeWidth={3} />
      </Svg>
    </View>
  );
}
