import { z } from 'zod';
import type { SiteSettings, SiteView } from '../../../shared/api/sites';
import { oneLine } from '../../components/field/oneLine';

/** What was typed or pasted, without the unseen signs that the contract refuses. */
const words = (max: number) => z.string().transform(oneLine).pipe(z.string().min(1, 'app.required').max(max));

const instrumentForm = z.object({
  make: words(80),
  number: words(80),
  category: z.enum(['CAT II', 'CAT III', 'CAT IV']),
  ratedV: z.coerce.number<string>('office.number.wrong').positive('office.number.wrong'),
  checkDue: z.iso.date('office.date.wrong'),
});

/** The site's settings as the form holds them: numbers are still what somebody typed. */
export const siteForm = z.object({
  name: words(120),
  emergencyNumber: words(60),
  musterPoint: words(200),
  foremanPhone: z.string().transform(oneLine).pipe(z.string().max(60)),
  // The limit of common practice may be lowered, never raised: the same bound as in shared/api/sites.
  deadLimitV: z.coerce
    .number<string>('office.site.deadLimit.wrong')
    .positive('office.site.deadLimit.wrong')
    .max(1, 'office.site.deadLimit.wrong'),
  permitAsked: z.boolean(),
  ferruleScheme: z.enum(['DIN 46228-4', 'German old code', 'French code']),
  instruments: z.array(instrumentForm).max(200),
});
export type SiteValues = z.input<typeof siteForm>;

export const emptySite: SiteValues = {
  name: '',
  emergencyNumber: '',
  musterPoint: '',
  foremanPhone: '',
  deadLimitV: '1.0',
  permitAsked: false,
  ferruleScheme: 'DIN 46228-4',
  instruments: [],
};

export const siteValues = ({ name, settings }: SiteView): SiteValues => ({
  ...settings,
  name,
  foremanPhone: settings.foremanPhone ?? '',
  deadLimitV: Number.isInteger(settings.deadLimitV)
    ? settings.deadLimitV.toFixed(1)
    : String(settings.deadLimitV),
  instruments: settings.instruments.map((each) => ({ ...each, ratedV: String(each.ratedV) })),
});

/** What the contract wants, from what the form checked. */
export function siteOf(checked: z.output<typeof siteForm>): { name: string; settings: SiteSettings } {
  const { name, foremanPhone, ...settings } = checked;
  return { name, settings: { ...settings, ...(foremanPhone ? { foremanPhone } : {}) } };
}
