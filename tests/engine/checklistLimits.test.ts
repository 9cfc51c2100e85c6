import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../shared/checklist/generate';
import { inputAmps } from '../../shared/checklist/inputAmps';
import { offVolts } from '../../shared/checklist/offVolts';
import { acInput, dcInput, optoInput } from './rules/inputPanel';
import { without } from './rules/inputParts';
import { exampleInput } from '../support/smallPanel';

const { steps } = generateChecklist(exampleInput());
const ask = (id: string) => {
  const found = steps.find((step) => step.id === id)?.ask;
  if (found?.kind !== 'reading') throw new Error(`no reading ${id}`);
  return found;
};

describe('limits that come from the conductor and input tables', () => {
  // IEC 60228: 1.5 mm² class 5, 13.3 Ω/km; 2 · 13.3 · 0.1 km = 2.66 Ω, ± 20 % = 0.532 Ω (reference §13 row 7).
  test('100 m of 1.5 mm² show 2.66 Ω out and back at 20 °C', () => {
    expect(ask('cold.DI3.02.loop')).toMatchObject({ unit: 'ohm', low: 2.128, high: 3.192 });
  });

  // 24 V − 15 % − 2.5 V − 2.5 mA · 2 · 20 m · 39 Ω/km · 1.1965 = 20.4 − 2.5 − 0.0047 V.
  test('on: low supply less sensor and warm cable', () => {
    expect(ask('prove.DI3.01.on-volts')).toMatchObject({ low: 17.895, high: 28.8 });
  });

  test('off: a type 3 is off up to 5 V, either way round (IEC 61131-2)', () => {
    expect(ask('prove.DI3.02.off-volts')).toMatchObject({ low: -5, high: 5 });
  });

  test.each([
    ['230 V AC type 1', acInput(), 40],
    ['custom', dcInput({ type: 'custom', thresholds: { UL_V: 4, UH_V: 15, IT_mA: 1, IH_mA: 2 } }), 4],
    ['custom without thresholds', dcInput({ type: 'custom' }), undefined],
    ['a row that the table does not hold', dcInput({ V: 12 }), undefined],
    // 1.1 V + 0.5 mA · 2200 Ω.
    ['optocoupler', optoInput(), 2.2],
  ] as const)('off volts of %s', (_name, io, V) => {
    const is = offVolts(io);
    if (V === undefined) expect(is).toBeUndefined();
    else expect(is).toBeCloseTo(V, 9);
  });

  test('an input of unknown current counts with the most its type may draw, a custom one with nothing', () => {
    const bare = without(dcInput(), 'inputOhm');
    expect(inputAmps(bare, 24)).toBe(0.015);
    expect(inputAmps({ ...bare, type: 'custom' }, 24)).toBeUndefined();
  });
});
