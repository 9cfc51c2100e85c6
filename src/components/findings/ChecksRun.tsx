import type { FindingsAnswer } from '../../../shared/api/panels';
import { useWords } from '../words';
import { WhereTags } from './WhereTags';

type ChecksRunProps = Pick<FindingsAnswer, 'checks' | 'couldNotRun'> & { found: number };

/** How many checks ran and which could not: a list of findings is never shown without it. */
export function ChecksRun({ checks, couldNotRun, found }: ChecksRunProps) {
  const { t } = useWords();
  const counts = t('office.checks.ran', { found, checks, missing: couldNotRun.length });
  if (couldNotRun.length === 0) return <p className="m-0 font-bold">{counts}</p>;
  return (
    <details>
      <summary className="min-h-11 cursor-pointer content-center font-bold">{counts}</summary>
      <ul
        className="m-0 max-h-80 list-none overflow-auto border border-rule p-3"
        tabIndex={0}
        aria-label={counts}
      >
        {couldNotRun.map((each, index) => (
          <li key={index} className="flex flex-wrap items-center gap-x-2 py-0.5">
            <code className="font-mono text-sm">{each.rule}</code>
            <WhereTags where={each.where} />
            <span>
              {t('office.checks.missing')}{' '}
              <code className="font-mono text-sm wrap-anywhere">{each.missing}</code>
            </span>
          </li>
        ))}
      </ul>
    </details>
  );
}
