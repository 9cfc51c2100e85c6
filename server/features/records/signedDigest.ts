/** Does a signature name the digest of what its signer had before them? Computed again from the same entries. */
import type { Entry } from '../../../shared/job/entry';
import { foldJob } from '../../../shared/job/fold';
import { signatureDigest } from '../../../shared/job/signatureDigest';
import type { SignatureState } from '../../../shared/job/types';
import type { FoldedJob } from '../jobs/folding';

/** Number of each log up to which an entry knew it: what it had seen, and what those had seen. */
function knownTo(entries: readonly Entry[], signature: Entry): Map<string, number> {
  const known = new Map(Object.entries(signature.seen));
  known.set(signature.log, signature.seq - 1);
  let grew = true;
  while (grew) {
    grew = false;
    for (const { log, seq, seen } of entries) {
      if (seq > (known.get(log) ?? 0)) continue;
      for (const [other, upTo] of Object.entries(seen))
        if (upTo > (known.get(other) ?? 0)) {
          known.set(other, upTo);
          grew = true;
        }
    }
  }
  return known;
}

export function digestFits(
  { pack, entries: received, facts }: FoldedJob,
  { entry: id, body }: SignatureState,
): boolean {
  const entries = received.map(({ entry }) => entry);
  const signature = entries.find((each) => each.id === id);
  if (!signature) return false;
  const known = knownTo(entries, signature);
  const before = entries.filter(({ log, seq }) => seq <= (known.get(log) ?? 0));
  const state = foldJob(pack.checklist, before, facts);
  return signatureDigest({ pack, state, language: body.language }) === body.digest;
}
