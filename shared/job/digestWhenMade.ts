/** The digest that a signature must carry: worked out again from what its device held when it was made. */
import type { Checklist } from '../checklist/types';
import type { Entry } from './entry';
import { foldJob } from './fold';
import { signatureDigest } from './signatureDigest';
import type { JobFacts } from './types';

interface Made {
  pack: { digest: string; job: { id: string; site: { id: string } }; checklist: Checklist };
  entries: readonly Entry[];
  facts: JobFacts;
  signature: Entry;
}

/** `seen` says exactly what a device held, so the same entries give the same summary and heads again. */
export function digestWhenMade({ pack, entries, facts, signature }: Made, language: string): string {
  const held = entries.filter(({ log, seq }) =>
    log === signature.log ? seq < signature.seq : seq <= (signature.seen[log] ?? 0),
  );
  return signatureDigest({ pack, state: foldJob(pack.checklist, held, facts), language });
}
