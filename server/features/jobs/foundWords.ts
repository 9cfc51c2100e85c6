/** An answer as people read it back: "0.3 V AC", "Black", "Lock 17", "Done". */
import type { Language } from '../../../shared/api/common';
import type { ReadingAsk, Step } from '../../../shared/checklist/types';
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

function choice(value: string, step: Step, language: Language, carried: Record<string, string>): string {
  const option =
    step.ask.kind === 'choice' ? step.ask.options.find((each) => each.value === value) : undefined;
  return option ? render(language, option.label, carried) : value;
}

export function foundWords(
  step: Step,
  value: AnswerRecord['value'],
  language: Language,
  carried: Record<string, string>,
): string {
  const say = (key: string, params?: Record<string, string | number>) =>
    render(language, params ? { key, params } : { key });
  switch (value.kind) {
    case 'reading':
      return reading(value.value, step, language);
    case 'choice':
      return choice(value.value, step, language, carried);
    case 'text':
    case 'scan':
      return value.text;
    case 'instrument':
      return `${value.make} ${value.number}`;
    case 'lock':
      return say('field.answer.lock', { lock: value.lock });
    case 'closed':
      return say('field.answer.closed', { counted: value.counted });
    case 'wait':
      return say('field.answer.wait', { seconds: Math.round(value.waitedS) });
    case 'photo':
      return say('field.answer.photo');
    case 'done':
      return say('field.answer.done');
  }
}
