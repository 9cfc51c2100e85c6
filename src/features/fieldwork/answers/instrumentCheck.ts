/** Is a tester fit for this work? A list of small checks, each with its reason in words. */
import type { SiteSettings } from '../../../../shared/api/sites';
import type { Ask } from '../../../../shared/checklist/types';

export type InstrumentFacts = SiteSettings['instruments'][number];
export type InstrumentAsk = Extract<Ask, { kind: 'instrument' }>;
export type InstrumentRefusal = 'expired' | 'weak' | 'volts';

const categories = ['CAT II', 'CAT III', 'CAT IV'] as const;

/**
 * Everything against this tester on this day.
 * @param today the local date as YYYY-MM-DD; a tester due today may still be used today.
 */
export function instrumentRefusals(
  ask: InstrumentAsk,
  tester: InstrumentFacts,
  today: string,
): InstrumentRefusal[] {
  const refusals: InstrumentRefusal[] = [];
  if (tester.checkDue < today) refusals.push('expired');
  if (categories.indexOf(tester.category) < categories.indexOf(ask.minCategory)) refusals.push('weak');
  if (tester.ratedV < ask.minV) refusals.push('volts');
  return refusals;
}

/** Today where the phone is, as YYYY-MM-DD. */
export const localDate = (now: Date): string =>
  `${now.getFullYear()}-${String(now.getMonth() + 1).padStart(2, '0')}-${String(now.getDate()).padStart(2, '0')}`;
