import { useState } from 'react';
import { View } from 'react-native';
import type { Lead } from '../../shared/api/desk';
import { dollarRange, dollars } from '../../shared/money';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { dayInWords } from '../../shared/dates';
import { Tape } from '../price/tape';
import { space } from '../theme/tokens';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { DeskCard } from './desk-card';
import { PriceTable } from './price-table';
import { deskScale } from './desk-scale';

/** The option the homeowner took, else the recommended one. */
export const takenOption = (lead: Lead): QuoteOption | null => {
  const options = lead.quote?.options ?? [];
  const byId = (id: string | null | undefined) => options.find((option) => option.id === id);
  return byId(lead.optionId) ?? byId(lead.quote?.recommendedOptionId) ?? options[0] ?? null;
};

const said = (lead: Lead, document: QuoteDocument, option: QuoteOption): string => {
  const mark = option.id === lead.optionId ? ' (taken)' : option.id === document.recommendedOptionId ? ' (recommended)' : '';
  return `${option.title} · ${dollarRange(option.lowCents, option.highCents)}${mark}`;
};

/** The frozen price: the option taken, its lines with their rules, its range on the tape, until when it holds. Or why there is none. */
export function LeadPrice({ lead }: { readonly lead: Lead }) {
  const [picked, setPicked] = useState<string | null>(null);
  const document = lead.quote;
  const option = document?.options.find((entry) => entry.id === picked) ?? takenOption(lead);
  if (!document || !option) return <NoPrice document={document} />;
  return (
    <DeskCard title="Price, line by line" aside={`Rulebook ${document.rulebookEdition}`}>
      {document.options.length > 1 ? (
        <Select
          id="lead-option" label="Option" hideLabel size="desk" value={option.id} onChange={setPicked}
          choices={document.options.map((entry) => ({ value: entry.id, label: said(lead, document, entry) }))}
        />
      ) : (
        <Text variant="subheading">{option.title}</Text>
      )}
      <PriceTable option={option} />
      <View style={{ paddingTop: space[3] }}>
        <Tape
          lowCents={option.lowCents} highCents={option.highCents} outcome={option.lowCents === option.highCents ? 'firm' : 'range'}
          scale={deskScale(option.lowCents, option.highCents)}
        />
      </View>
      <Text variant="note" color="ink2">
        {`Made ${dayInWords(document.pricedOn)}, held until ${dayInWords(document.heldUntil)}. Deposit ${dollars(option.depositCents)}. ${document.codeEdition} NEC, ${document.jurisdiction.name}.`}
      </Text>
    </DeskCard>
  );
}

function NoPrice({ document }: { readonly document: QuoteDocument | null }) {
  return (
    <DeskCard title="Price, line by line">
      <Text variant="subheading">No automatic price</Text>
      {document && document.flags.length > 0 ? (
        document.flags.map((flag) => <Text key={flag.id}>{flag.deskWords}</Text>)
      ) : (
        <Text color="ink2">The homeowner asked for a visit before a price was made.</Text>
      )}
    </DeskCard>
  );
}
