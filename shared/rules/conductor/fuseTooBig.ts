/** A fuse that lets more through than the wire, the output or the common behind it stands. */
import { fuseAtMost, protectsWire, standardFuses, surelyOpensA } from '../../electrical/fuseSizes';
import type { PointPlace, RuleContext } from '../context';
import type { Quantity } from '../finding';
import { isUnused } from '../output/drawnLoads';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { carries, fuseCapA, isCarries } from './carries';
import { protections, smallest, type Protection } from './protection';

const id = 'fuse.too-big';

interface Bound {
  variant: string;
  /** What the thing behind the fuse stands. */
  limitA: number;
  /** The greatest standard fuse for it. */
  maxA: number | undefined;
  because: Quantity[];
}

function tooBig(place: PointPlace, { A, tag, path, at }: Protection, bound: Bound): Outcome {
  const { maxA } = bound;
  const where = at === 'group' && bound.variant === 'group' && place.group ? place.group.where : place.where;
  return found(id, {
    harm: 'damages',
    where: place.where,
    variant: bound.variant,
    params: { fuse: tag, A, limitA: bound.limitA },
    because: [quantity('fuse', A, 'A', path), ...bound.because],
    remedy:
      maxA === undefined
        ? { says: { key: 'remedy.fuse.too-big.none' } }
        : { says: { key: 'remedy.fuse.too-big', params: { maxA } }, values: { maxA } },
    addsSteps: [{ family: 'check-fuse', where, params: { maxA: maxA ?? bound.limitA } }],
  });
}

type Kind = Protection['kind'];

/** Whether a fuse protects a wire that carries this much, in the panel's practice. */
function rightFor(
  place: PointPlace,
  context: RuleContext,
): (A: number, kind: Kind, wireA: number) => boolean {
  const { cable } = place.point;
  const cap = cable ? fuseCapA(cable, context) : Infinity;
  if (context.panel.practice === 'NFPA 79') return (A, _, wireA) => A <= Math.min(wireA, cap);
  return protectsWire;
}

function wireBound(place: PointPlace, context: RuleContext, fuse: Protection, wireA: number): Bound {
  const right = rightFor(place, context);
  const iec = context.panel.practice === 'IEC 60204-1';
  const opensA = surelyOpensA(fuse.A, fuse.kind);
  return {
    variant: 'wire',
    limitA: wireA,
    maxA: standardFuses.filter((A) => right(A, fuse.kind, wireA)).at(-1),
    because: [
      quantity('ampacity', wireA, 'A', `${context.panel.practice}, ${place.path}.cable`),
      ...(iec
        ? [
            quantity('fuse-opens', opensA, 'A', 'IEC 60364-4-43, factors from memory'),
            quantity('fuse-overload', 1.45 * wireA, 'A', 'IEC 60364-4-43'),
          ]
        : []),
    ],
  };
}

/** The wire to the field: the smallest protection in series against what the wire carries. */
function againstWire(place: PointPlace, context: RuleContext, fuse: Protection): Outcome {
  const able = carries(place, context);
  if (!isCarries(able)) return able;
  const right = rightFor(place, context);
  if (right(fuse.A, fuse.kind, able.worstA)) return 'ok';
  // What holds only for the mildest of the data not stated is not yet wrong; it is not yet right either.
  if (right(fuse.A, fuse.kind, able.A)) return missing(able.lacks ?? fuse.path);
  if (fuse.kind === undefined && right(fuse.A, 'breaker', able.A)) return missing(`${fuse.path}.kind`);
  return tooBig(place, fuse, wireBound(place, context, fuse, able.A));
}

/** The point's own fuse against the output's limit. */
function againstOutput(place: PointPlace, fuse: Protection): Outcome {
  const io = place.module?.io;
  if (io?.kind !== 'digital-output' || fuse.A <= io.pointA) return 'ok';
  const because = [quantity('point-limit', io.pointA, 'A', `modules.${place.module?.tag}.io.pointA`)];
  return tooBig(place, fuse, { variant: 'output', limitA: io.pointA, maxA: fuseAtMost(io.pointA), because });
}

/** The group's fuse against its common: said once, at the group's first point. */
function againstCommon(place: PointPlace, fuse: Protection): Outcome {
  const io = place.module?.io;
  if (io?.kind !== 'digital-output' || !isFirst(place)) return 'ok';
  // A common carries at least what one of its points may.
  if (fuse.A <= io.pointA) return 'ok';
  if (io.groupA === undefined) return missing(`modules.${place.module?.tag}.io.groupA`);
  if (fuse.A <= io.groupA) return 'ok';
  const because = [quantity('group-limit', io.groupA, 'A', `modules.${place.module?.tag}.io.groupA`)];
  return tooBig(place, fuse, { variant: 'group', limitA: io.groupA, maxA: fuseAtMost(io.groupA), because });
}

const isFirst = ({ group, point }: PointPlace): boolean =>
  group?.points.every((other) => point.address <= other.point.address) ?? false;

function check(place: PointPlace, context: RuleContext): Outcome[] {
  const { group, module, supply } = place;
  if (!group || !module || isUnused(place)) return [];
  if (!supply) return [missing(`${group.path}.supply`)];
  const fuses = protections(place);
  const least = smallest(fuses);
  // No protection at all is a finding of other rules; here nothing is there to be too big.
  if (!least) return [missing(`supplies.${supply.tag}.protectionA`)];
  const own = fuses.find(({ at }) => at === 'point');
  const common = fuses.find(({ at }) => at === 'group');
  const said = [
    againstWire(place, context, least),
    ...(own ? [againstOutput(place, own)] : []),
    ...(common ? [againstCommon(place, common)] : []),
  ].filter((one) => one !== 'ok');
  return said.length > 0 ? said : ['ok'];
}

export const fuseTooBig: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 7.2, IEC 60364-4-43; NFPA 79 with NEC 240.4(D); the limits of the module',
  appliesTo: 'point',
  check,
};
