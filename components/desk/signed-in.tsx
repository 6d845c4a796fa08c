import { Redirect, usePathname } from 'expo-router';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { Session } from '../../shared/api/desk';
import { isProblem } from '../api/client';
import { useSession } from '../api/use-session';
import { colors, space } from '../theme/tokens';
import { Skeleton } from '../ui/skeleton';
import { DeskFrame } from './desk-frame';
import { signInPath } from './desk-paths';
import { LoadFailure } from './load-failure';

/** A page for who is signed in, in the desk's frame; others are led to the sign-in. The server decides who may see what. */
export function SignedIn({ children }: { readonly children: (session: Session) => ReactNode }) {
  const { data: session, error, refetch } = useSession();
  const path = usePathname();
  if (isProblem(error, 401)) return <Redirect href={signInPath(path)} />;
  if (session) return <DeskFrame session={session}>{children(session)}</DeskFrame>;
  return (
    <View role="main" id="main" style={{ flexGrow: 1, backgroundColor: colors.paper, padding: space[6] }}>
      {error ? <LoadFailure error={error} level={1} onRetry={() => void refetch()} /> : <Skeleton label="Opening the desk" />}
    </View>
  );
}
