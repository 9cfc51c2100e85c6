import { data } from './findings/data';
import { general } from './findings/general';
import { inputs } from './findings/inputs';
import { quantities } from './findings/quantities';
import { supplies } from './findings/supplies';

export const findings = {
  ...general,
  ...supplies,
  ...inputs,
  ...data,
  ...quantities,
} as const;
