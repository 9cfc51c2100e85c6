/** The resistor that leads a leakage away, across an input or across an output's load: measured before it is fitted. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { inThousandths } from '../../inThousandths';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';
import { otherPoles } from './poles';

// E24 values are made to 5 % (IEC 60063).
const tolerance = 0.05;

/** The panel file's own resistor, else the one a finding's remedy asks for. */
function resistorFor(facts: Facts, { point }: PointFacts): { ohm: number; W: number | string } | undefined {
  if (point.bleeder) return point.bleeder;
  const seed = facts.seeds('fit-bleeder').find(({ where }) => where.point === point.address);
  const values = { ...seed?.finding.remedy?.values, ...seed?.params };
  if (typeof values.ohm !== 'number') return undefined;
  return { ohm: values.ohm, W: values.W ?? '?' };
}

/** Across the input it goes to the common; across a load to the pole the load goes back to, never across the output. */
function acrossWhat({ group, module, supply }: PointFacts): { what: 'input' | 'load'; far: string } {
  if (module.io.kind !== 'digital-output') return { what: 'input', far: group.terminal };
  return { what: 'load', far: supply ? otherPoles(group, supply).join(', ') : '?' };
}

export function bleeder(facts: Facts, worked: PointFacts): Step[] {
  const resistor = resistorFor(facts, worked);
  if (!resistor) return [];
  const { address, terminal } = worked.point;
  const { ohm, W } = resistor;
  const { what, far } = acrossWhat(worked);
  const common = { stage: 'wire', family: 'bleeder', where: { point: address, terminal } } as const;
  return [
    makeStep({
      ...common,
      id: `wire.${address}.bleeder.value`,
      title: say('checklist.wire.bleeder.value', { terminal }),
      detail: [say('checklist.wire.bleeder.watts', { ohm, W })],
      ask: {
        kind: 'reading',
        unit: 'ohm',
        low: inThousandths(ohm * (1 - tolerance)),
        high: inThousandths(ohm * (1 + tolerance)),
        why: say('checklist.why.bleeder', { ohm }),
      },
    }),
    makeStep({
      ...common,
      id: `wire.${address}.bleeder`,
      title: say('checklist.wire.bleeder', { ohm, terminal, common: far }),
      detail: [
        say(what === 'input' ? 'checklist.wire.bleeder.across' : 'checklist.wire.bleeder.across-load'),
      ],
      ask: choice([`bleeder-across-${what}`], ['bleeder-elsewhere']),
      picture: { kind: 'loop', point: address },
    }),
  ];
}
