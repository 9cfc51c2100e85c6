import type { Stage } from '../../../../shared/checklist/types';
import { StageStrip } from '../../../components/field/StageStrip';
import { TitleStrip } from '../../../components/field/TitleStrip';
import { useWords } from '../../../components/words';
import { stageCells, stageWords } from './stageCells';
import { useFieldJob } from './useFieldJob';

/** The title block of the job and its stages: the head of every page of the job. */
export function JobHeader({ stage }: { stage?: Stage }) {
  const { t } = useWords();
  const { pack, state } = useFieldJob();
  const { panel } = pack;
  const cells = stageCells(state, t, stage);
  return (
    <>
      <TitleStrip
        cells={[
          { label: t('field.title.panel'), value: panel.tag, note: panel.name },
          { label: t('field.title.drawing'), value: `${panel.drawing.number} ${panel.drawing.revision}` },
          { label: t('field.title.round'), value: String(state.round.number) },
        ]}
      />
      <StageStrip cells={cells} words={stageWords(cells, t)} />
    </>
  );
}
