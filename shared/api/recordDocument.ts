/** What is sealed: the canonical JSON of one completed job, as record page, PDF and download show it. */
import { z } from 'zod';
import { recordRow } from './records';
import { signaturePicture } from '../job/entry';
import { digest, id, instant, language } from './common';

/** One answered step with the words the signer saw. */
export const recordedAnswer = z.object({
  step: z.string(),
  stage: z.string(),
  shown: z.string(),
  /** What was found, as a sentence or a reading with its unit. */
  answer: z.string(),
  person: z.string(),
  at: instant,
  round: z.int(),
  verdict: z.enum(['ok', 'out', 'refused']),
});

export const recordDocument = z.object({
  format: z.literal('coldloop-record/1'),
  language,
  /** The record that this one amends, when entries arrived after its seal. */
  amends: z.object({ number: z.int(), digest }).nullable(),
  site: z.object({ id, name: z.string() }),
  job: z.object({ id, number: z.string(), due: z.iso.date(), words: z.string().nullable() }),
  panel: z.object({
    tag: z.string(),
    name: z.string(),
    location: z.string(),
    drawing: z.object({ number: z.string(), revision: z.string() }),
    revision: z.int(),
    digest,
  }),
  /** Digest of the checklist pack that was answered. */
  pack: digest,
  /** Every log with its last entry: who wrote how many, and the hash that covers them all. */
  logs: z.array(z.object({ log: id, person: z.string(), seq: z.int(), hash: digest })),
  scope: z.array(z.string()),
  people: z.array(z.object({ id, name: z.string(), part: z.enum(['electrician', 'foreman']) })),
  times: z.object({
    sentAt: instant.nullable(),
    startedAt: instant.nullable(),
    signedAt: instant.nullable(),
    countersignedAt: instant.nullable(),
  }),
  lockOut: z.array(
    z.object({
      isolator: z.string(),
      lock: z.string(),
      person: z.string(),
      onAt: instant,
      offAt: instant.nullable(),
      /** The supervisor who took it off, when its owner did not. */
      removedBy: z.string().nullable(),
      round: z.int(),
    }),
  ),
  deadTests: z.array(
    z.object({
      terminal: z.string(),
      second: z.string(),
      pair: z.string(),
      supply: z.string(),
      value: z.number(),
      unit: z.string(),
      person: z.string(),
      at: instant,
      round: z.int(),
      verdict: z.enum(['ok', 'out', 'refused']),
    }),
  ),
  points: z.array(
    z.object({
      address: z.string(),
      terminal: z.string(),
      description: z.string(),
      answers: z.array(recordedAnswer),
    }),
  ),
  /** Steps that belong to no single point, dead tests left out. */
  steps: z.array(recordedAnswer),
  findings: z.array(
    z.object({
      rule: z.string(),
      harm: z.string(),
      place: z.string(),
      says: z.string(),
      accepted: z.object({ reason: z.string(), by: z.string() }).nullable(),
    }),
  ),
  holds: z.array(
    z.object({
      step: z.string(),
      shown: z.string(),
      reason: z.string(),
      words: z.string(),
      person: z.string(),
      at: instant,
      decision: z.enum(['rework', 'accept', 'out-of-scope']).nullable(),
      decidedBy: z.string().nullable(),
      decidedWords: z.string().nullable(),
    }),
  ),
  rounds: z.array(
    z.object({
      number: z.int(),
      reason: z.string(),
      words: z.string(),
      person: z.string(),
      at: instant,
      points: z.array(z.string()),
    }),
  ),
  /** Steps sent back by the foreman, with the words that went along. */
  returned: z.array(z.object({ shown: z.string(), words: z.string(), person: z.string(), at: instant })),
  /** Where two answers stood side by side: which one was chosen, and why. */
  chosen: z.array(z.object({ shown: z.string(), words: z.string(), person: z.string(), at: instant })),
  /** What was found other than drawn, and notes. */
  drawingDiffers: z.array(z.object({ words: z.string(), person: z.string(), at: instant })),
  notes: z.array(z.object({ words: z.string(), person: z.string(), at: instant })),
  photos: z.array(
    z.object({ sha256: digest, shown: z.string().nullable(), person: z.string(), at: instant }),
  ),
  signatures: z.array(
    z.object({
      kind: z.enum(['signed', 'countersigned']),
      name: z.string(),
      meaning: z.string(),
      at: instant,
      zone: z.string(),
      digest,
      picture: signaturePicture,
    }),
  ),
});
export type RecordDocument = z.infer<typeof recordDocument>;

/** One record with what was sealed and its place in the chain. */
export const recordView = recordRow.extend({
  previousSeal: digest.nullable(),
  amendedBy: z.array(z.int()),
  document: recordDocument,
});
export type RecordView = z.infer<typeof recordView>;
