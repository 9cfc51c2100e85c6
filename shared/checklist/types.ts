/** The checklist of one job: stages, steps and what each step asks. Made once, at issue, and carried in the pack. */
import type { Text } from '../panel/says';
import type { Where } from '../rules/finding';

export const stages = [
  'get-ready',
  'isolate',
  'prove-dead',
  'wire',
  'check-cold',
  'close-up',
  'locks-off',
  'close',
  'prove-points',
  'restore-motion',
  'sign',
] as const;
export type Stage = (typeof stages)[number];

export interface Warning {
  signal: 'danger' | 'warning' | 'caution' | 'notice';
  says: Text;
}

export interface ReadingAsk {
  kind: 'reading';
  unit: 'V AC' | 'V DC' | 'A' | 'mA' | 'ohm' | 'Mohm' | 'mm2' | 'Nm' | 's' | 'padlocks';
  /** Inclusive limits; absent = no limit on that side. */
  low?: number;
  high?: number;
  /** The sum behind the limits, for the screen. */
  why?: Text;
  /** Present on a dead test: readings above `high` get the bands of isolation.md §3. */
  dead?: { supply: string; pair: string; terminal: string; second: string; proves: boolean };
}

export type Ask =
  | { kind: 'done'; label: Text }
  | ReadingAsk
  | { kind: 'choice'; options: { value: string; label: Text; ok: boolean }[] }
  | { kind: 'text'; maxLength: number }
  | { kind: 'photo' }
  | { kind: 'wait'; seconds: number }
  | { kind: 'scan'; expect: string }
  /** Make, number, check date, category and rated volts of the tester; refused when the check date has passed or too weak. */
  | { kind: 'instrument'; minCategory: 'CAT II' | 'CAT III' | 'CAT IV'; minV: number }
  | { kind: 'lock-on'; isolator: string }
  | { kind: 'lock-off'; isolator: string }
  /** Count the padlocks and close: only 0 opens it. Answered by a `closed` entry. */
  | { kind: 'close'; isolator: string };

/** What an order of work needs before this step may be answered; see shared/job/gates. */
export interface Step {
  /** Stable over regeneration: `dead.G2.C3.L-PE.ac`, `wire.DI3.07.land.signal`. */
  id: string;
  stage: Stage;
  /** Part of the stage, from 1; at most 12 items a part. */
  part: number;
  /** Name of the step family that made it, for records and tests. */
  family: string;
  title: Text;
  detail?: Text[];
  warnings?: Warning[];
  where?: Where;
  ask: Ask;
  /** `each`: every worker answers it alone (own lock, own dead tests); `one`: one answer serves the crew. */
  by: 'each' | 'one';
  /**
   * True on a `one` step whose answer counts only for the person who gave it: the terminal of a point, read dead.
   * Whoever goes on with that point without having answered it themselves answers it again first.
   */
  personal?: true;
  /** True for a step that needs dead conductors and proof (Wire, Check cold). */
  needsIsolation: boolean;
  /** True when a round started by a fault re-opens it whatever points are affected (isolate, prove dead, close ...). */
  everyRound: boolean;
  picture?: { kind: 'loop'; point: string; mark?: string } | { kind: 'energy' };
}

export interface Checklist {
  format: 'coldloop-checklist/1';
  ruleSet: string;
  /** SHA-256 of the panel revision's canonical JSON. */
  panelDigest: string;
  scope: string[];
  /** Tags in opening order: what every worker locks. */
  isolators: string[];
  steps: Step[];
}
