/** Two phases, or two AC supplies, on one module: more volts stand between its commons than the module may part. */
import type { GroupPlace, ModulePlace } from '../context';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { supplyVolts } from '../volts';

const id = 'output.phase-mixed';

interface Pair {
  a: GroupPlace;
  b: GroupPlace;
  /** The most that can stand between the two commons. */
  V: number;
  /** The field that would tell whether it really does. */
  lacks?: string;
  tolerance?: string;
}

const onAc = (group: GroupPlace): boolean => group.supply !== undefined && group.supply.kind !== 'dc';

/** Between two supplies the phases can stand opposite: their volts add up. On one supply, phase against phase. */
function between(a: GroupPlace, b: GroupPlace): Pair {
  const unsure = [a, b].find((group) => group.volts && !group.volts.known)?.volts?.tolerancePath;
  const tolerance = unsure === undefined ? {} : { tolerance: unsure };
  if (a.supply !== b.supply || !a.supply)
    return { a, b, V: (a.volts?.maxV ?? 0) + (b.volts?.maxV ?? 0), ...tolerance };
  const same = { a, b, V: 0 };
  if (a.supply.kind === 'ac1' || (a.group.common === 'neutral' && b.group.common === 'neutral')) return same;
  if (a.group.phase !== undefined && a.group.phase === b.group.phase) return same;
  const unknown = [a, b].find(({ group }) => group.phase === undefined && group.common === 'line');
  const V = supplyVolts(a.supply).maxV;
  return { a, b, V, ...tolerance, ...(unknown && { lacks: `${unknown.path}.phase` }) };
}

function judge({ module, where, path }: ModulePlace, pair: Pair): Outcome {
  const { a, b, V, lacks, tolerance } = pair;
  const insulationV = module.commonInsulationV;
  if (V === 0) return 'ok';
  if (insulationV !== undefined && insulationV >= V)
    return tolerance === undefined ? 'ok' : missing(tolerance);
  if (lacks !== undefined) return missing(lacks);
  if (insulationV === undefined) return missing(`${path}.commonInsulationV`);
  return found(id, {
    harm: 'hurts',
    where,
    params: { module: module.tag, first: a.group.tag, second: b.group.tag, V, insulationV },
    because: [
      quantity('between-commons', V, 'V AC', `groups ${a.group.tag} and ${b.group.tag}, high supply`),
      quantity('common-insulation', insulationV, 'V', `${path}.commonInsulationV`),
    ],
    remedy: { says: { key: 'remedy.output.phase-mixed', params: { V } } },
  });
}

const pairsOf = (groups: GroupPlace[]): Pair[] =>
  groups.flatMap((a, index) => groups.slice(index + 1).map((b) => between(a, b))).sort((p, q) => q.V - p.V);

/** One answer a module: what is surely wrong, else what is not known, else that nothing is wrong. */
function mostTelling(place: ModulePlace, pairs: Pair[]): Outcome[] {
  const outcomes = pairs.map((pair) => judge(place, pair));
  const said =
    outcomes.find((one) => one !== 'ok' && 'finding' in one) ??
    outcomes.find((one) => one !== 'ok') ??
    outcomes[0];
  return said === undefined ? [] : [said];
}

export const phaseMixed: RuleAt<'module'> = {
  id,
  title: titleOf(id),
  basis: "the module's stated insulation between commons",
  appliesTo: 'module',
  check: (place) => {
    if (place.module.io.kind !== 'digital-output') return [];
    if (place.groups.length < 2) return [];
    const groups = [...place.groups].sort((a, b) => (a.group.tag < b.group.tag ? -1 : 1));
    const unfed = groups.find(({ supply }) => !supply);
    const said = mostTelling(place, pairsOf(groups.filter(onAc)));
    return unfed && !said.some((one) => one !== 'ok') ? [missing(`${unfed.path}.supply`)] : said;
  },
};
