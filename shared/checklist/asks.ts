/** The few shapes of answers that many families share. */
import { say, type Text } from '../panel/says';
import type { Ask, ReadingAsk } from './types';

export const done = (key = 'checklist.answer.done'): Ask => ({ kind: 'done', label: say(key) });

const knownChoices = new Map<string, Ask>();
// The values come from panel files: without an end a server would keep those of every panel it ever saw.
const mostKnownChoices = 500;

/** A choice of good answers and bad ones, by their names under `checklist.choice`. */
export function choice(good: readonly string[], bad: readonly string[], params?: Text['params']): Ask {
  // The same few choices stand in thousands of steps: they are made once and shared.
  const values =
    good.length === 1 && bad.length === 1 ? `${good[0]}/${bad[0]}` : `${good.join()}/${bad.join()}`;
  const name = params ? values + JSON.stringify(params) : values;
  const known = knownChoices.get(name);
  if (known) return known;
  const option = (ok: boolean) => (value: string) => ({
    value,
    label: say(`checklist.choice.${value}`, params),
    ok,
  });
  const made: Ask = { kind: 'choice', options: [...good.map(option(true)), ...bad.map(option(false))] };
  if (knownChoices.size >= mostKnownChoices) knownChoices.clear();
  knownChoices.set(name, made);
  return made;
}

/** Names and numbers a person writes: long enough for a sentence. */
export const written: Ask = { kind: 'text', maxLength: 300 };

/**
 * A dead test in volts, read as AC or as DC.
 * Its limit holds on both sides of zero: a meter with swapped probes shows −24 V, and that is not dead.
 */
export function deadReading(
  function_: 'AC' | 'DC',
  limitV: number,
  dead: NonNullable<ReadingAsk['dead']>,
): ReadingAsk {
  return function_ === 'DC'
    ? { kind: 'reading', unit: 'V DC', low: -limitV, high: limitV, dead }
    : { kind: 'reading', unit: 'V AC', low: 0, high: limitV, dead };
}
