/** The rules of supplies, commons and groups, those that can hurt first. */
import { fuseMissing } from './group/fuseMissing';
import type { Rule } from './rule';
import { logicFeedsField } from './supply/logicFeedsField';
import { supplyMixedBands } from './supply/mixedBands';
import { noTolerance } from './supply/noTolerance';
import { supplyOverload } from './supply/overload';
import { commonsBridged, twoOnOneCommon } from './supply/sharedConductor';
import { supplyKind } from './supply/supplyKind';
import { supplyLevelHigh, supplyLevelLow } from './supply/supplyLevel';
import { supplyMissing } from './supply/supplyMissing';
import { unearthedControl } from './supply/unearthedControl';

export const supplyRules: readonly Rule[] = [
  twoOnOneCommon,
  commonsBridged,
  supplyMixedBands,
  supplyMissing,
  supplyKind,
  supplyLevelHigh,
  supplyLevelLow,
  supplyOverload,
  logicFeedsField,
  noTolerance,
  unearthedControl,
  fuseMissing,
];
