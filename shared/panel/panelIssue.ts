/** What an issued revision may not contain although a draft may: broken references, duplicates, unstated facts. */
import type { Panel } from './panelSchema';

export interface PanelProblem {
  /** Path in the panel file, e.g. `groups.2.supply`. */
  path: string;
  says: string;
}

function duplicates(values: string[], path: string, field: string): PanelProblem[] {
  const seen = new Map<string, number>();
  return values.flatMap((value, index) => {
    const first = seen.get(value);
    if (first === undefined) {
      seen.set(value, index);
      return [];
    }
    return [{ path: `${path}.${index}.${field}`, says: `"${value}" already stands at ${path}.${first}` }];
  });
}

const namesOfPoles = (kind: Panel['supplies'][number]['kind']): string[] => {
  if (kind === 'dc') return ['minus,plus'];
  return kind === 'ac1' ? ['L,N', 'L1,L2'] : ['L1,L2,L3', 'L1,L2,L3,N'];
};

/** A pole without a terminal of its own is never read dead. */
function polesThatDoNotFit({ supplies }: Panel): PanelProblem[] {
  return supplies.flatMap(({ kind, terminals }, index) => {
    const path = `supplies.${index}.terminals`;
    const poles = Object.entries<string | undefined>(terminals).filter(([, tag]) => tag !== undefined);
    const allowed = namesOfPoles(kind);
    const isFit = allowed.includes(
      poles
        .map(([pole]) => pole)
        .sort()
        .join(),
    );
    const isShared = new Set(poles.map(([, tag]) => tag)).size < poles.length;
    return [
      ...(isFit ? [] : [{ path, says: `a supply of kind ${kind} has the poles ${allowed.join(' or ')}` }]),
      ...(isShared ? [{ path, says: 'two poles stand on one terminal' }] : []),
    ];
  });
}

/**
 * Every reason why this panel cannot be issued as a revision; an empty list means that it can.
 * Tags are unique in their kind, addresses unique, every reference resolves, `otherSupply` is stated everywhere.
 */
export function panelProblems(panel: Panel): PanelProblem[] {
  const tags = (items: { tag: string }[]) => items.map((item) => item.tag);
  const isolators = new Set(tags(panel.isolators));
  const supplies = new Set(tags(panel.supplies));
  const feeders = new Set([...tags(panel.sources), ...supplies]);
  const modules = new Set(tags(panel.modules));
  const groups = new Set(tags(panel.groups));

  const problems: PanelProblem[] = [
    ...duplicates(tags(panel.sources), 'sources', 'tag'),
    ...duplicates(tags(panel.isolators), 'isolators', 'tag'),
    ...duplicates(tags(panel.supplies), 'supplies', 'tag'),
    ...duplicates(tags(panel.modules), 'modules', 'tag'),
    ...duplicates(tags(panel.groups), 'groups', 'tag'),
    ...duplicates(tags(panel.stopControls), 'stopControls', 'tag'),
    ...duplicates(
      panel.points.map((point) => point.address),
      'points',
      'address',
    ),
  ];
  const refer = (path: string, value: string, known: Set<string>, what: string) => {
    if (!known.has(value)) problems.push({ path, says: `no ${what} "${value}" in this panel` });
  };

  for (const shared of tags(panel.sources).filter((tag) => supplies.has(tag)))
    problems.push({ path: 'supplies', says: `"${shared}" names both a source and a supply` });
  if (panel.disconnect !== null) refer('disconnect', panel.disconnect, isolators, 'isolator');
  panel.sources.forEach((source, i) =>
    source.isolators?.forEach((tag, k) => refer(`sources.${i}.isolators.${k}`, tag, isolators, 'isolator')),
  );
  panel.supplies.forEach((supply, i) =>
    supply.feeds.forEach((feed, k) => {
      refer(`supplies.${i}.feeds.${k}.from`, feed.from, feeders, 'source or supply');
      feed.through.forEach((tag, n) =>
        refer(`supplies.${i}.feeds.${k}.through.${n}`, tag, isolators, 'isolator'),
      );
    }),
  );
  panel.groups.forEach((group, i) => {
    refer(`groups.${i}.module`, group.module, modules, 'module');
    if (group.supply === undefined) problems.push({ path: `groups.${i}.supply`, says: 'is missing' });
    else refer(`groups.${i}.supply`, group.supply, supplies, 'supply');
    group.linkedTo?.forEach((tag, k) => refer(`groups.${i}.linkedTo.${k}`, tag, groups, 'group'));
  });
  panel.points.forEach((point, i) => {
    refer(`points.${i}.group`, point.group, groups, 'group');
    if (point.otherSupply === undefined)
      problems.push({
        path: `points.${i}.otherSupply`,
        says: 'is missing: name the other supply, or "none"',
      });
    else if (point.otherSupply !== 'none')
      refer(`points.${i}.otherSupply`, point.otherSupply, supplies, 'supply');
    if (point.device.kind === 'ssr-control')
      refer(`points.${i}.device.load.supply`, point.device.load.supply, supplies, 'supply');
  });
  return [...problems, ...polesThatDoNotFit(panel)];
}
