/** What a load draws at the moment it is switched on, against what the output survives. */
import { inrushTimes } from '../../electrical/inrush';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { drawnLoads, type DrawnLoad } from './drawnLoads';
import { atOutput, type OutputPlace } from './outputPlace';

const id = 'output.inrush';

export interface Inrush {
  A: number;
  ms?: number;
  /** The field that holds, or would hold, the maker's value. */
  path: string;
  stated: boolean;
}

/** Stated, or the most that such a load draws. */
export function inrushOf({ A, inrushA, inrushMs, load, path }: DrawnLoad, current: 'ac' | 'dc'): Inrush {
  const times = inrushTimes(load, current);
  const stated = inrushA !== undefined;
  return {
    A: inrushA ?? A * times.high,
    ...(inrushMs !== undefined && { ms: inrushMs }),
    path: `${path}.inrushA`,
    // A load that draws no more than its steady current needs no maker's value.
    stated: stated || times.high === 1,
  };
}

function tooMuch({ place, io, ioPath }: OutputPlace, A: number, ms: number | undefined): Outcome {
  const limit = io.inrush;
  return found(id, {
    harm: 'damages',
    where: place.where,
    variant: ms === undefined ? 'amps' : 'time',
    params: { A, limitA: limit?.A ?? io.pointA, ...(ms !== undefined && { ms, limitMs: limit?.ms ?? 0 }) },
    because: [
      quantity('inrush', A, 'A', 'inrush of the loads of the point'),
      ...(ms === undefined ? [] : [quantity('inrush-time', ms, 'ms', 'the loads’ inrushMs')]),
      quantity('inrush-limit', limit?.A ?? io.pointA, 'A', `${ioPath}.inrush`),
      ...(limit ? [quantity('inrush-limit-time', limit.ms, 'ms', `${ioPath}.inrush`)] : []),
    ],
    remedy: { says: { key: 'remedy.output.inrush', params: { A } }, values: { A } },
    addsSteps: settleOnSite(id, place.where),
  });
}

function judge(at: OutputPlace): Outcome {
  const { io, ioPath, place, supply } = at;
  const inrushes = drawnLoads(place).map((load) => inrushOf(load, supply.kind === 'dc' ? 'dc' : 'ac'));
  const A = inrushes.reduce((sum, one) => sum + one.A, 0);
  if (A <= io.pointA * (1 + 1e-9)) return 'ok';
  const unsaid = inrushes.find(({ stated }) => !stated);
  if (unsaid && !(io.inrush && A <= io.inrush.A)) return missing(unsaid.path);
  if (!io.inrush) return missing(`${ioPath}.inrush`);
  if (A > io.inrush.A) return tooMuch(at, A, undefined);
  const timeless = inrushes.find(({ ms, stated }) => ms === undefined || !stated);
  if (timeless) return missing(timeless.path.replace(/inrushA$/, timeless.stated ? 'inrushMs' : 'inrushA'));
  const ms = Math.max(...inrushes.map((one) => one.ms ?? 0));
  return ms > io.inrush.ms ? tooMuch(at, A, ms) : 'ok';
}

export const inrush: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the output's stated surge; loads without a maker's value by reference §8",
  appliesTo: 'point',
  check: (place) => atOutput(place, (at) => (drawnLoads(place).length === 0 ? [] : [judge(at)])),
};
