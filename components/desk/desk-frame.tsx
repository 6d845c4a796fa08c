import { Redirect } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import type { Session } from '../../shared/api/desk';
import { useSignOut } from '../api/use-session';
import { colors } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { SkipLink } from '../ui/skip-link';
import { DeskBar } from './desk-bar';
import { DeskRail } from './desk-rail';

/** The desk's rail at the left (a bar on top on phones) and the page beside it. */
export function DeskFrame({ session, children }: { readonly session: Session; readonly children: ReactNode }) {
  const breakpoint = useBreakpoint();
  const signOut = useSignOut();
  if (signOut.isSuccess) return <Redirect href="/desk/sign-in" />;
  const leave = { failed: signOut.isError, busy: signOut.isPending, onPress: () => signOut.mutate(session.csrfToken) };
  return (
    <View dataSet={{ part: 'page' }} style={[styles.frame, breakpoint === 'phone' && styles.phone]}>
      <SkipLink />
      {breakpoint === 'phone' ? (
        <DeskBar session={session} leave={leave} />
      ) : (
        <DeskRail session={session} leave={leave} folded={breakpoint === 'tablet'} />
      )}
      <View role="main" id="main" style={styles.page}>{children}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { flexGrow: 1, flexDirection: 'row', backgroundColor: colors.paper },
  phone: { flexDirection: 'column' },
  page: { flex: 1, minWidth: 0 },
});
