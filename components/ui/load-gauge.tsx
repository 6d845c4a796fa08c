import { StyleSheet, View } from 'react-native';
import Svg, { Defs, Path, Pattern, Rect } from 'react-native-svg';
import { ampsInWords } from '../../shared/units';
import { border, colors, radius, space } from '../theme/tokens';
import { StatusTag } from './status-tag';
import { Text } from './text';

export interface LoadGaugeProps {
  readonly serviceAmps: number;
  readonly homeAmps: number;
  readonly chargerAmps: number;
  /** green: it fits. amber: it is tight, something has to manage or change. red: too much. */
  readonly status: 'green' | 'amber' | 'red';
  /** False: a typical home was assumed; then it says so. */
  readonly known: boolean;
  readonly title?: string;
}

const VERDICTS = { green: { kind: 'good', label: 'Fits' }, amber: { kind: 'look', label: 'Tight' }, red: { kind: 'bad', label: 'Too much' } } as const;

/** How much of the service the home takes, the charger adds, and what is left; the numbers stand above as words. */
export function LoadGauge({ serviceAmps, homeAmps, chargerAmps, status, known, title }: LoadGaugeProps) {
  const spare = serviceAmps - homeAmps - chargerAmps;
  const share = (amps: number) => Math.max(0, Math.min(100, (amps / serviceAmps) * 100));
  const home = share(homeAmps);
  const charger = Math.min(100 - home, share(chargerAmps));
  const rest = spare >= 0 ? `${ampsInWords(spare)} spare` : `${ampsInWords(-spare)} over`;
  return (
    <View style={{ gap: space[1] }}>
      <View style={styles.line}>
        <Text weight={700} style={{ flexShrink: 1 }}>{title ?? `Room on ${known ? 'your' : 'a likely'} ${ampsInWords(serviceAmps)} panel`}</Text>
        <StatusTag {...VERDICTS[status]} />
      </View>
      <View style={styles.line}>
        <Text variant="note" weight={700}>{`Home ${known ? '' : 'about '}${ampsInWords(homeAmps)}`}</Text>
        <Text variant="note" weight={800} color="copper">{`Charger ${ampsInWords(chargerAmps)}`}</Text>
        <Text variant="note" color={spare >= 0 ? 'ink2' : 'stop'}>{rest}</Text>
      </View>
      <View role="img" aria-label={`Home ${Math.round(homeAmps)}, charger ${Math.round(chargerAmps)} of ${serviceAmps} amps, ${rest}`} style={styles.bar}>
        <View style={[styles.home, { width: `${home}%` }]} />
        <View style={{ width: `${charger}%` }}>
          <Svg width="100%" height="100%">
            <Defs>
              <Pattern id="charger-hatch" width={7} height={7} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
                <Rect width={7} height={7} fill={colors.live} />
                <Path d="M0 0v7" stroke={colors.copperDeep} strokeWidth={4} />
              </Pattern>
            </Defs>
            <Rect width="100%" height="100%" fill="url(#charger-hatch)" />
          </Svg>
        </View>
      </View>
      <View style={styles.line} aria-hidden>
        <Text variant="fine" color="ink2">0</Text>
        <Text variant="fine" color="ink2">{ampsInWords(serviceAmps / 2)}</Text>
        <Text variant="fine" color="ink2">{`${ampsInWords(serviceAmps)} main`}</Text>
      </View>
      {known ? null : <Text variant="note" color="ink2">A typical home where an answer is missing.</Text>}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', alignItems: 'center', columnGap: space[2] },
  bar: { flexDirection: 'row', height: 24, borderRadius: radius.tag, borderWidth: border.quiet, borderColor: colors.edge, backgroundColor: colors.card, overflow: 'hidden' },
  home: { backgroundColor: colors.spruce },
});
