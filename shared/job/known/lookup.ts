/** A checklist looked up once: steps by number, by stage, by point, by isolator. */
import { stages, type Checklist, type Step } from '../../checklist/types';

export interface Lookup {
  steps: readonly Step[];
  numberOf: ReadonlyMap<string, number>;
  /** Number of the stage of each step. */
  stageOf: readonly number[];
  /** Steps of each stage, in order. */
  inStage: readonly (readonly number[])[];
  ofPoint: ReadonlyMap<string, readonly number[]>;
  /** Steps of each stage that belong to no point. */
  ofPanel: readonly (readonly number[])[];
  /** By isolator tag. */
  lockOn: ReadonlyMap<string, number>;
  lockOff: ReadonlyMap<string, number>;
  close: ReadonlyMap<string, number>;
  isolators: readonly string[];
  /** What each person answers alone to prove dead: tester, readings, stored charge. */
  ownTests: readonly number[];
  /** The terminals of a point, each read dead by who works on it. */
  terminals: ReadonlyMap<string, readonly number[]>;
}

export const stageNumber = Object.fromEntries(stages.map((stage, index) => [stage, index])) as Record<
  (typeof stages)[number],
  number
>;

const kept = new WeakMap<Checklist, Lookup>();

function grouped(steps: readonly Step[], keyOf: (step: Step) => string | undefined): Map<string, number[]> {
  const groups = new Map<string, number[]>();
  steps.forEach((step, index) => {
    const key = keyOf(step);
    if (key === undefined) return;
    const group = groups.get(key);
    if (group) group.push(index);
    else groups.set(key, [index]);
  });
  return groups;
}

function byIsolator(steps: readonly Step[], kind: 'lock-on' | 'lock-off' | 'close'): Map<string, number> {
  const found = new Map<string, number>();
  steps.forEach(({ ask }, index) => {
    if (ask.kind === kind) found.set(ask.isolator, index);
  });
  return found;
}

function lookUp({ steps, isolators }: Checklist): Lookup {
  const inStage = grouped(steps, ({ stage }) => stage);
  return {
    steps,
    numberOf: new Map(steps.map(({ id }, index) => [id, index])),
    stageOf: steps.map(({ stage }) => stageNumber[stage]),
    inStage: stages.map((stage) => inStage.get(stage) ?? []),
    ofPoint: grouped(steps, ({ where }) => where?.point),
    ofPanel: stages.map((stage) =>
      (inStage.get(stage) ?? []).filter((index) => steps[index]?.where?.point === undefined),
    ),
    lockOn: byIsolator(steps, 'lock-on'),
    lockOff: byIsolator(steps, 'lock-off'),
    close: byIsolator(steps, 'close'),
    isolators,
    ownTests: (inStage.get('prove-dead') ?? []).filter((index) => steps[index]?.by === 'each'),
    terminals: grouped(steps, ({ personal, where }) => (personal ? where?.point : undefined)),
  };
}

export function lookupOf(checklist: Checklist): Lookup {
  const known = kept.get(checklist);
  if (known) return known;
  const made = lookUp(checklist);
  kept.set(checklist, made);
  return made;
}
