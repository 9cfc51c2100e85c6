/** What an entry is worth, judged once by what it had seen. */
import type { Answered, Round } from '../view/view';
import type { Refusal } from '../types';

export interface Judged {
  /** False for what counts for nothing: entries of people who have no part in it. */
  counts: boolean;
  refusals: Refusal[];
  /** The answer it gives to a step, refused ones too: they are history. */
  answer?: Answered;
  /** The round it starts. */
  round?: Round;
}
