import { describe, expect, test } from 'vitest';
import { currentCases } from './cases/inputCurrent';
import { offCases } from './cases/inputOff';
import { onCases } from './cases/inputOn';
import { poleCases } from './cases/inputPoles';
import { verdict } from './verdict';

const cases = [...poleCases, ...onCases, ...offCases, ...currentCases];

describe('input rules', () => {
  test.each(cases)('$rule: $name → $expected', ({ rule, panel, expected }) => {
    expect(verdict(panel, rule)).toBe(expected);
  });

  test('every input rule is triggered by one case, passed by one and, but for NAMUR and mixed commons, left open by one', () => {
    const byRule = new Map<string, string[]>();
    for (const { rule, expected } of cases) byRule.set(rule, [...(byRule.get(rule) ?? []), expected]);
    expect(byRule.size).toBe(18);
    for (const [rule, answers] of byRule) {
      expect(
        answers.some((answer) => /hurts|damages|fails|tells/.test(answer)),
        rule,
      ).toBe(true);
      expect(
        answers.some((answer) => answer === 'ok' || answer === 'nothing'),
        rule,
      ).toBe(true);
      if (rule !== 'input.mixed-on-common')
        expect(
          answers.some((answer) => /missing|doubt/.test(answer)),
          rule,
        ).toBe(true);
    }
  });
});
