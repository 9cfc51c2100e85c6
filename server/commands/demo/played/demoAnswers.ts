/** What the demo's electricians answer: good values, as a meter or an eye would give them. */
import type { Ask, Step } from '../../../../shared/checklist/types';
import type { AnswerValue } from '../../../../shared/job/entry';
import { demoSites } from '../people';

type Reading = Extract<Ask, { kind: 'reading' }>;

/** In the middle of what is accepted, with no more digits than a meter shows. */
function goodReading({ low, high, dead }: Reading, family: string): number {
  if (dead) return 0;
  // A tester is proved between half and twice the voltage: on the voltage itself, that is.
  if (family === 'tester-proved' && low !== undefined) return low * 2;
  const wanted =
    low !== undefined && high !== undefined
      ? (low + high) / 2
      : high !== undefined
        ? high / 2
        : (low ?? 1) * 1.1;
  const inside = (value: number) =>
    (low === undefined || value >= low) && (high === undefined || value <= high);
  return [0, 1, 2, 3].map((digits) => Number(wanted.toFixed(digits))).find(inside) ?? wanted;
}

/** What is written where words are asked for, by step or family. */
const words: Record<string, string> = {
  'ready.proving.name': 'Proving unit PU-12',
  'ready.ppe': 'Class 0 gloves, face shield, long sleeves',
  'ready.permit': 'Permit 2026-118',
  'prove.allowed': 'The people named on permit 2026-118',
  'prove.second': 'Bea Lowe, by the stop at the door',
  'motion.handback': 'Bea Lowe, filter operator',
};

/** A good answer to what a step asks; undefined for locks and closing, which are entries of their own kind. */
export function demoAnswer({ ask, family, id }: Step): AnswerValue | undefined {
  switch (ask.kind) {
    case 'done':
      return { kind: 'done' };
    case 'reading':
      return { kind: 'reading', value: goodReading(ask, family) };
    case 'choice':
      return { kind: 'choice', value: ask.options.find(({ ok }) => ok)?.value ?? '' };
    case 'text':
      return { kind: 'text', text: words[id] ?? 'As drawn' };
    case 'photo':
      return { kind: 'photo', sha256: 'd'.repeat(64) };
    case 'wait':
      return { kind: 'wait', waitedS: Math.ceil(ask.seconds) };
    case 'scan':
      return { kind: 'scan', text: ask.expect, typed: true };
    case 'instrument': {
      const [tester] = demoSites.waterWorks.settings.instruments;
      return tester && { kind: 'instrument', ...tester };
    }
    default:
      return undefined;
  }
}
