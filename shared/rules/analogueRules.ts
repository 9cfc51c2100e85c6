/** The rules of analogue points. */
import { commonShared } from './analogue/commonShared';
import { compliance } from './analogue/compliance';
import { leadCount } from './analogue/leadCount';
import { powerNone, powerTwice } from './analogue/power';
import { signalCable } from './analogue/signalCable';
import type { Rule } from './rule';

export const analogueRules: readonly Rule[] = [
  powerTwice,
  powerNone,
  compliance,
  leadCount,
  signalCable,
  commonShared,
];
