import type { RecordDocument } from '../../../shared/api/recordDocument';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';
import { Verdict } from './Verdict';

type Answer = RecordDocument['steps'][number] & { index: number };

/** Steps as the signer saw them, with what was found. */
export function AnswerTable({ caption, answers }: { caption: string; answers: RecordDocument['steps'] }) {
  const { t } = useWords();
  const columns: Column<Answer>[] = [
    { head: t('records.step'), className: 'md:w-[38%]', cell: (answer) => answer.shown },
    { head: t('records.found'), cell: (answer) => <strong>{answer.answer}</strong> },
    { head: t('records.verdict'), cell: (answer) => <Verdict verdict={answer.verdict} /> },
    { head: t('records.person'), cell: (answer) => answer.person },
    { head: t('records.at'), cell: (answer) => <Moment at={answer.at} form="exact" /> },
    { head: t('records.round'), className: 'md:w-20', cell: (answer) => answer.round },
  ];
  const rows = answers.map((answer, index) => ({ ...answer, index }));
  return <Table caption={caption} columns={columns} rows={rows} keyOf={(answer) => String(answer.index)} />;
}
