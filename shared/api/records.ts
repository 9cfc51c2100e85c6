/** Sealed records: the list, one record, verifying. */
import { z } from 'zod';
import { digest, id, instant, pageQuery } from './common';

export const recordQuery = pageQuery.extend({
  site: id.optional(),
  panel: z.string().max(60).optional(),
  person: z.string().max(120).optional(),
  from: z.iso.date().optional(),
  to: z.iso.date().optional(),
  point: z.string().max(60).optional(),
  lock: z.string().max(60).optional(),
  exceptions: z.enum(['true', 'false']).optional(),
});
export const recordRow = z.object({
  id,
  number: z.int(),
  site: id,
  siteName: z.string(),
  panelTag: z.string(),
  panelName: z.string(),
  jobNumber: z.string(),
  sealedAt: instant,
  electricians: z.array(z.string()),
  foreman: z.string(),
  points: z.int(),
  exceptions: z.int(),
  digest,
  seal: digest,
  amendment: z.boolean(),
});
export type RecordRow = z.infer<typeof recordRow>;

export const verifyRequest = z.union([
  z.strictObject({ digest }),
  z.strictObject({ record: z.record(z.string(), z.unknown()) }),
]);
export const verifyAnswer = z.object({
  known: z.boolean(),
  chainHolds: z.boolean().optional(),
  panelTag: z.string().optional(),
  date: z.string().optional(),
  number: z.int().optional(),
  amendedBy: z.array(z.int()).optional(),
});
export type VerifyAnswer = z.infer<typeof verifyAnswer>;
