import { StyleSheet, View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import { ampsInWords, feetInWords, kilowattsInWords } from '../../shared/units';
import type { My } from '../../shared/api/quotes';
import { isProblem } from '../api/client';
import { useMy } from '../api/use-my';
import { GaragePlan } from '../plan/garage-plan';
import { momentInWords } from '../../shared/dates';
import { Failure } from '../price/failure';
import { HowWeKnow } from '../price/how-we-know';
import { PriceLines } from '../price/price-lines';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Plate } from '../ui/plate';
import { RunTimeline } from '../ui/run-timeline';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';

/** The homeowner's own page: where the job stands, what was picked, what was paid, what the price covers. */
export function MyScreen() {
  const my = useMy(true);
  return (
    <Page title="Your job">
      {my.data ? <MyJob my={my.data} /> : isProblem(my.error, 401, 404, 410) ? <NoLink /> : my.error ? <Failure error={my.error} onRetry={() => void my.refetch()} /> : <Skeleton label="Loading your job" lines={8} />}
    </Page>
  );
}

const NoLink = () => (
  <View style={{ gap: space[4], maxWidth: 640 }}>
    <Text variant="title" level={1}>Open your page from your mail</Text>
    <Text>The link in your receipt opens it. We keep no password, so that there is none to lose.</Text>
    <Link label="Start a new price" href="/" />
  </View>
);

function MyJob({ my }: { readonly my: My }) {
  const wide = useBreakpoint() === 'wide';
  const option = my.quote.options.find((entry) => entry.id === my.optionId) ?? null;
  return (
    <View style={{ gap: space[5] }}>
      <View>
        <Text variant="note" weight={700} color="ink2">{`Job ${my.jobNumber} · ${my.street}, ${my.town}`}</Text>
        <Text variant="title" level={1}>{headings[my.stage] ?? 'Your job'}</Text>
      </View>
      <View style={[styles.columns, wide && styles.wide]}>
        <View style={styles.column}>
          <Card>
            <RunTimeline label="Where your job stands" items={my.timeline.map((entry) => ({ key: entry.id, title: entry.title, note: entry.detail, state: entry.state === 'next' ? 'todo' : entry.state }))} />
          </Card>
          {my.deposit ? (
            <Card>
              <Directory
                label="Receipt"
                start={null}
                items={[
                  { key: 'option', title: my.deposit.optionTitle, value: option ? dollarRange(option.lowCents, option.highCents) : '' },
                  { key: 'paid', title: 'Deposit paid', note: my.deposit.paidAt ? momentInWords(my.deposit.paidAt, my.quote.jurisdiction.timeZone) : 'Comes off the bill', value: dollars(my.deposit.amountCents) },
                  { key: 'mail', title: 'Receipt sent to', value: my.deposit.email },
                ]}
              />
            </Card>
          ) : null}
          <Text color="ink2">{`To change an answer, a date or to cancel, call ${my.phone} and give the job number.`}</Text>
          <View style={{ flexDirection: 'row', gap: space[5], flexWrap: 'wrap' }}>
            <Link label={`Call ${my.phone}`} href={`tel:${my.phone}`} />
            <Link label="Terms" href="/terms" />
          </View>
        </View>
        {option ? (
          <View style={styles.column}>
            <Card style={{ gap: space[3] }}>
              <View style={styles.head}>
                <Plate>Job card</Plate>
                <Text variant="note" weight={700} color="ink2">{`${feetInWords(Math.round(option.run.lengthFt))} run`}</Text>
              </View>
              {my.quote.plan ? <GaragePlan plan={my.quote.plan} maxHeightPx={320} /> : null}
              <Directory
                label="Job card"
                start={null}
                items={[
                  { key: 'charging', title: 'Charging', note: `${kilowattsInWords(option.kw)}, about ${Math.round(option.milesPerHour)} miles of range an hour`, value: ampsInWords(option.chargingAmps) },
                  { key: 'breaker', title: 'Breaker', value: ampsInWords(option.breakerAmps) },
                  { key: 'wire', title: 'Wire and pipe', note: option.circuit.words },
                ]}
              />
            </Card>
          </View>
        ) : null}
      </View>
      {option ? <PriceLines option={option} /> : null}
      {option ? <HowWeKnow document={my.quote} option={option} fixed /> : null}
    </View>
  );
}

/** Where the job stands, as its homeowner reads it; by the desk's stages. */
const headings: Readonly<Record<string, string>> = {
  'check-photos': 'We’re checking your answers and photos', 'waiting-on-photo': 'We need one more photo', 'needs-a-visit': 'We’ll come and look',
  'firm-price-sent': 'Your firm price is here', accepted: 'You accepted the firm price', booked: 'Your day is booked', closed: 'This job is closed',
};

const styles = StyleSheet.create({
  columns: { gap: space[5] },
  wide: { flexDirection: 'row', alignItems: 'flex-start' },
  column: { flex: 1, minWidth: 0, gap: space[4] },
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center' },
});
