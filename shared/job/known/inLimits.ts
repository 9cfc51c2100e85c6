/** Is a value what the step asked for, and is it in limits? */
import type { Ask, ReadingAsk } from '../../checklist/types';
import type { AnswerRecord } from '../types';

type Value = AnswerRecord['value'];
export type Limits = 'ok' | 'out' | 'wrong-kind';

// Lowest first (IEC 61010-2-030).
const categories = ['CAT II', 'CAT III', 'CAT IV'] as const;

/** A sign only says which way round the probes were: −24 V is as live as 24 V. */
function readingLimits(ask: ReadingAsk, value: number): Limits {
  const high = ask.high ?? (ask.dead ? 0 : Infinity);
  const measured = ask.dead ? Math.abs(value) : value;
  const low = ask.dead ? 0 : (ask.low ?? -Infinity);
  return measured >= low && measured <= high ? 'ok' : 'out';
}

const sameTag = (a: string, b: string): boolean =>
  a.replace(/\s/g, '').toUpperCase() === b.replace(/\s/g, '').toUpperCase();

const said = (good: boolean): Limits => (good ? 'ok' : 'out');

type Judge<A extends Ask['kind']> = (ask: Extract<Ask, { kind: A }>, value: Value, at: string) => Limits;

const judges: { [A in Ask['kind']]: Judge<A> } = {
  done: (_ask, { kind }) => (kind === 'done' ? 'ok' : 'wrong-kind'),
  reading: (ask, value) => (value.kind === 'reading' ? readingLimits(ask, value.value) : 'wrong-kind'),
  choice: ({ options }, value) => {
    if (value.kind !== 'choice') return 'wrong-kind';
    const option = options.find((each) => each.value === value.value);
    return option ? said(option.ok) : 'wrong-kind';
  },
  text: ({ maxLength }, value) =>
    value.kind === 'text' && value.text.length <= maxLength ? said(value.text.trim() !== '') : 'wrong-kind',
  photo: (_ask, { kind }) => (kind === 'photo' ? 'ok' : 'wrong-kind'),
  wait: ({ seconds }, value) => (value.kind === 'wait' ? said(value.waitedS >= seconds) : 'wrong-kind'),
  scan: ({ expect }, value) => (value.kind === 'scan' ? said(sameTag(value.text, expect)) : 'wrong-kind'),
  instrument: ({ minCategory, minV }, value, at) =>
    value.kind === 'instrument'
      ? said(
          categories.indexOf(value.category) >= categories.indexOf(minCategory) &&
            value.ratedV >= minV &&
            value.checkDue >= at.slice(0, 10),
        )
      : 'wrong-kind',
  'lock-on': (_ask, { kind }) => (kind === 'lock' ? 'ok' : 'wrong-kind'),
  'lock-off': (_ask, { kind }) => (kind === 'lock' ? 'ok' : 'wrong-kind'),
  close: (_ask, value) => (value.kind === 'closed' ? said(value.counted === 0) : 'wrong-kind'),
};

/** @param at the device's clock, as ISO 8601; only the check date of a tester is compared with it. */
export function inLimits(ask: Ask, value: Value, at: string): Limits {
  // Each judge takes the ask of its own kind.
  const judge = judges[ask.kind] as (ask: Ask, value: Value, at: string) => Limits;
  return judge(ask, value, at);
}
