import { Redirect, useLocalSearchParams } from 'expo-router';
import { View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import { firstOpenStep } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useStartDeposit } from '../api/use-deposit';
import { useIntake } from '../api/use-intake';
import { useQuote } from '../api/use-quote';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { CautionBox } from '../ui/caution-box';
import { Directory } from '../ui/directory';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { ContactForm } from './contact-form-later';
import { dayInWords } from '../../shared/dates';
import { Failure } from './failure';
import { goTo } from './go-to';
import { NoIntake } from './no-intake';

/** Who to come to, and the way to the payment page. The price chosen stands above, the terms before the button. */
export function BookScreen() {
  const { option: wanted } = useLocalSearchParams<{ option?: string }>();
  const intake = useIntake();
  const ready = intake.data !== undefined && firstOpenStep(intake.data.answers).id === 'price';
  const quote = useQuote(ready ? intake.data?.version : undefined);
  const deposit = useStartDeposit();

  if (isProblem(intake.error, 401, 404, 410)) return <NoIntake />;
  if (intake.data?.stage === 'paid') return <Redirect href="/quote/deposit" />;
  if (intake.data && !ready) return <Redirect href="/quote" />;
  const document = quote.data?.document;
  const option = document?.options.find((entry) => entry.id === wanted) ?? document?.options.find((entry) => entry.recommended);
  if (document && !option) return <Redirect href="/quote/visit" />;
  const error = intake.error ?? quote.error;
  return (
    <Page title="Book it" width="text">
      {!quote.data || !document || !option ? (
        error ? <Failure error={error} onRetry={() => void (intake.error ? intake.refetch() : quote.refetch())} /> : <Skeleton label="Loading your price" />
      ) : (
        <View style={{ gap: space[5] }}>
          <Text variant="title" level={1}>Where should we come, and who do we ask for?</Text>
          <Card>
            <Directory
              label="What you book"
              start={null}
              items={[
                { key: 'option', title: option.title, note: option.circuit.words, value: dollarRange(option.lowCents, option.highCents) },
                { key: 'deposit', title: 'Deposit now', note: 'It comes off the bill', value: dollars(option.depositCents) },
                { key: 'held', title: 'Price held until', value: dayInWords(document.heldUntil) },
              ]}
            />
            <View style={{ flexDirection: 'row', gap: space[5], flexWrap: 'wrap' }}>
              <Link label="Pick another option" href="/quote/price" variant="note" />
              <Link label="Check your answers" href="/quote/check" variant="note" />
            </View>
          </Card>
          <ContactForm
            submitLabel={`Pay ${dollars(option.depositCents)} deposit`}
            busyLabel="Opening the payment page"
            busy={deposit.isPending || deposit.isSuccess}
            error={deposit.error}
            onSubmit={(contact, key) => deposit.mutate({ quoteId: quote.data.id, optionId: option.id, contact, key }, { onSuccess: ({ checkoutUrl }) => goTo(checkoutUrl) })}
          >
            <CautionBox level="note" title="Before you pay">
              {`A licensed electrician checks your answers and sends a firm price. You may cancel within three business days, and until you pick a day, and get all ${dollars(option.depositCents)} back. No work starts before that.`}
            </CautionBox>
            <Text variant="note" color="ink2">You pay on the payment provider’s own page. We never see your card.</Text>
          </ContactForm>
        </View>
      )}
    </Page>
  );
}
