/** A panel file in, everything the engines say about it out: findings, lock plan, still-live picture, checklist. */
import { deadTests } from '../isolation/deadTests';
import { isolationReport } from '../isolation/isolationFindings';
import { lockPlan } from '../isolation/lockPlan';
import { stillLive } from '../isolation/stillLive';
import type { DeadTest, LockPlan, StillLive, Wait } from '../isolation/types';
import { waits } from '../isolation/waits';
import { digestOf } from '../panel/canonical';
import { panelProblems, type PanelProblem } from '../panel/panelIssue';
import type { Panel } from '../panel/panelSchema';
import { checkWiring } from '../rules/checkWiring';
import type { Finding, Findings } from '../rules/finding';
import { findingsInScope } from '../rules/findingsInScope';
import { ruleSetVersion } from '../rules/registry';
import type { ChecklistInput } from './facts';
import { generateChecklist } from './generate';
import { stages, type Checklist, type Stage } from './types';

export interface PanelCheckInput {
  panel: Panel;
  /** Addresses of the points to be worked; absent: all of them. */
  scope?: readonly string[] | undefined;
  /** Isolators to take as open for the still-live picture; absent: the panel's own disconnect. */
  open?: readonly string[] | undefined;
  /** The other panels of the site, where they are known. */
  sitePanels?: readonly Panel[] | undefined;
  /** For a caller with a clock: false stops the search for the plan past 24 isolators. */
  mayGoOn?: (() => boolean) | undefined;
  /** Of the site; absent: what a site starts with. */
  settings?: ChecklistInput['settings'] | undefined;
}

export interface PanelCheckResult extends Findings {
  panel: string;
  digest: string;
  ruleSet: string;
  scope: string[];
  /** Why this file cannot be issued as a revision yet. */
  problems: PanelProblem[];
  /** Null: no set of isolators makes the scope safe. */
  plan: LockPlan | null;
  stillLive: StillLive[];
  deadTests: DeadTest[];
  waits: Wait[];
  /** Null without a plan, or while `problems` stand: a job is made from an issued revision only. */
  checklist: Checklist | null;
}

const usualSettings: ChecklistInput['settings'] = {
  deadLimitV: 1,
  permitAsked: true,
  ferruleScheme: 'DIN 46228-4',
};

/** Paths and reasons why the scope or the open isolators do not belong to this panel; empty when they do. */
export function unknownNames({ panel, scope, open }: PanelCheckInput): PanelProblem[] {
  const points = new Set(panel.points.map(({ address }) => address));
  const isolators = new Set(panel.isolators.map(({ tag }) => tag));
  const strange = (path: string, names: readonly string[], known: Set<string>, what: string) =>
    names.flatMap((name, index) =>
      known.has(name) ? [] : [{ path: `${path}.${index}`, says: `no ${what} "${name}" in this panel` }],
    );
  return [
    ...strange('scope', scope ?? [], points, 'point'),
    ...strange('open', open ?? [], isolators, 'isolator'),
  ];
}

/** How many steps each stage has, stages without one included. */
export function stepsByStage(checklist: Checklist | null): { stage: Stage; steps: number }[] {
  const counts = new Map<Stage, number>();
  for (const { stage } of checklist?.steps ?? []) counts.set(stage, (counts.get(stage) ?? 0) + 1);
  return stages.map((stage) => ({ stage, steps: counts.get(stage) ?? 0 }));
}

/** True when something found can hurt someone. */
export const canHurt = (findings: readonly Finding[]): boolean =>
  findings.some(({ harm }) => harm === 'hurts');

/**
 * Runs every engine over one panel. Findings are those of the scope; without one, all.
 * @throws Error when `scope` names an address that the panel does not have: ask `unknownNames` first.
 */
export function checkPanel(input: PanelCheckInput): PanelCheckResult {
  const { panel, settings = usualSettings } = input;
  const scope = [...new Set(input.scope ?? panel.points.map(({ address }) => address))];
  const plan = lockPlan(panel, scope, input.mayGoOn ? { mayGoOn: input.mayGoOn } : {});
  const wiring = checkWiring(panel);
  const isolation = isolationReport(panel, scope, { plan, sitePanels: input.sitePanels });
  const all = [...wiring.findings, ...isolation.findings];
  const planned = plan?.isolators.map(({ isolator }) => isolator.tag);
  const problems = panelProblems(panel);
  const own = panel.disconnect === null ? [] : [panel.disconnect];
  const made = {
    panel,
    panelDigest: digestOf(panel),
    ruleSet: ruleSetVersion,
    scope,
    findings: input.scope ? findingsInScope(panel, all, scope, planned) : all,
    stillLive: stillLive(panel, new Set(own)),
    deadTests: plan ? deadTests(panel, scope, plan, settings.deadLimitV) : [],
    waits: waits(panel, scope),
    settings,
  };
  return {
    panel: panel.tag,
    digest: made.panelDigest,
    ruleSet: made.ruleSet,
    scope,
    problems,
    checks: wiring.checks + isolation.checks,
    couldNotRun: [...wiring.couldNotRun, ...isolation.couldNotRun],
    findings: made.findings,
    plan,
    stillLive: input.open ? stillLive(panel, new Set(input.open)) : made.stillLive,
    deadTests: made.deadTests,
    waits: made.waits,
    checklist: plan && problems.length === 0 ? generateChecklist({ ...made, plan }) : null,
  };
}
