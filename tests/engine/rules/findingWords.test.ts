import { describe, expect, test } from 'vitest';
import type { Text } from '../../../shared/panel/says';
import type { Finding } from '../../../shared/rules/finding';
import { rules } from '../../../shared/rules/registry';
import { en } from '../../../shared/wording/en';
import { render } from '../../../shared/wording/render';
import { commonCases } from './cases/commons';
import { currentCases } from './cases/inputCurrent';
import { offCases } from './cases/inputOff';
import { onCases } from './cases/inputOn';
import { poleCases } from './cases/inputPoles';
import { supplyCases } from './cases/supplies';
import { outcomes } from './verdict';

const cases = [...poleCases, ...onCases, ...offCases, ...currentCases, ...supplyCases, ...commonCases];
const findings = cases.flatMap(({ panel, rule }) =>
  outcomes(panel, rule).flatMap((outcome): Finding[] =>
    typeof outcome === 'object' && 'finding' in outcome ? [outcome.finding] : [],
  ),
);
const textsOf = ({ says, remedy, because }: Finding): Text[] => [
  says,
  ...(remedy ? [remedy.says] : []),
  ...because.map(({ name }) => ({ key: name })),
];

describe('the words of findings', () => {
  test.each(['en', 'es'] as const)('every sentence, remedy and quantity renders whole in %s', (language) => {
    expect(findings.length).toBeGreaterThan(60);
    for (const finding of findings)
      for (const text of textsOf(finding)) {
        const said = render(language, text);
        expect(said, text.key).not.toBe('');
        expect(said, text.key).not.toMatch(/[{}]|undefined|\bNaN\b|Infinity|\[object/);
      }
  });

  test('every rule has a title', () => {
    const keys = new Set<string>(Object.keys(en));
    expect(rules.map(({ title }) => title).filter((title) => !keys.has(title))).toEqual([]);
  });

  test('every quantity has a finite value, a unit and a basis', () => {
    for (const { because, rule } of findings)
      for (const { value, unit, basis, name } of because) {
        expect(Number.isFinite(value), `${rule} ${name}`).toBe(true);
        expect(
          [unit, basis].every((word) => word.length > 0),
          `${rule} ${name}`,
        ).toBe(true);
      }
  });

  test('a finding of harm, but for those that only tell, offers a remedy', () => {
    const without = findings
      .filter(({ harm, remedy }) => harm !== 'doubt' && harm !== 'tells' && !remedy)
      .map(({ rule }) => rule);
    expect(without).toEqual([]);
  });
});
