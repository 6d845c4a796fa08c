import { Redirect, usePathname } from 'expo-router';
import { View } from 'react-native';
import { failureWords, isProblem, NetworkError } from '../api/client';
import { space } from '../theme/tokens';
import { Button } from '../ui/button';
import { Text } from '../ui/text';
import { signInPath } from './desk-paths';

export interface LoadFailureProps {
  readonly error: unknown;
  readonly onRetry: () => void;
  /** 1 where it stands for the whole page. */
  readonly level?: 1 | 2;
}

/** Something of the desk did not load: what happened, what is safe, one way on. A session that ran out leads to the sign-in. */
export function LoadFailure({ error, onRetry, level = 2 }: LoadFailureProps) {
  const path = usePathname();
  if (isProblem(error, 401)) return <Redirect href={signInPath(path)} />;
  const refused = isProblem(error, 403);
  return (
    <View role="alert" style={{ gap: space[3], alignItems: 'flex-start', maxWidth: 560, padding: space[4] }}>
      <Text variant={level === 1 ? 'deskTitle' : 'heading'} level={level}>{refused ? 'Your role does not open this' : 'This did not load'}</Text>
      <Text>{refused ? 'Ask the owner if you need it.' : error instanceof NetworkError ? error.message : failureWords(error)}</Text>
      {refused ? null : <Button label="Try again" kind="quiet" size="desk" onPress={onRetry} />}
    </View>
  );
}
