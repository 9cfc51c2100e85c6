/** A mail as it waits in the queue: a kind, a language and values; rendered when it is sent. */
import { z } from 'zod';
import { language } from '../../../shared/api/common';

export const mailKinds = [
  'invitation',
  'password-reset',
  'job-given',
  'countersign-wanted',
  'job-returned',
  'record-sealed',
  'record-amended',
  'key-registered',
] as const;

export const mailMessage = z.strictObject({
  to: z.email(),
  language,
  kind: z.enum(mailKinds),
  params: z.record(z.string(), z.union([z.string(), z.number()])),
  /** Path on this server that the mail leads to; the configured host is put before it. */
  path: z.string().startsWith('/').optional(),
  attachment: z.strictObject({ name: z.string(), record: z.uuid() }).optional(),
});
export type MailMessage = z.infer<typeof mailMessage>;
