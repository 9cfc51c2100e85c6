import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Step } from '../../../../shared/checklist/types';
import type { BodyOf } from '../../../../shared/job/entry';
import { paths } from '../../../app/paths';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { RadioList } from '../../../components/field/RadioList';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';

type Reason = BodyOf<'hold'>['reason'];
const reasons: readonly Reason[] = [
  'cannot-reach',
  'part-missing',
  'part-damaged',
  'drawing-differs',
  'not-safe',
  'out-of-limit',
  'other',
];

interface HoldSheetProps {
  step: Step;
  reason?: Reason;
  onClose: () => void;
}

/** A step somebody could not do: why, from a list and in words. The foreman decides what happens to it. */
export function HoldSheet({ step, reason: first, onClose }: HoldSheetProps) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const navigate = useNavigate();
  const { save, saving, failed } = useSave();
  const [reason, setReason] = useState<Reason | undefined>(first);
  const [words, setWords] = useState('');
  const stops = step.stage === 'isolate' || step.stage === 'prove-dead';
  async function hold() {
    if (!reason) return;
    if (await save('hold', { step: step.id, reason, words: oneLine(words) }))
      await navigate(paths.myJob(pack.job.id), { state: { saved: step.id } });
  }
  return (
    <Sheet
      title={t('field.hold.cant')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton
          look="primary"
          disabled={!reason || !oneLine(words) || saving}
          onClick={() => void hold()}
        >
          {t('field.hold.save')}
        </FieldButton>
      }
    >
      {stops && <SignalBox signal="danger">{t('field.hold.stops')}</SignalBox>}
      <RadioList
        legend={t('field.hold.why')}
        options={reasons.map((value) => ({ value, label: t(`field.hold.${value}`) }))}
        chosen={reason}
        onChoose={setReason}
      />
      <WordsBox label={t('field.hold.words')} value={words} onChange={setWords} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
