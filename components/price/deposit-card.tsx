import Lock from 'lucide-react-native/icons/lock';
import { View } from 'react-native';
import { dollars } from '../../shared/money';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Card } from '../ui/card';
import { Text } from '../ui/text';
import { bookHref } from './book-href';
import { dayInWords } from '../../shared/dates';

/** The deposit, its terms in a sentence, and the way to it. */
export function DepositCard({ option, document }: { readonly option: QuoteOption; readonly document: QuoteDocument }) {
  const amount = dollars(option.depositCents);
  return (
    <Card style={{ gap: space[3] }}>
      <View style={{ flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center' }}>
        <Text variant="subheading" level={2}>Deposit</Text>
        <Text variant="figure">{amount}</Text>
      </View>
      <Text color="ink2">It comes off the bill. All of it back until you pick a day.</Text>
      <ButtonLink label={`Book with a ${amount} deposit`} href={bookHref(option)} icon={Lock} grow />
      <Text variant="note" color="ink2">{`This price is held until ${dayInWords(document.heldUntil)}.`}</Text>
    </Card>
  );
}
