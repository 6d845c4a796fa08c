import { StyleSheet, View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import { border, colors } from '../theme/tokens';
import { Text } from '../ui/text';
import { DeskCard } from './desk-card';
import { deskMoment } from './time-words';

/** What happened, newest first: by whom, when, from what to what. Nothing here can be changed. */
export function LeadHistory({ lead, timeZone, nowMs }: { readonly lead: Lead; readonly timeZone: string; readonly nowMs: number }) {
  return (
    <DeskCard title="History">
      <View role="list" aria-label="History">
        {lead.history.map((entry, index) => (
          <View key={entry.id} role="listitem" style={[styles.entry, index > 0 && styles.ruled]}>
            <Text weight={700} style={styles.what}>{[entry.what, changeWords(entry.before, entry.after)].filter(Boolean).join(': ')}</Text>
            <Text variant="fine" weight={500} color="ink2">{`${entry.who} · ${deskMoment(entry.at, timeZone, nowMs)}`}</Text>
          </View>
        ))}
      </View>
      {lead.history.length === 0 ? <Text color="ink2">Nothing has happened yet.</Text> : null}
    </DeskCard>
  );
}

/** "Check photos to Booked", or the one side that is known. */
const changeWords = (before: string | null, after: string | null): string =>
  before !== null && after !== null ? `${before} to ${after}` : (after ?? before ?? '');

const styles = StyleSheet.create({
  entry: { paddingVertical: 7 },
  ruled: { borderTopWidth: border.hair, borderColor: colors.rule },
  what: { fontSize: 15, lineHeight: 21 },
});
