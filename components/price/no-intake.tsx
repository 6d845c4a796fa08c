import { View } from 'react-native';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Text } from '../ui/text';

/** This browser holds no intake (any more): start one, or open the mailed link. */
export function NoIntake() {
  return (
    <Page title="Nothing open here" width="text">
      <View style={{ gap: space[4], alignItems: 'flex-start' }}>
        <Text variant="title" level={1}>Nothing is open in this browser</Text>
        <Text>If you asked for a link to finish later, open it from your mail. Your answers are behind it.</Text>
        <ButtonLink label="Start with your home" href="/quote/home" arrow />
        <Link label="Open a saved job" href="/resume" />
      </View>
    </Page>
  );
}
