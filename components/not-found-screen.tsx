import Head from 'expo-router/head';
import { Link } from 'expo-router';
import { Text, View } from 'react-native';

/** What an address shows that leads nowhere: says so, and the way back. */
export function NotFoundScreen() {
  return (
    <View role="main">
      <Head>
        <title>Page not found – Tidyrun</title>
      </Head>
      <Text role="heading" aria-level={1}>This page is not here</Text>
      <Text>The address may be old or mistyped. Nothing you told us is lost.</Text>
      <Link href="/">Go to the start</Link>
    </View>
  );
}
