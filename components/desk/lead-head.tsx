import ArrowLeft from 'lucide-react-native/icons/arrow-left';
import Clock from 'lucide-react-native/icons/clock';
import { StyleSheet, View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';
import { JobBox } from './lead-cells';
import { StageTag } from './stage-tag';
import { timeLeft } from './time-words';

/** Way back, job number, who, where it stands, what is left of its time. */
export function LeadHead({ lead, backHref, nowMs }: { readonly lead: Lead; readonly backHref: string; readonly nowMs: number }) {
  const due = lead.stage === 'closed' ? null : timeLeft(lead.dueAt, nowMs);
  return (
    <View style={styles.head}>
      <ButtonLink kind="back" size="desk" icon={ArrowLeft} label="Back to leads" href={backHref} />
      <JobBox jobNumber={lead.jobNumber} large />
      <Text variant="deskTitle" level={1} style={{ flexShrink: 1 }}>{lead.name}</Text>
      <StageTag stage={lead.stage} />
      <Text variant="note" weight={700} color="ink2" style={styles.where}>
        {[`${lead.street}, ${lead.town}`, lead.phone, lead.email].filter(Boolean).join(' · ')}
      </Text>
      {due ? (
        <View style={styles.due}>
          <Glyph of={Clock} color={due.late ? 'stop' : 'copper'} />
          <Text weight={800} color={due.late ? 'stop' : 'copper'}>{due.words}</Text>
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
  where: { flexGrow: 1, flexShrink: 1, flexBasis: 200, fontSize: 15 },
  due: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
});
