/** An output is proved one at a time, by command, with everybody clear of what it drives. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import { cableDrop } from '../../cableDrop';
import { deviceName, moves } from '../../device';
import type { Facts, PointFacts } from '../../facts';
import { liveMeasuring } from '../../liveSignal';
import { makeStep } from '../../makeStep';
import type { Ask, Stage, Step, Warning } from '../../types';
import { outputOff, outputOn, type Window } from './windows';

// From this share of the point's rating the current is read as well (common practice, no source).
const nearRating = 0.8;

function currentAsk({ point, module }: PointFacts): Ask | undefined {
  const { io } = module;
  const { device } = point;
  if (io.kind !== 'digital-output' || device.kind !== 'load' || device.A < nearRating * io.pointA)
    return undefined;
  return {
    kind: 'reading',
    unit: 'A',
    low: 0,
    high: io.pointA,
    why: say('checklist.why.point-current', { A: io.pointA }),
  };
}

function movementWarning(facts: Facts, worked: PointFacts): Warning[] {
  const asked = facts.seeds('movement-warning').some(({ where }) => where.point === worked.point.address);
  const may = moves(worked) || asked;
  return may
    ? [{ signal: 'warning', says: say('checklist.warning.movement', { device: deviceName(worked) }) }]
    : [];
}

/** In Prove points; in Restore motion for an output whose supply comes back only there. */
export function proveOutput(facts: Facts, worked: PointFacts, stage: Stage): Step[] {
  const { point, supply } = worked;
  const { address, terminal } = point;
  const unit = supply?.kind === 'dc' ? 'V DC' : 'V AC';
  const warnings = movementWarning(facts, worked);
  const part = (name: string, ask: Ask, warned: Warning[] = []) =>
    makeStep({
      id: `prove.${address}.${name}`,
      stage,
      family: 'prove-output',
      title: say(`checklist.prove.output.${name}`, { device: deviceName(worked), address, terminal }),
      warnings: warned,
      where: worked.where,
      ask,
      picture: worked.loop,
    });
  const reading = (window: Window): Ask => ({ kind: 'reading', unit, ...window });
  const drop = point.device.kind === 'load' ? cableDrop(point.cable, point.device.A) : 0;
  const current = currentAsk(worked);
  return [
    part('clear', choice(['area-clear'], ['someone-near']), warnings),
    part('command', choice(['only-this-acts'], ['acts-wrong'])),
    part('on-volts', reading(outputOn(worked, drop)), liveMeasuring(supply)),
    ...(current ? [part('current', current, liveMeasuring(supply))] : []),
    part('off', choice(['device-off'], ['device-stays-on'])),
    part('off-volts', reading(outputOff(worked)), liveMeasuring(supply)),
  ];
}
