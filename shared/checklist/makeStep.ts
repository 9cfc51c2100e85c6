/** One step with what its stage implies, so that a family states only what is its own. */
import type { Stage, Step } from './types';

// Steps that touch conductors: each needs own locks and own proof (isolation.md §4).
const onDeadConductors: ReadonlySet<Stage> = new Set(['wire', 'check-cold']);
// What a round always walks through again, whatever points it is for (isolation.md §4, Round).
const walkedEveryRound: ReadonlySet<Stage> = new Set([
  'isolate',
  'prove-dead',
  'close-up',
  'locks-off',
  'close',
]);

type Given = Pick<Step, 'id' | 'stage' | 'family' | 'title' | 'ask'> &
  Partial<Pick<Step, 'detail' | 'warnings' | 'where' | 'by' | 'personal' | 'everyRound' | 'picture'>>;

/** Parts are numbered later, by `intoParts`. Fields are set in one fixed order: a checklist has tens of thousands of these. */
export function makeStep(given: Given): Step {
  const { id, stage, family, title, ask, detail, warnings, where, picture } = given;
  const step: Step = {
    id,
    stage,
    part: 1,
    family,
    title,
    ask,
    by: given.by ?? 'one',
    needsIsolation: onDeadConductors.has(stage),
    everyRound: given.everyRound ?? walkedEveryRound.has(stage),
  };
  if (detail && detail.length > 0) step.detail = detail;
  if (warnings && warnings.length > 0) step.warnings = warnings;
  if (where) step.where = where;
  if (given.personal) step.personal = true;
  if (picture) step.picture = picture;
  return step;
}
