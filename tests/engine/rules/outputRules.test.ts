import { describe, expect, test } from 'vitest';
import { outputHurtsCases } from './cases/outputHurts';
import { outputLoadCases } from './cases/outputLoads';
import { outputSpikeCases } from './cases/outputSpikes';
import { verdict } from './verdict';

describe('output rules', () => {
  test.each([...outputHurtsCases, ...outputLoadCases, ...outputSpikeCases])(
    '$rule: $name → $expected',
    ({ rule, panel, expected }) => {
      expect(verdict(panel, rule)).toBe(expected);
    },
  );
});
