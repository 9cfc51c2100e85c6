/** The order of stages and steps: which earlier step a step waits for. */
import { stages, type Stage } from '../../checklist/types';
import { stageNumber } from '../known/lookup';
import type { GateFacts } from './gateFacts';

type Before = (facts: GateFacts, stage: Stage) => number | undefined;

const crew: Before = ({ known }, stage) => known.firstLeft(stageNumber[stage], undefined);
const own: Before = ({ known, person }, stage) => known.firstLeft(stageNumber[stage], person);

// Who works under isolation answered these stages alone; whoever closes and proves later need not have.
const underIsolation: ReadonlySet<Stage> = new Set(['prove-dead', 'wire', 'check-cold']);
const isolating: Before = (facts, stage) =>
  underIsolation.has(facts.step.stage) ? own(facts, stage) : crew(facts, stage);

const firstOf = (facts: GateFacts, numbers: readonly number[], whose?: string): number | undefined =>
  numbers.find((number) => number !== facts.number && !facts.known.passes(number, whose));

/** A point is checked cold as soon as it is wired itself. */
const wired: Before = (facts, stage) => {
  const { lookup } = facts.known;
  const point = facts.step.where?.point;
  if (facts.step.stage !== 'check-cold' || point === undefined) return crew(facts, stage);
  return firstOf(
    facts,
    (lookup.ofPoint.get(point) ?? []).filter((number) => lookup.steps[number]?.stage === stage),
  );
};

/** What each stage must have come to before a later one begins. */
const earlierStage: Record<Stage, Before> = {
  'get-ready': own,
  isolate: isolating,
  'prove-dead': isolating,
  wire: wired,
  'check-cold': crew,
  'close-up': crew,
  'locks-off': crew,
  close: crew,
  'prove-points': crew,
  'restore-motion': crew,
  sign: crew,
};

const earlierIn = ({ known: { lookup }, number, step }: GateFacts): readonly number[] =>
  (lookup.inStage[stageNumber[step.stage]] ?? []).filter((each) => each < number);

const oneByOne = (facts: GateFacts): number | undefined => firstOf(facts, earlierIn(facts), facts.person);

/** One's own locks come off in any order; closing waits for everybody's. */
const restoring = (facts: GateFacts): number | undefined => {
  const { steps } = facts.known.lookup;
  const isLockOff = (number: number) => steps[number]?.ask.kind === 'lock-off';
  const earlier = earlierIn(facts).filter((each) => !(isLockOff(facts.number) && isLockOff(each)));
  return firstOf(facts, earlier);
};

const withinPoint = (facts: GateFacts): number | undefined => {
  const { lookup } = facts.known;
  const ofPoint = lookup.ofPoint.get(facts.step.where?.point ?? '') ?? [];
  return firstOf(
    facts,
    ofPoint.filter((each) => each < facts.number && lookup.steps[each]?.stage === facts.step.stage),
  );
};

/** Who is allowed, what is covered and every stop come before the first point. */
const proving = (facts: GateFacts): number | undefined => {
  const panel = facts.known.lookup.ofPanel[stageNumber[facts.step.stage]] ?? [];
  if (facts.step.where?.point === undefined) return undefined;
  return firstOf(facts, panel, facts.person) ?? withinPoint(facts);
};

const anyOrder = () => undefined;
const withinStage: Record<Stage, (facts: GateFacts) => number | undefined> = {
  'get-ready': anyOrder,
  isolate: oneByOne,
  'prove-dead': oneByOne,
  wire: anyOrder,
  'check-cold': withinPoint,
  'close-up': anyOrder,
  'locks-off': anyOrder,
  close: restoring,
  'prove-points': proving,
  'restore-motion': restoring,
  sign: anyOrder,
};

/** Number of the first step that must be answered before; undefined when it is this one's turn. */
export function orderBlocker(facts: GateFacts): number | undefined {
  const { stage } = facts.step;
  for (const earlier of stages.slice(0, stageNumber[stage])) {
    const left = earlierStage[earlier](facts, earlier);
    if (left !== undefined) return left;
  }
  return withinStage[stage](facts);
}
