/** Sign-in, people, invitations. */
import { z } from 'zod';
import { text } from '../panel/units';
import { id, instant, language, role } from './common';

export const siteRole = z.strictObject({ site: id, role });
export const email = z.email().max(200).toLowerCase();
/** NIST SP 800-63B-4: 15 characters where the password is the only factor; no composition rules. */
export const newPassword = z.string().min(15).max(200);

export const signInRequest = z.strictObject({ email, password: z.string().min(1).max(200) });
export const sessionView = z.object({
  person: z.object({ id, name: z.string(), email: z.string(), language }),
  roles: z.array(z.object({ site: id, siteName: z.string(), role })),
});
export type SessionView = z.infer<typeof sessionView>;

export const personView = z.object({
  id,
  name: z.string(),
  email: z.string(),
  language,
  active: z.boolean(),
  version: z.int(),
  roles: z.array(siteRole),
  invitedAt: instant.nullable(),
  joinedAt: instant.nullable(),
});
export type PersonView = z.infer<typeof personView>;
export const personChange = z.strictObject({
  version: z.int(),
  name: text(120).optional(),
  language: language.optional(),
  active: z.boolean().optional(),
  roles: z.array(siteRole).optional(),
});
export const invitationRequest = z.strictObject({
  id,
  name: text(120),
  email,
  language,
  roles: z.array(siteRole).min(1),
});
export const tokenRequest = z.strictObject({ token: z.string().min(20).max(200) });
export const invitationLook = z.object({ name: z.string(), email: z.string() });
export const passwordWithToken = z.strictObject({
  token: z.string().min(20).max(200),
  password: newPassword,
});
export const passwordResetRequest = z.strictObject({ email });
