import type { RouteObject } from 'react-router-dom';
import { paths } from '../../app/paths';
import { JobLayout } from './job/JobLayout';
import { MyJobsPage } from './jobs/MyJobsPage';
import { FieldLayout } from './layout/FieldLayout';
import { LivePage } from './live/LivePage';

/** The field screens: they open cold from the device store, one person at a time. */
export const fieldRoutes: RouteObject[] = [
  {
    Component: FieldLayout,
    children: [
      { path: paths.myJobs, Component: MyJobsPage },
      {
        Component: JobLayout,
        children: [
          {
            path: paths.myJob(':job'),
            lazy: async () => ({ Component: (await import('./job/JobPage')).JobPage }),
          },
          {
            path: '/my/jobs/:job/steps/:step',
            lazy: async () => ({ Component: (await import('./step/StepPage')).StepPage }),
          },
          // The red screen waits for nothing.
          { path: '/my/jobs/:job/live/:step', Component: LivePage },
          {
            path: paths.jobLocks(':job'),
            lazy: async () => ({ Component: (await import('./locks/LocksPage')).LocksPage }),
          },
          {
            path: paths.sign(':job'),
            lazy: async () => ({ Component: (await import('./sign/SignPage')).SignPage }),
          },
          {
            path: paths.review(':job'),
            lazy: async () => ({ Component: (await import('./review/ReviewPage')).ReviewPage }),
          },
        ],
      },
    ],
  },
];
