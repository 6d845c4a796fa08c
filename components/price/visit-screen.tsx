import { Redirect } from 'expo-router';
import { View } from 'react-native';
import type { Flag } from '../../shared/quote';
import { firstOpenStep } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useAskForVisit } from '../api/use-ask-for-visit';
import { useCompany } from '../api/use-company';
import { useIntake } from '../api/use-intake';
import { space } from '../theme/tokens';
import { CautionBox } from '../ui/caution-box';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { ContactForm } from './contact-form-later';
import { Failure } from './failure';
import { NoIntake } from './no-intake';

/** No fair price from here: why, in plain words, and a person instead of a number. Also for who would rather have a visit. */
export function VisitScreen() {
  const intake = useIntake();
  const company = useCompany().data;
  const ask = useAskForVisit();
  if (isProblem(intake.error, 401, 404, 410)) return <NoIntake />;
  if (intake.data?.stage === 'paid') return <Redirect href="/quote/deposit" />;
  if (intake.data && !intake.data.answers.zip) return <Redirect href={`/quote/${firstOpenStep(intake.data.answers).id}`} />;
  const flags = intake.data?.range.flags ?? [];
  return (
    <Page title="A visit instead" width="text">
      {!intake.data ? (
        intake.error ? <Failure error={intake.error} onRetry={() => void intake.refetch()} /> : <Skeleton label="Loading" />
      ) : intake.data.stage === 'visit-asked' ? (
        <View style={{ gap: space[4] }}>
          <Text variant="title" level={1}>Thank you. We have it.</Text>
          <Text>{`An electrician reads your answers and gets in touch within two working days. We sent a note to your e-mail.${company ? ` Questions until then: ${company.phone}.` : ''}`}</Text>
          {flags.some((flag) => flag.danger) ? <Danger phone={company?.phone} /> : null}
          <Link label="Back to the start" href="/" />
        </View>
      ) : (
        <View style={{ gap: space[5] }}>
          <Text variant="title" level={1}>{flags.length > 0 ? 'We can’t give a fair range for this one from here' : 'Would you rather have a visit?'}</Text>
          {flags.some((flag) => flag.danger) ? <Danger phone={company?.phone} /> : null}
          {flags.length > 0 ? <Reasons flags={flags} /> : null}
          <Text>A free visit can. Leave your name and address: everything you answered goes with it, so nobody asks twice.</Text>
          <ContactForm submitLabel="Ask for a visit" busyLabel="Sending" busy={ask.isPending} error={ask.error} onSubmit={(contact, key) => ask.mutate({ contact, key })} />
          <Link label="Check your answers" href="/quote/check" />
        </View>
      )}
    </Page>
  );
}

const Reasons = ({ flags }: { readonly flags: readonly Flag[] }) => (
  <View role="list" style={{ gap: space[2] }}>
    {flags.map((flag) => <View key={flag.id} role="listitem"><CautionBox level="note">{flag.words}</CautionBox></View>)}
  </View>
);

const Danger = ({ phone }: { readonly phone: string | undefined }) => (
  <CautionBox level="stop" title="Leave the panel alone" action={phone ? <Link label={`Call ${phone}`} href={`tel:${phone}`} /> : undefined}>
    If anything is sparking or smoking, leave the house and call 911.
  </CautionBox>
);
