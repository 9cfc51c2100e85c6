/** An aged optocoupler on low supply that no longer pulls its transistor down. */
import { collectormA, saturationmA } from '../../electrical/optoInput';
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { ledReversed } from './fieldDevices';
import { atLoop, type InputPlace } from './inputPlace';
import { onState } from './onState';

const id = 'input.not-saturated';

function ask(at: InputPlace): Outcome[] {
  const { io, ioPath, where } = at;
  // A module that states only its on current vouches for its transistor itself.
  if (io.kind !== 'opto-input' || !io.ctr || ledReversed(at)) return [];
  const { minPct, agePct, logicV, vceSat, loadOhm } = io.ctr;
  const on = onState(at);
  if ('missing' in on) return [missing(on.missing)];
  const has = collectormA(on.is.mA, minPct, agePct);
  const needs = saturationmA(logicV, vceSat ?? 0, loadOhm);
  if (has >= needs) return ['ok'];
  // Unstated, the saturation volts counted as 0, which asks for most: less may be enough.
  if (vceSat === undefined) return [missing(`${ioPath}.ctr.vceSat`)];
  const ledmA = needs / ((minPct / 100) * (1 - agePct / 100));
  return [
    found(id, {
      harm: 'fails',
      where,
      params: { has, needs },
      because: [
        ...on.is.because(),
        quantity('transfer-ratio', minPct, '%', `${ioPath}.ctr.minPct`),
        quantity('ageing', agePct, '%', `${ioPath}.ctr.agePct`),
        quantity('collector-current', has, 'mA', 'I·CTR·(1 − age)'),
        quantity('saturation-current', needs, 'mA', '(V − V_CEsat)/R'),
      ],
      remedy: Number.isFinite(ledmA)
        ? { says: say(`finding.${id}.remedy`, { mA: ledmA }), values: { mA: ledmA } }
        : { says: say('finding.remedy.other-sensor') },
    }),
  ];
}

export const notSaturated: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'I_F·CTR_min·(1 − age) ≥ (V_logic − V_CEsat)/R_load',
  appliesTo: 'point',
  check: (place, context) => atLoop(place, context, ask),
};
