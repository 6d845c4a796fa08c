import { useLocalSearchParams, useRouter } from 'expo-router';
import Head from 'expo-router/head';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { failureWords, isProblem, problemByField } from '../api/client';
import { useCompany } from '../api/use-company';
import { useSignIn } from '../api/use-session';
import { BrandMark } from '../drawings/brand-mark';
import { colors, space } from '../theme/tokens';
import { Button } from '../ui/button';
import { Card } from '../ui/card';
import { CautionBox } from '../ui/caution-box';
import { ErrorSummary } from '../ui/error-summary';
import { Field } from '../ui/field';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { useFocusHeading } from '../ui/use-focus-heading';
import { pathAfterSignIn } from './desk-paths';

const MISSING = { email: 'Type your e-mail address', password: 'Type your password' } as const;

/** Why a sign-in failed; null when it did not, or when its words stand beside a field. */
function refusal(error: unknown): string | null {
  if (!error || isProblem(error, 422)) return null;
  if (isProblem(error, 401)) return 'That e-mail and password do not match. Check both and try again.';
  return failureWords(error);
}

/** The door of the desk. What is typed stays after a refusal. */
export function SignInScreen() {
  const router = useRouter();
  const { next } = useLocalSearchParams<{ next?: string }>();
  const company = useCompany().data;
  const signIn = useSignIn();
  const [typed, setTyped] = useState({ email: '', password: '' });
  const [attempt, setAttempt] = useState(0);
  useFocusHeading('Sign in');
  const missing = attempt > 0 ? (['email', 'password'] as const).filter((id) => typed[id].trim() === '') : [];
  const wrong: Readonly<Record<string, string>> = {
    ...problemByField(signIn.error), ...Object.fromEntries(missing.map((id) => [id, MISSING[id]])),
  };
  const submit = () => {
    if (signIn.isPending) return;
    setAttempt(attempt + 1);
    if (typed.email.trim() === '' || typed.password === '') return;
    signIn.mutate({ email: typed.email.trim(), password: typed.password }, { onSuccess: () => router.replace(pathAfterSignIn(next)) });
  };
  const problems = Object.entries(wrong).map(([field, detail]) => ({ field: `sign-in-${field}`, detail }));
  const refused = refusal(signIn.error);
  return (
    <View dataSet={{ part: 'page' }} style={styles.page}>
      <Head><title>Sign in – Tidyrun desk</title></Head>
      <View role="main" id="main" style={styles.main}>
        <View style={styles.brand}>
          <BrandMark size={44} />
          <View>
            <Text variant="deskTitle" level={1}>Sign in to the desk</Text>
            <Text variant="note" color="ink2">{company?.name ?? ' '}</Text>
          </View>
        </View>
        <Card style={styles.form}>
          <ErrorSummary problems={problems} attempt={attempt} />
          <View role="alert">{refused ? <CautionBox level="stop">{refused}</CautionBox> : null}</View>
          <Field
            id="sign-in-email" label="E-mail" value={typed.email} onChangeText={(email) => setTyped({ ...typed, email })} onSubmit={submit}
            error={wrong['email'] ?? null} inputMode="email" autoComplete="username" maxLength={254}
          />
          <Field
            id="sign-in-password" label="Password" value={typed.password} onChangeText={(password) => setTyped({ ...typed, password })} onSubmit={submit}
            error={wrong['password'] ?? null} secure autoComplete="current-password" maxLength={200}
          />
          <Button label="Sign in" busyLabel="Signing in" busy={signIn.isPending} onPress={submit} />
        </Card>
        <View style={styles.foot}>
          <Text variant="note" color="ink2">For the people of the contractor.</Text>
          <Link label="Looking for a price?" href="/" variant="note" />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flexGrow: 1, backgroundColor: colors.paper, alignItems: 'center', justifyContent: 'center', padding: space[4] },
  main: { width: '100%', maxWidth: 420, gap: space[5] },
  brand: { flexDirection: 'row', alignItems: 'center', gap: space[3] },
  form: { gap: space[4] },
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', columnGap: space[4] },
});
