import { describe, expect, it } from 'vitest';
import type { FindingView } from '../../../shared/api/panels';
import { pointFindings } from '../../../src/features/panels/pointFindings';
import { loopCases } from '../../support/loopCases';

const panel = loopCases();
const [point] = panel.points;
if (!point) throw new Error('no point');
const finding = (where: FindingView['where']): FindingView => ({
  rule: 'input.leakage',
  harm: 'fails',
  where,
  says: 'Leakage keeps the input on',
  because: [],
  remedy: null,
});

describe('the findings of one loop', () => {
  it.each<[string, FindingView['where'], string | undefined]>([
    ['its point', { point: 'contact' }, 'point'],
    ['another point of its group', { point: 'pnp', group: 'in.sink' }, undefined],
    ['its terminal', { terminal: 'X3:16' }, 'terminal'],
    ['another terminal', { terminal: 'X3:99' }, undefined],
    ['its group', { group: 'in.sink' }, 'group'],
    ['another group', { group: 'in.ac' }, undefined],
    ['its module', { module: 'DI3' }, 'module'],
    ['its supply', { supply: 'S24' }, 'supply'],
    ['another supply', { supply: 'S230' }, undefined],
    ['an isolator', { isolator: 'Q1' }, undefined],
  ])('%s', (_name, where, at) => {
    expect(pointFindings(panel, point, [finding(where)]).map(({ mark }) => mark.at)).toEqual(at ? [at] : []);
  });

  it('count from 1 in their order', () => {
    const signed = pointFindings(panel, point, [finding({ supply: 'S24' }), finding({ point: 'contact' })]);
    expect(signed.map(({ mark }) => mark)).toEqual([
      { at: 'supply', sign: '1' },
      { at: 'point', sign: '2' },
    ]);
  });
});
