/** The isolators of a job in opening order: the plan's, then the valves, blocks and pins of other energy. */
import type { PlannedIsolator } from '../isolation/types';
import type { Isolator, Source } from '../panel/panelSchema';
import type { ChecklistInput, IsolatorFacts } from './facts';

const asPlanned = (isolator: Isolator): PlannedIsolator => ({
  isolator,
  tell: isolator.alsoFeeds ?? [],
  afterDoor: isolator.operatedFrom === 'door-open',
  currentMustBeZero: false,
  extraMeasure: isolator.lock === 'cannot-lock',
});

/** @throws Error when a source of the plan names an isolator that the panel does not have. */
export function plannedIsolators({ panel, cabinet = panel, plan }: ChecklistInput): IsolatorFacts[] {
  const planned = new Map(plan.isolators.map((each) => [each.isolator.tag, each]));
  const held = new Map<string, Source>();
  for (const source of plan.otherEnergy)
    for (const tag of source.isolators ?? []) if (!held.has(tag)) held.set(tag, source);

  const electrical = plan.isolators
    .filter(({ isolator }) => !held.has(isolator.tag))
    .map((each): IsolatorFacts => ({
      ...each,
      restoredIn: each.isolator.purpose === 'motive' ? 'restore-motion' : 'close',
    }));
  const others = [...held].map(([tag, holds]): IsolatorFacts => {
    const isolator = cabinet.isolators.find((each) => each.tag === tag);
    if (!isolator)
      throw new Error(`source ${holds.tag} names isolator ${tag}, which the panel does not have`);
    return { ...(planned.get(tag) ?? asPlanned(isolator)), holds, restoredIn: 'restore-motion' };
  });
  return [...electrical, ...others];
}
