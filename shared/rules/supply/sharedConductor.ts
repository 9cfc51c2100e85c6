/** Commons that are one conductor must stand on one pole of one supply. */
import { say } from '../../panel/says';
import type { GroupPlace, RuleContext } from '../context';
import { found, missing, titleOf, type Outcome, type RuleAt } from '../rule';
import { bridgedWith, poleOf } from './bridges';

const distinct = (texts: readonly (string | undefined)[]): string[] =>
  [...new Set(texts.filter((text) => text !== undefined))].sort();

/** @param together all groups on the conductor, the asking one among them. */
function judged(id: string, place: GroupPlace, together: readonly GroupPlace[]): Outcome[] {
  if (together.length === 0) return [];
  const supplies = distinct(together.map(({ supply }) => supply?.tag));
  const params = {
    common: place.group.terminal,
    groups: distinct(together.map(({ group }) => group.tag)).join(', '),
    supplies: supplies.join(', '),
  };
  const remedy = { says: say(`finding.${id}.remedy`) };
  if (supplies.length > 1) return [found(id, { harm: 'hurts', where: place.where, params, remedy })];
  if (distinct(together.map(poleOf)).length > 1)
    return [found(id, { harm: 'hurts', where: place.where, variant: 'poles', params, remedy })];
  const unsaid = together.length > 1 ? together.find((one) => poleOf(one) === undefined) : undefined;
  if (!unsaid) return ['ok'];
  return [missing(`${unsaid.path}.${unsaid.supply ? 'phase' : 'supply'}`)];
}

const shared = (
  id: string,
  basis: string,
  together: (place: GroupPlace, context: RuleContext) => readonly GroupPlace[],
): RuleAt<'group'> => ({
  id,
  title: titleOf(id),
  basis,
  appliesTo: 'group',
  check: (place, context) => judged(id, place, together(place, context)),
});

export const twoOnOneCommon = shared(
  'supply.two-on-one-common',
  'two supplies on one terminal: opening one leaves the other',
  ({ group }, context) => context.groupsByTerminal.get(group.terminal) ?? [],
);

export const commonsBridged = shared(
  'supply.commons-bridged',
  'two supplies bridged: opening one leaves the other',
  bridgedWith,
);
