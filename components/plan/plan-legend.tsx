import { View } from 'react-native';
import Svg, { Circle, Line, Rect } from 'react-native-svg';
import { colors, space } from '../theme/tokens';
import { Text } from '../ui/text';
import { SLACK_FT } from './plan-car';

/** What the lines of the plan mean. */
export function PlanLegend() {
  const entries = [
    { words: 'conduit run', mark: <><Rect y={4} width={32} height={8} fill={colors.live} /><Line x1={0} x2={32} y1={4} y2={4} stroke={colors.copperDeep} strokeWidth={1.5} /><Line x1={0} x2={32} y1={12} y2={12} stroke={colors.copperDeep} strokeWidth={1.5} /></> },
    { words: `cable reach, ${SLACK_FT}\u00a0ft kept slack`, mark: <Line x1={1} x2={32} y1={8} y2={8} stroke={colors.lake} strokeWidth={2.4} strokeDasharray="1 6" strokeLinecap="round" /> },
    { words: 'charge port', mark: <Circle cx={16} cy={8} r={5} fill={colors.white} stroke={colors.lake} strokeWidth={2.6} /> },
  ];
  return (
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'center', columnGap: space[5], rowGap: space[1], paddingTop: space[2] }}>
      {entries.map((entry) => (
        <View key={entry.words} style={{ flexDirection: 'row', alignItems: 'center', gap: space[2] }}>
          <Svg width={32} height={16} aria-hidden>{entry.mark}</Svg>
          <Text variant="note" color="ink2">{entry.words}</Text>
        </View>
      ))}
      <Text variant="note" color="ink2">{'One square is 1\u00a0ft'}</Text>
    </View>
  );
}
