/** What is known of a job at one moment: all that a gate may ask, of an entry's past or of the present. */
import type { Text } from '../../panel/says';
import type { Proof, StepStatus } from '../types';
import type { Lookup } from './lookup';

export interface KnownLock {
  isolator: string;
  lock: string;
  person: string;
}

/** Whose answers count on `each` steps: this person's own, or (undefined) what stands for the whole job. */
export type Whose = string | undefined;

export interface Known {
  lookup: Lookup;
  accepted: boolean;
  /** Everybody given the job as an electrician. */
  workers: readonly string[];
  foremen: readonly string[];
  nameOf: (person: string) => string;
  /** May what comes after this step begin? */
  passes: (step: number, whose: Whose) => boolean;
  /** First step of a stage that does not let the job go on. */
  firstLeft: (stage: number, whose: Whose) => number | undefined;
  /** What stands for this person: their own on an `each` step, the crew's on a `one` step. */
  ownStatus: (step: number, person: string) => StepStatus;
  /** Locks known on, whatever the plan says. */
  locksOn: readonly KnownLock[];
  proofOf: (person: string) => Omit<Proof, 'terminals'>;
  /** Did this person read this terminal dead in their present proof? */
  isRead: (step: number, person: string) => boolean;
  /** Locks off has begun, or an isolator was closed, in this round. */
  isolationOver: boolean;
  contradictions: readonly { says: Text }[];
  /** How many entries this version cannot read. */
  unreadable: number;
  /** Steps with a dead reading over its limit that nobody has measured again in limits. */
  dangers: readonly number[];
  /** Held steps of Isolate and Prove dead: they stop the job. */
  stops: readonly number[];
  isClear: (person: string) => boolean;
  /** Lifted wires, jumpers and earths that are still where they were put. */
  temporariesLeft: number;
  /** First step before Sign that is neither answered in limits nor settled by the foreman. */
  firstUnsettled: () => number | undefined;
  /** Steps whose answer that stands is this person's and that no signature of theirs covers yet. */
  unsigned: (person: string) => readonly string[];
  /** Does every answer that stands have its own person's signature? */
  allSigned: () => boolean;
  /** Did they answer, lock, or sign as one who worked? */
  tookPart: (person: string) => boolean;
}
