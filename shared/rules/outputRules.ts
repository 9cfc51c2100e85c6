/** The rules of outputs and their loads: first what can hurt somebody. */
import { contactAc, contactDc } from './output/contactLoad';
import { earthFaultStarts } from './output/earthFaultStarts';
import { groupCurrent } from './output/groupCurrent';
import { inrush } from './output/inrush';
import { leakageHolds } from './output/leakageHolds';
import { loadUnderfed } from './output/loadUnderfed';
import { minLoad } from './output/minLoad';
import { noSuppression } from './output/noSuppression';
import { phaseMixed } from './output/phaseMixed';
import { pointCurrent } from './output/pointCurrent';
import { polarity } from './output/polarity';
import { ssrControl } from './output/ssrControl';
import { ssrHeat } from './output/ssrHeat';
import { ssrLoad } from './output/ssrLoad';
import { suppressorReversed } from './output/suppressorReversed';
import { switchesNeutral } from './output/switchesNeutral';
import { transistorOnAc } from './output/transistorOnAc';
import { triacOnDc } from './output/triacOnDc';
import { voltageWindow } from './output/voltageWindow';
import { wrongSuppression } from './output/wrongSuppression';
import type { Rule } from './rule';

export const outputRules: readonly Rule[] = [
  triacOnDc,
  switchesNeutral,
  leakageHolds,
  ssrLoad,
  phaseMixed,
  transistorOnAc,
  polarity,
  earthFaultStarts,
  pointCurrent,
  groupCurrent,
  inrush,
  contactDc,
  contactAc,
  voltageWindow,
  noSuppression,
  wrongSuppression,
  suppressorReversed,
  minLoad,
  loadUnderfed,
  ssrControl,
  ssrHeat,
];
