/** Plus where minus belongs: the output's common, a polarised load, or a load whose other end is on the common's own pole. */
import type { Group, Point } from '../../panel/panelSchema';
import { settleOnSite } from '../settleOnSite';
import { found, missing, titleOf, type Outcome, type RuleAt } from '../rule';
import { drawnLoads } from './drawnLoads';
import { atOutput, type OutputPlace } from './outputPlace';

const id = 'output.polarity';

function wrong({ place, group, supply }: OutputPlace, variant: string, what: string): Outcome {
  const { where, point } = place;
  return found(id, {
    harm: 'damages',
    where,
    variant,
    params: { what, terminal: point.terminal, common: group.group.terminal, supply: supply.tag },
    remedy: { says: { key: `remedy.output.polarity.${variant}` } },
    addsSteps: settleOnSite(id, where),
  });
}

/** A sourcing output switches plus, a sinking one 0 V (IEC 61131-2): its common is on that pole. */
function ofCommon(at: OutputPlace): Outcome[] {
  const { io, group, module } = at;
  const { common } = group.group;
  const backwards =
    (io.technology === 'sourcing' && common === 'negative') ||
    (io.technology === 'sinking' && common === 'positive');
  return backwards ? [wrong(at, 'common', module.tag)] : [];
}

const polarisedLoads = (at: OutputPlace): Outcome[] =>
  drawnLoads(at.place)
    .filter(({ polarised }) => polarised)
    .flatMap((load) => {
      if (load.reversed === undefined) return [missing(`${load.path}.reversed`)];
      return load.reversed ? [wrong(at, 'load', load.tag ?? at.place.point.address)] : [];
    });

const ownPole: Record<Group['common'], string> = {
  positive: 'plus',
  negative: 'minus',
  line: 'line',
  neutral: 'neutral',
};
const otherEnds: Record<Group['common'], string> = {
  positive: 'minus',
  negative: 'plus',
  line: 'neutral',
  neutral: 'line',
};

/** A load between the terminal and the pole that the output itself switches never works as drawn. */
function otherEnd(at: OutputPlace, { conductors = [], address }: Point): Outcome[] {
  const roles = new Set<string>(conductors.map(({ role }) => role));
  const { common } = at.group.group;
  const back = roles.has('return') || roles.has(otherEnds[common]);
  return roles.has(ownPole[common]) && !back ? [wrong(at, 'pole', address)] : [];
}

export const polarity: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 61131-2 (sourcing outputs supply current, sinking ones receive it)',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, (at) => {
      if (at.supply.kind !== 'dc') return [];
      const said = [...ofCommon(at), ...polarisedLoads(at), ...otherEnd(at, place.point)];
      return said.length > 0 ? said : ['ok'];
    }),
};
