/** The rules of supplies, commons and groups. */
import type { Rule } from './rule';

export const supplyRules: readonly Rule[] = [];
