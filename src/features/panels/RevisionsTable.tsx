import { Link } from 'react-router-dom';
import type { RevisionRow } from '../../../shared/api/panels';
import { paths } from '../../app/paths';
import { EmptyState } from '../../components/EmptyState';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';

/** The issued revisions, with who issued them and what stood then. */
export function RevisionsTable({ panel, revisions }: { panel: string; revisions: readonly RevisionRow[] }) {
  const { t } = useWords();
  if (revisions.length === 0)
    return <EmptyState title={t('office.revisions.empty')}>{t('office.revisions.empty.first')}</EmptyState>;
  const columns: Column<RevisionRow>[] = [
    {
      head: t('office.panel.revision'),
      className: 'md:w-28',
      cell: (row) => (
        <Link
          to={paths.panelRevision(panel, row.number)}
          className="inline-block py-1.5 font-mono font-semibold"
        >
          {row.number}
        </Link>
      ),
    },
    { head: t('office.revision.issuedAt'), cell: (row) => <Moment at={row.issuedAt} form="exact" /> },
    { head: t('office.revision.issuedBy'), cell: (row) => row.issuedBy },
    { head: t('office.revision.standing'), className: 'md:w-32', cell: (row) => row.standing.length },
    {
      head: t('office.digest'),
      cell: (row) => <code className="font-mono text-sm break-all">{row.digest.slice(0, 16)}…</code>,
    },
  ];
  return (
    <Table
      caption={t('office.revisions')}
      columns={columns}
      rows={revisions}
      keyOf={(row) => String(row.number)}
    />
  );
}
