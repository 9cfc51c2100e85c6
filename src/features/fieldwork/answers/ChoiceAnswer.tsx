import { useState } from 'react';
import { RadioList } from '../../../components/field/RadioList';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** What was found, out of a few; the button repeats it. Nothing is chosen beforehand. */
export function ChoiceAnswer({ step }: { step: StepOf<'choice'> }) {
  const { t } = useWords();
  const { plain } = useFieldJob();
  const { answer, saving, failed } = useAnswer(step);
  const [value, setValue] = useState<string>();
  const options = step.ask.options.map((option) => ({ value: option.value, label: plain(option.label) }));
  const label = options.find((option) => option.value === value)?.label;
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <RadioList legend={t('field.choice.found')} options={options} chosen={value} onChoose={setValue} />
      }
      primary={
        <SaveButton
          saving={saving}
          disabled={value === undefined}
          onSave={async () => {
            if (value !== undefined) await answer({ kind: 'choice', value });
          }}
        >
          {label === undefined ? t('field.choice.choose') : t('field.saveValue', { value: label })}
        </SaveButton>
      }
    />
  );
}
