/** Runs every wiring rule at every place of a panel and says what was found, how much was tried and what could not be. */
import type { Panel } from '../panel/panelSchema';
import { say } from '../panel/says';
import { ruleContext, type RuleContext } from './context';
import { missingFindings } from './dataMissing';
import type { CouldNotRun, Finding, Findings, Where } from './finding';
import { placeKey } from './placeKey';
import { withoutExplained } from './precedence';
import { rules } from './registry';
import type { Outcome, Rule } from './rule';

/** Fields whose absence is a finding of its own rule: no second doubt is raised for each rule that waits for them. */
const hasOwnRule = (field: string) => /^(supplies\..*\.tolerance|groups\..*\.supply)$/.test(field);

const lacks = ({ rule, where, missing }: CouldNotRun): Finding => ({
  rule,
  harm: 'doubt',
  where,
  says: say('finding.lacks', { field: missing }),
  because: [],
  addsSteps: [{ family: 'settle-doubt', where, params: { rule, field: missing } }],
});

/** Asks one rule at all places of its kind. */
function ask(rule: Rule, context: RuleContext, answer: (where: Where, outcomes: Outcome[]) => void): void {
  switch (rule.appliesTo) {
    case 'point':
      return context.places.point.forEach((at) => answer(at.where, rule.check(at, context)));
    case 'group':
      return context.places.group.forEach((at) => answer(at.where, rule.check(at, context)));
    case 'module':
      return context.places.module.forEach((at) => answer(at.where, rule.check(at, context)));
    case 'supply':
      return context.places.supply.forEach((at) => answer(at.where, rule.check(at, context)));
  }
}

interface Sortable {
  rule: string;
  where: Where;
}
/** Order by rule, then place, so that the order of rows in the file changes nothing. */
function sorted<T extends Sortable>(items: T[], detailOf: (item: T) => string): T[] {
  const order = new Map(rules.map((rule, index) => [rule.id, index]));
  const keyed = items.map((item) => ({
    item,
    rank: order.get(item.rule) ?? rules.length,
    key: `${placeKey(item.where)}\u0000${detailOf(item)}`,
  }));
  keyed.sort((a, b) => a.rank - b.rank || (a.key < b.key ? -1 : a.key > b.key ? 1 : 0));
  return keyed.map(({ item }) => item);
}

/**
 * Every wiring finding of a panel. Pure; never throws on a panel that fits the schema, broken references included.
 * A check is one rule at one place where it has something to ask.
 */
export function checkWiring(panel: Panel): Findings {
  const context = ruleContext(panel);
  const found: Finding[] = [];
  const couldNotRun: CouldNotRun[] = [];
  let checks = 0;
  for (const rule of rules)
    ask(rule, context, (where, outcomes) => {
      if (outcomes.length > 0) checks += 1;
      for (const outcome of outcomes)
        if (outcome === 'ok') continue;
        else if ('finding' in outcome) found.push(outcome.finding);
        else couldNotRun.push({ rule: rule.id, where, missing: outcome.missing });
    });
  const unsettled = couldNotRun.filter(({ missing }) => !hasOwnRule(missing));
  const findings = [
    ...withoutExplained(found, context),
    ...unsettled.map(lacks),
    ...missingFindings(unsettled),
  ];
  return {
    findings: sorted(findings, (finding) => JSON.stringify(finding.says)),
    checks,
    couldNotRun: sorted(couldNotRun, ({ missing }) => missing),
  };
}
