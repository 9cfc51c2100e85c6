import type { Role } from '../../shared/api/common';
import { useCurrentSite } from '../api/currentSite';
import { useSession } from '../api/session';

/** The roles of the person signed in, at the site that is shown. */
export function useHeldRoles(): Role[] {
  const session = useSession();
  const { site } = useCurrentSite();
  const held = session.data?.roles.filter((each) => each.site === site?.id) ?? [];
  return [...new Set(held.map((each) => each.role))];
}
