import type { RouteObject } from 'react-router-dom';
import { paths } from '../../app/paths';
import { JobLayout } from './job/JobLayout';
import { JobPage } from './job/JobPage';
import { MyJobsPage } from './jobs/MyJobsPage';
import { FieldLayout } from './layout/FieldLayout';
import { LivePage } from './live/LivePage';
import { LocksPage } from './locks/LocksPage';
import { StepPage } from './step/StepPage';

/** The field screens: they open cold from the device store, one person at a time. */
export const fieldRoutes: RouteObject[] = [
  {
    Component: FieldLayout,
    children: [
      { path: paths.myJobs, Component: MyJobsPage },
      {
        Component: JobLayout,
        children: [
          { path: paths.myJob(':job'), Component: JobPage },
          { path: '/my/jobs/:job/steps/:step', Component: StepPage },
          { path: '/my/jobs/:job/live/:step', Component: LivePage },
          { path: paths.jobLocks(':job'), Component: LocksPage },
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
