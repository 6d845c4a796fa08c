import Check from 'lucide-react-native/icons/check';
import { useEffect, useState } from 'react';
import { View } from 'react-native';
import { dollars } from '../../shared/money';
import type { Deposit } from '../../shared/api/quotes';
import { isProblem } from '../api/client';
import { useCompany } from '../api/use-company';
import { useDeposit } from '../api/use-deposit';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { ButtonLink } from '../ui/button-link';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Glyph } from '../ui/glyph';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { Failure } from './failure';
import { NoIntake } from './no-intake';

const ASK_EVERY_MS = 1_500;
const ASK_FOR_MS = 60_000;

/** Where the payment page leads back to. The provider's message may come a moment later: it waits and says so. */
export function DepositScreen() {
  const [waiting, setWaiting] = useState(true);
  const deposit = useDeposit(waiting ? ASK_EVERY_MS : false);
  useEffect(() => {
    const timer = setTimeout(() => setWaiting(false), ASK_FOR_MS);
    return () => clearTimeout(timer);
  }, [waiting]);

  if (isProblem(deposit.error, 401, 404, 410)) return <NoIntake />;
  return (
    <Page title={deposit.data?.state === 'paid' ? 'Deposit received' : 'Your deposit'} focusKey={deposit.data?.state ?? 'loading'} width="text">
      {!deposit.data ? (
        deposit.error ? <Failure error={deposit.error} onRetry={() => void deposit.refetch()} /> : <Skeleton label="Asking the payment provider" />
      ) : deposit.data.state === 'paid' ? (
        <Paid deposit={deposit.data} />
      ) : deposit.data.state === 'refunded' ? (
        <Text variant="title" level={1}>{`Your deposit of ${dollars(deposit.data.amountCents)} went back to you`}</Text>
      ) : deposit.data.state === 'pending' && waiting ? (
        <View style={{ gap: space[4] }}>
          <Text variant="title" level={1}>Waiting for the payment provider</Text>
          <Text role="status">This takes a few seconds. You can leave this page open.</Text>
        </View>
      ) : (
        <View style={{ gap: space[4], alignItems: 'flex-start' }}>
          <Text variant="title" level={1}>No payment has come in</Text>
          <Text>Nothing was taken that we know of. Your price and your answers are kept. If you did pay, we hear of it and mail you the receipt.</Text>
          <ButtonLink label="Back to your price" href="/quote/price" />
          <Button label="Look again" kind="quiet" onPress={() => { setWaiting(true); void deposit.refetch(); }} />
        </View>
      )}
    </Page>
  );
}

function Paid({ deposit }: { readonly deposit: Deposit }) {
  const company = useCompany().data;
  return (
    <View style={{ gap: space[5] }}>
      <View style={{ flexDirection: 'row', gap: space[3], alignItems: 'center' }}>
        <Glyph of={Check} size={24} color="ok" />
        <Text variant="note" color="ok" weight={800}>{`${dollars(deposit.amountCents)} paid`}</Text>
      </View>
      <Text variant="title" level={1}>Deposit received. We’re checking your answers.</Text>
      <Card>
        <Directory
          label="Your order"
          start={null}
          items={[
            ...(deposit.jobNumber === null ? [] : [{ key: 'job', title: 'Job number', value: String(deposit.jobNumber) }]),
            { key: 'option', title: 'You picked', value: deposit.optionTitle },
            { key: 'mail', title: 'Receipt sent to', value: deposit.email },
          ]}
        />
      </Card>
      <View style={{ gap: space[2] }}>
        <Text variant="heading" level={2}>What happens next</Text>
        <Directory
          label="What happens next"
          items={[
            { key: 'check', title: 'An electrician checks the details', note: 'Within two working days you get a firm price.' },
            { key: 'day', title: 'You pick a day', note: 'Until then, all of the deposit comes back if you cancel.' },
            { key: 'work', title: 'Install and inspection', note: 'We bring the right parts and meet the inspector.' },
          ]}
        />
      </View>
      {deposit.myUrl ? <ButtonLink label="Open your own page" href={deposit.myUrl as `/my/${string}`} arrow /> : null}
      {company ? <Link label={`Questions? ${company.phone}`} href={`tel:${company.phone}`} /> : null}
    </View>
  );
}
