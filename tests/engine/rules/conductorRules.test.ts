import { describe, expect, test } from 'vitest';
import { analogueCases } from './cases/analogues';
import { conductorCases } from './cases/conductors';
import { verdict } from './verdict';

describe('conductor and analogue rules', () => {
  test.each([...conductorCases, ...analogueCases])(
    '$rule: $name → $expected',
    ({ rule, panel, expected }) => {
      expect(verdict(panel, rule)).toBe(expected);
    },
  );
});
