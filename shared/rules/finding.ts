/** What a wiring or isolation check says about a panel, in keys and numbers. */
import type { Panel } from '../panel/panelSchema';
import type { Text } from '../panel/says';

export type Harm = 'hurts' | 'damages' | 'fails' | 'doubt' | 'tells';

export interface Where {
  point?: string;
  group?: string;
  module?: string;
  supply?: string;
  isolator?: string;
  source?: string;
  terminal?: string;
}

/** One number of the sum behind a finding. `basis` names document and clause, the panel file's field, or "common practice". */
export interface Quantity {
  /** Wording key of the quantity's name, e.g. `quantity.leakage`. */
  name: string;
  value: number;
  unit: string;
  basis: string;
}

export interface Remedy {
  says: Text;
  values?: Record<string, number | string>;
}

/** A step that a finding adds to the checklist of a job whose scope it touches. */
export interface StepSeed {
  /** Name of the step family in shared/checklist that makes the step. */
  family: string;
  where: Where;
  params?: Record<string, string | number>;
}

export interface Finding {
  rule: string;
  harm: Harm;
  where: Where;
  says: Text;
  because: Quantity[];
  remedy?: Remedy;
  addsSteps?: StepSeed[];
}

/** A check that could not run at a place because a datum is missing. */
export interface CouldNotRun {
  rule: string;
  where: Where;
  /** The field of the panel file that is missing, e.g. `supplies.S1.tolerance`. */
  missing: string;
}

export interface Findings {
  findings: Finding[];
  /** How many checks (rule × place) were tried, those that could not run among them. */
  checks: number;
  couldNotRun: CouldNotRun[];
}

export type CheckPanel = (panel: Panel) => Findings;
