/** What is gone on paper still hangs in the cabinet: the tester is proved for it, and no description of it is lost. */
import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../../shared/checklist/generate';
import type { Step } from '../../../shared/checklist/types';
import { asFound } from '../../../shared/isolation/asFound';
import { deadTests } from '../../../shared/isolation/deadTests';
import { lockPlan } from '../../../shared/isolation/lockPlan';
import { waits } from '../../../shared/isolation/waits';
import type { Panel, Supply } from '../../../shared/panel/panelSchema';
import { dc24, supply } from '../isolation/parts';
import { smallPanel } from '../../support/smallPanel';

const scope = ['DI3.02'];
const stepsOf = (panel: Panel, asBuilt: Panel): Step[] => {
  const cabinet = asFound(panel, asBuilt);
  const plan = lockPlan(cabinet, scope);
  if (!plan) throw new Error('no plan');
  return generateChecklist({
    panel,
    cabinet,
    panelDigest: 'a'.repeat(64),
    ruleSet: 'test',
    scope,
    findings: [],
    plan,
    stillLive: [],
    deadTests: deadTests(cabinet, scope, plan),
    waits: waits(cabinet, scope),
    settings: { deadLimitV: 1, permitAsked: false, ferruleScheme: 'DIN 46228-4' },
  }).steps;
};

/** The small panel with one more supply in the cabinet, which the new revision does not have. */
const before = (more: Supply): Panel => {
  const panel = smallPanel();
  return { ...panel, supplies: [...panel.supplies, more] };
};
const provedAt = (steps: Step[], unit: string): number[] =>
  steps.flatMap(({ stage, family, ask }) =>
    stage === 'prove-dead' && family === 'tester-proved' && ask.kind === 'reading' && ask.unit === unit
      ? [ask.low ?? 0]
      : [],
  );

describe('a supply that only the last built revision has', () => {
  const steps = stepsOf(smallPanel(), before(dc24('OLD', [['MCC-2', 'F7']], { V: 600, extraLow: 'none' })));

  test('is read dead', () => {
    expect(steps.some(({ ask }) => ask.kind === 'reading' && ask.dead?.supply === 'OLD')).toBe(true);
  });
  test('has the tester proved at its voltage, never at 0 V', () => {
    expect(provedAt(steps, 'V DC')).toContain(300);
    expect(Math.min(...provedAt(steps, 'V DC'), ...provedAt(steps, 'V AC'))).toBeGreaterThan(0);
  });
  test('asks for a tester that bears it', () => {
    const [tester] = steps.flatMap(({ ask }) => (ask.kind === 'instrument' ? [ask] : []));
    expect(tester?.minV).toBe(600);
  });
});

describe('a supply that both revisions have, described differently', () => {
  const now = smallPanel();
  const was = smallPanel();
  was.supplies = was.supplies.map((each) =>
    each.tag === 'S230'
      ? supply('S230', [['MCC-2', 'F7']], { V: 400, terminals: { L: 'X3:1', N: 'X3:2' } })
      : each.tag === 'S24'
        ? { ...each, bulk: { uF: 90000, bleedOhm: 1000 } }
        : each,
  );
  const steps = stepsOf(now, was);

  test('waits once, for the longer of both', () => {
    const found = steps.flatMap(({ id, ask }) => (id === 'dead.wait.S24' ? [ask] : []));
    const alone = stepsOf(now, now).flatMap(({ id, ask }) => (id === 'dead.wait.S24' ? [ask] : []));
    const seconds = (asks: Step['ask'][]) => asks.map((ask) => (ask.kind === 'wait' ? ask.seconds : 0));
    expect(found).toHaveLength(1);
    expect(seconds(found)[0]).toBeGreaterThan(seconds(alone)[0] ?? 0);
  });
  test('has the tester proved at both voltages', () => {
    expect(provedAt(steps, 'V AC')).toEqual(expect.arrayContaining([115, 200]));
  });
});
