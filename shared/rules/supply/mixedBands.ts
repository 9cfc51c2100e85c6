/** Extra-low and low voltage side by side, on neighbouring terminals or in one cable, with insulation for the lower only. */
import { say } from '../../panel/says';
import type { Supply } from '../../panel/panelSchema';
import type { ModulePlace, PointPlace, RuleContext } from '../context';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { mixedBands, type Mixed } from './bands';

const id = 'supply.mixed-bands';

/** The supplies that are known to reach a point's terminal and its cable. */
function suppliesAt({ supply, point }: PointPlace, { supplies }: RuleContext): Supply[] {
  const other = point.otherSupply === undefined ? undefined : supplies.get(point.otherSupply)?.supply;
  return [supply, other].filter((one) => one !== undefined);
}

/** The first supply of the module that nobody named: it may be of either band. */
function unnamed({ groups }: ModulePlace, { supplies }: RuleContext): string | undefined {
  for (const { path, supply, points } of groups) {
    if (!supply) return `${path}.supply`;
    const unstated = points.find(
      ({ point: { otherSupply } }) =>
        otherSupply === undefined || (otherSupply !== 'none' && !supplies.has(otherSupply)),
    );
    if (unstated) return `${unstated.path}.otherSupply`;
  }
  return undefined;
}

/** By terminal: the commons and the points of the module. */
function suppliesByTerminal({ groups }: ModulePlace, context: RuleContext): Map<string, Supply[]> {
  const met = new Map<string, Supply[]>();
  const add = (terminal: string, supplies: Supply[]) =>
    met.set(terminal, [...(met.get(terminal) ?? []), ...supplies]);
  for (const { group, supply, points } of groups) {
    add(group.terminal, supply ? [supply] : []);
    for (const place of points) add(place.point.terminal, suppliesAt(place, context));
  }
  return met;
}

const finding = (
  { where }: ModulePlace,
  variant: 'terminals' | 'cable',
  { low, high }: Mixed,
  insulation: { V: number; basis: string },
  place: string,
): Outcome =>
  found(id, {
    harm: 'hurts',
    where,
    variant,
    params: { place, low: low.tag, high: high.tag, V: high.V, insulationV: insulation.V },
    because: [
      quantity('higher-supply', high.V, 'V', `supplies.${high.tag}.V`),
      quantity('insulation', insulation.V, 'V', insulation.basis),
    ],
    remedy: { says: say(`finding.${id}.${variant}.remedy`, { V: high.V }), values: { V: high.V } },
  });

/** Which pair of neighbours on the face of the module mixes bands. */
function mixedNeighbours(
  place: ModulePlace,
  met: Map<string, Supply[]>,
): (Mixed & { at: string }) | undefined {
  const { terminals = [] } = place.module;
  for (const [index, terminal] of terminals.entries()) {
    const next = terminals[index + 1];
    const both = [...(met.get(terminal) ?? []), ...(next === undefined ? [] : (met.get(next) ?? []))];
    const mixed = mixedBands(both);
    if (mixed) return { ...mixed, at: next === undefined ? terminal : `${terminal}, ${next}` };
  }
  return undefined;
}

function onTerminals(place: ModulePlace, context: RuleContext): Outcome[] {
  const { module, path } = place;
  const met = suppliesByTerminal(place, context);
  const anywhere = mixedBands([...met.values()].flat());
  const unknown = unnamed(place, context);
  const passed: Outcome[] = [unknown === undefined ? 'ok' : missing(unknown)];
  if (!anywhere) return passed;
  const { commonInsulationV } = module;
  if (commonInsulationV !== undefined && commonInsulationV >= anywhere.high.V) return passed;
  if (!module.terminals) return [missing(`${path}.terminals`)];
  const mixed = mixedNeighbours(place, met);
  if (!mixed) return passed;
  if (commonInsulationV === undefined) return [missing(`${path}.commonInsulationV`)];
  if (commonInsulationV >= mixed.high.V) return passed;
  const insulation = { V: commonInsulationV, basis: `${path}.commonInsulationV` };
  return [finding(place, 'terminals', mixed, insulation, mixed.at)];
}

function inCable(place: ModulePlace, tag: string, points: PointPlace[], context: RuleContext): Outcome[] {
  const mixed = mixedBands(points.flatMap((point) => suppliesAt(point, context)));
  if (!mixed) return [];
  const stated = points.map(({ point, path }) => ({
    V: point.cable?.insulationV,
    basis: `${path}.cable.insulationV`,
  }));
  const unstated = stated.find(({ V }) => V === undefined);
  const least = Math.min(...stated.map(({ V }) => V ?? Infinity));
  if (least < mixed.high.V)
    return [finding(place, 'cable', mixed, { V: least, basis: stated[0]?.basis ?? tag }, tag)];
  return [unstated ? missing(unstated.basis) : 'ok'];
}

/** Each cable of the module's points once. */
function inCables(place: ModulePlace, context: RuleContext): Outcome[] {
  const tags = new Set(
    place.groups
      .flatMap(({ points }) => points.map(({ point }) => point.cable?.tag))
      .filter((tag) => tag !== undefined),
  );
  return [...tags]
    .sort()
    .flatMap((tag) => inCable(place, tag, context.pointsByCable.get(tag) ?? [], context));
}

export const supplyMixedBands: RuleAt<'module'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 13.1.3: conductors of different voltages together are insulated for the highest',
  appliesTo: 'module',
  check: (place, context) => [...onTerminals(place, context), ...inCables(place, context)],
};
