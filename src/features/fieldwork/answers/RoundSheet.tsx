import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Step } from '../../../../shared/checklist/types';
import { paths } from '../../../app/paths';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { PointTicks } from './PointTicks';

/** A fault found live starts a new round: which points go back through isolation, and what is wrong. */
export function RoundSheet({ step, onClose }: { step: Step; onClose: () => void }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const [points, setPoints] = useState<string[]>(step.where?.point ? [step.where.point] : []);
  const [words, setWords] = useState('');
  async function start() {
    if (await save('round-started', { points, reason: 'fault', words: oneLine(words) }))
      await navigate(paths.myJob(pack.job.id), { state: { saved: step.id } });
  }
  return (
    <Sheet
      title={t('field.out.round')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton
          look="primary"
          disabled={points.length === 0 || !oneLine(words) || saving}
          onClick={() => void start()}
        >
          {t('field.round.start', { n: points.length })}
        </FieldButton>
      }
    >
      <SignalBox signal="danger">{t('field.round.live')}</SignalBox>
      <p className="m-0">{t('field.round.what')}</p>
      <PointTicks chosen={points} onChange={setPoints} />
      <WordsBox label={t('field.round.words')} value={words} onChange={setWords} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
