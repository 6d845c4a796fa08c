import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Circle, Defs, Line, LinearGradient, Path, Pattern, Rect, Stop } from 'react-native-svg';
import { dollars, spokenRange } from '../../shared/money';
import { colors, radius } from '../theme/tokens';
import { StatusTag } from '../ui/status-tag';
import { Text } from '../ui/text';
import { labels, placeOn, ticks, TAPE_TO_CENTS, wizardScale, type Scale } from './tape-scale';

export interface TapeProps {
  readonly lowCents: number | null;
  readonly highCents: number | null;
  /** The range before the last answer: its remains are hatched. */
  readonly previous?: { readonly lowCents: number; readonly highCents: number } | null;
  /** firm: one pin. visit and too-early: the blade is blank. */
  readonly outcome?: 'range' | 'firm' | 'visit' | 'too-early';
  /** On spruce. */
  readonly dark?: boolean;
  /** Only the desk may zoom; then there is no case, to show that it is a section. */
  readonly scale?: Scale;
}

const TICK = { short: 8, middle: 12, long: 17 } as const;
const BLADE_TOP = 14;
const BLADE_HEIGHT = 42;
const CASE_WIDTH = 44;

/** The price as a measuring tape. The numbers are always beside it as text; this is a picture with a name. */
export function Tape({ lowCents, highCents, previous = null, outcome = 'range', dark = false, scale = wizardScale }: TapeProps) {
  const [widthPx, setWidthPx] = useState(300);
  const zoomed = scale !== wizardScale;
  const shown = lowCents !== null && highCents !== null && (outcome === 'range' || outcome === 'firm');
  const [from, to] = shown ? [placeOn(scale, lowCents), placeOn(scale, highCents)] : [0, 0];
  const firm = shown && (outcome === 'firm' || lowCents === highCents);
  const beyond = shown && highCents > TAPE_TO_CENTS && !zoomed;
  const name = !shown ? (outcome === 'visit' ? 'No price range: needs a visit' : 'No price range yet') : firm
    ? `Firm price ${spokenRange(lowCents, lowCents)}`
    : `Price range ${spokenRange(lowCents, highCents)}, ${((highCents - lowCents) / 100).toLocaleString('en-US')} wide`;
  return (
    <View role="img" aria-label={name} style={styles.tape}>
      <View style={[styles.blade, { right: zoomed ? 0 : CASE_WIDTH - 8 }]}><Blade /></View>
      <View style={[styles.hook, dark && { backgroundColor: colors.mist, borderColor: colors.mist }]} />
      <View
        style={[styles.scale, { right: zoomed ? 16 : CASE_WIDTH + 8 }]}
        onLayout={(event) => setWidthPx(event.nativeEvent.layout.width || widthPx)}
      >
        {previous && shown ? <Hatched from={placeOn(scale, previous.lowCents)} to={placeOn(scale, previous.highCents)} /> : null}
        {shown && !firm ? <View dataSet={{ slides: 'tape' }} style={[styles.segment, { left: `${from}%`, right: `${100 - to}%` }]}><View style={styles.bar} /></View> : null}
        <Svg width="100%" height={24} style={styles.ticks} aria-hidden>
          {ticks(scale).map((tick) => (
            <Line key={tick.cents} x1={`${tick.place}%`} x2={`${tick.place}%`} y1={0} y2={TICK[tick.kind]} stroke={colors.ink} strokeWidth={tick.kind === 'short' ? 1.2 : 2} />
          ))}
        </Svg>
        {labels(scale, widthPx, shown ? [from, to] : []).map((tick) => (
          <View key={tick.cents} style={[styles.label, { left: `${tick.place}%` }]}><Text variant="fine" weight={700} style={styles.labelText}>{dollars(tick.cents)}</Text></View>
        ))}
        {shown ? <Pin place={from} dark={dark} /> : null}
        {shown && !firm ? <Pin place={to} dark={dark} /> : null}
        {outcome === 'visit' ? <View style={styles.blank}><StatusTag kind="visit" label="Needs a visit" /></View> : null}
      </View>
      {zoomed ? null : <Case dark={dark} words={beyond ? dollars(highCents) : null} />}
    </View>
  );
}

function Pin({ place, dark }: { place: number; dark: boolean }) {
  const [line, head] = dark ? [colors.white, colors.liveDark] : [colors.copperDeep, colors.copper];
  return (
    <View dataSet={{ slides: 'tape' }} style={[styles.pin, { left: `${place}%` }]}>
      <View style={[styles.pinHead, { backgroundColor: head, borderColor: line }]} />
      <View style={[styles.pinLine, { backgroundColor: line }]} />
    </View>
  );
}

function Blade() {
  return (
    <Svg width="100%" height="100%" aria-hidden>
      <Defs>
        <LinearGradient id="blade" x1="0" y1="0" x2="0" y2="1">
          <Stop offset="0" stopColor="#FCF3D2" /><Stop offset="0.55" stopColor={colors.blade} /><Stop offset="1" stopColor="#EBCF85" />
        </LinearGradient>
      </Defs>
      <Rect width="100%" height="100%" fill="url(#blade)" />
      <Line x1={0} x2="100%" y1={0.5} y2={0.5} stroke={colors.warn} strokeWidth={1} />
      <Line x1={0} x2="100%" y1={BLADE_HEIGHT - 0.5} y2={BLADE_HEIGHT - 0.5} stroke={colors.warn} strokeWidth={1} />
    </Svg>
  );
}

/** What is left of the range before, so that one sees how far it came. */
function Hatched({ from, to }: { from: number; to: number }) {
  return (
    <View style={[styles.hatched, { left: `${from}%`, right: `${100 - to}%` }]}>
      <Svg width="100%" height="100%" aria-hidden>
        <Defs>
          <Pattern id="before" width={9} height={9} patternUnits="userSpaceOnUse" patternTransform="rotate(35)">
            <Path d="M0 0v9" stroke={colors.live} strokeWidth={1.6} />
          </Pattern>
        </Defs>
        <Rect y={9} width="100%" height={10} fill="url(#before)" />
        <Line x1={0.8} x2={0.8} y1={0} y2={19} stroke={colors.copper} strokeWidth={1.6} strokeDasharray="3 2.5" />
        <Line x1="99.4%" x2="99.4%" y1={0} y2={19} stroke={colors.copper} strokeWidth={1.6} strokeDasharray="3 2.5" />
      </Svg>
    </View>
  );
}

function Case({ dark, words }: { dark: boolean; words: string | null }) {
  const [body, lip, ring, dot] = dark ? [colors.paper, '#D9D0BC', colors.ink, colors.copper] : [colors.spruce, colors.spruceDeep, colors.mist, colors.liveDark];
  return (
    <View style={styles.case}>
      <Svg width={CASE_WIDTH + 6} height={60} viewBox={`0 0 ${CASE_WIDTH + 6} 60`} aria-hidden>
        <Rect x={0} y={9} width={10} height={49} rx={4} fill={lip} />
        <Path d="M6 12a12 12 0 0 1 12-10h20a12 12 0 0 1 12 12v34a12 12 0 0 1-12 12H18A12 12 0 0 1 6 48z" fill={body} />
        {words ? null : <><Circle cx={28} cy={31} r={12} fill="none" stroke={ring} strokeWidth={2.2} /><Circle cx={28} cy={31} r={4.5} fill={dot} /></>}
      </Svg>
      {words ? <View style={styles.caseWords}><Text variant="fine" weight={800} color={dark ? 'ink' : 'paper'} style={{ fontSize: 12 }}>{words}</Text></View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  tape: { height: 64, width: '100%' },
  blade: { position: 'absolute', left: 3, top: BLADE_TOP, height: BLADE_HEIGHT },
  hook: { position: 'absolute', left: 0, top: BLADE_TOP - 3, width: 7, height: BLADE_HEIGHT + 7, borderRadius: 2, backgroundColor: '#879A8F', borderWidth: 1, borderColor: colors.ink },
  scale: { position: 'absolute', left: 17, top: 0, bottom: 0 },
  ticks: { position: 'absolute', left: 0, right: 0, top: BLADE_TOP, overflow: 'visible' },
  label: { position: 'absolute', top: BLADE_TOP + 16, width: 0, alignItems: 'center', overflow: 'visible' },
  labelText: { fontSize: 12, width: 60, textAlign: 'center' },
  segment: { position: 'absolute', top: BLADE_TOP + 1, height: BLADE_HEIGHT - 1, backgroundColor: 'rgba(222,164,112,0.55)' },
  bar: { position: 'absolute', left: 0, right: 0, bottom: 0, height: 10, backgroundColor: colors.copper },
  hatched: { position: 'absolute', top: BLADE_TOP + BLADE_HEIGHT - 19, height: 19 },
  pin: { position: 'absolute', top: 2, bottom: 2, width: 0, alignItems: 'center' },
  pinHead: { width: 11, height: 11, borderRadius: 6, borderWidth: 1.5 },
  pinLine: { width: 3, flexGrow: 1, borderRadius: radius.plate },
  blank: { position: 'absolute', left: 0, right: 0, top: BLADE_TOP + 9, alignItems: 'center' },
  case: { position: 'absolute', right: 0, top: 2, width: CASE_WIDTH + 6, height: 60 },
  caseWords: { position: 'absolute', left: 6, right: 0, top: 21, alignItems: 'center' },
});
