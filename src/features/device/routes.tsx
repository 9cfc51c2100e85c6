import type { RouteObject } from 'react-router-dom';
import { paths } from '../../app/paths';

/** *This device*: open without a PIN, because it is where a person gets one. */
export const deviceRoutes: RouteObject[] = [
  { path: paths.device, lazy: async () => ({ Component: (await import('./DevicePage')).DevicePage }) },
];
