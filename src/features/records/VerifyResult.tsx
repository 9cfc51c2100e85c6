import type { VerifyAnswer } from '../../../shared/api/records';
import { Moment } from '../../components/Moment';
import { useWords } from '../../components/words';

const outcomeOf = (answer: VerifyAnswer, changedPdf: boolean) => {
  if (!answer.known) return 'unknown';
  if (answer.chainHolds !== true) return 'broken';
  return changedPdf ? 'otherPdf' : 'holds';
};

/** The verdict in one sentence, then what may be shown of the record. */
export function VerifyResult({ answer, changedPdf }: { answer: VerifyAnswer; changedPdf: boolean }) {
  const { t } = useWords();
  const outcome = outcomeOf(answer, changedPdf);
  return (
    <div role="status" className="my-4 max-w-[66ch] border-2 border-ink px-4 py-3">
      <p className="m-0 text-lg font-bold">
        <span aria-hidden="true">{outcome === 'holds' ? '✓' : '▲'} </span>
        {t(`records.verify.${outcome}`)}
      </p>
      {answer.panelTag && (
        <p className="mb-0">
          {t('office.panel')} <strong className="font-mono">{answer.panelTag}</strong>
          {answer.number !== undefined && <> · {t('records.verify.number', { n: answer.number })}</>}
          {answer.date && (
            <>
              {' · '}
              <Moment at={answer.date} form="date" />
            </>
          )}
        </p>
      )}
      {answer.amendedBy !== undefined && answer.amendedBy.length > 0 && (
        <p className="mb-0">{t('records.amendedBy', { numbers: answer.amendedBy.join(', ') })}</p>
      )}
    </div>
  );
}
