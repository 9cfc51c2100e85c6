import { describe, expect, test } from 'vitest';
import { checkWiring } from '../../../shared/rules/checkWiring';
import { dataCases } from './cases/data';
import type { panelOf } from './inputPanel';
import { cable, dcInput, inputPanel } from './inputPanel';
import { noCable, noTolerance, twoWire, unknownSupply } from './inputParts';
import { verdict } from './verdict';

describe('rules of the data', () => {
  test.each(dataCases)('$rule: $name → $expected', ({ rule, panel, expected }) => {
    expect(verdict(panel, rule)).toBe(expected);
  });
});

describe('what could not be checked', () => {
  const found = (panel: ReturnType<typeof panelOf>) => {
    const { findings, checks, couldNotRun } = checkWiring(panel);
    return {
      checks,
      couldNotRun,
      missing: findings.filter(({ rule }) => rule === 'data.missing'),
      lacking: findings
        .filter(({ says }) => says.key === 'finding.lacks')
        .map(({ rule }) => rule)
        .sort(),
    };
  };

  test('a healthy panel has no finding, and says how many checks ran', () => {
    const { findings, checks, couldNotRun } = checkWiring(inputPanel());
    expect(findings).toEqual([]);
    expect(couldNotRun).toEqual([]);
    expect(checks).toBeGreaterThan(15);
  });

  test('a missing cable is one data.missing that names the field and the rules that wait', () => {
    const { missing, lacking, couldNotRun } = found(noCable(inputPanel()));
    expect(lacking.filter((rule) => rule.startsWith('input.'))).toEqual([
      'input.never-on',
      'input.undefined',
    ]);
    expect(missing).toHaveLength(1);
    expect(missing[0]).toMatchObject({
      harm: 'doubt',
      where: { point: 'DI.01' },
      says: { params: { field: 'points.DI.01.cable', rules: lacking.join(', ') } },
    });
    expect(couldNotRun.map(({ rule }) => rule).sort()).toEqual(lacking);
  });

  test('a missing tolerance is said once, by its own rule, though many checks wait for it', () => {
    const { findings, couldNotRun } = checkWiring(inputPanel(dcInput(), {}, noTolerance()));
    expect(findings.map(({ rule }) => rule)).toEqual(['supply.no-tolerance']);
    expect(couldNotRun.length).toBeGreaterThan(3);
  });

  test('a common without a supply is said once, by its own rule', () => {
    const { findings, couldNotRun } = checkWiring(unknownSupply(inputPanel()));
    expect(findings.map(({ rule }) => rule)).toEqual(['supply.missing']);
    expect(couldNotRun.length).toBeGreaterThan(10);
  });

  test('a doubt leaves a step that settles it on site', () => {
    const doubt = checkWiring(noCable(inputPanel())).findings.find(({ rule }) => rule === 'input.never-on');
    expect(doubt?.addsSteps).toEqual([
      {
        family: 'settle-doubt',
        where: { point: 'DI.01' },
        params: { rule: 'input.never-on', field: 'points.DI.01.cable' },
      },
    ]);
  });
});

describe('precedence', () => {
  const rulesOf = (panel: ReturnType<typeof panelOf>) =>
    checkWiring(panel)
      .findings.filter(({ says }) => says.key !== 'finding.lacks')
      .map(({ rule }) => rule);
  const three = { dropV: 2, leakmA: 0.1, maxmA: 200, supplymA: 10 };

  test.each([
    [
      'NPN on a common at 0 V',
      inputPanel(dcInput(), { device: { kind: 'npn', ...three } }),
      'input.npn-on-sinking',
    ],
    ['NAMUR', inputPanel(dcInput(), { device: { kind: 'namur' } }), 'input.namur'],
    [
      'AC sensor on DC',
      inputPanel(dcInput(), { device: twoWire({ current: 'ac' }) }),
      'input.ac-sensor-on-dc',
    ],
    ['LED the wrong way round', inputPanel(dcInput({ polarity: 'negative-only' })), 'input.led-reversed'],
    ['leakage that leaves it on', inputPanel(dcInput(), { device: twoWire({ leakmA: 4 }) }), 'input.leakage'],
    [
      'leakage that leaves it undefined',
      inputPanel(dcInput(), { device: twoWire({ leakmA: 2 }) }),
      'input.leakage',
    ],
  ])('%s: the named cause alone', (_name, panel, rule) => {
    expect(rulesOf(panel)).toEqual([rule]);
  });

  test('leakage does not hide that the same input is not on when switched', () => {
    const device = twoWire({ leakmA: 2, dropV: 9 });
    const panel = inputPanel(dcInput(), { device, cable: cable({ lengthM: 2000 }) });
    expect(rulesOf(panel)).toEqual(['input.undefined', 'input.leakage']);
  });
});
