/** A landed point is pulled at and named before the next is begun. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export function finish({ point, where }: PointFacts): Step[] {
  const { address, terminal, wire } = point;
  const common = { stage: 'wire', family: 'finish', where } as const;
  return [
    makeStep({
      ...common,
      id: `wire.${address}.tug`,
      title: say('checklist.wire.tug', { terminal }),
      ask: choice(['wires-hold'], ['wire-moved']),
    }),
    makeStep({
      ...common,
      id: `wire.${address}.label`,
      title: say('checklist.wire.label', { wire, terminal }),
      ask: choice(['label-reads-right'], ['label-wrong']),
    }),
  ];
}
