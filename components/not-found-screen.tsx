import { View } from 'react-native';
import { space } from './theme/tokens';
import { ButtonLink } from './ui/button-link';
import { Page } from './ui/page';
import { Text } from './ui/text';

/** What an address shows that leads nowhere: says so, and the way back. */
export function NotFoundScreen() {
  return (
    <Page title="Page not found" width="text">
      <View style={{ gap: space[4], alignItems: 'flex-start' }}>
        <Text variant="title" level={1}>This page is not here</Text>
        <Text color="ink2">The address may be old or mistyped. Nothing you told us is lost.</Text>
        <ButtonLink href="/" label="Go to the start" />
      </View>
    </Page>
  );
}
