import { describe, expect, it } from 'vitest';
import { fitTag } from '../../../shared/diagram/fitLabel';

describe('a label in its room', () => {
  it.each([
    ['keeps its size where there is room', 'X1:3', 12, 60, 'X1:3'],
    ['has smaller letters before it loses one', '2.5 mA', 12, 44, '2.5 mA'],
    ['is whole at the smallest size that fits', 'DI1-1', 12, 31.6, 'DI1-1'],
    ['is cut with an ellipsis when even that is too wide', 'X2:DI1.11+', 12, 40, 'X2:DI…'],
  ])('%s', (_name, text, size, room, shown) => {
    const fitted = fitTag(text, size, room);
    expect(fitted.text).toBe(shown);
    expect(fitted.text.length * fitted.size * 0.632).toBeLessThanOrEqual(room + 1e-9);
  });
});
