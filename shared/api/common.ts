/** What every request and answer shares: problems, ids, pages, roles. */
import { z } from 'zod';

export const roles = ['electrician', 'foreman', 'safety-officer', 'panel-engineer', 'administrator'] as const;
export const role = z.enum(roles);
export type Role = z.infer<typeof role>;
export const language = z.enum(['en', 'es']);
export type Language = z.infer<typeof language>;
export const id = z.uuid();
export const digest = z.string().regex(/^[0-9a-f]{64}$/);
export const instant = z.iso.datetime({ offset: true });

/** RFC 9457 body of every failure. `code` is what programs branch on; `says` what people read. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  code: z.string(),
  errors: z.array(z.object({ path: z.string(), says: z.string() })).optional(),
});
export type Problem = z.infer<typeof problem>;

export const pageQuery = z.object({
  // A zero character is no text to PostgreSQL.
  after: z
    .string()
    .max(200)
    .refine((value) => !value.includes('\u0000'))
    .optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export const page = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), next: z.string().nullable() });
export interface Page<T> {
  items: T[];
  next: string | null;
}
