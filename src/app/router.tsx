import { createBrowserRouter } from 'react-router-dom';
import { FaultPage } from './FaultPage';
import { Home } from './Home';
import { officeRoutes } from './officeRoutes';
import { paths } from './paths';
import { Root } from './Root';

export const router = createBrowserRouter([
  {
    Component: Root,
    // What is drawn while the first page's bundle arrives: nothing, for the blink it takes.
    HydrateFallback: () => null,
    children: [
      {
        errorElement: <FaultPage />,
        children: [
          { path: paths.home, Component: Home },
          ...officeRoutes,
          { path: '*', lazy: async () => ({ Component: (await import('./NotFound')).NotFound }) },
        ],
      },
    ],
  },
]);
