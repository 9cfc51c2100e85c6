/** A fuse that opens in normal service, at switching on, or together with the one before it. */
import { continuousFactor, fuseAtLeast, selectivityRatio } from '../../electrical/fuseSizes';
import { inrushTimes } from '../../electrical/inrush';
import type { PointPlace } from '../context';
import type { Quantity } from '../finding';
import { drawnLoads, steadyA } from '../output/drawnLoads';
import { groupSum } from '../output/groupCurrent';
import { atOutput, type OutputPlace } from '../output/outputPlace';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { protections, type Protection } from './protection';

const id = 'fuse.too-small';

interface Short {
  variant: string;
  needsA: number;
  because: Quantity[];
}

function tooSmall(place: PointPlace, { tag, A, path, at }: Protection, { variant, needsA, because }: Short) {
  const minA = fuseAtLeast(needsA) ?? needsA;
  const where = at === 'group' && place.group ? place.group.where : place.where;
  return found(id, {
    harm: 'fails',
    where: place.where,
    variant,
    params: { fuse: tag, A, needsA },
    because: [quantity('fuse', A, 'A', path), ...because],
    remedy: { says: { key: `remedy.fuse.too-small.${variant}`, params: { minA } }, values: { minA } },
    addsSteps: [{ family: 'check-fuse', where }],
  });
}

/** Loads that stay on: 1.25 times their current. */
function forLoad(place: PointPlace, fuse: Protection, loadA: number | undefined, lacks: string): Outcome {
  const needsA = continuousFactor * (loadA ?? 0);
  if (fuse.A < needsA * (1 - 1e-9))
    return tooSmall(place, fuse, {
      variant: 'load',
      needsA,
      because: [quantity('fuse-least', needsA, 'A', 'NEC 210.20; elsewhere common practice')],
    });
  return loadA === undefined ? missing(lacks) : 'ok';
}

/** A quick fuse sees the inrush as a fault: where the surge is above its rating it must be a time-lag one. */
function forInrush({ place, supply }: OutputPlace, fuse: Protection): Outcome {
  const current = supply.kind === 'dc' ? 'dc' : 'ac';
  const surges = drawnLoads(place).map((load) => ({
    A: load.inrushA ?? load.A * inrushTimes(load.load, current).low,
    path: `${load.path}.inrushA`,
  }));
  const A = surges.reduce((sum, surge) => sum + surge.A, 0);
  if (A <= fuse.A) return 'ok';
  if (fuse.kind === undefined) return missing(`${fuse.path}.kind`);
  if (fuse.kind !== 'miniature-F') return 'ok';
  const because = [quantity('inrush', A, 'A', surges[0]?.path ?? place.path)];
  return tooSmall(place, fuse, { variant: 'quick', needsA: fuse.A, because });
}

/** The fuse before it should be 1.6 times as big, so that a fault opens only the near one. */
function forSelectivity(place: PointPlace, own: Protection, common: Protection): Outcome {
  const needsA = selectivityRatio * own.A;
  if (common.A >= needsA * (1 - 1e-9)) return 'ok';
  const because = [quantity('fuse-upstream', common.A, 'A', common.path)];
  return tooSmall(place, common, { variant: 'selectivity', needsA, because });
}

const isFirst = ({ group, point }: PointPlace): boolean =>
  group?.points.every((other) => point.address <= other.point.address) ?? false;

/** The group's fuse against the group's sum: said once, at the group's first point. */
function ofGroup(at: OutputPlace, fuse: Protection): Outcome[] {
  if (!isFirst(at.place)) return [];
  const { A, unknown } = groupSum(at.group.points);
  const short = forLoad(at.place, fuse, A, '');
  if (short !== 'ok' || !unknown) return [short];
  return [missing(`${unknown.path}.device.A`)];
}

export const fuseTooSmall: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'I_f ≥ 1.25·I_load (NEC 210.20; elsewhere common practice); selectivity 1.6 (common practice)',
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, (at) => {
      const fuses = protections(place);
      const own = fuses.find(({ at: where }) => where === 'point');
      const common = fuses.find(({ at: where }) => where === 'group');
      const asked = [
        ...(own ? [forLoad(place, own, steadyA(place), `${at.path}.device.A`), forInrush(at, own)] : []),
        ...(common ? ofGroup(at, common) : []),
        ...(own && common ? [forSelectivity(place, own, common)] : []),
      ];
      const said = asked.filter((one) => one !== 'ok');
      return said.length > 0 ? said : asked.slice(0, 1);
    }),
};
