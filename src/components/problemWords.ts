import type { Problem } from '../../shared/api/common';
import type { WordingKey } from '../../shared/wording/render';

interface SaidProblem {
  happened: string;
  next: string;
  errors: { path: string; says: string }[];
}

/** A refused request carries its problem; told by shape, so that components need not know the API client. */
export function problemIn(error: unknown): Problem | undefined {
  if (typeof error !== 'object' || error === null || !('problem' in error)) return undefined;
  return error.problem as Problem;
}

/** What happened and what to do next, for any error a screen may meet. */
export function problemWords(error: unknown, t: (key: WordingKey) => string): SaidProblem {
  const problem = problemIn(error);
  if (!problem) return { happened: t('app.unreachable'), next: t('app.unreachable.next'), errors: [] };
  const next = problem.status === 401 ? t('app.signInAgain.next') : t('app.tryAgain.next');
  return { happened: problem.detail ?? problem.title, next, errors: problem.errors ?? [] };
}
