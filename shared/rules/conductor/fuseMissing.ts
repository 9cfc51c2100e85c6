/** A semiconductor output, or a contact between two supplies, with nothing that opens when its wire meets another pole. */
import type { StepSeed } from '../finding';
import { steadyA } from '../output/drawnLoads';
import { atOutput, isSemiconductor, type OutputPlace } from '../output/outputPlace';
import { continuousFactor, fuseAtLeast } from '../../electrical/fuseSizes';
import type { RuleContext } from '../context';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { protections } from './protection';

const id = 'fuse.missing';

function none({ place, path }: OutputPlace, variant: string, supply: string): Outcome {
  const A = steadyA(place) ?? 0;
  const fitA = fuseAtLeast(continuousFactor * A);
  const addsSteps: StepSeed[] = [{ family: 'check-fuse', where: place.where }];
  return found(id, {
    harm: 'damages',
    where: place.where,
    variant,
    params: { terminal: place.point.terminal, supply },
    because: [quantity('load-current', A, 'A', `${path}.device.A`)],
    remedy:
      A > 0 && fitA !== undefined
        ? { says: { key: 'remedy.fuse.missing', params: { fitA } }, values: { fitA } }
        : { says: { key: 'remedy.fuse.missing.any' } },
    addsSteps,
  });
}

/** A second supply at the terminal is not behind the group's fuse: it needs the point's own, or one where it comes from. */
function ofOther(at: OutputPlace, context: RuleContext): Outcome {
  const { otherSupply, fuse } = at.place.point;
  if (fuse) return 'ok';
  if (otherSupply === undefined) return missing(`${at.path}.otherSupply`);
  if (otherSupply === 'none') return 'ok';
  const protectedThere = context.supplies.get(otherSupply)?.supply.protectionA !== undefined;
  return protectedThere ? 'ok' : none(at, 'other-supply', otherSupply);
}

function ofRelayLoad(at: OutputPlace, context: RuleContext): Outcome {
  const { device } = at.place.point;
  if (device.kind !== 'ssr-control') return 'ok';
  const fed = context.supplies.get(device.load.supply);
  if (!fed) return missing(`${at.path}.device.load.supply`);
  return fed.supply.protectionA === undefined ? none(at, 'relay-load', fed.supply.tag) : 'ok';
}

/** Has something to ask where a fault current would go through silicon, or where two supplies meet. */
const asks = ({ io, place }: OutputPlace): boolean =>
  isSemiconductor(io) || place.point.otherSupply !== 'none' || place.point.device.kind === 'ssr-control';

export const fuseMissing: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60204-1 7.2; a fuse may still not save a semiconductor',
  appliesTo: 'point',
  check: (place, context) =>
    atOutput(place, (at) => {
      if (!asks(at)) return [];
      const bare = isSemiconductor(at.io) && protections(place).length === 0;
      const said = [
        bare ? none(at, 'semiconductor', at.supply.tag) : ('ok' as const),
        ofOther(at, context),
        ofRelayLoad(at, context),
      ].filter((one) => one !== 'ok');
      return said.length > 0 ? said : ['ok'];
    }),
};
