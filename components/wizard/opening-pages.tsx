import { View } from 'react-native';
import { failureWords } from '../api/client';
import { useForgetIntake } from '../api/use-forget-intake';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { ButtonLink } from '../ui/button-link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';

const stack = { gap: space[4], alignItems: 'flex-start', paddingTop: space[6] } as const;

/** While the answers are being fetched. */
export function OpeningPage({ title }: { title: string }) {
  return (
    <Page title={title} width="text">
      <Text variant="title" level={1}>{title}</Text>
      <View style={{ paddingTop: space[5] }}><Skeleton label="Opening your answers" lines={6} /></View>
    </Page>
  );
}

/** The answers could not be fetched: nothing is lost, try again. */
export function OpenFailedPage({ error, onAgain }: { error: unknown; onAgain: () => void }) {
  return (
    <Page title="We could not open your answers" width="text">
      <View style={stack}>
        <Text variant="title" level={1}>We could not open your answers</Text>
        <Text>{failureWords(error)} What you answered before is safe.</Text>
        <Button label="Try again" onPress={onAgain} />
      </View>
    </Page>
  );
}

/** This browser does not hold the answers any more. */
export function GonePage() {
  const forget = useForgetIntake();
  // A new page load, because everything kept in this one belongs to the answers that are gone.
  const start = () => forget.mutate(undefined, { onSettled: () => window.location.assign('/quote/home') });
  return (
    <Page title="These answers are not open here any more" width="text">
      <View style={stack}>
        <Text variant="title" level={1}>These answers are not open here any more</Text>
        <Text>
          They were opened somewhere else, closed, or kept as long as we promised. Your link from “Finish later” opens them again,
          on any device.
        </Text>
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: space[3] }}>
          <ButtonLink label="Open a saved job" href="/resume" />
          <Button label="Start again" kind="quiet" busy={forget.isPending} busyLabel="Starting" onPress={start} />
        </View>
      </View>
    </Page>
  );
}
