/** Panel, plan and findings → the checklist of one job. Pure: the same input gives the same bytes everywhere. */
import { factsOf, type ChecklistInput } from './facts';
import { intoParts } from './intoParts';
import { stageBlocks } from './stageBlocks';
import { stages, type Checklist } from './types';

/**
 * Makes the checklist that the pack of a job carries.
 * @throws Error when the scope names a point that the panel does not have, or two steps would share an id.
 */
export function generateChecklist(input: ChecklistInput): Checklist {
  const facts = factsOf(input);
  const steps = stages.map((stage) => intoParts(stageBlocks[stage](facts))).flat();
  const ids = new Set<string>();
  for (const { id } of steps) {
    if (ids.has(id)) throw new Error(`two steps share the id ${id}`);
    ids.add(id);
  }
  return {
    format: 'coldloop-checklist/1',
    ruleSet: input.ruleSet,
    panelDigest: input.panelDigest,
    scope: facts.points.map(({ point }) => point.address),
    isolators: facts.isolators.map(({ isolator }) => isolator.tag),
    steps,
  };
}
