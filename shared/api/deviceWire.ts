/** What travels between a device and the server: entries, keys, packs. Apart, so that a phone carries no more of the contract. */
import { z } from 'zod';
import { entryEnvelope } from '../job/entry';
import { text } from '../panel/units';
import { digest, id, instant, problem } from './common';

export const jobStatus = z.enum([
  'planned',
  'sent',
  'accepted',
  'running',
  'signed',
  'returned',
  'countersigned',
  'sealed',
  'cancelled',
]);
export const entriesRequest = z.strictObject({
  /** log → key that signs it; the log's id is uuidv5(job, key). */
  logs: z.record(z.string(), id),
  entries: z.array(entryEnvelope).min(1).max(500),
});
export const acknowledgement = z.object({
  id,
  order: z.int().nullable(),
  setAside: z.boolean(),
});
export const entriesAnswer = z.object({ acknowledged: z.array(acknowledgement) });
/** 409 of a push: an entry's `previous` is not held. `heads` is the highest seq held of each log of the request (0: none). */
export const headsProblem = problem.extend({
  code: z.literal('heads'),
  heads: z.record(z.string(), z.int().nonnegative()),
});
export type HeadsProblem = z.infer<typeof headsProblem>;
export const logView = z.object({
  log: id,
  key: id,
  person: id,
  publicKey: z.record(z.string(), z.unknown()),
});
export const entriesPage = z.object({
  entries: z.array(entryEnvelope.extend({ order: z.int(), receivedAt: instant })),
  logs: z.array(logView),
  /** Cursor to give as `after` next time; equal to the one given when nothing is new. */
  after: z.int(),
  more: z.boolean(),
  status: jobStatus,
});
export type EntriesPage = z.infer<typeof entriesPage>;

export const deviceRequest = z.strictObject({ id, name: text(120) });
export const keyRequest = z.strictObject({
  id,
  device: id,
  publicKey: z.strictObject({
    kty: z.literal('EC'),
    crv: z.literal('P-256'),
    x: z.string().max(60),
    y: z.string().max(60),
  }),
});
export const packList = z.object({
  /** Packs this device does not have yet. */
  packs: z.array(z.unknown()),
  current: z.array(z.object({ job: id, digest, status: jobStatus })),
});
