/** Which steps still keep a stage from being done, kept up as entries come. */
import { isPassed } from '../known/passing';
import { ownStanding } from './stepStatus';
import { wholeStatus } from './wholeStatus';
import type { View } from './view';

/** Looks again at one step after something touched it. */
export function refresh(view: View, step: number): void {
  const { steps, stageOf } = view.setting.lookup;
  const stage = stageOf[step] ?? 0;
  const asked = steps[step];
  view.stageVersion[stage] = (view.stageVersion[stage] ?? 0) + 1;
  if (asked?.by !== 'one') return;
  if (isPassed(ownStanding(view, step, '').status, asked.stage)) view.left[stage]?.delete(step);
  else view.left[stage]?.add(step);
}

export function passes(view: View, step: number, whose: string | undefined): boolean {
  const { steps, stageOf } = view.setting.lookup;
  const asked = steps[step];
  if (!asked) return true;
  if (asked.by === 'one') return !view.left[stageOf[step] ?? 0]?.has(step);
  const status =
    whose === undefined || asked.ask.kind === 'lock-off'
      ? wholeStatus(view, step)
      : ownStanding(view, step, whose).status;
  return isPassed(status, asked.stage);
}

function findLeft(view: View, stage: number, whose: string | undefined): number | undefined {
  const { inStage, steps } = view.setting.lookup;
  const crew = [...(view.left[stage] ?? [])].reduce((least, step) => Math.min(least, step), Infinity);
  const alone = inStage[stage]?.find((step) => steps[step]?.by === 'each' && !passes(view, step, whose));
  const first = Math.min(crew, alone ?? Infinity);
  return Number.isFinite(first) ? first : undefined;
}

/** Found once until the stage or anything wider changes. */
export function firstLeft(view: View, stage: number, whose: string | undefined): number | undefined {
  const key = `${stage} ${whose ?? ''}`;
  const version = `${view.stageVersion[stage] ?? 0} ${view.proofVersion}`;
  const known = view.firsts.get(key);
  if (known?.version === version) return known.first;
  const first = findLeft(view, stage, whose);
  view.firsts.set(key, { version, first });
  return first;
}
