import { describe, expect, test } from 'vitest';
import type { Device } from '../../../shared/panel/device';
import { acInput, acSupply, cable, dcInput, inputPanel } from './inputPanel';
import { twoWire, acTwoWire, without, bare } from './inputParts';
import { findingOf } from './verdict';

describe('the resistor across an input', () => {
  const leaking = (device: Device, io = bare) => inputPanel(io, { device });

  test('is offered with its values and a step: UL₂/(I − UL₂/R) = 5/(2 − 1.667) mA = 15 kΩ', () => {
    const finding = findingOf(leaking(twoWire({ leakmA: 2 })), 'input.leakage');
    // 28.8²/15000 = 0.055 W, twice that is 0.111 W: 0.25 W.
    expect(finding.remedy?.values).toEqual({ ohm: 15_000, W: 0.25 });
    expect(finding.addsSteps).toEqual([
      { family: 'fit-bleeder', where: { point: 'DI.01' }, params: { ohm: 15_000, W: 0.25 } },
    ]);
  });

  test('without the maker’s resistance: UL₂/I = 5 V / 2 mA = 2.5 kΩ, next lower 2.4 kΩ, and a doubt', () => {
    const io = without(dcInput({ characteristic: 'constant-current', ratedmA: 3 }), 'inputOhm');
    const finding = findingOf(inputPanel(io, { device: twoWire({ leakmA: 2 }) }), 'input.leakage');
    expect(finding).toMatchObject({ harm: 'doubt', remedy: { values: { ohm: 2400, W: 1 } } });
    expect(finding.says.params).toMatchObject({ field: 'modules.DI.io.inputOhm' });
  });

  test('is not offered where the sensor cannot carry it', () => {
    const finding = findingOf(leaking(twoWire({ leakmA: 3, maxmA: 10 })), 'input.leakage');
    expect(finding.remedy?.says.key).toBe('finding.remedy.bleeder.sensor');
    expect(finding.addsSteps).toBeUndefined();
  });

  test('is not offered where the input would no longer be on', () => {
    const panel = inputPanel(bare, {
      device: twoWire({ leakmA: 5, dropV: 9 }),
      cable: cable({ lengthM: 650 }),
    });
    const finding = findingOf(panel, 'input.leakage');
    expect(finding.remedy?.says.key).toBe('finding.remedy.bleeder.on');
  });

  test('is not offered where no common rating bears its heat', () => {
    // 253 V across it, and nearly nothing may be left: far more than 5 W.
    const panel = inputPanel(acInput(), { device: acTwoWire({ leakmA: 10 }) }, acSupply());
    expect(findingOf(panel, 'input.leakage').remedy?.says.key).toBe('finding.remedy.bleeder.heat');
  });

  test('settles leakage and least load at once: both name the smaller resistor', () => {
    const panel = leaking(twoWire({ leakmA: 2, minmA: 12 }));
    const leak = findingOf(panel, 'input.leakage').remedy?.values;
    expect(leak).toEqual(findingOf(panel, 'input.min-load').remedy?.values);
    expect(leak?.ohm).toBeLessThan(15_000);
  });
});
