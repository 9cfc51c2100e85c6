/** What a wiring rule is: one question asked at one kind of place, answered by findings, a missing datum, or nothing wrong. */
import type { Text } from '../panel/says';
import type { Finding, Harm, Quantity, Remedy, StepSeed, Where } from './finding';
import type { GroupPlace, ModulePlace, PointPlace, RuleContext, SupplyPlace } from './context';

/** `missing` is the tag-based path of the field of the panel file that the rule waits for. */
export type Outcome = { finding: Finding } | { missing: string } | 'ok';

export interface PlaceOf {
  point: PointPlace;
  group: GroupPlace;
  module: ModulePlace;
  supply: SupplyPlace;
}

export interface RuleAt<K extends keyof PlaceOf> {
  id: string;
  /** Wording key of its short name. */
  title: string;
  /** Document and clause, a maker's field, or "common practice". */
  basis: string;
  appliesTo: K;
  /** Answers for one place; an empty list says that the rule has nothing to ask there. */
  check: (place: PlaceOf[K], context: RuleContext) => Outcome[];
}

export type Rule = RuleAt<'point'> | RuleAt<'group'> | RuleAt<'module'> | RuleAt<'supply'>;

interface Parts {
  harm: Harm;
  where: Where;
  /** Distinguishes the sentences of one rule: `finding.<rule>.<variant>`. */
  variant?: string;
  params?: Text['params'];
  because?: Quantity[];
  remedy?: Remedy;
  addsSteps?: StepSeed[];
}

/** One finding as the outcome of a rule. Its sentence is `finding.<rule>` or `finding.<rule>.<variant>`. */
export function found(rule: string, parts: Parts): Outcome {
  const { variant, params, because = [], ...rest } = parts;
  const key = `finding.${rule}${variant === undefined ? '' : `.${variant}`}`;
  return { finding: { rule, ...rest, says: params ? { key, params } : { key }, because } };
}

export const missing = (path: string): Outcome => ({ missing: path });
export const quantity = (name: string, value: number, unit: string, basis: string): Quantity => ({
  name: `quantity.${name}`,
  value,
  unit,
  basis,
});
export const titleOf = (rule: string): string => `finding.${rule}.title`;
