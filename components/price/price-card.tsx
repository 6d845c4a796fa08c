import { StyleSheet, View } from 'react-native';
import { dollarRange } from '../../shared/money';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { useCompany } from '../api/use-company';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { Plate } from '../ui/plate';
import { Text } from '../ui/text';
import { dayInWords } from '../../shared/dates';
import { Tape } from './tape';

/** The range (or the one firm price) of the chosen option on its tape, against where the homeowner started. */
export function PriceCard({ document, option, wide }: { readonly document: QuoteDocument; readonly option: QuoteOption; readonly wide: boolean }) {
  const company = useCompany().data;
  const firm = document.outcome === 'firm';
  return (
    <Card tone="spruce" style={[styles.card, wide && styles.wide]}>
      <View style={[styles.words, wide && styles.half]}>
        <View style={styles.head}>
          <Plate number={7} dark>{firm ? 'Firm price' : 'Your price'}</Plate>
          {wide ? null : <Text variant="note" color="mist">{`Held until ${dayInWords(document.heldUntil)}`}</Text>}
        </View>
        <Text variant="price" color="paper" level={1} aria-label={`${firm ? 'Firm price' : 'Your price'}: ${dollarRange(option.lowCents, option.highCents)}`}>
          {dollarRange(option.lowCents, option.highCents)}
        </Text>
        <Text variant="body" color="mist">
          {`Installed, tested and inspected. Permit and tax included.${wide ? ` Held until ${dayInWords(document.heldUntil)}.` : ''}`}
        </Text>
      </View>
      <View style={[styles.tape, wide && styles.grow]}>
        <Tape
          dark
          lowCents={option.lowCents}
          highCents={option.highCents}
          previous={company ? { lowCents: company.openingLowCents, highCents: company.openingHighCents } : null}
        />
        <Text variant="note" color="mist">{firm ? 'Nothing that matters is left open, so this is one price.' : 'The hatched part is where you started.'}</Text>
      </View>
    </Card>
  );
}

const styles = StyleSheet.create({
  card: { gap: space[4] },
  wide: { flexDirection: 'row', alignItems: 'center', gap: space[7], padding: space[7] },
  words: { gap: space[1] },
  half: { width: 400 },
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center', gap: space[3], flexWrap: 'wrap' },
  tape: { gap: space[2] },
  grow: { flex: 1 },
});
