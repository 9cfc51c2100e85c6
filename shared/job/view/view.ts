/** All that counts of a set of entries, kept so that one more entry changes only what it touches. */
import type { Lookup } from '../known/lookup';
import type { BodyOf } from '../entry';
import type { Placed, PlacedOf } from '../order/placed';
import type { AnswerRecord, JobFacts, Proof, Refusal } from '../types';

export interface Answered {
  placed: Placed;
  step: number;
  person: string;
  value: AnswerRecord['value'];
  verdict: AnswerRecord['verdict'];
  refusals?: Refusal[];
  /** Id of the round it was given in; '' for the first. */
  round: string;
}

export interface Held {
  placed: PlacedOf<'hold'>;
  step: number;
  decisions: PlacedOf<'hold-decided'>[];
}

export interface Round {
  placed: Placed;
  reason: BodyOf<'round-started'>['reason'];
  points: readonly string[];
  words: string;
}

export interface Lock {
  on: PlacedOf<'lock-on'>;
  isolator: string;
  lock: string;
  person: string;
  /** Was it put on through an open gate? Only such a lock counts for proof; every lock keeps an isolator open. */
  counts: boolean;
  /** Entries that took it off: its owner's, or (removed) a foreman's by the supervised exception. */
  offs: { placed: Placed; removed: boolean }[];
}

export interface Closing {
  placed: PlacedOf<'closed'>;
  isolator: string;
}

/** The proof for the panel; what of it counts at single terminals is worked out where it is asked. */
export type PanelProof = Omit<Proof, 'terminals'>;

/** Facts of the job that every view shares. */
export interface Setting {
  lookup: Lookup;
  facts: JobFacts;
  workers: readonly string[];
  foremen: readonly string[];
  /** Log number → numbers that a proof of its owner must come after: holes and forks. */
  unsureUpTo: readonly number[];
  /** Log number → whose it is. */
  ownerOf: readonly string[];
}

export interface View {
  setting: Setting;
  accepted: boolean;
  started: boolean;
  /** For each step the counting answers that no later one replaces; for `each` steps a person's own replace their own. */
  answers: (Answered[] | undefined)[];
  /** For the terminals of points: everybody's own newest. */
  own: (Answered[] | undefined)[];
  /** Dead readings over their limit, whatever their gate, that no later good one replaces. */
  dangers: Map<number, Answered[]>;
  /** The tester failed on a known voltage. */
  failures: Map<number, Answered[]>;
  holds: Map<number, Held[]>;
  chosen: Map<number, PlacedOf<'chosen'>[]>;
  /** What re-opened single steps: returns, rework, rounds that name their point. */
  reopened: Map<number, Placed[]>;
  pointsOut: Map<string, Placed[]>;
  rounds: Round[];
  locks: Lock[];
  closings: Closing[];
  /** Lock-offs through an open gate: Locks off has begun. */
  restoring: Placed[];
  removals: Placed[];
  clears: Map<string, Placed[]>;
  /** Newest entries of each person that put them to work in the panel. */
  work: Map<string, Placed[]>;
  /** Everybody who answered, locked, closed, fitted something or signed. */
  hands: Set<string>;
  unreadable: Placed[];
  temporaries: { placed: PlacedOf<'temporary'>; removedBy: Placed[] }[];
  signed: { placed: PlacedOf<'signed'>; refusals: Refusal[] }[];
  countersigned: { placed: PlacedOf<'countersigned'>; refusals: Refusal[] }[];
  returned: PlacedOf<'returned'>[];
  /** For each stage the `one` steps that still keep it from being done. */
  left: Set<number>[];
  /** Counts every change that can touch a proof; what was worked out before is then stale. */
  proofVersion: number;
  proofs: Map<string, { version: number; proof: PanelProof }>;
  /** Counts every change in a stage. */
  stageVersion: number[];
  firsts: Map<string, { version: string; first: number | undefined }>;
}

export function emptyView(setting: Setting): View {
  const { lookup } = setting;
  return {
    setting,
    accepted: false,
    started: false,
    answers: new Array<Answered[] | undefined>(lookup.steps.length),
    own: new Array<Answered[] | undefined>(lookup.steps.length),
    dangers: new Map(),
    failures: new Map(),
    holds: new Map(),
    chosen: new Map(),
    reopened: new Map(),
    pointsOut: new Map(),
    rounds: [],
    locks: [],
    closings: [],
    restoring: [],
    removals: [],
    clears: new Map(),
    work: new Map(),
    hands: new Set(),
    unreadable: [],
    temporaries: [],
    signed: [],
    countersigned: [],
    returned: [],
    left: lookup.inStage.map((steps) => new Set(steps.filter((step) => lookup.steps[step]?.by === 'one'))),
    proofVersion: 0,
    proofs: new Map(),
    stageVersion: lookup.inStage.map(() => 0),
    firsts: new Map(),
  };
}

/** Adds to a list under a key. */
export function addTo<K, V>(map: Map<K, V[]>, key: K, value: V): void {
  const list = map.get(key);
  if (list) list.push(value);
  else map.set(key, [value]);
}
