/** The supply against what the outputs of a group may switch, and against what their loads are made for. */
import type { PointPlace } from '../context';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { drawnLoads, type DrawnLoad } from './drawnLoads';
import { atOutputGroup, type OutputGroup } from './outputPlace';

const id = 'output.voltage-window';

/** A load takes its rated volts with the tolerance of the supplies it is made for (IEC 61131-2: +20 % DC, +10 % AC). */
const loadTakes = { dc: 1.2, ac: 1.1 };

// 400 V between lines is 230.9 V to neutral, and both are called 230/400 V (IEC 60038).
const nameRounding = 1.005;

function ofOutput(at: OutputGroup): Outcome {
  const { io, ioPath, volts, place, supply } = at;
  const tooHigh = volts.maxV > io.Vmax;
  if (!tooHigh && volts.minV >= io.Vmin) return volts.known ? 'ok' : missing(volts.tolerancePath);
  const variant = tooHigh ? 'high' : 'low';
  const V = tooHigh ? volts.maxV : volts.minV;
  const limitV = tooHigh ? io.Vmax : io.Vmin;
  return found(id, {
    harm: 'damages',
    where: place.where,
    variant,
    params: { module: at.module.tag, supply: supply.tag, V, limitV },
    because: [
      quantity(tooHigh ? 'supply-high' : 'supply-low', V, 'V', `supplies.${supply.tag}.V, tolerance`),
      quantity('output-limit', limitV, 'V', `${ioPath}.${tooHigh ? 'Vmax' : 'Vmin'}`),
    ],
    remedy: { says: { key: 'remedy.output.voltage-window' } },
    addsSteps: settleOnSite(id, place.where),
  });
}

function ofLoad({ supply, volts }: OutputGroup, point: PointPlace, load: DrawnLoad): Outcome[] {
  // The control side of a solid-state relay has limits of its own, and a rule of its own.
  if (load.load === 'control') return [];
  const current = supply.kind === 'dc' ? 'dc' : 'ac';
  const tag = load.tag ?? point.point.address;
  const limitV = load.V * loadTakes[current];
  // A resistive load or a filament lamp does not care which kind of current heats it.
  const cares = load.load !== 'resistive' && load.load !== 'lamp';
  const variant =
    cares && load.current !== current ? 'load-kind' : volts.maxV > limitV * nameRounding ? 'load-high' : '';
  if (variant === '') return [];
  return [
    found(id, {
      harm: 'damages',
      where: point.where,
      variant,
      params: { load: tag, supply: supply.tag, V: volts.maxV, limitV },
      because: [
        quantity('supply-high', volts.maxV, 'V', `supplies.${supply.tag}.V, tolerance`),
        quantity('load-limit', limitV, 'V', `${load.path}.V with the tolerance of IEC 61131-2`),
      ],
      remedy: { says: { key: 'remedy.output.voltage-window.load' } },
      addsSteps: settleOnSite(id, point.where),
    }),
  ];
}

export const voltageWindow: RuleAt<'group'> = {
  id,
  title: titleOf(id),
  basis: "the output's and the loads' stated volts",
  appliesTo: 'group',
  check: (place) =>
    atOutputGroup(place, (at) => {
      const own = ofOutput(at);
      const loads = place.points.flatMap((point) =>
        drawnLoads(point).flatMap((load) => ofLoad(at, point, load)),
      );
      return own === 'ok' && loads.length > 0 ? loads : [own, ...loads];
    }),
};
