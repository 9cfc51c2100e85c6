import { useSearchParams } from 'react-router-dom';
import { paths } from '../../app/paths';
import { useCurrentSite } from '../../api/currentSite';
import { useRecords } from '../../api/records';
import { Answered } from '../../components/Answered';
import { ButtonLink } from '../../components/ButtonLink';
import { EmptyState } from '../../components/EmptyState';
import { MoreButton } from '../../components/MoreButton';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { RecordFilter } from './RecordFilter';
import { RecordsTable } from './RecordsTable';

/** Completed sign-offs, found by panel, person, date, point or lock; the address of the page holds the search. */
export function RecordsPage() {
  const { t } = useWords();
  const { site } = useCurrentSite();
  const [search, setSearch] = useSearchParams();
  const filter = search.toString();
  const records = useRecords(site?.id, filter);
  return (
    <SheetPage
      title={t('app.tab.records')}
      titleHidden
      asOf={records.dataUpdatedAt}
      actions={<ButtonLink to={paths.verify}>{t('app.tab.verify')}</ButtonLink>}
      cells={[
        { label: t('app.sheet'), value: t('app.tab.records') },
        { label: t('app.site'), value: site?.name },
      ]}
      page={records.data && t('app.pageOpen', { page: records.data.pages.length })}
    >
      <RecordFilter key={filter} search={search} onSearch={setSearch} />
      <Answered query={records}>
        {(data) => {
          const rows = data.pages.flatMap((page) => page.items);
          if (rows.length > 0) return <RecordsTable rows={rows} />;
          return filter ? (
            <EmptyState title={t('records.noneFound')}>{t('records.noneFound.next')}</EmptyState>
          ) : (
            <EmptyState title={t('records.empty')}>{t('records.empty.first')}</EmptyState>
          );
        }}
      </Answered>
      <MoreButton query={records} />
    </SheetPage>
  );
}
