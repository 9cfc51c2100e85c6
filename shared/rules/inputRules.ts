/** The rules of input points. */
import type { Rule } from './rule';

export const inputRules: readonly Rule[] = [];
