import { View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import { space } from '../theme/tokens';
import { CautionBox } from '../ui/caution-box';
import { Text } from '../ui/text';

/** What must be seen before anything else: dangers the homeowner told of, and answers changed after the price was made. */
export function LeadNotices({ lead }: { readonly lead: Lead }) {
  const dangers = lead.quote?.flags.filter((flag) => flag.danger) ?? [];
  if (dangers.length === 0 && lead.differences.length === 0) return null;
  return (
    <View style={{ gap: space[3] }}>
      {dangers.map((flag) => <CautionBox key={flag.id} level="stop">{flag.deskWords}</CautionBox>)}
      {lead.differences.length > 0 ? (
        <CautionBox level="note" title="Changed after the price was made">
          <View role="list" aria-label="Changed after the price was made">
            {lead.differences.map((entry) => (
              <View key={entry.label} role="listitem"><Text>{`${entry.label}: was ${entry.before}, now ${entry.after}`}</Text></View>
            ))}
          </View>
        </CautionBox>
      ) : null}
    </View>
  );
}
