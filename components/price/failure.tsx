import { View } from 'react-native';
import { failureWords } from '../api/client';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { Text } from '../ui/text';

/** A page that could not be filled: what happened, what is safe, one way on. */
export function Failure({ error, onRetry }: { readonly error: unknown; readonly onRetry: () => void }) {
  return (
    <View role="alert" style={{ gap: space[4], alignItems: 'flex-start', maxWidth: 560 }}>
      <Text variant="title" level={1}>This did not load</Text>
      <Text>{failureWords(error)}</Text>
      <Text color="ink2">Your answers are kept on our side.</Text>
      <Button label="Try again" kind="quiet" onPress={onRetry} />
    </View>
  );
}
