/** Green-and-yellow on a live conductor can kill; another colour than the practice's misleads. */
import type { Point } from '../../panel/panelSchema';
import type { PointPlace, RuleContext } from '../context';
import { isUnused } from '../output/drawnLoads';
import { found, missing, titleOf, type Outcome, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { colourCode, expectedColours, isProtective } from './colours';

const id = 'wire.colour';

type Conductor = NonNullable<Point['conductors']>[number];

const isLive = ({ role }: Conductor): boolean => role !== 'earth' && role !== 'screen';

function protectiveOnLive(place: PointPlace, what: string, variant: string): Outcome {
  return found(id, {
    harm: 'hurts',
    where: place.where,
    variant,
    params: { wire: what, terminal: place.point.terminal },
    remedy: { says: { key: 'remedy.wire.colour.protective' } },
  });
}

/** Conductors that carry current in a cable, its other points' among them. */
function liveInCable({ point }: PointPlace, context: RuleContext): number {
  const tag = point.cable?.tag;
  const sharing = tag === undefined ? [] : (context.pointsByCable.get(tag) ?? []);
  const points = sharing.length > 0 ? sharing.map((place) => place.point) : [point];
  return points.reduce((sum, { conductors = [] }) => sum + conductors.filter(isLive).length, 0);
}

/** A cable with fewer other cores than live conductors puts one of them on the green-and-yellow core. */
function ofCable(place: PointPlace, context: RuleContext): Outcome[] {
  const colours = place.point.cable?.colours?.map(colourCode);
  if (!colours) return [];
  const others = colours.filter((code) => !isProtective(code, context.panel.practice)).length;
  const tag = place.point.cable?.tag ?? place.point.wire;
  return liveInCable(place, context) > others ? [protectiveOnLive(place, tag, 'cable')] : [];
}

/** What the practice expects. In a multicore the maker chooses the colours; signals of sensors have codes of their own. */
function ofPractice(place: PointPlace, context: RuleContext, conductor: Conductor, code: string): Outcome[] {
  const { point, module, group, supply, path, where } = place;
  const { practice } = context.panel;
  const multicore = (point.cable?.cores ?? 1) > 1 || module?.io.kind === 'analogue-input';
  if (conductor.role === 'screen' || (multicore && conductor.role !== 'earth')) return [];
  if (!supply) return group ? [missing(`${group.path}.supply`)] : [];
  const foreign = point.otherSupply !== 'none' && point.otherSupply !== undefined;
  const expected = expectedColours(conductor.role, { supply, foreign }, practice);
  if (expected.includes(code)) return [];
  if (conductor.role !== 'earth' && point.cable && point.cable.cores === undefined)
    return [missing(`${path}.cable.cores`)];
  return [
    found(id, {
      harm: 'doubt',
      where,
      variant: 'other',
      params: { wire: conductor.wire, colour: code, expected: expected.join(', '), practice },
      remedy: { says: { key: 'remedy.wire.colour.other' } },
      addsSteps: settleOnSite(id, where),
    }),
  ];
}

function ofConductor(place: PointPlace, context: RuleContext, conductor: Conductor): Outcome[] {
  // The colours of a cable's cores, where they are listed, answer for its conductors.
  if (conductor.colour === undefined)
    return place.point.cable?.colours || conductor.role === 'screen'
      ? []
      : [missing(`${place.path}.conductors.${conductor.wire}.colour`)];
  const code = colourCode(conductor.colour);
  if (isLive(conductor) && isProtective(code, context.panel.practice))
    return [protectiveOnLive(place, conductor.wire, 'protective')];
  return ofPractice(place, context, conductor, code);
}

export const colour: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 13.2; NFPA 79 13.2',
  appliesTo: 'point',
  check: (place, context) => {
    if (isUnused(place)) return [];
    const { conductors } = place.point;
    if (!conductors) return [missing(`${place.path}.conductors`)];
    const said = [
      ...ofCable(place, context),
      ...conductors.flatMap((conductor) => ofConductor(place, context, conductor)),
    ];
    return said.length > 0 ? said : ['ok'];
  },
};
