/** Panel, plan and findings → the checklist of one job. Pure: the same input gives the same bytes everywhere. */
import { factsOf, type ChecklistInput } from './facts';
import { intoParts } from './intoParts';
import { stageBlocks } from './stageBlocks';
import { stages, type Checklist, type Step } from './types';

function refuseSharedIds(steps: readonly Step[]): void {
  const ids = new Set(steps.map(({ id }) => id));
  if (ids.size === steps.length) return;
  const shared = steps.find(({ id }) => !ids.delete(id));
  throw new Error(`two steps share the id ${shared?.id}`);
}

/**
 * Makes the checklist that the pack of a job carries.
 * @throws Error when the scope names a point that the panel does not have, or two steps would share an id.
 */
export function generateChecklist(input: ChecklistInput): Checklist {
  const facts = factsOf(input);
  const steps = stages.map((stage) => intoParts(stageBlocks[stage](facts))).flat();
  refuseSharedIds(steps);
  return {
    format: 'coldloop-checklist/1',
    ruleSet: input.ruleSet,
    panelDigest: input.panelDigest,
    scope: facts.points.map(({ point }) => point.address),
    isolators: facts.isolators.map(({ isolator }) => isolator.tag),
    steps,
  };
}
