import type { RecordDocument } from '../../../shared/api/recordDocument';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';
import { AnswerTable } from './AnswerTable';

// A record of 500 points must open at once: past this many, each point opens on request.
const openUpTo = 12;

/** What was done and read at each point, then the steps that belong to none. */
export function PointAnswers({ document }: { document: RecordDocument }) {
  const { t } = useWords();
  return (
    <>
      {document.points.map((point) => (
        <details
          key={point.address}
          open={document.points.length <= openUpTo}
          className="border-b border-rule py-1"
        >
          <summary className="min-h-11 cursor-pointer content-center">
            <Tag>{point.terminal}</Tag> <span className="font-mono">{point.address}</span> {point.description}{' '}
            ({t('records.answers', { n: point.answers.length })})
          </summary>
          <AnswerTable caption={point.address} answers={point.answers} />
        </details>
      ))}
      <details className="py-1">
        <summary className="min-h-11 cursor-pointer content-center font-bold">
          {t('records.otherSteps', { n: document.steps.length })}
        </summary>
        <AnswerTable
          caption={t('records.otherSteps', { n: document.steps.length })}
          answers={document.steps}
        />
      </details>
    </>
  );
}
