import { View } from 'react-native';
import { countInWords } from '../../shared/units';
import { photoSlots, steps, visibleFields, visibleGroups, type Answers, type Step } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useIntake } from '../api/use-intake';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { Failure } from './failure';
import { NoIntake } from './no-intake';

/** Every answer in words, each a link to where it is changed. Changing one makes a new price; nothing else is lost. */
export function CheckScreen() {
  const intake = useIntake();
  if (isProblem(intake.error, 401, 404, 410)) return <NoIntake />;
  return (
    <Page title="Check your answers">
      {!intake.data ? (
        intake.error ? <Failure error={intake.error} onRetry={() => void intake.refetch()} /> : <Skeleton label="Loading your answers" lines={8} />
      ) : (
        <View style={{ gap: space[5], maxWidth: 860 }}>
          <Text variant="title" level={1}>Check your answers</Text>
          <Text color="ink2">Tap a line to change it. A changed answer makes a new price.</Text>
          {steps.filter((step) => step.number <= 5).map((step) => <StepAnswers key={step.id} step={step} answers={intake.data.answers} />)}
          <View style={{ gap: space[2] }}>
            <Text variant="heading" level={2}>Photos</Text>
            <Card>
              <Directory
                label="Photos"
                items={photoSlots.map((slot) => {
                  const count = intake.data.photos.filter((photo) => photo.slot === slot.id).length;
                  return { key: slot.id, title: slot.name, value: count === 0 ? 'None' : countInWords(count, 'photo', 'photos'), href: '/quote/photos' };
                })}
              />
            </Card>
          </View>
          <ButtonLink label="See my price" href="/quote/price" arrow />
        </View>
      )}
    </Page>
  );
}

function StepAnswers({ step, answers }: { readonly step: Step; readonly answers: Answers }) {
  const items = visibleGroups(step, answers).flatMap((group) =>
    visibleFields(group, answers).map((field) => {
      const value = answers[field.id] === undefined ? (field.optional ? 'As usual' : 'Not answered') : field.words(answers[field.id]);
      return { key: field.id, title: field.name, value, href: `/quote/${step.id}?part=${group.id}` as const };
    }),
  );
  if (items.length === 0) return null;
  return (
    <View style={{ gap: space[2] }}>
      <Text variant="heading" level={2}>{step.short}</Text>
      <Card><Directory label={step.short} items={items} /></Card>
    </View>
  );
}
