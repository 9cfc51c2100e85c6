/** What was found at a step, but for readings: a sentence's key, or the words as they were entered. */
import type { Step } from '../checklist/types';
import { say, type Text } from '../panel/says';
import type { AnswerRecord } from './types';

type Answer = AnswerRecord['value'];

/** "Black", "Lock 17", "Done": screens, office and record say an answer the same way. A reading needs its unit's sign. */
export function answerText(step: Step, value: Exclude<Answer, { kind: 'reading' }>): Text | string {
  switch (value.kind) {
    case 'choice': {
      const options = step.ask.kind === 'choice' ? step.ask.options : [];
      return options.find((each) => each.value === value.value)?.label ?? value.value;
    }
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
