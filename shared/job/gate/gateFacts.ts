/** What every gate check is given: a person, a step, and what is known at that moment. */
import type { Step } from '../../checklist/types';
import { say, type Text } from '../../panel/says';
import type { Known } from '../known/known';
import type { Refusal } from '../types';

export interface GateFacts {
  known: Known;
  person: string;
  step: Step;
  number: number;
}

/** One small question: undefined when it has nothing against. */
export type GateCheck = (facts: GateFacts) => Refusal | undefined;

/** A refusal whose words stand under `job.gate.<code>`. */
export const refuse = (code: string, params?: Text['params']): Refusal => ({
  code,
  says: say(`job.gate.${code}`, params),
});
