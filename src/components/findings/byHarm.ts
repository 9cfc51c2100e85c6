import type { FindingView } from '../../../shared/api/panels';

export const harms = ['hurts', 'damages', 'fails', 'doubt', 'tells'] as const;

/** What keeps a job from any safe isolation is read before what is wrong with one wire. */
const isIsolation = (rule: string): number => (rule.startsWith('isolation.') ? 0 : 1);

/** Findings in the order of what they do, the worst first; within one harm isolation leads, else the order stays. */
export const byHarm = <F extends Pick<FindingView, 'harm' | 'rule'>>(findings: readonly F[]): F[] =>
  [...findings].sort(
    (a, b) => harms.indexOf(a.harm) - harms.indexOf(b.harm) || isIsolation(a.rule) - isIsolation(b.rule),
  );
