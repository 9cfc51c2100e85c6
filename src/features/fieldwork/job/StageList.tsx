import { useWords } from '../../../components/words';
import { useFieldJob } from './useFieldJob';

const fills = {
  done: 'bg-ink text-paper',
  current: 'bg-sheet text-ink shadow-[inset_0_0_0_3px_var(--ink)]',
  open: 'bg-sheet text-ink',
  locked: 'bg-sheet text-muted',
} as const;

/** The stages as the terminals of a strip, standing: number, name, how far. */
export function StageList() {
  const { t } = useWords();
  const { state } = useFieldJob();
  return (
    <section aria-label={t('field.job.stages')}>
      <ol className="m-0 grid list-none border-2 border-ink p-0">
        {state.stages.map(({ stage, status, done, of }, index) => (
          <li key={stage} className="stage-row flex min-h-9 border-ink leading-tight not-first:border-t">
            <span
              className={`flex w-10 shrink-0 items-center justify-center font-mono font-bold ${fills[status]}`}
            >
              {index + 1}
            </span>
            <span
              className={`flex flex-1 items-center border-l border-ink bg-sheet px-3 ${status === 'current' ? 'font-bold' : ''}`}
            >
              {t(`field.stage.${stage}`)}
            </span>
            <span className="flex items-center bg-sheet px-3 text-[0.9rem] text-muted">
              {t(`field.stageStatus.${status}`, { done, of })}
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
