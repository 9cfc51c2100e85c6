import { describe, expect, test } from 'vitest';
import type { Point } from '../../../shared/panel/panelSchema';
import { acCoil, acPanel, coil, heater, outputPanel, relay, sourcing, triac } from './outputParts';
import { findingOf, verdict } from './verdict';

type Values = Record<string, number | string>;
const valuesOf = (panel: Parameters<typeof findingOf>[0], rule: string): Values =>
  findingOf(panel, rule).remedy?.values ?? {};
const numberOf = (values: Values, name: string): number => {
  const value = values[name];
  if (typeof value !== 'number') throw new Error(`no ${name}`);
  return value;
};

describe('a remedy that is applied takes its finding away', () => {
  test.each([
    ['a held contactor', acPanel(triac({ leakmA: 15.1 }))],
    [
      'a glowing heater',
      acPanel(triac({ leakmA: 10.2 }), { device: heater({ V: 230, current: 'ac', A: 0.1 }) }),
    ],
    ['a small valve on a transistor', outputPanel(sourcing({ leakmA: 5 }), { device: coil({ A: 0.005 }) })],
  ])('bleeder across the load: %s', (_name, panel) => {
    const values = valuesOf(panel, 'output.leakage-holds');
    const bleeder: Point['bleeder'] = { ohm: numberOf(values, 'ohm'), W: numberOf(values, 'W') };
    const mended = { ...panel, points: panel.points.map((point) => ({ ...point, bleeder })) };
    expect(verdict(mended, 'output.leakage-holds')).toBe('ok');
  });

  test('a resistor that would burn is not offered', () => {
    const panel = acPanel(triac({ leakmA: 30 }));
    // 34.5 V / (30 − 15) mA = 2.3 kΩ: 253 V would turn 29 W into heat in 2.2 kΩ.
    expect(findingOf(panel, 'output.leakage-holds').remedy).toEqual({
      says: { key: 'remedy.output.leakage-holds.relay' },
    });
  });

  test('resistor beside a load that is too small', () => {
    const panel = acPanel(triac(), { device: acCoil({ A: 0.02 }) });
    const values = valuesOf(panel, 'output.min-load');
    const bleeder = { ohm: numberOf(values, 'ohm'), W: numberOf(values, 'W') };
    const mended = { ...panel, points: panel.points.map((point) => ({ ...point, bleeder })) };
    expect(verdict(mended, 'output.min-load')).toBe('ok');
  });

  test('the fuse of the remedy is small enough, and the next standard one is not', () => {
    const fused = (A: number) =>
      outputPanel(
        relay({ pointA: 40, groupA: 40 }),
        { device: heater({ A: 0.1 }) },
        { group: { fuse: { A, kind: 'gG' } } },
      );
    const wide = (A: number) => ({
      ...fused(A),
      supplies: fused(A).supplies.map((one) => ({ ...one, protectionA: 63 })),
    });
    const maxA = numberOf(valuesOf(wide(25), 'fuse.too-big'), 'maxA');
    expect(maxA).toBe(6.3);
    expect(verdict(wide(maxA), 'fuse.too-big')).toBe('ok');
    expect(verdict(wide(8), 'fuse.too-big')).toBe('damages');
  });

  test('diode of the remedy', () => {
    const bare = outputPanel(sourcing(), { suppressor: { kind: 'none', at: 'load' } });
    const values = valuesOf(bare, 'output.no-suppression');
    const fitted = outputPanel(sourcing(), {
      suppressor: {
        kind: 'diode',
        at: 'load',
        V: numberOf(values, 'V'),
        A: numberOf(values, 'A'),
        reversed: false,
      },
    });
    for (const rule of ['output.no-suppression', 'output.wrong-suppression', 'output.suppressor-reversed'])
      expect(verdict(fitted, rule)).toBe('ok');
  });

  test('more leakage never clears a held load', () => {
    const order = ['ok', 'hurts'];
    const verdicts = [1, 5, 10, 15, 15.1, 20, 40, 80].map((leakmA) =>
      order.indexOf(verdict(acPanel(triac({ leakmA })), 'output.leakage-holds')),
    );
    expect(verdicts).toEqual([...verdicts].sort((a, b) => a - b));
    expect(new Set(verdicts)).toEqual(new Set([0, 1]));
  });
});
