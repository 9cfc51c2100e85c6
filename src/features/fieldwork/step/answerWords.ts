import type { Step } from '../../../../shared/checklist/types';
import { answerText } from '../../../../shared/job/answerText';
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
  if (value.kind === 'reading')
    return step.ask.kind === 'reading' ? readingWords(value.value, step.ask.unit, t) : String(value.value);
  const found = answerText(step, value);
  return typeof found === 'string' ? found : plain(found);
}
