/** The state of a job as folded from its checklist and any set of entries. */
import type { Step, Stage } from '../checklist/types';
import type { Text } from '../panel/says';
import type { AnswerValue, BodyOf } from './entry';

export interface JobPerson {
  id: string;
  name: string;
  /** What they do on this job. A foreman countersigns; an electrician works. */
  part: 'electrician' | 'foreman';
}

/** What the fold needs to know besides checklist and entries: who owns each log and who is on the job. */
export interface JobFacts {
  people: JobPerson[];
  /** log id → person id; the log of an unknown owner folds as nobody's. */
  logs: Record<string, string>;
  cancelled?: boolean;
  /** Digest of the pack in force. Dead readings answered under another prove nothing now. */
  pack?: string;
}

/** A refusal of a gate, in words: why this person cannot answer this step now. */
export interface Refusal {
  code: string;
  says: Text;
}

export type Gate = { open: true } | { open: false; refusals: Refusal[] };

export interface AnswerRecord {
  entry: string;
  person: string;
  at: string;
  value: AnswerValue | { kind: 'lock'; lock: string } | { kind: 'closed'; counted: number };
  shown?: string;
  /** In limits, out of limits, or refused at its gate (kept as history, counts for nothing). */
  verdict: 'ok' | 'out' | 'refused';
  refusals?: Refusal[];
  round: string;
}

export type StepStatus = 'open' | 'done' | 'held' | 'out' | 'two-answers' | 'out-of-scope' | 'accepted';

export interface StepState {
  step: Step;
  /** For a step that each answers, keyed by person; `one` answers under ''. */
  by: Record<string, { status: StepStatus; answer?: AnswerRecord }>;
  status: StepStatus;
  history: AnswerRecord[];
  hold?: {
    entry: string;
    person: string;
    at: string;
    body: BodyOf<'hold'>;
    decided?: BodyOf<'hold-decided'>;
  };
  returned?: { entry: string; words: string };
}

export interface LockState {
  isolator: string;
  lock: string;
  person: string;
  entry: string;
  onAt: string;
  /** Undefined while the lock is known on. */
  offAt?: string;
  offEntry?: string;
  removedBy?: string;
  round: string;
}

export interface IsolatorState {
  isolator: string;
  status: 'to-open' | 'locked' | 'locks-off' | 'closed' | 'not-known';
  locks: LockState[];
}

/** One person's proof in the current round: their locks on every isolator and, after them, their own dead tests. */
export interface Proof {
  person: string;
  locked: { isolator: string; lock: string; at: string }[];
  missingLocks: string[];
  missingTests: string[];
  holds: boolean;
  lastTestAt?: string;
  /** Terminals of points (step ids) that they read dead themselves in this proof. */
  terminals: string[];
}

export interface SignatureState {
  entry: string;
  person: string;
  at: string;
  body: BodyOf<'signed'> | BodyOf<'countersigned'>;
  /** False when an entry it did not cover changed one of its steps. */
  stands: boolean;
  why?: Text;
}

export type JobStatus =
  'sent' | 'accepted' | 'running' | 'signed' | 'returned' | 'countersigned' | 'cancelled';

export interface JobState {
  status: JobStatus;
  /** Everybody on the job, as the facts named them. */
  people: JobPerson[];
  /** An electrician has accepted it: nothing opens before. */
  accepted: boolean;
  round: { id: string; number: number; points: string[] };
  rounds: {
    id: string;
    number: number;
    reason: string;
    words: string;
    person: string;
    at: string;
    points: string[];
  }[];
  stages: { stage: Stage; status: 'done' | 'current' | 'locked' | 'open'; done: number; of: number }[];
  steps: Record<string, StepState>;
  isolators: Record<string, IsolatorState>;
  locks: LockState[];
  proofs: Record<string, Proof>;
  signatures: SignatureState[];
  countersign?: SignatureState;
  /** Which of two answers a foreman chose, and why. */
  chosen: { entry: string; person: string; at: string; body: BodyOf<'chosen'> }[];
  returns: { entry: string; person: string; at: string; steps: { step: string; words: string }[] }[];
  /** Entries that cannot both be true: wiring and closing are shut, sealing waits. */
  contradictions: { code: string; entries: string[]; says: Text }[];
  /** Contradictions that ended when a lock came off: kept for the record. */
  settled: { code: string; entries: string[]; says: Text }[];
  /** Locks off has begun, or something was closed, in this round. */
  isolationOver: boolean;
  /** Electricians who are clear in this round, after everything they did in the panel. */
  clear: string[];
  /** Dead steps with a reading over its limit that nobody has measured again in limits. */
  dangers: string[];
  /** Everybody who took part in the work: none of them countersigns it. */
  tookPart: string[];
  /** Parents named by an entry and held nowhere: `log` heard to `seq`; `person` is empty for an unknown owner. */
  gaps: { log: string; person: string; seq: number }[];
  forks: { log: string; entries: string[] }[];
  /** Kinds this version does not know: what depends on them stays shut. */
  unknown: { entry: string; kind: string }[];
  notes: { entry: string; person: string; at: string; words: string }[];
  drawingDiffers: { entry: string; person: string; at: string; body: BodyOf<'drawing-differs'> }[];
  temporaries: { entry: string; body: BodyOf<'temporary'>; removedBy?: string }[];
  /** Highest seq held per log. */
  heads: Record<string, number>;
}
