/** How a part of a sending round ended; the worst of its parts decides when and how to go on. */
import type { Text } from '../../shared/panel/says';
import type { ServerAnswer } from './serverCall';

export type RoundOutcome =
  | { end: 'done' }
  /** Goes on at the next round; other jobs and logs go on at once. */
  | { end: 'refused'; says: Text }
  | { end: 'sign-in' }
  /** The whole round stops: the server or the network is not there. */
  | { end: 'wait'; says: Text; retryAfterMs: number | null };

export const done: RoundOutcome = { end: 'done' };
const rank = { done: 0, refused: 1, 'sign-in': 2, wait: 3 } as const;
export const worse = (a: RoundOutcome, b: RoundOutcome): RoundOutcome => (rank[b.end] > rank[a.end] ? b : a);

/** Statuses that speak about the server's state, not about what was sent (RFC 9110, RFC 6585). */
const passing = (status: number): boolean => status >= 500 || status === 429 || status === 408;

/** The outcome of an answer that is not a success. */
export function outcomeOf(answer: Exclude<ServerAnswer<unknown>, { kind: 'ok' }>): RoundOutcome {
  if (answer.kind === 'unreachable')
    return {
      end: 'wait',
      says: { key: 'device.store.error.unreachable' },
      retryAfterMs: answer.retryAfterMs,
    };
  if (answer.kind === 'unreadable') return { end: 'refused', says: { key: 'device.store.error.update-app' } };
  if (answer.problem.status === 401) return { end: 'sign-in' };
  if (passing(answer.problem.status))
    return { end: 'wait', says: { key: 'device.store.error.busy' }, retryAfterMs: answer.retryAfterMs };
  return {
    end: 'refused',
    says: {
      key: 'device.store.error.refused',
      params: { says: answer.problem.detail ?? answer.problem.title },
    },
  };
}
