/** The door, and what stays live behind it: covered before any hand goes in. */
import type { StillLive } from '../../../isolation/types';
import { say, type Text } from '../../../panel/says';
import { choice, done } from '../../asks';
import type { Facts } from '../../facts';
import { staysLive } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

const placeOf = ({ terminal, incomingOf, supply }: StillLive): Text =>
  incomingOf !== undefined
    ? say('checklist.place.incoming', { tag: incomingOf })
    : say('checklist.place.terminal', { terminal: terminal ?? supply ?? '' });

const idOf = ({ terminal, incomingOf, supply }: StillLive) =>
  incomingOf !== undefined ? `incoming:${incomingOf}` : (terminal ?? supply ?? '');

const covered =
  (facts: Facts) =>
  (place: StillLive): Step =>
    makeStep({
      id: `isolate.cover.${idOf(place)}`,
      stage: 'isolate',
      family: 'door-open',
      title: say('checklist.isolate.cover', { place: placeOf(place) }),
      warnings: [staysLive(placeOf(place), place.V, facts.supply(place.supply)?.kind)],
      where: place.incomingOf !== undefined ? { isolator: place.incomingOf } : { terminal: idOf(place) },
      ask: choice(['covered'], ['not-covered']),
      picture: { kind: 'energy' },
    });

const guarded = ({ supply, guard, reason }: Facts['plan']['guarded'][number]): Step =>
  makeStep({
    id: `isolate.guard.${supply}`,
    stage: 'isolate',
    family: 'door-open',
    title: say('checklist.isolate.guard', { supply }),
    detail: [say('checklist.said', { words: guard }), say('checklist.said', { words: reason })],
    where: { supply },
    ask: choice(['guard-on'], ['guard-missing']),
  });

export function doorOpen(facts: Facts): Step[] {
  const { plan, panel } = facts;
  const places = [...new Map(plan.cover.map((place) => [idOf(place), place])).values()];
  return [
    makeStep({
      id: 'isolate.door',
      stage: 'isolate',
      family: 'door-open',
      title: say('checklist.isolate.door', { panel: panel.tag }),
      warnings: [{ signal: 'danger', says: say('checklist.warning.touch-nothing') }],
      ask: done('checklist.answer.open'),
    }),
    ...places.map(covered(facts)),
    ...plan.guarded.map(guarded),
  ];
}
