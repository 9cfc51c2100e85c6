/** Does an isolator, when open, make the circuit behind it dead? */
import type { Isolator, Panel, Source, Supply } from '../panel/panelSchema';
import { countsAsIsolation, electricalKind } from './countsAsIsolation';

/** Earthed and taken to neutral or 0 V: opening its one live conductor leaves nothing live. */
const returnsToEarth = (supply: Supply): boolean =>
  supply.earthed && ('N' in supply.terminals || 'minus' in supply.terminals) && !('L1' in supply.terminals);

// Two namings of one nominal voltage differ by up to 10 % (220/230/240 V, 110/115/120 V; common practice, no source).
const sameVoltage = (a: number, b: number): boolean => Math.abs(a - b) <= 0.1 * Math.max(a, b);

/** Is the supply the very circuit that the source brings, with no transformer or power unit between them? */
function sameCircuit(source: Source, supply: Supply): boolean {
  if (source.V === undefined || source.phases === undefined) return false;
  if (source.phases === 'dc') return supply.kind === 'dc' && sameVoltage(source.V, supply.V);
  if (supply.kind !== 'ac1') return false;
  return sameVoltage(source.phases === 3 ? source.V / Math.sqrt(3) : source.V, supply.V);
}

/** The supplies at the isolator; empty when the file does not say what the circuit there is. */
function suppliesAt(panel: Panel, from: string, fed: Supply): Supply[] {
  const sources = panel.sources.filter((source) => source.tag === from);
  if (sources.length > 0) return sources.every((source) => sameCircuit(source, fed)) ? [fed] : [];
  return panel.supplies.filter((supply) => supply.tag === from);
}

/**
 * Whether opening this isolator cuts a feed from `from` to the supply `fed`.
 * `described` holds every description of its tag; all must agree. A one-conductor isolator is judged by the
 * supply at the isolator; when the file does not tell what that is, it does not count.
 */
export function cutsCircuit(
  panel: Panel,
  described: Isolator[] | undefined,
  from: string,
  fed: Supply,
): boolean {
  if (!described || described.length === 0) return false;
  return described.every((isolator) => {
    if (!countsAsIsolation(isolator) || !electricalKind(isolator)) return false;
    if (isolator.opens !== 'one-conductor') return true;
    const at = suppliesAt(panel, from, fed);
    return at.length > 0 && at.every(returnsToEarth);
  });
}
