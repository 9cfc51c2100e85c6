/** Where in the checklist a step is: "Point 2 of 4 · step 5 of 9" or "Part 2 of 3 · reading 4 of 10". */
import type { Checklist, Stage, Step } from '../../../../shared/checklist/types';

export type Place =
  | { in: 'point'; point: number; points: number; step: number; steps: number }
  | { in: 'part'; part: number; parts: number; step: number; steps: number; readings: boolean };

// These stages are walked point by point; the others part by part.
const byPoint: ReadonlySet<Stage> = new Set(['wire', 'check-cold', 'prove-points']);

const within = (list: Step[], step: Step) => ({
  step: list.findIndex(({ id }) => id === step.id) + 1,
  steps: list.length,
});

/** Steps of a point in scope are counted by point, all others by the part of their stage. */
export function placeLine(checklist: Checklist, step: Step): Place {
  const stage = checklist.steps.filter((each) => each.stage === step.stage);
  const point = step.where?.point;
  const points = [...new Set(stage.flatMap(({ where }) => (where?.point ? [where.point] : [])))];
  if (point !== undefined && byPoint.has(step.stage))
    return {
      in: 'point',
      point: points.indexOf(point) + 1,
      points: points.length,
      ...within(
        stage.filter(({ where }) => where?.point === point),
        step,
      ),
    };
  const part = stage.filter((each) => each.part === step.part);
  return {
    in: 'part',
    part: step.part,
    parts: Math.max(...stage.map((each) => each.part)),
    readings: part.every(({ ask }) => ask.kind === 'reading'),
    ...within(part, step),
  };
}
