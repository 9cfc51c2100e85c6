/** Everything the engines find in a whole panel. */
import { isolationReport } from '../../../shared/isolation/isolationFindings';
import { lockPlan } from '../../../shared/isolation/lockPlan';
import type { Panel } from '../../../shared/panel/panelSchema';
import { checkWiring } from '../../../shared/rules/checkWiring';
import type { Findings } from '../../../shared/rules/finding';

/** isolation.md §2: past 24 isolators the search may stop here with the best set found. */
const searchMs = 2_000;

/** A clock for the search of a lock plan, started when it is made. */
export function searchClock(): () => boolean {
  const until = Date.now() + searchMs;
  return () => Date.now() < until;
}

export function wholePanel(panel: Panel, sitePanels: readonly Panel[]): Findings {
  const scope = [...new Set(panel.points.map(({ address }) => address))];
  const wiring = checkWiring(panel);
  const plan = lockPlan(panel, scope, { mayGoOn: searchClock() });
  const isolation = isolationReport(panel, scope, { plan, sitePanels });
  return {
    findings: [...wiring.findings, ...isolation.findings],
    checks: wiring.checks + isolation.checks,
    couldNotRun: [...wiring.couldNotRun, ...isolation.couldNotRun],
  };
}
