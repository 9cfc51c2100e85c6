/** A current loop is powered by exactly one side: none gives no signal, two burn the input. */
import type { Panel } from '../../panel/panelSchema';
import { found, missing, titleOf, type Outcome, type RuleAt } from '../rule';
import { settleOnSite } from '../settleOnSite';
import { atAnalogueInput, isLoop, type AnaloguePlace } from './analoguePlace';

const twice = 'analogue.power-twice';
const none = 'analogue.power-none';

/** A plus core that is landed on a supply's own plus terminal brings the loop's power from outside the module. */
function poweredFromSupply({ place }: AnaloguePlace, { supplies }: Panel): boolean {
  const plus = new Set(supplies.flatMap(({ terminals }) => ('plus' in terminals ? [terminals.plus] : [])));
  return (place.point.conductors ?? []).some(({ role, terminal }) => role === 'plus' && plus.has(terminal));
}

function said(rule: string, { place }: AnaloguePlace, variant: string): Outcome {
  return found(rule, {
    harm: rule === twice ? 'damages' : 'fails',
    where: place.where,
    variant,
    params: { device: place.point.device.tag ?? place.point.address },
    remedy: { says: { key: `remedy.${rule}` } },
    addsSteps: settleOnSite(rule, place.where),
  });
}

export const powerTwice: RuleAt<'point'> = {
  id: twice,
  title: titleOf(twice),
  basis: 'a four-wire transmitter drives the loop itself',
  appliesTo: 'point',
  check: (place, { panel }) =>
    atAnalogueInput(place, (at) => {
      const { device, conductors } = place.point;
      if (!isLoop(at.io) || device.kind !== 'transmitter' || device.wires === 3) return [];
      if (!at.io.powersLoop) return ['ok'];
      if (device.wires === 4) return [said(twice, at, 'four-wire')];
      if (!conductors) return [missing(`${at.path}.conductors`)];
      return [poweredFromSupply(at, panel) ? said(twice, at, 'supply') : 'ok'];
    }),
};

export const powerNone: RuleAt<'point'> = {
  id: none,
  title: titleOf(none),
  basis: 'a two-wire transmitter lives on the current of its loop',
  appliesTo: 'point',
  check: (place) =>
    atAnalogueInput(place, (at) => {
      const { device, conductors } = place.point;
      if (!isLoop(at.io) || device.kind !== 'transmitter' || device.wires !== 2) return [];
      if (at.io.powersLoop) return ['ok'];
      if (!conductors) return [missing(`${at.path}.conductors`)];
      return [conductors.some(({ role }) => role === 'plus') ? 'ok' : said(none, at, 'two-wire')];
    }),
};
