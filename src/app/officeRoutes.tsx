import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';
import type { Role } from '../../shared/api/common';
import { chosenLanguage } from '../components/wording/chosenLanguage';
import { holdArea } from '../components/wording/held';
import { paths } from './paths';

type Load = () => Promise<ComponentType>;

/** A page in its own bundle, shown to the roles named; none named: to everybody. */
function page(path: string, load: Load, ...roles: Role[]): RouteObject {
  return {
    path,
    lazy: async () => {
      const [Page, { ForRoles }] = await Promise.all([
        load(),
        import('./ForRoles'),
        holdArea('desk', chosenLanguage()),
      ]);
      if (roles.length === 0) return { Component: Page };
      return {
        Component: () => (
          <ForRoles roles={roles}>
            <Page />
          </ForRoles>
        ),
      };
    },
  };
}

const plainPages: RouteObject[] = [
  page(paths.signIn, async () => (await import('../features/session/SignInPage')).SignInPage),
  page(paths.invitation, async () => (await import('../features/session/InvitationPage')).InvitationPage),
  page(
    paths.passwordReset,
    async () => (await import('../features/session/PasswordResetPage')).PasswordResetPage,
  ),
  page(paths.verify, async () => (await import('../features/records/VerifyPage')).VerifyPage),
];

const officePages: RouteObject[] = [
  page(paths.jobs, async () => (await import('../features/jobs/JobsPage')).JobsPage, 'foreman'),
  page(paths.newJob, async () => (await import('../features/jobs/NewJobPage')).NewJobPage, 'foreman'),
  page(paths.job(':job'), async () => (await import('../features/jobs/JobPage')).JobPage, 'foreman'),
  page(
    paths.panels,
    async () => (await import('../features/panels/PanelsPage')).PanelsPage,
    'panel-engineer',
    'foreman',
  ),
  page(
    paths.panel(':panel'),
    async () => (await import('../features/panels/PanelPage')).PanelPage,
    'panel-engineer',
    'foreman',
  ),
  page(
    '/panels/:panel/revisions/:revision',
    async () => (await import('../features/panels/RevisionPage')).RevisionPage,
    'panel-engineer',
    'foreman',
  ),
  page(
    paths.records,
    async () => (await import('../features/records/RecordsPage')).RecordsPage,
    'safety-officer',
    'foreman',
  ),
  page(
    paths.record(':record'),
    async () => (await import('../features/records/RecordPage')).RecordPage,
    'safety-officer',
    'foreman',
  ),
  page(paths.people, async () => (await import('../features/people/PeoplePage')).PeoplePage, 'administrator'),
  page(paths.sites, async () => (await import('../features/sites/SitesPage')).SitesPage, 'administrator'),
  page(
    paths.site(':site'),
    async () => (await import('../features/sites/SitePage')).SitePage,
    'administrator',
  ),
];

/** The office: each page and both frames load on their own, so the field never carries them. */
export const officeRoutes: RouteObject[] = [
  {
    lazy: async () => ({ Component: (await import('./PlainLayout')).PlainLayout }),
    children: plainPages,
  },
  {
    lazy: async () => ({ Component: (await import('./OfficeLayout')).OfficeLayout }),
    children: officePages,
  },
];
