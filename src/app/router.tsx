import { createBrowserRouter, type PatchRoutesOnNavigationFunction } from 'react-router-dom';
import { FaultPage } from './FaultPage';
import { officeRoutes } from './officeRoutes';
import { paths } from './paths';
import { Root } from './Root';
import { withServer } from './withServer';

const pages = 'pages';
const fieldPath = /^\/my(\/|$)/;
let isFieldHere = false;

/** The field screens arrive in their own bundle, with their routes, the first time one of them is opened. */
const addField: PatchRoutesOnNavigationFunction = async ({ path, patch }) => {
  if (isFieldHere || !fieldPath.test(path)) return;
  const { fieldBranch } = await import('./fieldBranch');
  isFieldHere = true;
  patch(pages, fieldBranch);
};

export const router = createBrowserRouter(
  [
    {
      Component: Root,
      // What is drawn while the first page's bundle arrives: nothing, for the blink it takes.
      HydrateFallback: () => null,
      children: [
        {
          id: pages,
          errorElement: <FaultPage />,
          children: [
            withServer([
              { path: paths.home, lazy: async () => ({ Component: (await import('./Home')).Home }) },
              ...officeRoutes,
            ]),
            { path: '*', lazy: async () => ({ Component: (await import('./NotFound')).NotFound }) },
          ],
        },
      ],
    },
  ],
  { patchRoutesOnNavigation: addField },
);
