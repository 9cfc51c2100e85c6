import { useState } from 'react';
import type { PersonView } from '../../../shared/api/people';
import { useCurrentSite } from '../../api/currentSite';
import { usePeople } from '../../api/people';
import { Answered } from '../../components/Answered';
import { Button } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { MoreButton } from '../../components/MoreButton';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { InviteDialog } from './InviteDialog';
import { PeopleTable } from './PeopleTable';
import { PersonDialog } from './PersonDialog';

/** Who works with Coldloop at this site, and as what. */
export function PeoplePage() {
  const { t } = useWords();
  const { site } = useCurrentSite();
  const people = usePeople(site?.id);
  const [inviting, setInviting] = useState(false);
  const [changing, setChanging] = useState<PersonView>();
  return (
    <SheetPage
      title={t('app.tab.people')}
      titleHidden
      asOf={people.dataUpdatedAt}
      cells={[
        { label: t('app.sheet'), value: t('app.tab.people') },
        { label: t('app.site'), value: site?.name },
      ]}
      actions={
        <Button look="primary" onClick={() => setInviting(true)}>
          {t('office.people.invite')}
        </Button>
      }
    >
      <Answered query={people}>
        {(data) => {
          const rows = data.pages.flatMap((page) => page.items);
          if (rows.length === 0)
            return <EmptyState title={t('office.people.empty')}>{t('office.people.empty.first')}</EmptyState>;
          return <PeopleTable rows={rows} onChange={setChanging} />;
        }}
      </Answered>
      <MoreButton query={people} />
      {inviting && <InviteDialog onClose={() => setInviting(false)} />}
      {changing && <PersonDialog person={changing} onClose={() => setChanging(undefined)} />}
    </SheetPage>
  );
}
