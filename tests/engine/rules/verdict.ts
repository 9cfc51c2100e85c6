/** What one rule says of a panel, short enough for a table: harms, `ok`, `missing <field>`, or `nothing`. */
import type { Panel } from '../../../shared/panel/panelSchema';
import { ruleContext } from '../../../shared/rules/context';
import type { Finding } from '../../../shared/rules/finding';
import { rules } from '../../../shared/rules/registry';
import type { Outcome, Rule } from '../../../shared/rules/rule';

function ask(rule: Rule, panel: Panel): Outcome[] {
  const context = ruleContext(panel);
  switch (rule.appliesTo) {
    case 'point':
      return context.places.point.flatMap((place) => rule.check(place, context));
    case 'group':
      return context.places.group.flatMap((place) => rule.check(place, context));
    case 'module':
      return context.places.module.flatMap((place) => rule.check(place, context));
    case 'supply':
      return context.places.supply.flatMap((place) => rule.check(place, context));
  }
}

/** Before precedence, at every place. @throws Error when no rule has this id. */
export function outcomes(panel: Panel, id: string): Outcome[] {
  const rule = rules.find((one) => one.id === id);
  if (!rule) throw new Error(`no rule ${id}`);
  return ask(rule, panel);
}

const said = (outcome: Outcome): string => {
  if (outcome === 'ok') return 'ok';
  return 'missing' in outcome ? `missing ${outcome.missing}` : outcome.finding.harm;
};

/** Each different answer once, in alphabetical order. */
export function verdict(panel: Panel, id: string): string {
  const answers = [...new Set(outcomes(panel, id).map(said))].sort();
  return answers.length === 0 ? 'nothing' : answers.join(', ');
}

/** The first finding of a rule. @throws Error when there is none. */
export function findingOf(panel: Panel, id: string): Finding {
  for (const outcome of outcomes(panel, id))
    if (typeof outcome === 'object' && 'finding' in outcome) return outcome.finding;
  throw new Error(`${id} found nothing`);
}
