import { NavLink } from 'react-router-dom';
import { useCurrentSite } from '../api/currentSite';
import { useSession } from '../api/session';
import { useWords } from '../components/words';
import { SignOutButton } from './SignOutButton';
import { tabsFor } from './tabs';
import { useHeldRoles } from './useHeldRoles';

const tabClass = ({ isActive }: { isActive: boolean }) =>
  `flex min-h-12 items-center border-r border-rule px-5 font-bold no-underline max-md:border-b max-md:px-4 ${
    isActive ? 'bg-ink text-paper' : 'text-ink hover:underline'
  }`;

function SiteChoice() {
  const { t } = useWords();
  const { site, sites, choose } = useCurrentSite();
  if (sites.length < 2) return <span>{site?.name}</span>;
  return (
    <select
      aria-label={t('app.site')}
      value={site?.id}
      onChange={(event) => choose(event.target.value)}
      className="min-h-11 max-w-full border border-edge bg-sheet px-2 text-ink md:max-w-80"
    >
      {sites.map((each) => (
        <option key={each.id} value={each.id}>
          {each.name}
        </option>
      ))}
    </select>
  );
}

/** The tabs of the sheets at the top, and at the right whose they are. */
export function OfficeHeader() {
  const { t } = useWords();
  const session = useSession();
  const roles = useHeldRoles();
  return (
    <header className="flex flex-wrap border-b-2 border-ink">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:z-10 focus:bg-sheet focus:p-3"
      >
        {t('app.skip')}
      </a>
      <nav aria-label={t('app.tabs')} className="flex flex-1 flex-wrap">
        {tabsFor(roles).map((tab) => (
          <NavLink key={tab.to} to={tab.to} className={tabClass}>
            {t(tab.words)}
          </NavLink>
        ))}
      </nav>
      <div className="flex flex-wrap items-center gap-x-3 border-rule px-5 py-1 text-muted max-md:w-full max-md:px-4 md:border-l">
        <SiteChoice />
        <span aria-hidden="true">·</span>
        <span title={roles.map((role) => t(`app.role.${role}`)).join(', ')}>{session.data?.person.name}</span>
        <SignOutButton />
      </div>
    </header>
  );
}
