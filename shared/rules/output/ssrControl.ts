/** The control side of a solid-state relay gets enough to switch and not enough to burn. */
import type { DeviceOf } from '../../panel/device';
import { cableDropV } from '../cableOhms';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { atOutput, type OutputPlace } from './outputPlace';

const id = 'output.ssr-control';

function wrong(at: OutputPlace, device: DeviceOf<'ssr-control'>, variant: string, V: number, limitV: number) {
  const { place, path, supply } = at;
  const name = variant === 'low' ? 'Vmin' : 'Vmax';
  return found(id, {
    harm: variant === 'low' ? 'fails' : 'damages',
    where: place.where,
    variant,
    params: { relay: device.tag ?? place.point.address, V, limitV },
    because: [
      quantity('control-voltage', V, 'V', `supplies.${supply.tag}.V, tolerance, less drops`),
      quantity('control-limit', limitV, 'V', `${path}.device.${name}`),
    ],
    remedy: { says: { key: `remedy.output.ssr-control.${variant}` } },
    addsSteps: settleOnSite(id, place.where),
  });
}

/** Lowest supply, less the output's drop and the cable's at the control current. */
function low(at: OutputPlace, device: DeviceOf<'ssr-control'>): Outcome {
  const { place, path, io, ioPath, volts } = at;
  const { cable } = place.point;
  const drop = io.onDropV ?? 0;
  const V = volts.minV - drop - (cable ? cableDropV(cable, device.mA / 1000) : 0);
  if (V < device.Vmin) return wrong(at, device, 'low', V, device.Vmin);
  if (io.onDropV === undefined && io.technology !== 'relay') return missing(`${ioPath}.onDropV`);
  if (!cable) return missing(`${path}.cable`);
  return volts.known ? 'ok' : missing(volts.tolerancePath);
}

function high(at: OutputPlace, device: DeviceOf<'ssr-control'>): Outcome {
  const { volts, supply } = at;
  if (device.polarised && supply.kind !== 'dc') return wrong(at, device, 'ac', volts.maxV, device.Vmax);
  if (volts.maxV > device.Vmax) return wrong(at, device, 'high', volts.maxV, device.Vmax);
  return volts.known ? 'ok' : missing(volts.tolerancePath);
}

const sameAnswer = (a: Outcome, b: Outcome): boolean => JSON.stringify(a) === JSON.stringify(b);

export const ssrControl: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: "the relay's stated control range",
  appliesTo: 'point',
  check: (place) =>
    atOutput(place, (at) => {
      const { device } = place.point;
      if (device.kind !== 'ssr-control') return [];
      const below = low(at, device);
      const above = high(at, device);
      const said = [below, ...(sameAnswer(below, above) ? [] : [above])].filter((one) => one !== 'ok');
      return said.length === 0 ? ['ok'] : said;
    }),
};
