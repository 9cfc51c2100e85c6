/** Every wiring rule, in the order in which their findings are listed. */
import type { Rule } from './rule';

export const ruleSetVersion = '2026.1';

export const rules: readonly Rule[] = [];
