import { Redirect, Slot, usePathname } from 'expo-router';
import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { isProblem } from '../api/client';
import { useSession } from '../api/use-session';
import { colors, space } from '../theme/tokens';
import { Skeleton } from '../ui/skeleton';
import { DeskFrame } from './desk-frame';
import { signInPath } from './desk-paths';
import { LoadFailure } from './load-failure';
import { DeskProvider } from './session-context';

/** Around every page of the desk: nobody sees one without a session. The server decides; this only leads to the sign-in. */
export function DeskLayout() {
  return usePathname() === '/desk/sign-in' ? <Slot /> : <SignedIn />;
}

function SignedIn() {
  const { data: session, error, refetch } = useSession();
  const path = usePathname();
  const [search, setSearch] = useState('');
  const desk = useMemo(() => (session ? { session, search, setSearch } : null), [session, search]);
  if (isProblem(error, 401)) return <Redirect href={signInPath(path)} />;
  if (!desk) {
    return (
      <View role="main" id="main" style={{ flexGrow: 1, backgroundColor: colors.paper, padding: space[6] }}>
        {error ? <LoadFailure error={error} level={1} onRetry={() => void refetch()} /> : <Skeleton label="Opening the desk" />}
      </View>
    );
  }
  return (
    <DeskProvider value={desk}>
      <DeskFrame session={desk.session}><Slot /></DeskFrame>
    </DeskProvider>
  );
}
