/** Locks and isolators as they stand. */
import { isClosedUnder, isOffInRound, isOn } from '../view/locks';
import { isInRound, roundOf } from '../view/rounds';
import type { IsolatorState, LockState } from '../types';
import type { Lock, View } from '../view/view';

export function lockState(view: View, { on, isolator, lock, person, offs }: Lock): LockState {
  const [off] = offs;
  return {
    isolator,
    lock,
    person,
    entry: on.entry.id,
    onAt: on.entry.at,
    ...(off && { offAt: off.placed.entry.at, offEntry: off.placed.entry.id }),
    ...(off?.removed && { removedBy: off.placed.person }),
    round: roundOf(view.rounds, on),
  };
}

type Status = IsolatorState['status'];

/** What is known of one isolator; where entries do not agree, nothing is. */
function statusOf(view: View, isolator: string): Status {
  const locks = view.locks.filter((lock) => lock.isolator === isolator);
  const closings = view.closings.filter((each) => each.isolator === isolator);
  const disagrees = closings.some((closing) =>
    locks.some((lock) => isOn(lock) && isClosedUnder(lock, closing)),
  );
  if (disagrees) return 'not-known';
  if (locks.some(isOn)) return 'locked';
  const step = view.setting.lookup.close.get(isolator);
  const closed = closings.filter(({ placed }) => isInRound(view, placed));
  if (closed.length > 0)
    return view.answers[step ?? -1]?.some(
      ({ placed, verdict }) => verdict === 'ok' && isInRound(view, placed),
    )
      ? 'closed'
      : 'not-known';
  return locks.some((lock) => isOffInRound(view, lock)) ? 'locks-off' : 'to-open';
}

export function isolatorStates(view: View): Record<string, IsolatorState> {
  const tags = [...view.setting.lookup.isolators, ...view.locks.map(({ isolator }) => isolator)];
  return Object.fromEntries(
    [...new Set(tags)].map((isolator): [string, IsolatorState] => [
      isolator,
      {
        isolator,
        status: statusOf(view, isolator),
        locks: view.locks.filter((lock) => lock.isolator === isolator).map((lock) => lockState(view, lock)),
      },
    ]),
  );
}
