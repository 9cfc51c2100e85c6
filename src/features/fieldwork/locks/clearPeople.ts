/** Who of a job has said that they are clear in this round: shown before an isolator is closed. */
import type { BodyOf, Entry } from '../../../../shared/job/entry';
import type { JobState } from '../../../../shared/job/types';

/** An entry belongs to a round when it had seen that round's start; before any round was started all belong. */
function belongsTo(entry: Entry, start: Entry | undefined): boolean {
  if (!start) return true;
  return entry.log === start.log ? entry.seq > start.seq : (entry.seen[start.log] ?? 0) >= start.seq;
}

/** The people named by a `clear` entry of the present round. The gate decides; this only tells the screen. */
export function clearPeople(entries: Entry[], state: JobState): Set<string> {
  const start = entries.find(({ id }) => id === state.round.id);
  return new Set(
    entries
      .filter((entry) => entry.kind === 'clear' && belongsTo(entry, start))
      .map((entry) => (entry.body as BodyOf<'clear'>).person),
  );
}
