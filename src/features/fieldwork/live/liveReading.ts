/** Is this person's newest dead reading over its limit? Then every field screen is the red one, whatever was opened. */
import type { Checklist, ReadingAsk, Step } from '../../../../shared/checklist/types';
import type { BodyOf, Entry } from '../../../../shared/job/entry';
import type { JobFacts } from '../../../../shared/job/types';

export interface LiveReading {
  step: Step;
  ask: ReadingAsk;
  value: number;
  entry: Entry;
}

type DeadSteps = Map<string, { step: Step; ask: ReadingAsk }>;

function deadSteps(checklist: Checklist): DeadSteps {
  const found: DeadSteps = new Map();
  for (const step of checklist.steps)
    if (step.ask.kind === 'reading' && step.ask.dead) found.set(step.id, { step, ask: step.ask });
  return found;
}

function readingOf(entry: Entry, steps: DeadSteps): LiveReading | undefined {
  if (entry.kind !== 'answer') return undefined;
  const body = entry.body as BodyOf<'answer'>;
  const asked = steps.get(body.step);
  if (!asked || body.value.kind !== 'reading') return undefined;
  return { ...asked, value: body.value.value, entry };
}

/** A sign only says which way round the probes were: −24 V is as live as 24 V. */
export const overLimit = (reading: { ask: ReadingAsk; value: number }): boolean =>
  Math.abs(reading.value) > (reading.ask.high ?? 0);

/** The newest dead reading of each of the person's logs (one a device). */
function newestByLog(checklist: Checklist, entries: Entry[], facts: JobFacts, person: string): LiveReading[] {
  const steps = deadSteps(checklist);
  const newest = new Map<string, LiveReading>();
  for (const entry of entries) {
    if (facts.logs[entry.log] !== person) continue;
    const reading = readingOf(entry, steps);
    if (reading && entry.seq >= (newest.get(entry.log)?.entry.seq ?? 0)) newest.set(entry.log, reading);
  }
  return [...newest.values()];
}

/**
 * The reading that holds this person on the red screen, if one does.
 * A later good reading on another of their phones lets them go only when it had seen the bad one.
 */
export function liveReading(
  checklist: Checklist,
  entries: Entry[],
  facts: JobFacts,
  person: string,
): LiveReading | undefined {
  const newest = newestByLog(checklist, entries, facts, person);
  const good = newest.filter((reading) => !overLimit(reading));
  return newest.find(
    (reading) =>
      overLimit(reading) &&
      !good.some(({ entry }) => (entry.seen[reading.entry.log] ?? 0) >= reading.entry.seq),
  );
}
