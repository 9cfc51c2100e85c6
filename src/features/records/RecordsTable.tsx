import { Link } from 'react-router-dom';
import type { RecordRow } from '../../../shared/api/records';
import { paths } from '../../app/paths';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';

export function RecordsTable({ rows }: { rows: readonly RecordRow[] }) {
  const { t } = useWords();
  const columns: Column<RecordRow>[] = [
    {
      head: t('records.number'),
      className: 'md:w-[9%]',
      cell: (row) => (
        <Link to={paths.record(row.id)} className="inline-block py-1.5 font-mono font-semibold">
          {row.number}
        </Link>
      ),
    },
    {
      head: t('office.panel'),
      className: 'md:w-[18%] lg:w-[24%]',
      cell: (row) => (
        <>
          <strong className="font-mono">{row.panelTag}</strong> {row.panelName}
        </>
      ),
    },
    {
      head: t('office.job'),
      className: 'md:w-[9%]',
      cell: (row) => <span className="font-mono">{row.jobNumber}</span>,
    },
    { head: t('records.sealedAt'), cell: (row) => <Moment at={row.sealedAt} form="exact" /> },
    { head: t('records.signedBy'), cell: (row) => row.electricians.join(', ') },
    { head: t('records.countersignedBy'), cell: (row) => row.foreman },
    {
      head: t('records.exceptions'),
      className: 'md:w-[18%] lg:w-[12%]',
      cell: (row) => (
        <>
          {row.exceptions === 0
            ? t('records.exceptions.none')
            : t('records.exceptions.n', { n: row.exceptions })}
          {row.amendment && ` · ${t('records.amendment')}`}
        </>
      ),
    },
  ];
  return <Table caption={t('app.tab.records')} columns={columns} rows={rows} keyOf={(row) => row.id} />;
}
