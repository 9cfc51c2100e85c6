/** What the demo's electricians answer: good values, as a meter or an eye would give them. */
import type { Ask, Step } from '../../../../shared/checklist/types';
import type { AnswerValue } from '../../../../shared/job/entry';
import { demoSites } from '../people';

type Reading = Extract<Ask, { kind: 'reading' }>;

/** In the middle of what is accepted, with no more digits than a meter shows. */
function goodReading({ low, high, dead }: Reading): number {
  if (dead) return 0;
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

/** A good answer to what a step asks; undefined for locks and closing, which are entries of their own kind. */
export function demoAnswer({ ask, stage }: Step): AnswerValue | undefined {
  switch (ask.kind) {
    case 'done':
      return { kind: 'done' };
    case 'reading':
      return { kind: 'reading', value: goodReading(ask) };
    case 'choice':
      return { kind: 'choice', value: ask.options.find(({ ok }) => ok)?.value ?? '' };
    case 'text':
      return { kind: 'text', text: stage === 'get-ready' ? 'PT-4471' : 'As drawn' };
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
