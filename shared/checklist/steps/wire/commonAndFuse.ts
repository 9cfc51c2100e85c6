/** The common of a group on its pole, and the ratings of the fuses, read off the fuses themselves. */
import { say } from '../../../panel/says';
import type { Where } from '../../../rules/finding';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

const common = { stage: 'wire', family: 'common-and-fuse' } as const;

const rating = (id: string, fuse: string, A: number, terminal: string, where: Where): Step =>
  makeStep({
    ...common,
    id,
    title: say('checklist.wire.fuse', { fuse, terminal }),
    where,
    ask: { kind: 'reading', unit: 'A', low: A, high: A, why: say('checklist.why.fuse', { fuse, A }) },
  });

/** Once a group, before its first point: sixteen points share one common and one fuse. */
export function groupCommon(facts: Facts, { group, supply }: PointFacts): Step[] {
  const { tag, terminal, fuse } = group;
  const where = { group: tag, terminal };
  return [
    makeStep({
      ...common,
      id: `wire.group.${tag}.common`,
      title: say('checklist.wire.common', { terminal, pole: say(`checklist.pole.${group.common}`) }),
      detail: supply ? [say('checklist.wire.common.supply', { supply: supply.tag, V: supply.V })] : [],
      where,
      ask: choice(['common-right'], ['common-wrong']),
    }),
    ...(fuse ? [rating(`wire.group.${tag}.fuse`, fuse.tag ?? tag, fuse.A, terminal, where)] : []),
    ...facts
      .seeds('check-fuse')
      .filter((seed) => seed.where.point === undefined && seed.where.group === tag)
      .map((seed) => fuseToCheck(`wire.group.${tag}.check-fuse.${seed.finding.id}`, tag, terminal, seed)),
  ];
}

type Seed = ReturnType<Facts['seeds']>[number];

/** A finding doubts the fuse: what is fitted is read, against the finding's own limit where it gives one. */
function fuseToCheck(id: string, fuse: string, terminal: string, { where, params, finding }: Seed): Step {
  const most = params?.maxA ?? params?.A;
  return makeStep({
    ...common,
    id,
    title: say('checklist.wire.fuse', { fuse, terminal }),
    detail: [finding.says],
    where,
    ask: {
      kind: 'reading',
      unit: 'A',
      low: 0,
      ...(typeof most === 'number' ? { high: most, why: say('checklist.why.fuse-most', { A: most }) } : {}),
    },
  });
}

export function pointFuse(facts: Facts, { point }: PointFacts): Step[] {
  const { address, terminal, fuse } = point;
  const where = { point: address, terminal };
  return [
    ...(fuse ? [rating(`wire.${address}.fuse`, fuse.tag ?? address, fuse.A, terminal, where)] : []),
    ...facts
      .seeds('check-fuse')
      .filter((seed) => seed.where.point === address)
      .map((seed) =>
        fuseToCheck(`wire.${address}.check-fuse.${seed.finding.id}`, fuse?.tag ?? address, terminal, seed),
      ),
  ];
}
