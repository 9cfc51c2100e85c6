/** What a job on these points would be: as-found plan, findings in its scope, what blocks it, its checklist. */
import type { SiteView } from '../../../shared/api/sites';
import { generateChecklist } from '../../../shared/checklist/generate';
import type { Checklist } from '../../../shared/checklist/types';
import { asFound } from '../../../shared/isolation/asFound';
import { deadTests } from '../../../shared/isolation/deadTests';
import { isolationReport } from '../../../shared/isolation/isolationFindings';
import { lockPlan } from '../../../shared/isolation/lockPlan';
import { stillLive } from '../../../shared/isolation/stillLive';
import type { LockPlan, StillLive, Wait } from '../../../shared/isolation/types';
import { waits } from '../../../shared/isolation/waits';
import type { Panel } from '../../../shared/panel/panelSchema';
import { say, type Text } from '../../../shared/panel/says';
import { blocking } from '../../../shared/rules/blocking';
import type { CouldNotRun, Finding, Findings } from '../../../shared/rules/finding';
import { findingsInScope } from '../../../shared/rules/findingsInScope';
import { ruleSetVersion } from '../../../shared/rules/registry';
import { acceptanceOf, type GivenAcceptance } from '../panels/findingView';
import { searchClock } from '../panels/wholePanel';

export interface JobChoice {
  panel: Panel;
  panelDigest: string;
  /** What the wiring rules of this version say about the whole panel. */
  wiring: Findings;
  /** The revision that was last built, when it is another one. */
  asBuilt: Panel | undefined;
  sitePanels: readonly Panel[];
  points: readonly string[];
  site: SiteView;
  acceptances: readonly GivenAcceptance[];
}

export interface ScopedFinding {
  finding: Finding;
  accepted: GivenAcceptance | undefined;
  needsAcceptance: boolean;
}

export interface PreparedJob {
  /** In the panel's order, each once. */
  points: string[];
  blocked: { code: 'no-points' | 'unknown-point' | 'no-plan' | 'hurts'; says: Text }[];
  plan: LockPlan | null;
  stillLive: StillLive[];
  waits: Wait[];
  findings: ScopedFinding[];
  checks: number;
  couldNotRun: CouldNotRun[];
  checklist: Checklist | null;
}

const nothing = (blocked: PreparedJob['blocked']): PreparedJob => ({
  points: [],
  blocked,
  plan: null,
  stillLive: [],
  waits: [],
  findings: [],
  checks: 0,
  couldNotRun: [],
  checklist: null,
});

function strangePoints({ panel, points }: JobChoice): PreparedJob['blocked'] {
  const known = new Set(panel.points.map(({ address }) => address));
  if (points.length === 0) return [{ code: 'no-points', says: say('reason.no-points') }];
  return points
    .filter((address) => !known.has(address))
    .map((point) => ({ code: 'unknown-point' as const, says: say('reason.unknown-point', { point }) }));
}

/** What cannot run where the job works: the same question as for a finding. */
const inScope = (
  panel: Panel,
  lacks: readonly CouldNotRun[],
  scope: readonly string[],
  isolators?: string[],
) => {
  const asFindings = lacks.map((lack) => ({
    ...lack,
    harm: 'doubt' as const,
    says: say(lack.missing),
    because: [],
  }));
  const kept = new Set<Finding>(findingsInScope(panel, asFindings, scope, isolators));
  return lacks.filter((_lack, index) => {
    const finding = asFindings[index];
    return finding !== undefined && kept.has(finding);
  });
};

const scoped = (finding: Finding, acceptances: readonly GivenAcceptance[]): ScopedFinding => {
  const accepted = acceptanceOf(finding, acceptances);
  const how = blocking(finding);
  return { finding, accepted, needsAcceptance: (how === 'by-name' || how === 'by-rule') && !accepted };
};

const blockedBy = (findings: readonly ScopedFinding[]): PreparedJob['blocked'] =>
  findings
    .filter(({ finding }) => blocking(finding) === 'never-accepted')
    .map(({ finding }) => ({
      code: finding.rule === 'isolation.none' ? ('no-plan' as const) : ('hurts' as const),
      says: finding.says,
    }));

/** Pure but for the clock that bounds the search of the plan. */
export function prepareJob(choice: JobChoice): PreparedJob {
  const strange = strangePoints(choice);
  if (strange.length > 0) return nothing(strange);
  const { panel, wiring } = choice;
  const { settings } = choice.site;
  const wanted = new Set(choice.points);
  const scope = [...new Set(panel.points.map(({ address }) => address))].filter((each) => wanted.has(each));
  // The cabinet may still hold what the paper has lost: everything that isolates asks both revisions.
  const cabinet = asFound(panel, choice.asBuilt);
  const plan = lockPlan(cabinet, scope, { mayGoOn: searchClock() });
  const isolation = isolationReport(cabinet, scope, { plan, sitePanels: choice.sitePanels });
  const isolators = plan?.isolators.map(({ isolator }) => isolator.tag);
  const all = [...wiring.findings, ...isolation.findings];
  const findings = findingsInScope(cabinet, all, scope, isolators).map((each) =>
    scoped(each, choice.acceptances),
  );
  const own = new Set(panel.disconnect === null ? [] : [panel.disconnect]);
  const live = stillLive(cabinet, own);
  const pauses = waits(cabinet, scope);
  const made = {
    panel,
    cabinet,
    panelDigest: choice.panelDigest,
    ruleSet: ruleSetVersion,
    scope,
    findings: findings.map(({ finding }) => finding),
    stillLive: live,
    waits: pauses,
    settings,
  };
  return {
    points: scope,
    blocked: blockedBy(findings),
    plan,
    stillLive: live,
    waits: pauses,
    findings,
    checks: wiring.checks + isolation.checks,
    couldNotRun: inScope(cabinet, [...wiring.couldNotRun, ...isolation.couldNotRun], scope, isolators),
    checklist: plan
      ? generateChecklist({ ...made, plan, deadTests: deadTests(cabinet, scope, plan, settings.deadLimitV) })
      : null,
  };
}
