/** An input is proved from its device: actuate, see the light and the bit, read the volts on and off. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { cableDrop } from '../../cableDrop';
import { deviceName } from '../../device';
import { inputAmps } from '../../inputAmps';
import { liveMeasuring } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import { offVolts } from '../../offVolts';
import type { Ask, Stage, Step, Warning } from '../../types';
import { inputOff, inputOn, type Window } from './windows';

export function proveInput(worked: PointFacts, stage: Stage): Step[] {
  const { point, module, group, supply } = worked;
  const { address, terminal } = point;
  const { io } = module;
  const unit = supply?.kind === 'dc' ? 'V DC' : 'V AC';
  const part = (name: string, ask: Ask, warnings: Warning[] = []) =>
    makeStep({
      id: `prove.${address}.${name}`,
      stage,
      family: 'prove-input',
      title: say(`checklist.prove.input.${name}`, {
        device: deviceName(worked),
        address,
        terminal,
        common: group.terminal,
      }),
      warnings,
      where: worked.where,
      ask,
      picture: worked.loop,
    });
  const reading = (window: Window): Ask => ({ kind: 'reading', unit, ...window });
  const input = io.kind === 'digital-input' || io.kind === 'opto-input' ? io : undefined;
  const amps = input && inputAmps(input, supply?.V ?? 0);
  const drop = amps === undefined ? undefined : cableDrop(point.cable, amps);
  const off = inputOff(input && offVolts(input));
  return [
    part('on', choice(['light-and-bit-on'], ['light-or-bit-off'])),
    part('on-volts', reading(inputOn(worked, drop)), liveMeasuring(supply)),
    part('off', choice(['light-and-bit-off'], ['light-or-bit-on'])),
    part('off-volts', reading(off), liveMeasuring(supply)),
  ];
}
