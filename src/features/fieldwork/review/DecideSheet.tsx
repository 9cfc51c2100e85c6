import { useState } from 'react';
import type { BodyOf } from '../../../../shared/job/entry';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { RadioList } from '../../../components/field/RadioList';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useSave } from '../job/useSave';

type Decision = BodyOf<'hold-decided'>['decision'];
const decisions: readonly Decision[] = ['rework', 'accept', 'out-of-scope'];

/** The foreman's word on a hold: done again, accepted with a reason, or taken out of the job. */
export function DecideSheet({ hold, onClose }: { hold: string; onClose: () => void }) {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  const [decision, setDecision] = useState<Decision>();
  const [words, setWords] = useState('');
  async function decide() {
    if (decision && (await save('hold-decided', { hold, decision, words: oneLine(words) }))) onClose();
  }
  return (
    <Sheet
      title={t('field.review.decide')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton
          look="primary"
          disabled={!decision || !oneLine(words) || saving}
          onClick={() => void decide()}
        >
          {t('field.save')}
        </FieldButton>
      }
    >
      <RadioList
        legend={t('field.review.decision')}
        options={decisions.map((value) => ({ value, label: t(`field.decision.${value}`) }))}
        chosen={decision}
        onChoose={setDecision}
      />
      <WordsBox label={t('field.review.why')} value={words} onChange={setWords} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
