import { problemWords } from './problemWords';
import { useWords } from './words';

interface ProblemMessageProps {
  error: unknown;
  /** What was kept: by default, what stands on the screen. */
  kept?: string;
  /** What to do next: by default, try again. */
  next?: string;
}

/** A failure in words: what happened, what was kept, what to do next; then each reason with its place. */
export function ProblemMessage({ error, kept, next }: ProblemMessageProps) {
  const { t } = useWords();
  if (!error) return null;
  const said = problemWords(error, t);
  return (
    <div role="alert" className="my-4 max-w-[66ch] border-2 border-ink border-l-8 bg-sheet px-4 py-3">
      <p className="m-0 font-bold">{said.happened}</p>
      {said.errors.length > 0 && (
        <ul className="my-2 max-h-72 list-disc overflow-auto pl-5" tabIndex={0} aria-label={t('app.reasons')}>
          {said.errors.map((each, index) => (
            <li key={index}>
              {each.path && <code className="font-mono wrap-anywhere">{each.path}</code>} {each.says}
            </li>
          ))}
        </ul>
      )}
      <p className="m-0 empty:hidden">{kept ?? t('app.kept')}</p>
      <p className="m-0 empty:hidden">{next ?? said.next}</p>
    </div>
  );
}
