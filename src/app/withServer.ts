import type { RouteObject } from 'react-router-dom';

/** Puts pages under what they need to ask the server; its bundle comes with the first of them. */
export const withServer = (children: RouteObject[]): RouteObject => ({
  lazy: async () => ({ Component: (await import('./Providers')).Providers }),
  children,
});
