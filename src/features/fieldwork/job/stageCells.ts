import type { JobState } from '../../../../shared/job/types';
import type { Stage } from '../../../../shared/checklist/types';
import type { StageCell } from '../../../components/field/StageStrip';
import type { useWords } from '../../../components/words';

type Say = ReturnType<typeof useWords>['t'];

/** The stages of a job as the cells of its terminal strip. `here` shows the stage of the step on screen as current. */
export function stageCells(state: JobState, t: Say, here?: Stage): StageCell[] {
  return state.stages.map(({ stage, status }) => {
    const isCurrent = here ? stage === here : status === 'current';
    const shown = status === 'current' ? 'open' : status;
    return { name: t(`field.stage.${stage}`), status: isCurrent ? 'current' : shown };
  });
}

/** The strip in words: "Stage 4 of 11: Wire. 3 done." */
export function stageWords(cells: StageCell[], t: Say): string {
  const index = cells.findIndex(({ status }) => status === 'current');
  const done = cells.filter(({ status }) => status === 'done').length;
  return index < 0
    ? t('field.stages.none', { done, of: cells.length })
    : t('field.stages.at', { number: index + 1, of: cells.length, name: cells[index]?.name ?? '', done });
}
