import { roles as allRoles, type Role } from '../../../shared/api/common';
import { useCurrentSite } from '../../api/currentSite';
import { CheckField } from '../../components/form/CheckField';
import { useWords } from '../../components/words';

export interface SiteRole {
  site: string;
  role: Role;
}

interface RolesFieldProps {
  roles: readonly SiteRole[];
  onChange: (roles: SiteRole[]) => void;
  error?: string | undefined;
}

/** Roles, site by site; roles at sites this administrator does not see stay as they are. */
export function RolesField({ roles, onChange, error }: RolesFieldProps) {
  const { t } = useWords();
  const { sites } = useCurrentSite();
  const has = (site: string, role: Role) => roles.some((each) => each.site === site && each.role === role);
  const toggle = (site: string, role: Role) =>
    onChange(
      has(site, role)
        ? roles.filter((each) => each.site !== site || each.role !== role)
        : [...roles, { site, role }],
    );
  return (
    <>
      {sites.map((site) => (
        <fieldset key={site.id} className="my-3 border border-edge px-4 py-1">
          <legend className="px-1 font-bold">{t('office.people.rolesAt', { site: site.name })}</legend>
          {allRoles.map((role) => (
            <CheckField
              key={role}
              label={t(`app.role.${role}`)}
              checked={has(site.id, role)}
              onChange={() => toggle(site.id, role)}
            />
          ))}
        </fieldset>
      ))}
      {error && (
        <p role="alert" className="m-0 font-bold">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      )}
    </>
  );
}
