/** The rules of the data themselves. */
import type { Rule } from './rule';

export const dataRules: readonly Rule[] = [];
