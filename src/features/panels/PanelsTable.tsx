import { Link } from 'react-router-dom';
import type { PanelRow } from '../../../shared/api/panels';
import { paths } from '../../app/paths';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';

/** One line a panel. */
export function PanelsTable({ rows }: { rows: readonly PanelRow[] }) {
  const { t } = useWords();
  const columns: Column<PanelRow>[] = [
    {
      head: t('office.panel'),
      className: 'md:w-[30%]',
      cell: (row) => (
        <Link to={paths.panel(row.id)} className="inline-block py-1.5">
          <strong className="font-mono">{row.tag}</strong> {row.name}
        </Link>
      ),
    },
    { head: t('office.panel.location'), cell: (row) => row.location },
    { head: t('office.points'), className: 'md:w-24', cell: (row) => row.points },
    {
      head: t('office.panel.revision'),
      cell: (row) =>
        row.revision === null ? t('office.panel.neverIssued') : t('office.panel.issued', { n: row.revision }),
    },
    {
      head: t('office.panel.draft'),
      cell: (row) => (row.draftChanged ? t('office.panel.draftChanged') : t('office.panel.draftSame')),
    },
    { head: t('office.panel.openJobs'), className: 'md:w-24', cell: (row) => row.openJobs },
  ];
  return <Table caption={t('app.tab.panels')} columns={columns} rows={rows} keyOf={(row) => row.id} />;
}
