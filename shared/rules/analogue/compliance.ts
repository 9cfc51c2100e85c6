/** Whether a current loop has volts enough left at 20 mA, and an analogue output a load that it can drive. */
import type { AnalogueOutput } from '../../panel/moduleIo';
import { cableLoopOhm } from '../cableOhms';
import type { PointPlace } from '../context';
import type { Quantity } from '../finding';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { atAnalogueInput, isLoop, type AnaloguePlace } from './analoguePlace';

const id = 'analogue.compliance';

/** The top of the signal range (IEC 60381-1). */
const fullScaleA = 0.02;

function ofLoop({ place, path, io, ioPath, group }: AnaloguePlace): Outcome[] {
  const { device, cable } = place.point;
  // A transmitter with a supply of its own drives the loop by that supply, which the panel file does not describe.
  if (!isLoop(io) || device.kind !== 'transmitter' || device.wires === 4) return [];
  const { volts, supply } = place;
  if (!volts || !supply) return [missing(`${group.path}.supply`)];
  const loopOhm = (io.inputOhm ?? 0) + (cable ? cableLoopOhm(cable) : 0);
  const dropV = fullScaleA * loopOhm;
  const leftV = volts.minV - (device.minV ?? 0) - dropV;
  if (leftV < 0) return [tooLittle(place, leftV)];
  const lacks = [
    device.minV === undefined && `${path}.device.minV`,
    io.inputOhm === undefined && `${ioPath}.inputOhm`,
    !cable && `${path}.cable`,
    !volts.known && volts.tolerancePath,
  ].find((field) => typeof field === 'string');
  return [lacks ? missing(lacks) : 'ok'];

  function tooLittle({ where }: PointPlace, left: number): Outcome {
    const because = [
      quantity('supply-low', volts?.minV ?? 0, 'V', `supplies.${supply?.tag}.V, tolerance`),
      quantity('input-resistance', io.inputOhm ?? 0, 'ohm', `${ioPath}.inputOhm`),
      quantity('loop-resistance', cable ? cableLoopOhm(cable) : 0, 'ohm', `${path}.cable, copper at 70 °C`),
      quantity('loop-drop', dropV, 'V', '20 mA × resistance'),
      quantity('loop-left', left, 'V', 'what is left'),
    ];
    return short(where, 'loop', { lackV: -left }, because);
  }
}

function short(
  where: PointPlace['where'],
  variant: string,
  params: Record<string, number>,
  because: Quantity[],
): Outcome {
  return found(id, {
    harm: 'fails',
    where,
    variant,
    params,
    because,
    remedy: { says: { key: `remedy.analogue.compliance.${variant}`, params } },
    addsSteps: settleOnSite(id, where),
  });
}

/** A current output drives at most so many ohms, a voltage output at least so many. */
function ofOutput(place: PointPlace, io: AnalogueOutput, ioPath: string): Outcome[] {
  const { device, cable } = place.point;
  if (device.kind !== 'load') return [];
  const ohm = device.V / device.A + (cable ? cableLoopOhm(cable) : 0);
  const isCurrent = io.signal === '4-20mA';
  const limitOhm = isCurrent ? io.maxLoadOhm : io.minLoadOhm;
  if (limitOhm === undefined) return [missing(`${ioPath}.${isCurrent ? 'maxLoadOhm' : 'minLoadOhm'}`)];
  if (isCurrent ? ohm <= limitOhm : ohm >= limitOhm)
    return [isCurrent && !cable ? missing(`${place.path}.cable`) : 'ok'];
  const because = [
    quantity('load-ohm', ohm, 'ohm', `${place.path}.device V / A, and the cable`),
    quantity('load-ohm-limit', limitOhm, 'ohm', ioPath),
  ];
  return [short(place.where, isCurrent ? 'output-current' : 'output-volts', { ohm, limitOhm }, because)];
}

export const compliance: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'V_s,min − V_tx,min − 20 mA·(R_in + R_loop) ≥ 0',
  appliesTo: 'point',
  check: (place) => {
    const { module } = place;
    if (module?.io.kind === 'analogue-output') return ofOutput(place, module.io, `modules.${module.tag}.io`);
    return atAnalogueInput(place, ofLoop);
  },
};
