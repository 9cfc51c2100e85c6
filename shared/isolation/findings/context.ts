/** What the isolation checks look at, worked out once. */
import type { Panel } from '../../panel/panelSchema';
import { energyGraph } from '../energyGraph';
import { lockPlan } from '../lockPlan';
import { reachIn } from '../reach';
import type { LockPlan, Reach } from '../types';
import { workedTerminals } from '../workedTerminals';
import type { Worked } from '../workedTerminals';
import type { Finding } from '../../rules/finding';

export interface IsolationContext {
  panel: Panel;
  worked: Worked;
  plan: LockPlan | null;
  /** With everything open that can be opened. */
  allOpen: Reach;
  /** With only the panel's own disconnect open. */
  disconnectOpen: Reach;
}
export type IsolationCheck = (context: IsolationContext) => Finding[];

export function isolationContext(
  panel: Panel,
  scope: readonly string[],
  plan: LockPlan | null = lockPlan(panel, scope),
): IsolationContext {
  const graph = energyGraph(panel);
  const every = new Set(panel.isolators.map((one) => one.tag));
  const own = new Set(panel.disconnect === null ? [] : [panel.disconnect]);
  return {
    panel,
    worked: workedTerminals(panel, scope),
    plan,
    allOpen: reachIn(panel, graph, every),
    disconnectOpen: reachIn(panel, graph, own),
  };
}
