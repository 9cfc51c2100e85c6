/** An input is proved from its device: actuate, see the light and the bit, read the volts on and off. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { cableDrop } from '../../cableDrop';
import { deviceName } from '../../device';
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
  const drop = 'ratedmA' in io && io.ratedmA !== undefined ? cableDrop(point.cable, io.ratedmA / 1000) : 0;
  const off = io.kind === 'digital-input' ? inputOff(io, offVolts(io)) : {};
  return [
    part('on', choice(['light-and-bit-on'], ['light-or-bit-off'])),
    part('on-volts', reading(inputOn(worked, drop)), liveMeasuring(supply)),
    part('off', choice(['light-and-bit-off'], ['light-or-bit-on'])),
    part('off-volts', reading(off), liveMeasuring(supply)),
  ];
}
