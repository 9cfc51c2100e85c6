/** The lock plan against trying every set, on 500 random panels. */
import { describe, expect, it } from 'vitest';
import { deadTests } from '../../../shared/isolation/deadTests';
import { isolationFindings } from '../../../shared/isolation/isolationFindings';
import { lockPlan, stillWorked } from '../../../shared/isolation/lockPlan';
import { reach } from '../../../shared/isolation/reach';
import { stillLive } from '../../../shared/isolation/stillLive';
import { workedTerminals } from '../../../shared/isolation/workedTerminals';
import type { Panel } from '../../../shared/panel/panelSchema';
import { naive, naivePlan } from './naivePlan';
import { random, randomPanel } from './randomPanel';
import type { Random } from './randomPanel';

const seeds = Array.from({ length: 500 }, (_, index) => index + 1);
const tagsOf = (plan: ReturnType<typeof lockPlan>) =>
  plan?.isolators.map(({ isolator }) => isolator.tag).sort() ?? null;

function shuffled<T>(items: readonly T[], r: Random): T[] {
  const left = [...items];
  return items.map(() => left.splice(r.below(left.length), 1)[0]).filter((one) => one !== undefined);
}
const shuffledPanel = (panel: Panel, r: Random): Panel => ({
  ...panel,
  sources: shuffled(panel.sources, r),
  isolators: shuffled(panel.isolators, r),
  supplies: shuffled(panel.supplies, r).map((one) => ({ ...one, feeds: shuffled(one.feeds, r) })),
  modules: shuffled(panel.modules, r),
  groups: shuffled(panel.groups, r),
  points: shuffled(panel.points, r),
});

describe('500 random panels of at most 10 isolators', () => {
  it('hold what the plan has to be tried on', () => {
    const panels = seeds.map((seed) => randomPanel(seed));
    const count = (holds: (panel: Panel) => boolean) => panels.filter(({ panel }) => holds(panel)).length;
    const plans = panels.map(({ panel, scope }) => lockPlan(panel, scope));
    expect(plans.filter((plan) => plan === null).length).toBeGreaterThan(50);
    expect(plans.filter((plan) => plan !== null && plan.isolators.length > 1).length).toBeGreaterThan(100);
    expect(plans.filter((plan) => plan !== null && plan.guarded.length > 0).length).toBeGreaterThan(10);
    expect(count((panel) => panel.supplies.some((one) => one.feeds.length > 1))).toBeGreaterThan(200);
    expect(count((panel) => panel.isolators.some((one) => one.opens === 'one-conductor'))).toBeGreaterThan(
      100,
    );
    expect(count((panel) => panel.isolators.some((one) => one.kind === 'contactor'))).toBeGreaterThan(50);
    expect(count((panel) => panel.groups.some((one) => one.linkedTo !== undefined))).toBeGreaterThan(40);
  });

  it('reach agrees with asking upwards, supply by supply', () => {
    for (const seed of seeds) {
      const { panel, scope, random: r } = randomPanel(seed);
      const { alive } = naive(panel, scope);
      for (let round = 0; round < 8; round += 1) {
        const open = new Set(panel.isolators.filter(() => r.chance(0.5)).map((one) => one.tag));
        const expected = panel.supplies.map((one) => one.tag).filter((tag) => alive(tag, open));
        expect([...reach(panel, open).supplies.keys()].sort(), `seed ${seed}`).toEqual(expected.sort());
      }
    }
  });

  it('the plan is the least set, ties included, or there is none', () => {
    for (const seed of seeds) {
      const { panel, scope } = randomPanel(seed);
      const plan = lockPlan(panel, scope);
      const expected = naivePlan(panel, scope);
      expect(tagsOf(plan), `seed ${seed}`).toEqual(expected?.tags ?? null);
      expect(plan?.weight ?? null, `seed ${seed}`).toEqual(expected?.weight ?? null);
      expect(plan?.proven ?? true).toBe(true);
    }
  });

  it('taking any isolator away leaves something reachable', () => {
    let taken = 0;
    for (const seed of seeds) {
      const { panel, scope } = randomPanel(seed);
      const tags = tagsOf(lockPlan(panel, scope)) ?? [];
      const worked = workedTerminals(panel, scope);
      for (const tag of tags) {
        const without = new Set(tags.filter((one) => one !== tag));
        expect(stillWorked(reach(panel, without), worked), `seed ${seed} without ${tag}`).not.toEqual([]);
        taken += 1;
      }
    }
    expect(taken).toBeGreaterThan(300);
  });

  it('never uses a control device or one not made for isolation', () => {
    for (const seed of seeds) {
      const { panel, scope } = randomPanel(seed);
      for (const { isolator } of lockPlan(panel, scope)?.isolators ?? [])
        expect([isolator.suitableForIsolation, isolator.kind === 'contactor']).toEqual([true, false]);
    }
  });

  it('the order of the file changes no answer', () => {
    for (const seed of seeds) {
      const { panel, scope } = randomPanel(seed);
      const r = random(seed + 10_000);
      const other = shuffledPanel(panel, r);
      const otherScope = shuffled(scope, r);
      const plan = lockPlan(panel, scope);
      const otherPlan = lockPlan(other, otherScope);
      const open = new Set(panel.isolators.slice(0, 2).map((one) => one.tag));
      expect(otherPlan, `seed ${seed}`).toEqual(plan);
      expect(stillLive(other, open), `seed ${seed}`).toEqual(stillLive(panel, open));
      expect(isolationFindings(other, otherScope), `seed ${seed}`).toEqual(isolationFindings(panel, scope));
      if (plan && otherPlan)
        expect(deadTests(other, otherScope, otherPlan), `seed ${seed}`).toEqual(
          deadTests(panel, scope, plan),
        );
    }
  });
});
