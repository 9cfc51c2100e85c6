/** Panels with all their points in scope and what the engines say of them, as the server hands it to the generator. */
import type { ChecklistInput } from '../../shared/checklist/facts';
import { deadTests } from '../../shared/isolation/deadTests';
import { lockPlan } from '../../shared/isolation/lockPlan';
import { stillLive } from '../../shared/isolation/stillLive';
import { waits } from '../../shared/isolation/waits';
import { digestOf } from '../../shared/panel/canonical';
import { panelSchema, type Panel } from '../../shared/panel/panelSchema';
import { smallPanel } from './smallPanel';

const modules = import.meta.glob<Record<string, unknown>>('../../server/commands/demo/panels/*.ts', {
  eager: true,
});

/** Every panel that a module of the demo exports, or makes when called without arguments. */
function demoPanels(): Panel[] {
  const exported = Object.values(modules).flatMap((module) => Object.values(module));
  const made = exported.map((each) =>
    typeof each === 'function' && each.length === 0 ? (each as () => unknown)() : each,
  );
  return made.flatMap((each) => {
    const parsed = panelSchema.safeParse(each);
    return parsed.success ? [parsed.data] : [];
  });
}

/** Undefined for a panel that no set of isolators makes safe: no job may start on it. */
export function engineInput(panel: Panel): ChecklistInput | undefined {
  const scope = panel.points.map(({ address }) => address);
  const plan = lockPlan(panel, scope);
  if (!plan) return undefined;
  return {
    panel,
    panelDigest: digestOf(panel),
    ruleSet: 'example-1',
    scope,
    findings: [],
    plan,
    stillLive: stillLive(panel, new Set(panel.disconnect === null ? [] : [panel.disconnect])),
    deadTests: deadTests(panel, scope, plan, 1),
    waits: waits(panel, scope),
    settings: { deadLimitV: 1, permitAsked: true, ferruleScheme: 'DIN 46228-4' },
  };
}

/** The small panel and those of the demo, by name; panels without a safe plan are left out. */
export const inputsOfPanels = (): [string, ChecklistInput][] =>
  [smallPanel(), ...demoPanels()].flatMap((panel): [string, ChecklistInput][] => {
    const input = engineInput(panel);
    return input ? [[`${panel.tag} ${panel.name}`, input]] : [];
  });
