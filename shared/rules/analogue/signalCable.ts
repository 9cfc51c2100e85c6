/** A cable that spoils its signal: copper on a thermocouple, or many metres of 0–10 V without a screen. */
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { atAnalogueInput, type AnaloguePlace } from './analoguePlace';

const id = 'analogue.cable';

/** A voltage signal on a longer cable without a screen picks up more than it should (common practice, no source). */
const longM = 20;

function wrong({ place }: AnaloguePlace, variant: string, params: Record<string, string | number>): Outcome {
  return found(id, {
    harm: 'fails',
    where: place.where,
    variant,
    params,
    because:
      typeof params.m === 'number'
        ? [
            quantity('length', params.m, 'm', `${place.path}.cable.lengthM`),
            quantity('length-limit', longM, 'm', 'common practice'),
          ]
        : [],
    remedy: { says: { key: `remedy.analogue.cable.${variant}`, params } },
    addsSteps: settleOnSite(id, place.where),
  });
}

/** IEC 60584-3 letters a cable by its thermocouple: type K on K, KX (extension) or KC (compensating). */
const isFor = (cableType: string, type: string): boolean =>
  cableType
    .toUpperCase()
    .split(/[^A-Z]+/)
    .some((word) => [type, `${type}X`, `${type}C`].includes(word));

function ofThermocouple(at: AnaloguePlace): Outcome[] {
  const { io, ioPath, place, path } = at;
  const { device, cable } = place.point;
  if (device.kind !== 'thermocouple')
    return [wrong(at, 'other', { device: device.tag ?? place.point.address })];
  const type = device.type.toUpperCase();
  if (io.tcType === undefined) return [missing(`${ioPath}.tcType`)];
  if (io.tcType.toUpperCase() !== type) return [wrong(at, 'input-type', { type, inputType: io.tcType })];
  if (cable?.type === undefined) return [missing(`${path}.cable.type`)];
  return [isFor(cable.type, type) ? 'ok' : wrong(at, 'cable-type', { type, cableType: cable.type })];
}

function ofVoltage(at: AnaloguePlace): Outcome[] {
  const { cable } = at.place.point;
  if (!cable) return [missing(`${at.path}.cable`)];
  if (cable.lengthM <= longM || cable.screened === true) return ['ok'];
  if (cable.screened === undefined) return [missing(`${at.path}.cable.screened`)];
  return [wrong(at, 'long', { m: cable.lengthM, limitM: longM })];
}

export const signalCable: RuleAt<'point'> = {
  id,
  title: titleOf(id),
  basis: 'IEC 60584-3 (thermocouple cables); common practice for 0–10 V',
  appliesTo: 'point',
  check: (place) =>
    atAnalogueInput(place, (at) => {
      if (at.io.signal === 'thermocouple') return ofThermocouple(at);
      return at.io.signal === '0-10V' ? ofVoltage(at) : [];
    }),
};
