import { StyleSheet, View } from 'react-native';
import type { LeadRow } from '../../shared/api/desk';
import { dollarRange } from '../../shared/money';
import { MiniTape } from '../price/mini-tape';
import { border, colors, radius } from '../theme/tokens';
import { Text } from '../ui/text';
import { timeLeft } from './time-words';

/** A job's number in its box. */
export function JobBox({ jobNumber, large = false }: { readonly jobNumber: number; readonly large?: boolean }) {
  return (
    <View style={[styles.box, large && styles.large]}>
      <Text variant={large ? 'subheading' : 'note'} weight={800}>{String(jobNumber)}</Text>
    </View>
  );
}

/** Two lines of a cell: the fact, and what belongs to it. */
export function TwoLines({ first, second = '', strong = false }: { readonly first: string; readonly second?: string; readonly strong?: boolean }) {
  return (
    <View>
      <Text weight={strong ? 800 : 500} style={styles.cell}>{first}</Text>
      {second ? <Text variant="note" weight={500} color="ink2" numberOfLines={2}>{second}</Text> : null}
    </View>
  );
}

/** The range in words, with its tape where there is room; a dash when there is no price. */
export function RangeCell({ lead, tape }: { readonly lead: LeadRow; readonly tape: boolean }) {
  if (lead.lowCents === null || lead.highCents === null) return <Text color="ink2" aria-label="No price" style={styles.cell}>–</Text>;
  return (
    <View style={styles.range}>
      {tape ? (
        <View style={styles.tape}><MiniTape lowCents={lead.lowCents} highCents={lead.highCents} firmCents={lead.firmCents} /></View>
      ) : null}
      <Text weight={700} numberOfLines={1} style={[styles.cell, styles.whole]}>{dollarRange(lead.lowCents, lead.highCents)}</Text>
    </View>
  );
}

/** What is left until it must be looked at; late in the color and in the word. */
export function DueCell({ lead, nowMs }: { readonly lead: LeadRow; readonly nowMs: number }) {
  const due = lead.stage === 'closed' ? null : timeLeft(lead.dueAt, nowMs);
  return (
    <View>
      {due ? <Text weight={800} numberOfLines={1} color={due.late ? 'stop' : 'ink'} style={styles.cell}>{due.words}</Text> : null}
      {lead.timeNote ? <Text variant="note" weight={500} color="ink2">{lead.timeNote}</Text> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    alignSelf: 'center', alignItems: 'center', minWidth: 46, paddingHorizontal: 7, paddingVertical: 4,
    borderRadius: radius.tag, borderWidth: border.control, borderColor: colors.ink3,
  },
  large: { paddingHorizontal: 10, paddingVertical: 6 },
  cell: { fontSize: 15, lineHeight: 21 },
  range: { flexDirection: 'row', alignItems: 'center', gap: 12 },
  whole: { flexShrink: 0 },
  tape: { width: 124, flexShrink: 1, minWidth: 96 },
});
