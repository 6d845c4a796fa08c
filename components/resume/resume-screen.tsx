import { useLocalSearchParams, useRouter } from 'expo-router';
import { useEffect, useRef } from 'react';
import { View } from 'react-native';
import { firstOpenStep } from '../../shared/wizard/index';
import { failureWords, isProblem } from '../api/client';
import { useResumeIntake } from '../api/use-resume-intake';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { ButtonLink } from '../ui/button-link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';
import { useHydrated } from '../wizard/use-hydrated';

/** Opens the answers by the mailed link and leads to where they were left. The token leaves the address at once. */
export function ResumeScreen() {
  const { token } = useLocalSearchParams<{ token: string }>();
  const hydrated = useHydrated();
  const router = useRouter();
  const { mutate, error } = useResumeIntake();
  const tried = useRef(false);
  const open = () => mutate(token, { onSuccess: (intake) => router.replace(intake.stage === 'open' ? `/quote/${firstOpenStep(intake.answers).id}` : '/quote/price') });

  useEffect(() => {
    if (!hydrated || tried.current) return;
    tried.current = true;
    open();
  });

  if (!error) {
    return (
      <Page title="Opening your answers" width="text">
        <Text variant="title" level={1}>Opening your answers</Text>
        <View style={{ paddingTop: space[5] }}><Skeleton label="Opening your answers" lines={4} /></View>
      </Page>
    );
  }
  const over = isProblem(error, 400, 401, 404, 410, 422);
  const title = over ? 'This link does not open anything any more' : 'We could not open your answers';
  return (
    <Page title={title} width="text">
      <View style={{ gap: space[4], alignItems: 'flex-start' }}>
        <Text variant="title" level={1}>{title}</Text>
        <Text>
          {over
            ? 'Links end after some weeks, and a newer one replaces an older one. Open the newest mail from us, and check that the whole address was copied.'
            : `${failureWords(error)} Your answers are safe.`}
        </Text>
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: space[3] }}>
          {over ? null : <Button label="Try again" onPress={open} />}
          <ButtonLink kind={over ? 'filled' : 'quiet'} label="Start with your home" href="/quote/home" />
        </View>
      </View>
    </Page>
  );
}
