import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { useState } from 'react';
import { SafeAreaProvider } from 'react-native-safe-area-context';
import { ProblemError } from './api/problem-error';
// Only the static page names the fonts; a script has to as well, or the export leaves their files out.
import './theme/font-files';

const MAX_TRIES = 2;

/** Around every screen: what the server said (react-query) and the safe area. It has no look of its own; pages bring their header. */
export function RootLayout() {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: {
            // A refusal stays a refusal; only what did not get through is tried again.
            retry: (failures, error) => failures < MAX_TRIES && !(error instanceof ProblemError),
            staleTime: 10_000,
          },
        },
      }),
  );
  return (
    <QueryClientProvider client={client}>
      <SafeAreaProvider>
        <Slot />
      </SafeAreaProvider>
    </QueryClientProvider>
  );
}
