import { useLocalSearchParams, useRouter } from 'expo-router';
import { useEffect, useRef } from 'react';
import { View } from 'react-native';
import { isProblem } from '../api/client';
import { useCompany } from '../api/use-company';
import { useOpenMy } from '../api/use-my';
import { Failure } from '../price/failure';
import { space } from '../theme/tokens';
import { Link } from '../ui/link';
import { Page } from '../ui/page';
import { Skeleton } from '../ui/skeleton';
import { Text } from '../ui/text';

/** Trades the token of a mailed link for a cookie, then goes to an address without it, so that it stays out of the history. */
export function MyLinkScreen() {
  const { token } = useLocalSearchParams<{ token?: string }>();
  const router = useRouter();
  const open = useOpenMy();
  const { mutate } = open;
  const asked = useRef('');
  const company = useCompany().data;
  useEffect(() => {
    if (!token || asked.current === token) return;
    asked.current = token;
    mutate(token, { onSuccess: () => router.replace('/my') });
  }, [token, mutate, router]);
  return (
    <Page title="Your job" width="text">
      {isProblem(open.error, 404, 410, 422) ? (
        <View style={{ gap: space[4] }}>
          <Text variant="title" level={1}>This link does not open anything</Text>
          <Text>It may have run out, or a part of it is missing. Open it again from the newest mail we sent.</Text>
          {company ? <Link label={`Or call ${company.phone}`} href={`tel:${company.phone}`} /> : null}
        </View>
      ) : open.error && token ? (
        <Failure error={open.error} onRetry={() => mutate(token, { onSuccess: () => router.replace('/my') })} />
      ) : (
        <Skeleton label="Opening your page" />
      )}
    </Page>
  );
}
