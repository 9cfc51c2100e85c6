import { createBrowserRouter, type PatchRoutesOnNavigationFunction } from 'react-router-dom';
import { FaultPage } from './FaultPage';
import { paths } from './paths';
import { Root } from './Root';
import { withServer } from './withServer';

const pages = 'pages';
const fieldPath = /^\/my(\/|$)/;
const here = new Set<string>();

const branches = {
  field: async () => (await import('./fieldBranch')).fieldBranch,
  office: async () => [withServer((await import('./officeRoutes')).officeRoutes)],
};

/** Field and office screens arrive each in their own bundle, with their routes, the first time one is opened. */
const addBranch: PatchRoutesOnNavigationFunction = async ({ path, patch }) => {
  const name = fieldPath.test(path) ? 'field' : 'office';
  if (here.has(name)) return;
  const branch = await branches[name]();
  // Another navigation may have brought it meanwhile.
  if (here.has(name)) return;
  here.add(name);
  patch(pages, branch);
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
            ]),
            { path: '*', lazy: async () => ({ Component: (await import('./NotFound')).NotFound }) },
          ],
        },
      ],
    },
  ],
  { patchRoutesOnNavigation: addBranch },
);
