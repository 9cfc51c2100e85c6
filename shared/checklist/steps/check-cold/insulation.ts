/** An insulation test, where an engineer or a finding asks for one: everything electronic is taken out of the way first. */
import { say } from '../../../panel/says';
import { choice } from '../../asks';
import type { Facts, PointFacts } from '../../facts';
import { makeStep } from '../../makeStep';
import type { Ask, Step, Warning } from '../../types';

/** Test voltage and least value: 250 V and 0.5 Mohm for SELV and PELV (from memory), else 500 V and 1 Mohm (reference §13 row 26). */
const testFor = (extraLow: boolean) => (extraLow ? { V: 250, Mohm: 0.5 } : { V: 500, Mohm: 1 });

const asked = (facts: Facts, address: string) =>
  [...facts.seeds('insulation'), ...facts.seeds('earth-insulation')].some(
    ({ where }) => where.point === address,
  );

export function insulation(facts: Facts, { point, module, supply }: PointFacts): Step[] {
  const { address, terminal, wire } = point;
  if (!asked(facts, address)) return [];
  const { V, Mohm } = testFor(supply !== undefined && supply.extraLow !== 'none');
  const part = (name: string, params: Record<string, string | number>, ask: Ask, warnings: Warning[] = []) =>
    makeStep({
      id: `cold.${address}.insulation.${name}`,
      stage: 'check-cold',
      family: 'insulation',
      title: say(`checklist.cold.insulation.${name}`, params),
      warnings,
      where: { point: address, terminal },
      ask,
    });
  const reading: Ask = {
    kind: 'reading',
    unit: 'Mohm',
    low: Mohm,
    why: say('checklist.why.insulation', { V, Mohm }),
  };
  return [
    part('ends', { wire, terminal }, choice(['both-ends-off'], ['end-on'])),
    part('parts', { terminal }, choice(['parts-off'], ['parts-on'])),
    part(
      'module',
      { module: module.tag },
      choice(['module-out', ...(module.pluggable ? [] : ['wire-off-module'])], ['module-in']),
    ),
    part('guard', { wire }, choice(['guarded'], ['not-guarded'])),
    part('read', { wire, V, earth: facts.panel.earthTerminal }, reading, [
      { signal: 'warning', says: say('checklist.warning.insulation', { V }) },
    ]),
    part('discharge', { wire }, choice(['discharged'], ['not-discharged'])),
    part('back', { wire, terminal }, choice(['landed'], ['not-landed'])),
    part(
      'module-back',
      { module: module.tag },
      choice(['module-in-again', ...(module.pluggable ? [] : ['module-stayed'])], ['module-still-out']),
    ),
  ];
}
