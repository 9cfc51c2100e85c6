import { describe, expect, test } from 'vitest';
import { commonCases } from './cases/commons';
import { supplyCases } from './cases/supplies';
import { dcSupply, module } from './inputPanel';
import { without } from './inputParts';
import { output, outputPanel, twoGroups, both } from './supplyParts';
import { findingOf, verdict } from './verdict';

const cases = [...supplyCases, ...commonCases];

describe('rules of supplies and commons', () => {
  test.each(cases)('$rule: $name → $expected', ({ rule, panel, expected }) => {
    expect(verdict(panel, rule)).toBe(expected);
  });

  test('every rule is triggered and passed by one case', () => {
    const byRule = new Map<string, string[]>();
    for (const { rule, expected } of cases) byRule.set(rule, [...(byRule.get(rule) ?? []), expected]);
    expect(byRule.size).toBe(12);
    for (const [rule, answers] of byRule) {
      expect(
        answers.some((answer) => /hurts|damages|fails|doubt/.test(answer)),
        rule,
      ).toBe(true);
      expect(answers.includes('ok'), rule).toBe(true);
    }
  });

  test('a bridge is dangerous at both of its ends, whichever states it', () => {
    const panel = twoGroups({ linkedTo: ['G2'] }, { supply: 'S2' }, both);
    const finding = findingOf(panel, 'supply.commons-bridged');
    expect(finding).toMatchObject({ where: { group: 'G1' }, says: { params: { supplies: 'S1, S2' } } });
    const mirrored = { ...panel, groups: [...panel.groups].reverse() };
    expect(findingOf(mirrored, 'supply.commons-bridged').where).toEqual({ group: 'G2' });
  });

  test('an output group without a fuse asks to read one, at most what the group bears', () => {
    const panel = outputPanel(without(dcSupply(), 'protectionA'));
    const fused = { ...panel, modules: [module(output({ groupA: 4 }))] };
    expect(findingOf(fused, 'group.fuse-missing')).toMatchObject({
      remedy: { values: { A: 4 } },
      addsSteps: [{ family: 'check-fuse', where: { group: 'G1' }, params: { maxA: 4 } }],
    });
  });
});
