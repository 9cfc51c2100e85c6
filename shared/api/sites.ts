/** Sites and their settings. */
import { z } from 'zod';
import { text } from '../panel/units';
import { id } from './common';

export const instrument = z.strictObject({
  make: text(80),
  number: text(80),
  category: z.enum(['CAT II', 'CAT III', 'CAT IV']),
  ratedV: z.number().positive(),
  checkDue: z.iso.date(),
});
export const siteSettings = z.strictObject({
  emergencyNumber: text(60),
  musterPoint: text(200),
  foremanPhone: text(60).optional(),
  /** Readings above this are not dead; a site may lower the 1.0 V of common practice, never raise it. */
  deadLimitV: z.number().positive().max(1),
  permitAsked: z.boolean(),
  ferruleScheme: z.enum(['DIN 46228-4', 'German old code', 'French code']),
  instruments: z.array(instrument).max(200),
});
export type SiteSettings = z.infer<typeof siteSettings>;
export const siteView = z.object({ id, name: z.string(), version: z.int(), settings: siteSettings });
export type SiteView = z.infer<typeof siteView>;
export const siteRequest = z.strictObject({ id, name: text(120), settings: siteSettings });
export const siteChange = z.strictObject({ version: z.int(), name: text(120), settings: siteSettings });
