import { StyleSheet, View } from 'react-native';
import Svg, { Circle, ClipPath, Defs, G, Path, Rect, Text as SvgText } from 'react-native-svg';
import { family } from '../theme/fonts';
import { colors, radius, space } from '../theme/tokens';
import { Text } from '../ui/text';

/** Where the main breaker and a blank space are: the panel with its door open, the main magnified. Words beside it where there is room. */
export function PanelDoorDrawing() {
  return (
    <View style={styles.picture}>
      <View dataSet={{ only: 'tablet-up' }} style={styles.left} aria-hidden>
        <Text weight={800}>The biggest handle,</Text>
        <Text weight={700} color="ink2">at the very top or very bottom</Text>
      </View>
      <View dataSet={{ part: 'panel-drawing' }} role="img" aria-label="An open panel. The main breaker is the biggest handle, at the very top or bottom; its number is printed on it. A blank space has a cover plate and no handle." style={styles.drawing}>
        <Svg width="100%" height="100%" viewBox="0 0 226 168" preserveAspectRatio="xMidYMin slice" aria-hidden><OpenDoor /></Svg>
      </View>
      <View style={styles.right} aria-hidden>
        <Text weight={800}>Main breaker</Text>
        <Text variant="note" weight={700} color="ink2">read the number here</Text>
        <View style={styles.blank}>
          <View style={styles.blankBox} />
          <Text variant="note" weight={700} color="ink2">a blank space</Text>
        </View>
      </View>
    </View>
  );
}

const DOOR = '#D9D6C7';

/** One breaker; its knob so far from its left end. */
function Breaker({ x, y, knob }: { x: number; y: number; knob: number }) {
  return (
    <G>
      <Rect x={x} y={y} width={34} height={17} rx={4} fill={colors.spruce} />
      <Rect x={x + knob} y={y + 4} width={11} height={9} rx={2.5} fill={colors.card} />
    </G>
  );
}

function OpenDoor() {
  const edge = { stroke: colors.ink, strokeWidth: 2.6, strokeLinejoin: 'round' } as const;
  return (
    <G>
      <Defs><ClipPath id="glass"><Circle cx={152} cy={50} r={39} /></ClipPath></Defs>
      <Path d="M3 7q0-3 3-2.5L94 18V200H3z" fill={DOOR} {...edge} />
      <Path d="M19 24l64 8v168H19z" fill={colors.card} />
      <Path d="M51 28v172" stroke={colors.rule} strokeWidth={1.4} />
      {[0, 1, 2, 3, 4, 5].map((row) => <Path key={row} d={`M25 ${46 + row * 24}l19 2M57 ${49 + row * 23}l19 1.5`} stroke={colors.ink2} strokeWidth={2.6} strokeLinecap="round" />)}
      <Rect x={94} y={12} width={118} height={200} rx={9} fill="#E6E2D3" {...edge} />
      <Rect x={105} y={25} width={96} height={190} fill="#C9CFC8" />
      <Rect x={149} y={86} width={6} height={120} fill={colors.live} />
      {[0, 1, 2, 3].map((row) => {
        const y = 92 + row * 24;
        const blank = row === 2;
        return (
          <G key={row}>
            <Breaker x={111} y={y} knob={19} />
            {blank ? <Rect x={159} y={y} width={34} height={17} rx={4} fill="#BFC6BF" stroke={colors.ink2} strokeWidth={1.6} strokeDasharray="4 3" /> : (
              <Breaker x={159} y={y} knob={4} />
            )}
          </G>
        );
      })}
      <G clipPath="url(#glass)">
        <Rect x={105} y={8} width={100} height={84} fill="#C9CFC8" />
        <Rect x={120} y={28} width={64} height={45} rx={6} fill={colors.ink} />
        <Rect x={140} y={33} width={24} height={35} rx={5} fill={colors.card} />
        <SvgText x={152} y={55.5} fontSize={14} fontFamily={family[800]} fill={colors.ink} textAnchor="middle">200</SvgText>
      </G>
      <Circle cx={152} cy={50} r={39} fill="none" stroke={colors.copper} strokeWidth={4} />
      <Path d="M191 50h33" stroke={colors.copper} strokeWidth={4} strokeLinecap="round" />
    </G>
  );
}

const styles = StyleSheet.create({
  picture: { flexDirection: 'row', alignItems: 'center', backgroundColor: colors.sage, borderRadius: radius.card, overflow: 'hidden', paddingRight: space[3], minHeight: 140 },
  left: { flex: 1, paddingLeft: space[4], maxWidth: 200 },
  drawing: { flexGrow: 1, flexShrink: 1, flexBasis: 200, minWidth: 0, height: 156, marginLeft: space[3], alignSelf: 'flex-end' },
  right: { flexShrink: 0, width: 122, gap: 2, paddingLeft: space[2] },
  blank: { flexDirection: 'row', alignItems: 'center', gap: space[2], paddingTop: space[3] },
  blankBox: { width: 24, height: 13, borderRadius: 3, borderWidth: 1.5, borderStyle: 'dashed', borderColor: colors.ink2 },
});
