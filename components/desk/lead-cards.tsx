import { StyleSheet, View } from 'react-native';
import type { LeadRow } from '../../shared/api/desk';
import { dollars } from '../../shared/money';
import { border, colors, radius, space } from '../theme/tokens';
import { Anchor } from '../ui/anchor';
import { Text } from '../ui/text';
import { DueCell, JobBox, RangeCell, TwoLines } from './lead-cells';
import type { LeadTableProps } from './lead-table';
import { StageTag } from './stage-tag';

/** Leads on a phone: one card a lead, the same facts in the same order as the table. */
export function LeadCards({ leads, nowMs, hrefOf }: Pick<LeadTableProps, 'leads' | 'nowMs' | 'hrefOf'>) {
  return (
    <View role="list" aria-label="Leads" style={{ gap: space[3] }}>
      {leads.map((lead) => (
        <View key={lead.id} role="listitem">
          <Anchor href={hrefOf(lead)} style={({ pressed }) => [styles.card, pressed && { backgroundColor: colors.well }]}>
            <LeadFacts lead={lead} nowMs={nowMs} />
          </Anchor>
        </View>
      ))}
    </View>
  );
}

function LeadFacts({ lead, nowMs }: { readonly lead: LeadRow; readonly nowMs: number }) {
  return (
    <>
      <View style={styles.head}>
        <JobBox jobNumber={lead.jobNumber} />
        <View style={{ flex: 1, minWidth: 0 }}><TwoLines strong first={lead.name} second={lead.town} /></View>
      </View>
      <TwoLines first={lead.work} second={lead.workNote} />
      <RangeCell lead={lead} tape />
      {lead.firmCents === null ? null : <Text variant="note" weight={800}>{`Firm price ${dollars(lead.firmCents)}`}</Text>}
      <View style={styles.foot}>
        <StageTag stage={lead.stage} />
        <DueCell lead={lead} nowMs={nowMs} />
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  card: {
    gap: space[2], padding: 14,
    borderRadius: radius.button, borderWidth: border.hair, borderColor: colors.rule, backgroundColor: colors.card,
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: space[3] },
  foot: {
    flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', alignItems: 'center',
    columnGap: space[3], rowGap: space[1], paddingTop: space[1],
  },
});
