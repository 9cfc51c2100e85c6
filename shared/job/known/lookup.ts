/** A checklist looked up once: steps by number, by stage, by point, by isolator. */
import { stages, type Checklist, type Step } from '../../checklist/types';

/** One part of Prove dead: the tester is proved, pairs are read, the tester is proved again. */
export interface ProvedPart {
  before: readonly number[];
  readings: readonly number[];
  after: readonly number[];
}

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
  provedParts: readonly ProvedPart[];
  /** The testers that each person names: another one makes every reading before it worthless. */
  instruments: readonly number[];
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

/** A tester proof before the first reading of its part comes before all of them; any other comes after them. */
function provedParts(steps: readonly Step[], ownTests: readonly number[]): ProvedPart[] {
  const byPart = new Map<number, number[]>();
  for (const number of ownTests) {
    const part = steps[number]?.part ?? 0;
    byPart.set(part, [...(byPart.get(part) ?? []), number]);
  }
  return [...byPart.values()].map((numbers) => {
    const proofs = numbers.filter((number) => steps[number]?.family === 'tester-proved');
    const readings = numbers.filter((number) => {
      const ask = steps[number]?.ask;
      return ask?.kind === 'reading' && ask.dead !== undefined;
    });
    const first = readings[0] ?? Infinity;
    return {
      before: proofs.filter((number) => number < first),
      readings,
      after: proofs.filter((number) => number > first),
    };
  });
}

function lookUp({ steps, isolators }: Checklist): Lookup {
  const inStage = grouped(steps, ({ stage }) => stage);
  const ownTests = (inStage.get('prove-dead') ?? []).filter((index) => steps[index]?.by === 'each');
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
    ownTests,
    provedParts: provedParts(steps, ownTests),
    instruments: steps.flatMap(({ ask, by }, index) =>
      ask.kind === 'instrument' && by === 'each' ? [index] : [],
    ),
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
