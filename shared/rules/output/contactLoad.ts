/** What a relay contact may make and break, against the coils that it switches. */
import { ac15MakeFactor, contactLimit } from '../../electrical/contactCodes';
import { settleOnSite } from '../settleOnSite';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { isCoil } from './circuits';
import { drawnLoads, type DrawnLoad } from './drawnLoads';
import { inrushOf } from './inrush';
import { atOutput, type OutputPlace } from './outputPlace';

interface Limit {
  makeA: number;
  breakA: number;
  basis: string;
}

/** Every statement the module makes about this kind of current at this voltage. */
function limitsAt({ io, ioPath }: OutputPlace, current: 'ac' | 'dc', V: number): Limit[] {
  const coded = (io.contact ?? []).flatMap((code) => {
    const limit = contactLimit(code, current, V);
    return limit ? [{ ...limit, basis: `IEC 60947-5-1 Annex A, ${code}` }] : [];
  });
  const rated = current === 'dc' ? io.dc13 : io.ac15;
  if (!rated || V > rated.V * toleranceOfRating[current]) return coded;
  const makeA = current === 'dc' ? rated.A : rated.A * ac15MakeFactor;
  return [...coded, { makeA, breakA: rated.A, basis: `${ioPath}.${current === 'dc' ? 'dc13' : 'ac15'}` }];
}

// DC-13 and AC-15 are given at a nominal voltage; supplies may be 20 % and 10 % above it (IEC 61131-2).
const toleranceOfRating = { dc: 1.2, ac: 1.1 };

const saysAnything = ({ io }: OutputPlace, current: 'ac' | 'dc'): boolean =>
  (current === 'dc' ? io.dc13 : io.ac15) !== undefined ||
  (io.contact ?? []).some((code) => /^[N-R]/.test(code) === (current === 'dc'));

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);

function judge(id: string, current: 'ac' | 'dc', at: OutputPlace, coils: DrawnLoad[]): Outcome {
  const { place, ioPath, volts } = at;
  if (!saysAnything(at, current)) return missing(`${ioPath}.${current === 'dc' ? 'dc13' : 'contact'}`);
  const breaks = sum(coils.map(({ A }) => A));
  const inrushes = coils.map((load) => inrushOf(load, current));
  const makes = sum(inrushes.map(({ A }) => A));
  const limits = limitsAt(at, current, volts.maxV);
  if (limits.some(({ makeA, breakA }) => makes <= makeA && breaks <= breakA))
    return volts.known ? 'ok' : missing(volts.tolerancePath);
  const unsaid = inrushes.find(({ stated }) => !stated);
  if (unsaid && limits.some(({ breakA }) => breaks <= breakA)) return missing(unsaid.path);
  const best = limits.reduce<Limit>((most, one) => (one.breakA > most.breakA ? one : most), {
    makeA: 0,
    breakA: 0,
    basis: 'no statement of the module reaches this voltage',
  });
  return found(id, {
    harm: 'damages',
    where: place.where,
    params: { A: breaks, makesA: makes, V: volts.maxV, limitA: best.breakA, makeLimitA: best.makeA },
    because: [
      quantity('load-current', breaks, 'A', `${place.path}.device.A`),
      quantity('inrush', makes, 'A', 'inrush of the coils of the point'),
      quantity('supply-high', volts.maxV, 'V', `supplies.${at.supply.tag}.V, tolerance`),
      quantity('break-limit', best.breakA, 'A', best.basis),
      quantity('make-limit', best.makeA, 'A', best.basis),
    ],
    remedy: { says: { key: `remedy.${id}`, params: { A: breaks, V: volts.maxV } }, values: { A: breaks } },
    addsSteps: settleOnSite(id, place.where),
  });
}

/** Codes are for coils (pilot duty): what a contact carries of other loads, the current per point says. */
function contactRule(id: string, current: 'ac' | 'dc'): RuleAt<'point'> {
  return {
    id,
    title: titleOf(id),
    basis: 'IEC 60947-5-1 (contact codes, AC-15, DC-13)',
    appliesTo: 'point',
    check: (place) =>
      atOutput(place, (at) => {
        if (at.io.technology !== 'relay' || (at.supply.kind === 'dc') !== (current === 'dc')) return [];
        const coils = drawnLoads(place).filter(isCoil);
        return coils.length === 0 ? [] : [judge(id, current, at, coils)];
      }),
  };
}

export const contactDc = contactRule('output.contact-dc', 'dc');
export const contactAc = contactRule('output.contact-ac', 'ac');
