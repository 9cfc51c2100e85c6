import type { RecordDocument } from '../../../shared/api/recordDocument';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';

type Lock = RecordDocument['lockOut'][number];

/** Every lock: isolator, number, whose, on, off. */
export function LockOutTable({ locks }: { locks: readonly Lock[] }) {
  const { t } = useWords();
  const columns: Column<Lock>[] = [
    { head: t('records.round'), className: 'md:w-20', cell: (lock) => lock.round },
    { head: t('records.isolator'), cell: (lock) => <Tag>{lock.isolator}</Tag> },
    { head: t('records.lock'), cell: (lock) => <span className="font-mono">{lock.lock}</span> },
    { head: t('records.person'), cell: (lock) => lock.person },
    { head: t('records.on'), cell: (lock) => <Moment at={lock.onAt} form="exact" /> },
    {
      head: t('records.off'),
      cell: (lock) => (
        <>
          {lock.offAt === null ? t('records.off.never') : <Moment at={lock.offAt} form="exact" />}
          {lock.removedBy && (
            <strong className="block">{t('records.removedBy', { name: lock.removedBy })}</strong>
          )}
        </>
      ),
    },
  ];
  return (
    <Table
      caption={t('records.lockOut')}
      columns={columns}
      rows={locks}
      keyOf={(lock) => `${lock.isolator} ${lock.lock} ${lock.onAt}`}
    />
  );
}
