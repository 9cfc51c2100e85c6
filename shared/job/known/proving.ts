/** The steps on which lives hang: isolating, proving dead, and every dead reading wherever it stands. */
import type { Step } from '../../checklist/types';

const isolating: ReadonlySet<Step['stage']> = new Set(['isolate', 'prove-dead']);

export const isIsolating = ({ stage }: Step): boolean => isolating.has(stage);

/** Here the worse of two answers counts until somebody locked on measures again; nobody may choose or accept. */
export const isProving = (step: Step): boolean =>
  isIsolating(step) || (step.ask.kind === 'reading' && step.ask.dead !== undefined);
