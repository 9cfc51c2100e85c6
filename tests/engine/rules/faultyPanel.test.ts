import { describe, expect, test } from 'vitest';
import { healthyPanel } from '../../../server/commands/demo/panels/healthy';
import { mixedPanel } from '../../../server/commands/demo/panels/mixed';
import { faultyPanel } from '../../../server/commands/demo/panels/faulty';
import { isolationFindings } from '../../../shared/isolation/isolationFindings';
import { panelSchema, type Panel } from '../../../shared/panel/panelSchema';
import { checkWiring } from '../../../shared/rules/checkWiring';
import { rules } from '../../../shared/rules/registry';
import { messageOf, render } from '../../../shared/wording/render';

const wiring = checkWiring(faultyPanel).findings;
const triggered = (rule: string) =>
  wiring.some((finding) => finding.rule === rule && finding.says.key !== 'finding.lacks');

const isolationRules = [
  'isolation.none',
  'isolation.no-feed',
  'isolation.derived-loop',
  'isolation.one-pole',
  'isolation.control-device-as-isolator',
  'isolation.other-energy',
  'isolation.single-point-cannot-lock',
  'isolation.foreign-voltage',
  'isolation.stored-unknown',
  'isolation.redundant-feed',
  'isolation.ups',
  'isolation.not-in-sight',
  'isolation.no-load-break',
  'isolation.same-tag-differs',
];

/**
 * What the isolators of a lock plan tell is said where a plan exists, and one common of unknown supply leaves none for
 * any job: no panel can have `supply.missing` and these three together. They are read with that one row mended.
 */
const planTells = ['isolation.single-point-cannot-lock', 'isolation.not-in-sight', 'isolation.no-load-break'];
const traced: Panel = {
  ...faultyPanel,
  groups: faultyPanel.groups.map((group) => ({ ...group, supply: group.supply ?? 'S24' })),
};
const sitePanels = [healthyPanel, mixedPanel];
const isolationAsFound = isolationFindings(faultyPanel, ['DI1.01'], { sitePanels });
const isolationTraced = isolationFindings(traced, ['DI1.01'], { sitePanels });
const isolationSaid = [...isolationAsFound, ...isolationTraced];

describe('the faulty panel of the demo', () => {
  test('fits the schema', () => {
    expect(panelSchema.safeParse(faultyPanel).error).toBeUndefined();
  });

  test('has a finding of every registered rule, beyond a missing datum', () => {
    const all = [...rules.map(({ id }) => id), 'data.missing'];
    expect(all.filter((rule) => !triggered(rule))).toEqual([]);
  });

  test('has every isolation finding, those of a lock plan once its one unknown supply is traced', () => {
    const asFound = new Set(isolationAsFound.map(({ rule }) => rule));
    const oncePlanned = new Set(isolationTraced.map(({ rule }) => rule));
    expect(isolationRules.filter((rule) => !asFound.has(rule))).toEqual(planTells);
    expect(planTells.filter((rule) => !oncePlanned.has(rule))).toEqual([]);
    expect([...asFound, ...oncePlanned].filter((rule) => !isolationRules.includes(rule))).toEqual([]);
  });

  test.each(['en', 'es'] as const)('reads in %s: findings, remedies, titles and quantities', (language) => {
    for (const { says, remedy, because, rule } of [...wiring, ...isolationSaid]) {
      expect(render(language, says)).not.toMatch(/[{}]|undefined|NaN/);
      if (remedy) expect(render(language, remedy.says)).not.toMatch(/[{}]|undefined|NaN/);
      for (const { name, value } of because) {
        expect(messageOf(language, name), name).toBeDefined();
        expect(Number.isFinite(value), `${rule} ${name}`).toBe(true);
      }
    }
    for (const { title } of rules) expect(messageOf(language, title), title).toBeDefined();
  });
});
