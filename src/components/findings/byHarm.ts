import type { FindingView } from '../../../shared/api/panels';

export const harms = ['hurts', 'damages', 'fails', 'doubt', 'tells'] as const;

/** Findings in the order of what they do, the worst first; within one harm the order stays. */
export const byHarm = <F extends Pick<FindingView, 'harm'>>(findings: readonly F[]): F[] =>
  [...findings].sort((a, b) => harms.indexOf(a.harm) - harms.indexOf(b.harm));
