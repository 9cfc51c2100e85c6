/** An answer as people read it back: "0.3 V AC", "Black", "Lock 17", "Done". */
import type { Language } from '../../../shared/api/common';
import type { ReadingAsk, Step } from '../../../shared/checklist/types';
import { answerText } from '../../../shared/job/answerText';
import type { AnswerRecord } from '../../../shared/job/types';
import { formatNumber, render } from '../../../shared/wording/render';

const signs: Record<Exclude<ReadingAsk['unit'], 'padlocks'>, string> = {
  'V AC': 'V AC',
  'V DC': 'V DC',
  A: 'A',
  mA: 'mA',
  ohm: 'Ω',
  Mohm: 'MΩ',
  mm2: 'mm²',
  Nm: 'Nm',
  s: 's',
};

function reading(value: number, step: Step, language: Language): string {
  const shown = formatNumber(value).replace('-', '−');
  if (step.ask.kind !== 'reading') return shown;
  const { unit } = step.ask;
  return `${shown} ${unit === 'padlocks' ? render(language, { key: 'field.unit.padlocks' }) : signs[unit]}`;
}

export function foundWords(
  step: Step,
  value: AnswerRecord['value'],
  language: Language,
  carried: Record<string, string>,
): string {
  if (value.kind === 'reading') return reading(value.value, step, language);
  const found = answerText(step, value);
  return typeof found === 'string' ? found : render(language, found, carried);
}
