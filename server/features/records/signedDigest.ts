/** Does a signature name the digest of what its signer had before them? Computed again from the same entries. */
import { digestWhenMade } from '../../../shared/job/digestWhenMade';
import type { SignatureState } from '../../../shared/job/types';
import type { FoldedJob } from '../jobs/folding';

export function digestFits(
  { pack, entries: received, facts }: FoldedJob,
  { entry: id, body }: SignatureState,
): boolean {
  const entries = received.map(({ entry }) => entry);
  const signature = entries.find((each) => each.id === id);
  if (!signature) return false;
  return digestWhenMade({ pack, entries, facts, signature }, body.language) === body.digest;
}
