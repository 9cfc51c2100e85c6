import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Providers } from './Providers';

export function Root() {
  return (
    <Providers>
      <Outlet />
      <ScrollRestoration />
    </Providers>
  );
}
