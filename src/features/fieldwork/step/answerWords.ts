import type { Step } from '../../../../shared/checklist/types';
import type { AnswerRecord } from '../../../../shared/job/types';
import type { Text } from '../../../../shared/panel/says';
import type { useWords } from '../../../components/words';
import { readingWords } from './unitWords';

type Say = ReturnType<typeof useWords>['t'];

/** An answer as people read it back: "0.3 V AC", "Black", "Lock 17", "Done". */
export function answerWords(
  step: Step,
  value: AnswerRecord['value'],
  t: Say,
  plain: (text: Text) => string,
): string {
  switch (value.kind) {
    case 'reading':
      return step.ask.kind === 'reading' ? readingWords(value.value, step.ask.unit, t) : String(value.value);
    case 'choice': {
      const option =
        step.ask.kind === 'choice' ? step.ask.options.find((each) => each.value === value.value) : undefined;
      return option ? plain(option.label) : value.value;
    }
    case 'text':
    case 'scan':
      return value.text;
    case 'instrument':
      return `${value.make} ${value.number}`;
    case 'lock':
      return t('field.answer.lock', { lock: value.lock });
    case 'closed':
      return t('field.answer.closed', { counted: value.counted });
    case 'wait':
      return t('field.answer.wait', { seconds: Math.round(value.waitedS) });
    case 'photo':
      return t('field.answer.photo');
    case 'done':
      return t('field.answer.done');
  }
}
