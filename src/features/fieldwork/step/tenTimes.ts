/** A decimal point in the wrong place: the value meant, when ten times more or less would be in limits. */
import type { ReadingAsk } from '../../../../shared/checklist/types';

const isWithin = (ask: ReadingAsk, value: number): boolean =>
  value >= (ask.low ?? -Infinity) && value <= (ask.high ?? Infinity);

/**
 * Undefined when the value is in limits or no slip explains it.
 * Never offered on a dead test, nor where only a lower limit exists: there a slip must not be talked into a pass.
 */
export function tenTimes(ask: ReadingAsk, value: number): number | undefined {
  if (ask.dead || ask.high === undefined || isWithin(ask, value)) return undefined;
  return [value / 10, value * 10]
    .map((each) => Number(each.toPrecision(6)))
    .find((each) => each !== value && isWithin(ask, each));
}
