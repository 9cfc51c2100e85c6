/** Everything the isolation engine has to say about a panel and a scope. */
import type { Panel } from '../panel/panelSchema';
import type { Finding } from '../rules/finding';
import { isolationContext } from './findings/context';
import type { IsolationCheck } from './findings/context';
import { noPlan } from './findings/noPlan';
import { controlDevice, onePole } from './findings/onlyMeans';
import { otherEnergyHeld } from './findings/otherEnergyHeld';
import { cannotLock, noLoadBreak, notInSight } from './findings/planTells';
import { sameTagDiffers } from './findings/sameTagDiffers';
import { foreignVoltage, redundantFeed, storedUnknown, ups } from './findings/supplyTells';
import { derivedLoop, noFeed } from './findings/withoutSource';
import { byCodeUnits } from './inOrder';
import type { LockPlan } from './types';

/** In the order in which they are shown: what hurts first. */
export const isolationChecks: IsolationCheck[] = [
  noPlan,
  noFeed,
  derivedLoop,
  onePole,
  controlDevice,
  otherEnergyHeld,
  cannotLock,
  foreignVoltage,
  storedUnknown,
  redundantFeed,
  ups,
  notInSight,
  noLoadBreak,
];

export interface IsolationFindingsOptions {
  /** The plan, when the caller has it; else it is made. */
  plan?: LockPlan | null;
  /** The site's other panels, for devices that two of them describe. */
  sitePanels?: readonly Panel[];
}

/** In a fixed order and each once: the order of rows in the file changes nothing. */
function settled(findings: Finding[]): Finding[] {
  const keyed = new Map(findings.map((finding) => [JSON.stringify([finding.where, finding.says]), finding]));
  return [...keyed].sort(([a], [b]) => byCodeUnits(a, b)).map(([, finding]) => finding);
}

/**
 * The findings of isolation.md for work on these points. Findings about isolators are those of the scope's plan.
 * @throws Error when the scope names an unknown address.
 */
export function isolationFindings(
  panel: Panel,
  scope: readonly string[],
  options: IsolationFindingsOptions = {},
): Finding[] {
  const context = isolationContext(panel, scope, options.plan);
  return [
    ...isolationChecks.flatMap((check) => settled(check(context))),
    ...settled(sameTagDiffers(panel, options.sitePanels ?? [])),
  ];
}
