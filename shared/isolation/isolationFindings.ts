/** Everything the isolation engine has to say about a panel and a scope. */
import type { Panel } from '../panel/panelSchema';
import type { Finding, Findings } from '../rules/finding';
import { isolationContext } from './findings/context';
import type { IsolationCheck, IsolationContext } from './findings/context';
import { noPlan } from './findings/noPlan';
import { controlDevice, onePole } from './findings/onlyMeans';
import { otherEnergyHeld } from './findings/otherEnergyHeld';
import { cannotLock, noLoadBreak, notInSight } from './findings/planTells';
import { sameTagDiffers } from './findings/sameTagDiffers';
import { foreignVoltage, redundantFeed, storedUnknown, ups } from './findings/supplyTells';
import { derivedLoop, noFeed } from './findings/withoutSource';
import { byCodeUnits } from './inOrder';
import { otherEnergySources } from './otherEnergy';
import type { LockPlan } from './types';

interface Asked {
  /** How many places of this panel and scope the check has something to ask at. */
  places: (context: IsolationContext) => number;
  check: IsolationCheck;
}

const supplies = ({ panel }: IsolationContext): number => panel.supplies.length;
const devices = ({ panel }: IsolationContext): number => panel.isolators.length;
const planned = ({ plan }: IsolationContext): number => plan?.isolators.length ?? 0;

/** In the order in which they are shown: what hurts first. */
const isolationChecks: Asked[] = [
  { check: noPlan, places: () => 1 },
  { check: noFeed, places: supplies },
  { check: derivedLoop, places: supplies },
  { check: onePole, places: devices },
  { check: controlDevice, places: devices },
  { check: otherEnergyHeld, places: ({ panel }) => otherEnergySources(panel).length },
  { check: cannotLock, places: planned },
  { check: foreignVoltage, places: ({ panel }) => panel.points.length },
  {
    check: storedUnknown,
    places: ({ panel }) => panel.supplies.filter(({ bulk }) => bulk !== 'none').length,
  },
  { check: redundantFeed, places: supplies },
  { check: ups, places: ({ panel }) => panel.sources.length },
  { check: notInSight, places: planned },
  { check: noLoadBreak, places: planned },
];

export interface IsolationFindingsOptions {
  /** The plan, when the caller has it; else it is made. */
  plan?: LockPlan | null | undefined;
  /** The site's other panels, for devices that two of them describe. */
  sitePanels?: readonly Panel[] | undefined;
}

/** In a fixed order and each once: the order of rows in the file changes nothing. */
function settled(findings: Finding[]): Finding[] {
  const keyed = new Map(findings.map((finding) => [JSON.stringify([finding.where, finding.says]), finding]));
  return [...keyed].sort(([a], [b]) => byCodeUnits(a, b)).map(([, finding]) => finding);
}

/**
 * The findings of isolation.md for work on these points, with the count of checks (rule at a place).
 * Findings about isolators are those of the scope's plan.
 * @throws Error when the scope names an unknown address.
 */
export function isolationReport(
  panel: Panel,
  scope: readonly string[],
  options: IsolationFindingsOptions = {},
): Findings {
  const context = isolationContext(panel, scope, options.plan);
  const { sitePanels } = options;
  const outside = panel.isolators.filter(({ inPanel }) => !inPanel);
  return {
    findings: [
      ...isolationChecks.flatMap(({ check }) => settled(check(context))),
      ...settled(sameTagDiffers(panel, sitePanels ?? [])),
    ],
    checks: isolationChecks.reduce((sum, { places }) => sum + places(context), outside.length),
    couldNotRun: sitePanels
      ? []
      : outside.map(({ tag }) => ({
          rule: 'isolation.same-tag-differs',
          where: { isolator: tag },
          missing: 'site.panels',
        })),
  };
}

/** The findings of `isolationReport` alone. */
export const isolationFindings = (
  panel: Panel,
  scope: readonly string[],
  options: IsolationFindingsOptions = {},
): Finding[] => isolationReport(panel, scope, options).findings;
