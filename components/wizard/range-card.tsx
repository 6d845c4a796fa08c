import { StyleSheet, View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import type { Narrowing } from '../../shared/quote';
import { Tape } from '../price/tape';
import { colors, space } from '../theme/tokens';
import { Card } from '../ui/card';
import { Plate } from '../ui/plate';
import { Text } from '../ui/text';
import { changeWords, standOf } from './range-change';
import { useWizard } from './wizard-context';

const MOST = 3;

/** The range on its tape and what would narrow it most, on wide windows. `small`: beside the plan, with one line. */
export function RangeCard({ small = false }: { small?: boolean }) {
  const { intake, rangeBefore } = useWizard();
  const range = intake?.range;
  if (!range || range.outcome === 'too-early') return null;
  const stand = standOf(range);
  if (!stand) {
    return (
      <Card tone="spruce" style={styles.card}>
        <Plate dark>Needs a visit</Plate>
        <Tape dark lowCents={null} highCents={null} outcome="visit" />
        {range.flags.map((flag) => <Text key={flag.id} color="paper">{flag.words}</Text>)}
        <Text variant="note" color="mist">Your answers still help: the electrician comes prepared.</Text>
      </Card>
    );
  }
  const change = changeWords(rangeBefore, stand);
  const most = range.narrowing[0];
  return (
    <Card tone="spruce" style={styles.card}>
      {small ? null : (
        <View style={styles.head}>
          <Plate dark>{range.outcome === 'firm' ? 'Firm price' : 'Likely total'}</Plate>
          {range.outcome === 'firm' ? null : <Text variant="note" color="mist">{`${dollars(stand.highCents - stand.lowCents)} wide`}</Text>}
        </View>
      )}
      <Text variant="figure" color="paper">{dollarRange(stand.lowCents, stand.highCents)}</Text>
      <Tape dark lowCents={stand.lowCents} highCents={stand.highCents} previous={rangeBefore} outcome={range.outcome} />
      {change ? <Text variant="note" color="copperPale" weight={700}>{change}</Text> : null}
      {small && most ? <Text variant="note" color="paper">{`${most.title} would narrow this by about ${dollars(most.cents)}.`}</Text> : null}
      {!small && most ? <NarrowingBars entries={range.narrowing.slice(0, MOST)} /> : null}
    </Card>
  );
}

function NarrowingBars({ entries }: { entries: readonly Narrowing[] }) {
  const largest = Math.max(...entries.map((entry) => entry.cents), 1);
  return (
    <View style={{ gap: space[2] }}>
      <Text variant="note" weight={800} color="paper" level={2}>What would narrow it most</Text>
      {entries.map((entry) => (
        <View key={entry.fact} style={{ gap: space[1] }}>
          <View style={styles.head}>
            <Text variant="note" weight={700} color="paper" style={{ flexShrink: 1 }}>{entry.title}</Text>
            <Text variant="note" weight={800} color="paper">{`about ${dollars(entry.cents)}`}</Text>
          </View>
          <View aria-hidden style={styles.track}><View style={[styles.bar, { width: `${(entry.cents / largest) * 100}%` }]} /></View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { gap: space[3], padding: space[5] },
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center', gap: space[3] },
  track: { height: 6, borderRadius: 3, backgroundColor: colors.spruceDeep, overflow: 'hidden' },
  bar: { height: 6, borderRadius: 3, backgroundColor: colors.liveDark },
});
