/** `data.missing`: one doubt for each field that rules wait for, naming the field and the rules. */
import type { CouldNotRun, Finding, Where } from './finding';
import { say } from '../panel/says';

const owners: Partial<Record<string, 'supply' | 'module' | 'group' | 'point'>> = {
  supplies: 'supply',
  modules: 'module',
  groups: 'group',
  points: 'point',
};

/** The place that owns a field, told by the first word of its path and the place that asked. */
function ownerOf({ where, missing }: CouldNotRun): Where {
  const [list = '', ...rest] = missing.split('.');
  const kind = owners[list];
  if (kind === undefined || where[kind] !== undefined) return where;
  const ending =
    /\.(tolerance|ratedA|otherLoadA|protectionA|io(\..*)?|commonInsulationV|terminals|terminalRange|supply|module|phase|fuse(\..*)?|common)$/;
  return { [kind]: rest.join('.').replace(ending, '') };
}

/** One finding a field, however many checks wait for it. */
export function missingFindings(couldNotRun: CouldNotRun[]): Finding[] {
  const byField = new Map<string, { where: Where; rules: Set<string> }>();
  for (const wait of couldNotRun) {
    const known = byField.get(wait.missing);
    if (known) known.rules.add(wait.rule);
    else byField.set(wait.missing, { where: ownerOf(wait), rules: new Set([wait.rule]) });
  }
  return [...byField].map(([field, { where, rules }]) => ({
    rule: 'data.missing',
    harm: 'doubt',
    where,
    says: say('finding.data.missing', { field, rules: [...rules].sort().join(', ') }),
    because: [],
  }));
}
