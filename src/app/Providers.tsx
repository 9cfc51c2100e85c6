import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { Outlet } from 'react-router-dom';
import { CurrentSiteProvider } from '../api/currentSite';
import { UnreachableError } from '../api/request';

/** One for the page: what was fetched stays when a person walks between the desk and this device. */
const client = new QueryClient({
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

/** What the pages that ask the server rely on: its data, and the site shown. Field pages do without. */
export function Providers() {
  return (
    <QueryClientProvider client={client}>
      <CurrentSiteProvider>
        <Outlet />
      </CurrentSiteProvider>
    </QueryClientProvider>
  );
}
