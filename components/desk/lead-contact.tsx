import { View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import { dollars } from '../../shared/money';
import { space } from '../theme/tokens';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { DeskCard } from './desk-card';
import { DeskRows } from './desk-rows';
import { deskMoment } from './time-words';

const WAYS: Readonly<Record<string, string>> = { email: 'e-mail', text: 'text message', phone: 'phone' };

/** "$150, paid" */
const depositWords = (deposit: Lead['deposit']): string => (deposit ? `${dollars(deposit.amountCents)}, ${deposit.state.replaceAll('-', ' ')}` : 'None');

/** How to reach the homeowner, what they agreed to, and their deposit. */
export function LeadContact({ lead, timeZone, nowMs }: { readonly lead: Lead; readonly timeZone: string; readonly nowMs: number }) {
  const paidAt = lead.deposit?.paidAt;
  const ways = lead.contactWays.map((way) => WAYS[way] ?? way).join(', ');
  return (
    <DeskCard title="Homeowner">
      <View>
        <Text weight={700}>{`${lead.street}, ${lead.town}`}</Text>
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space[5] }}>
          {lead.phone ? <Link label={lead.phone} href={`tel:${lead.phone}`} variant="note" spokenLabel={`Call ${lead.phone}`} /> : null}
          <Link label={lead.email} href={`mailto:${lead.email}`} variant="note" spokenLabel={`Write to ${lead.email}`} />
        </View>
      </View>
      <DeskRows
        label="Homeowner"
        rows={[
          { key: 'ways', title: 'May be reached by', value: ways || 'e-mail' },
          { key: 'consent', title: 'Agreed', value: deskMoment(lead.consentAt, timeZone, nowMs) },
          { key: 'deposit', title: 'Deposit', value: depositWords(lead.deposit), ...(paidAt ? { note: deskMoment(paidAt, timeZone, nowMs) } : {}) },
        ]}
      />
    </DeskCard>
  );
}
