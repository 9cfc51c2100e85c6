/** Terminals on the face of a module that no row of the file names: is something on them? */
import type { RuleContext } from '../context';
import { settleOnSite } from '../settleOnSite';
import { found, titleOf, type RuleAt } from '../rule';

const id = 'data.unused-terminal';

const known = new WeakMap<RuleContext, Set<string>>();

/** Every terminal that a point, a conductor or a common names. */
function namedTerminals(context: RuleContext): Set<string> {
  const reckoned = known.get(context);
  if (reckoned) return reckoned;
  const named = new Set([
    ...context.pointsByTerminal.keys(),
    ...context.groupsByTerminal.keys(),
    ...context.places.point.flatMap(({ point }) => (point.conductors ?? []).map(({ terminal }) => terminal)),
  ]);
  known.set(context, named);
  return named;
}

export const unusedTerminal: RuleAt<'module'> = {
  id,
  title: titleOf(id),
  basis: 'modules.*.terminals',
  appliesTo: 'module',
  check: ({ where, module }, context) => {
    if (!module.terminals) return [];
    const named = namedTerminals(context);
    const unused = module.terminals.filter((terminal) => !named.has(terminal));
    if (unused.length === 0) return ['ok'];
    return [
      found(id, {
        harm: 'doubt',
        where,
        params: { module: module.tag, terminals: unused.join(', ') },
        addsSteps: settleOnSite(id, where),
      }),
    ];
  },
};
