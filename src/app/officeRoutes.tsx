import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';
import type { Role } from '../../shared/api/common';
import { paths } from './paths';

type Load = () => Promise<ComponentType>;

/** A page in its own bundle, shown to the roles named; none named: to everybody. */
function page(path: string, load: Load, ...roles: Role[]): RouteObject {
  return {
    path,
    lazy: async () => {
      const [Page, { ForRoles }] = await Promise.all([load(), import('./ForRoles')]);
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
];

const officePages: RouteObject[] = [];

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
