import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { v7 as uuid } from 'uuid';
import type { SiteView } from '../../../shared/api/sites';
import { paths } from '../../app/paths';
import { useCreateSite, useSites } from '../../api/sites';
import { Answered } from '../../components/Answered';
import { Button } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { SheetPage } from '../../components/sheet/SheetPage';
import { SheetSection } from '../../components/sheet/SheetSection';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';
import { emptySite } from './siteForm';
import { SiteForm } from './SiteForm';

function NewSite() {
  const { t } = useWords();
  const navigate = useNavigate();
  const create = useCreateSite();
  const [id] = useState(() => uuid());
  return (
    <SheetSection title={t('office.sites.new')}>
      <SiteForm
        start={emptySite}
        busy={create.isPending}
        error={create.error}
        onSave={(values) =>
          create.mutate({ id, ...values }, { onSuccess: () => void navigate(paths.site(id)) })
        }
      />
    </SheetSection>
  );
}

/** The sites this administrator looks after. */
export function SitesPage() {
  const { t } = useWords();
  const sites = useSites();
  const [adding, setAdding] = useState(false);
  const columns: Column<SiteView>[] = [
    {
      head: t('app.site'),
      cell: (site) => (
        <Link to={paths.site(site.id)} className="inline-block py-1.5 font-bold">
          {site.name}
        </Link>
      ),
    },
    { head: t('office.site.emergency'), cell: (site) => site.settings.emergencyNumber },
    { head: t('office.site.muster'), cell: (site) => site.settings.musterPoint },
    {
      head: t('office.site.deadLimit'),
      cell: (site) => <span className="font-mono">{site.settings.deadLimitV} V</span>,
    },
    { head: t('office.site.instruments'), cell: (site) => site.settings.instruments.length },
  ];
  return (
    <SheetPage
      title={t('app.tab.sites')}
      titleHidden
      asOf={sites.dataUpdatedAt}
      actions={!adding && <Button onClick={() => setAdding(true)}>{t('office.sites.new')}</Button>}
    >
      <Answered query={sites}>
        {({ items }) =>
          items.length === 0 ? (
            <EmptyState title={t('office.sites.empty')}>{t('office.sites.empty.first')}</EmptyState>
          ) : (
            <Table caption={t('app.tab.sites')} columns={columns} rows={items} keyOf={(site) => site.id} />
          )
        }
      </Answered>
      <div className="mt-8">{adding && <NewSite />}</div>
    </SheetPage>
  );
}
