import { describe, expect, it } from 'vitest';
import { padNumber, padPress, type PadKey } from '../../src/components/field/padPress';
import { strokesOf } from '../../src/components/field/strokes';
import { oneLine } from '../../src/components/field/oneLine';
import { text } from '../../shared/panel/units';

const press = (keys: string): string =>
  Array.from(keys).reduce(
    (value, key) => padPress(value, (key === 'w' ? 'wipe' : key === '<' ? 'back' : key) as PadKey),
    '',
  );

describe('the number pad', () => {
  it.each([
    ['a reading', '0.3', '0.3', 0.3],
    ['a point first', '.5', '0.5', 0.5],
    ['a second point is ignored', '1.2.3', '1.23', 1.23],
    ['leading zeros fall away', '007', '7', 7],
    ['zero stays zero', '000', '0', 0],
    ['minus at any time', '24-', '-24', -24],
    ['minus twice', '-24-', '24', 24],
    ['minus before a point', '-.5', '-0.5', -0.5],
    ['wipe', '118w', '', undefined],
    ['one back', '118<', '11', 11],
    ['only a minus is no number', '-', '-', undefined],
    ['a trailing point still reads', '5.', '5.', 5],
    ['nothing typed is no zero', '', '', undefined],
  ])('%s: %s → %s', (_name, keys, shown, number) => {
    const value = press(keys);
    expect(value).toBe(shown);
    expect(padNumber(value)).toBe(number);
  });

  it('stops a stuck key', () => {
    expect(press('9'.repeat(40)).length).toBe(9);
  });

  it.each(['1e5', '0x10', 'Infinity', 'NaN', '1,5', ' '])('does not take %s for a number', (value) => {
    expect(padNumber(value)).toBeUndefined();
  });
});

describe('signature strokes', () => {
  const drawn = [
    {
      points: [
        { x: 30, y: 60, pressure: 0.51234 },
        { x: 150, y: 75, pressure: 1 },
      ],
    },
    { points: [] },
  ];
  it('are fractions of the width, so that turning the phone keeps them', () => {
    expect(strokesOf(drawn, 300)).toEqual([
      [
        [0.1, 0.2, 0.5123],
        [0.5, 0.25, 1],
      ],
    ]);
    const wide = drawn.map(({ points }) => ({
      points: points.map((point) => ({ ...point, x: point.x * 2, y: point.y * 2 })),
    }));
    expect(strokesOf(wide, 600)).toEqual(strokesOf(drawn, 300));
  });
});

describe('typed words', () => {
  it('become one line that an entry accepts', () => {
    const words = oneLine('  the wire\n is\ttoo short \r\n');
    expect(words).toBe('the wire is too short');
    expect(text(100).safeParse(words).success).toBe(true);
  });
});
