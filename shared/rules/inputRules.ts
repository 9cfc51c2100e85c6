/** The rules of input points, the named causes first. */
import { cableCapacitance } from './input/cableCapacitance';
import { earthFaultOn } from './input/earthFaultOn';
import { leakage } from './input/leakage';
import { ledReversed } from './input/ledReversed';
import { minLoad } from './input/minLoad';
import { mixedOnCommon } from './input/mixedOnCommon';
import { namur } from './input/namur';
import { notSaturated } from './input/notSaturated';
import { overcurrent } from './input/overcurrent';
import { resistorHot } from './input/resistorHot';
import { acSensorOnDc, dcSensorOnAc } from './input/sensorOnOtherCurrent';
import { neverOff, neverOn, twoWireInSeries, undefinedRange } from './input/switchedOn';
import { npnOnSinking, pnpOnSourcing } from './input/wrongSide';
import type { Rule } from './rule';

export const inputRules: readonly Rule[] = [
  npnOnSinking,
  pnpOnSourcing,
  mixedOnCommon,
  ledReversed,
  namur,
  dcSensorOnAc,
  acSensorOnDc,
  neverOn,
  neverOff,
  undefinedRange,
  overcurrent,
  resistorHot,
  leakage,
  cableCapacitance,
  minLoad,
  twoWireInSeries,
  notSaturated,
  earthFaultOn,
];
