import type { RecordDocument } from '../../../shared/api/recordDocument';
import { formatNumber } from '../../../shared/wording/renderWith';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';
import { Verdict } from './Verdict';

type Test = RecordDocument['deadTests'][number] & { index: number };

/** Every dead test with what was read. */
export function DeadTestTable({ tests }: { tests: RecordDocument['deadTests'] }) {
  const { t } = useWords();
  const columns: Column<Test>[] = [
    { head: t('records.round'), className: 'md:w-20', cell: (test) => test.round },
    {
      head: t('records.between'),
      className: 'md:w-[22%]',
      cell: (test) => (
        <>
          <Tag>{test.terminal}</Tag> <Tag>{test.second}</Tag>
        </>
      ),
    },
    { head: t('records.pair'), cell: (test) => <span className="font-mono">{test.pair}</span> },
    { head: t('records.supply'), cell: (test) => <span className="font-mono">{test.supply}</span> },
    {
      head: t('records.reading'),
      cell: (test) => (
        <strong className="font-mono">
          {formatNumber(test.value)} {test.unit}
        </strong>
      ),
    },
    { head: t('records.verdict'), cell: (test) => <Verdict verdict={test.verdict} /> },
    { head: t('records.person'), cell: (test) => test.person },
    { head: t('records.at'), cell: (test) => <Moment at={test.at} form="exact" /> },
  ];
  const rows = tests.map((test, index) => ({ ...test, index }));
  return (
    <Table
      caption={t('records.deadTests')}
      columns={columns}
      rows={rows}
      keyOf={(test) => String(test.index)}
    />
  );
}
