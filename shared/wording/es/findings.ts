import { analogues } from './findings/analogues';
import { conductors } from './findings/conductors';
import { data } from './findings/data';
import { general } from './findings/general';
import { inputs } from './findings/inputs';
import { outputQuantities } from './findings/outputQuantities';
import { outputs } from './findings/outputs';
import { quantities } from './findings/quantities';
import { supplies } from './findings/supplies';

export const findings = {
  ...general,
  ...supplies,
  ...inputs,
  ...data,
  ...outputs,
  ...conductors,
  ...analogues,
  ...outputQuantities,
  ...quantities,
} as const;
