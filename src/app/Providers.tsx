import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { CurrentSiteProvider } from '../api/currentSite';
import { UnreachableError } from '../api/request';
import { WordsProvider } from '../components/words';

const makeQueryClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: {
        // A refusal stays a refusal; only a missing answer is worth asking again.
        retry: (failures, error) => error instanceof UnreachableError && failures < 2,
        staleTime: 2_000,
        // Requests are tried whatever the browser believes about the network.
        networkMode: 'always',
      },
      mutations: { networkMode: 'always' },
    },
  });

/** What every screen may rely on: language, server data, the site shown. */
export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(makeQueryClient);
  return (
    <WordsProvider>
      <QueryClientProvider client={client}>
        <CurrentSiteProvider>{children}</CurrentSiteProvider>
      </QueryClientProvider>
    </WordsProvider>
  );
}
