/** What a signature covers: the summary as shown, and every head it was made on. */
import type { Checklist } from '../checklist/types';
import { digestOf } from '../panel/canonical';
import { jobSummary } from './jobSummary';
import type { JobState } from './types';

interface Covered {
  pack: { digest: string; job: { id: string; site: { id: string } }; checklist: Checklist };
  /** The state before the signature itself. */
  state: JobState;
  /** The language the summary was shown in. */
  language: string;
}

/** SHA-256 over RFC 8785 JSON of site, job, pack, language, summary and log heads (records.md, Sign). */
export const signatureDigest = ({ pack, state, language }: Covered): string =>
  digestOf({
    site: pack.job.site.id,
    job: pack.job.id,
    pack: pack.digest,
    language,
    summary: jobSummary(pack.checklist, state),
    heads: state.heads,
  });
