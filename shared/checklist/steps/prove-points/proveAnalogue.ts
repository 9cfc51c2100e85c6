/** An analogue point is proved by comparing what the wire carries with what the controller shows. */
import type { AnalogueInput, AnalogueOutput } from '../../../panel/moduleIo';
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import { deviceName } from '../../device';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Ask, ReadingAsk, Stage, Step } from '../../types';

type Signal = AnalogueInput['signal'] | AnalogueOutput['signal'];

/** The range of the signal is its name; temperature sensors carry nothing a tester could read. */
function signalAsk(signal: Signal): ReadingAsk | undefined {
  const why = say('checklist.why.signal', { signal });
  if (signal === '4-20mA') return { kind: 'reading', unit: 'mA', low: 4, high: 20, why };
  if (signal === '0-20mA') return { kind: 'reading', unit: 'mA', low: 0, high: 20, why };
  return signal === '0-10V' ? { kind: 'reading', unit: 'V DC', low: 0, high: 10, why } : undefined;
}

export function proveAnalogue(
  worked: PointFacts,
  signal: Signal,
  direction: 'input' | 'output',
  stage: Stage,
): Step[] {
  const { address, terminal } = worked.point;
  const part = (name: string, ask: Ask) =>
    makeStep({
      id: `prove.${address}.${name}`,
      stage,
      family: 'prove-analogue',
      title: say(`checklist.prove.analogue.${name}`, { device: deviceName(worked), address, terminal }),
      where: { point: address, terminal },
      ask,
      picture: { kind: 'loop', point: address },
    });
  const signalled = signalAsk(signal);
  return [
    ...(direction === 'output' ? [part('command', choice(['area-clear'], ['someone-near']))] : []),
    ...(signalled ? [part('signal', signalled)] : []),
    part('compare', choice(['values-agree'], ['values-differ'])),
    part('change', choice(['value-follows'], ['value-stays'])),
  ];
}
