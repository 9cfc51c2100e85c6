/** The load side of a solid-state relay is an output of its own: kind of current, volts, amps and direction. */
import type { DeviceOf } from '../../panel/device';
import type { PointPlace, RuleContext, SupplyPlace } from '../context';
import type { Harm, Quantity } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';

const id = 'output.ssr-load';

interface Side {
  device: DeviceOf<'ssr-control'>;
  path: string;
  fed: SupplyPlace;
  place: PointPlace;
}

function wrong({ device, fed, place }: Side, variant: string, because: Quantity[], harm: Harm = 'damages') {
  const { rating, load } = device;
  return found(id, {
    harm,
    where: place.where,
    variant,
    params: {
      relay: device.tag ?? place.point.address,
      supply: fed.supply.tag,
      V: fed.volts.maxV,
      ratedV: rating.V,
      A: load.A,
      ratedA: rating.A,
    },
    because,
    remedy: { says: { key: `remedy.output.ssr-load.${variant}` } },
    ...(harm === 'hurts' ? {} : { addsSteps: settleOnSite(id, place.where) }),
  });
}

/** An AC relay is a triac: on DC it cannot turn off. A DC relay on AC conducts half of it and breaks down. */
function kindOf(side: Side): Outcome {
  const { device, fed } = side;
  const supplied = fed.supply.kind === 'dc' ? 'dc' : 'ac';
  if (device.rating.current === supplied) return 'ok';
  const because = [quantity('supply-nominal', fed.supply.V, 'V', `${fed.path}.V`)];
  return supplied === 'dc' ? wrong(side, 'ac-on-dc', because, 'hurts') : wrong(side, 'dc-on-ac', because);
}

function voltsOf(side: Side): Outcome {
  const { device, fed, path } = side;
  const { maxV, known, tolerancePath } = fed.volts;
  if (maxV <= device.rating.V) return known ? 'ok' : missing(tolerancePath);
  return wrong(side, 'volts', [
    quantity('supply-high', maxV, 'V', `${fed.path}.V, tolerance`),
    quantity('rated-volts', device.rating.V, 'V', `${path}.rating.V`),
  ]);
}

function ampsOf(side: Side): Outcome {
  const { device, path } = side;
  if (device.load.A <= device.rating.A) return 'ok';
  return wrong(side, 'amps', [
    quantity('load-current', device.load.A, 'A', `${path}.load.A`),
    quantity('rated-current', device.rating.A, 'A', `${path}.rating.A`),
  ]);
}

function directionOf(side: Side): Outcome {
  const { device, path, fed } = side;
  if (!device.rating.polarised || fed.supply.kind !== 'dc') return 'ok';
  if (device.load.reversed === undefined) return missing(`${path}.load.reversed`);
  return device.load.reversed ? wrong(side, 'reversed', []) : 'ok';
}

function check(place: PointPlace, context: RuleContext): Outcome[] {
  const { device } = place.point;
  if (device.kind !== 'ssr-control') return [];
  const path = `${place.path}.device`;
  const fed = context.supplies.get(device.load.supply);
  if (!fed) return [missing(`${path}.load.supply`)];
  const side = { device, path, fed, place };
  const said = [kindOf, voltsOf, ampsOf, directionOf].map((ask) => ask(side)).filter((one) => one !== 'ok');
  return said.length > 0 ? said : ['ok'];
}

export const ssrLoad: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the relay's own rating; a triac turns off at the zero crossing of its current",
  appliesTo: 'point',
  check,
};
