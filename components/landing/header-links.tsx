import { Pressable, View } from 'react-native';
import { space, targetPx } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Text } from '../ui/text';

/** The landing's own links in the header: room for them on wide windows only; phones have them further down. */
export function HeaderLinks() {
  return (
    <View dataSet={{ only: 'wide' }} style={{ flexDirection: 'row', alignItems: 'center', gap: space[6] }}>
      <Pressable role="link" href="#how-prices-work" style={{ minHeight: targetPx, justifyContent: 'center' }}>
        <Text variant="subheading" color="lake" weight={700}>How prices work</Text>
      </Pressable>
      <ButtonLink kind="quiet" size="desk" href="/resume" label="Open a saved job" />
    </View>
  );
}
