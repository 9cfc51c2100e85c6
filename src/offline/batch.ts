/** Cuts what one request carries from the front of a log's unsent entries. */
import type { Entry } from '../../shared/job/entry';

// sync.md: at most 500 entries or 1 MB a request; the rest of the megabyte is for the envelope.
export const maxBatchEntries = 500;
const maxBatchBytes = 990_000;
const encoder = new TextEncoder();

/** At least one entry, at most `limit`, and no more than the bytes allow. */
export function batch(entries: Entry[], limit: number): Entry[] {
  const taken: Entry[] = [];
  let bytes = 0;
  for (const entry of entries.slice(0, Math.min(limit, maxBatchEntries))) {
    bytes += encoder.encode(JSON.stringify(entry)).length + 1;
    if (taken.length > 0 && bytes > maxBatchBytes) break;
    taken.push(entry);
  }
  return taken;
}
