/** What the isolation checks look at, worked out once. */
import type { Panel } from '../../panel/panelSchema';
import { energyGraph, withoutTerminals } from '../energyGraph';
import { lockPlan } from '../lockPlan';
import { reachIn } from '../reach';
import type { LockPlan, Reach } from '../types';
import { workedSupplies } from '../workedTerminals';
import type { Finding } from '../../rules/finding';

export interface IsolationContext {
  panel: Panel;
  scope: readonly string[];
  /** Supplies that must be dead for this scope. */
  workedSupplies: ReadonlySet<string>;
  plan: LockPlan | null;
  /** Supplies and commons with everything open that can be opened. */
  allOpen: Reach;
  /** Supplies and commons with only the panel's own disconnect open. */
  disconnectOpen: Reach;
}
export type IsolationCheck = (context: IsolationContext) => Finding[];

export function isolationContext(
  panel: Panel,
  scope: readonly string[],
  plan: LockPlan | null = lockPlan(panel, scope),
): IsolationContext {
  const graph = withoutTerminals(energyGraph(panel));
  const every = new Set(panel.isolators.map((one) => one.tag));
  const own = new Set(panel.disconnect === null ? [] : [panel.disconnect]);
  return {
    panel,
    scope,
    workedSupplies: workedSupplies(panel, scope),
    plan,
    allOpen: reachIn(panel, graph, every),
    disconnectOpen: reachIn(panel, graph, own),
  };
}
