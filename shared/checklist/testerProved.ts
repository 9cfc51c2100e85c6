/** The tester is shown a known voltage before and after it is believed, at every voltage it is used on. */
import { say } from '../panel/says';
import type { Facts } from './facts';
import { makeStep } from './makeStep';
import type { Stage, Step } from './types';

export interface KnownVoltage {
  kind: 'ac' | 'dc';
  V: number;
}

// "About the voltage tested": half to twice. Common practice, no source.
const around = { low: 0.5, high: 2 };

const highest = (values: number[], otherwise: number) =>
  values.length > 0 ? Math.max(...values) : otherwise;

/** Both functions of the meter are read everywhere, so the one no supply asks for is proved at its highest voltage here. */
export function voltagesToProve({ cabinet }: Facts, tested: readonly KnownVoltage[]): KnownVoltage[] {
  const most = highest(
    tested.map(({ V }) => V),
    0,
  );
  const missing = (['ac', 'dc'] as const)
    .filter((kind) => !tested.some((each) => each.kind === kind))
    .map((kind) => {
      const here = cabinet.supplies.filter((supply) => (supply.kind === 'dc') === (kind === 'dc'));
      return {
        kind,
        V: highest(
          here.map(({ V }) => V),
          most,
        ),
      };
    });
  const unique = new Map([...tested, ...missing].map((each) => [`${each.kind} ${each.V}`, each]));
  return [...unique.values()].sort((a, b) => b.V - a.V || (a.kind < b.kind ? -1 : 1));
}

/** Steps that prove the tester; called with an id prefix, before or after, so that both sets keep their own ids. */
export function testerProved(facts: Facts, tested: readonly KnownVoltage[]) {
  const voltages = voltagesToProve(facts, tested);
  return (prefix: string, when: 'before' | 'after', stage: Stage, by: Step['by']): Step[] =>
    voltages.map(({ kind, V }) =>
      makeStep({
        id: `${prefix}.tester.${when}.${kind}.${V}`,
        stage,
        family: 'tester-proved',
        title: say(`checklist.tester.${when}.${kind}`, { V }),
        detail: [say('checklist.tester.on')],
        ask: {
          kind: 'reading',
          unit: kind === 'ac' ? 'V AC' : 'V DC',
          low: V * around.low,
          high: V * around.high,
          why: say('checklist.why.about', { V }),
        },
        by,
      }),
    );
}
