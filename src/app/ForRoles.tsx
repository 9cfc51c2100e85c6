import type { ReactNode } from 'react';
import type { Role } from '../../shared/api/common';
import { ButtonLink } from '../components/ButtonLink';
import { SheetPage } from '../components/sheet/SheetPage';
import { useWords } from '../components/words';
import { paths } from './paths';
import { useHeldRoles } from './useHeldRoles';

/** Shows the page to people who hold one of the roles here, and to others why not. The server decides again on its own. */
export function ForRoles({ roles, children }: { roles: readonly Role[]; children: ReactNode }) {
  const { t } = useWords();
  const held = useHeldRoles();
  if (roles.some((role) => held.includes(role))) return children;
  return (
    <SheetPage title={t('app.notAllowed')}>
      <p className="max-w-[66ch]">
        {t('app.notAllowed.says', { roles: roles.map((role) => t(`app.role.${role}`)).join(', ') })}
      </p>
      <ButtonLink to={paths.home}>{t('app.toStart')}</ButtonLink>
    </SheetPage>
  );
}
