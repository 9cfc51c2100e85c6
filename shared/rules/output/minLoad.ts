/** A triac falls off, and a relay contact does not clean itself, when its load is too small. */
import { nextLowerE24 } from '../../electrical/eSeries';
import { ratingFor } from '../../electrical/resistorWatts';
import type { Remedy } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { isUnused, steadyA } from './drawnLoads';
import { atOutput, type OutputPlace } from './outputPlace';

const id = 'output.min-load';

/** Technologies that have a least current; a transistor needs none (reference §8). */
const needsLoad: ReadonlySet<string> = new Set(['triac', 'relay']);

/** A resistor beside the load that draws what is lacking, at the lowest supply. */
function resistorFor({ volts }: OutputPlace, lackmA: number): Remedy {
  const ohm = nextLowerE24((volts.minV / lackmA) * 1000);
  const W = ratingFor(volts.maxV ** 2 / ohm);
  if (W === undefined) return { says: { key: 'remedy.output.min-load.relay' } };
  return { says: { key: 'remedy.output.min-load', params: { ohm, W } }, values: { ohm, W } };
}

function judge(at: OutputPlace, A: number, least: number): Outcome {
  const { place, path, volts, ioPath } = at;
  const { bleeder } = place.point;
  const mA = A * 1000 + (bleeder ? (volts.minV / bleeder.ohm) * 1000 : 0);
  if (mA >= least * (1 - 1e-9)) return bleeder && !volts.known ? missing(volts.tolerancePath) : 'ok';
  return found(id, {
    harm: 'fails',
    where: place.where,
    params: { mA, leastmA: least },
    because: [
      quantity('load-current', mA, 'mA', `${path}.device.A`),
      quantity('least-load', least, 'mA', `${ioPath}.minLoadmA`),
    ],
    remedy: resistorFor(at, least - A * 1000),
    addsSteps: settleOnSite(id, place.where),
  });
}

export const minLoad: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the output's stated least load",
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, (at) => {
      const { io, ioPath, path } = at;
      if (isUnused(place)) return [];
      const A = steadyA(place);
      if (io.minLoadmA === undefined)
        return needsLoad.has(io.technology) ? [missing(`${ioPath}.minLoadmA`)] : [];
      return [A === undefined ? missing(`${path}.device.A`) : judge(at, A, io.minLoadmA)];
    }),
};
