/** Every wiring rule, in the order in which their findings are listed. */
import { analogueRules } from './analogueRules';
import { conductorRules } from './conductorRules';
import { dataRules } from './dataRules';
import { inputRules } from './inputRules';
import { outputRules } from './outputRules';
import type { Rule } from './rule';
import { supplyRules } from './supplyRules';

export const ruleSetVersion = '2026.1';

export const rules: readonly Rule[] = [
  ...supplyRules,
  ...inputRules,
  ...outputRules,
  ...conductorRules,
  ...analogueRules,
  ...dataRules,
];
