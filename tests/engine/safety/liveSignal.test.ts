/** Whether a reading is taken next to what kills is told by volts, never by a label. */
import { expect, test } from 'vitest';
import { liveMeasuring } from '../../../shared/checklist/liveSignal';
import { dc24, supply } from '../isolation/parts';

test.each([
  ['24 V DC, PELV', dc24('S', []), false],
  ['the same without a label', dc24('S', [], { extraLow: 'none' }), true],
  ['230 V AC called SELV', supply('S', [], { V: 230, extraLow: 'SELV' }), true],
  ['110 V DC called PELV', dc24('S', [], { V: 110 }), true],
  ['24 V AC, SELV, which may rise above 25 V', supply('S', [], { V: 24, extraLow: 'SELV' }), true],
  ['48 V DC, SELV, of a tolerance that nobody stated', dc24('S', [], { V: 48, tolerance: undefined }), true],
  ['a supply that the file does not have', undefined, true],
] as const)('%s', (_name, measured, isDanger) => {
  expect(liveMeasuring(measured).some(({ signal }) => signal === 'danger')).toBe(isDanger);
});
