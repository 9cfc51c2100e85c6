/** A landed point is pulled at and named before the next is begun. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Step } from '../../types';

export function finish({ point, where }: PointFacts): Step[] {
  const { address, terminal, wire } = point;
  return [
    makeStep({
      id: `wire.${address}.tug`,
      stage: 'wire',
      family: 'finish',
      where,
      title: say('checklist.wire.tug', { terminal }),
      ask: choice(['wires-hold'], ['wire-moved']),
    }),
    makeStep({
      id: `wire.${address}.label`,
      stage: 'wire',
      family: 'finish',
      where,
      title: say('checklist.wire.label', { wire, terminal }),
      ask: choice(['label-reads-right'], ['label-wrong']),
    }),
  ];
}
