/** How long stored charge needs before anyone may come near, supply by supply. */
import type { Panel, Supply } from '../panel/panelSchema';
import { dischargeSeconds } from './dischargeSeconds';
import { asRead } from './inOrder';
import type { Wait } from './types';
import { workedSupplies } from './workedTerminals';

// IEC 60204-1 6.2.4: live parts are to be at 60 V or less.
const mayApproachV = 60;
// The limit of a dead reading (common practice, no source).
const expectedToPassV = 1;
// Electrolytic capacitors are sold at −20/+20 % (common practice, no source).
const capacitanceHigh = 1.2;

/** Highest volts of a supply; null without a tolerance, which nobody may guess. */
const highest = (supply: Supply): number | null =>
  supply.tolerance ? supply.V * (1 + supply.tolerance.maxPct / 100) : null;

// A capacitor on an AC circuit keeps the peak of the wave.
const peakOfSine = Math.SQRT2;

/** Volts on the AC side of a rectifier: the peaks of the AC supplies that feed it, each at its highest. */
function rectifiedPeaks(panel: Panel, supply: Supply): (number | null)[] {
  const peaks = supply.feeds.flatMap((feed) => {
    const feeders = panel.supplies.filter((one) => one.tag === feed.from && one.kind !== 'dc');
    // Straight from a source: its tolerance is not in the file, so its highest is not known.
    return feeders.length > 0 ? feeders.map(highest) : [null];
  });
  // The power unit may hold more than the rectified mains: its own output then counts.
  const own = highest(supply) ?? supply.V;
  return [
    ...peaks.map((volts) => (volts === null ? null : volts * peakOfSine)),
    ...(peaks.length > 0 ? [own] : []),
  ];
}

/** Volts on the capacitors when the supply is switched off; null when the file cannot tell. */
function startVolts(panel: Panel, supply: Supply): number | null {
  const highestV = highest(supply);
  const rectified = supply.bulk !== 'none' && supply.bulk.rectified === true;
  if (supply.kind !== 'dc') return highestV === null ? null : highestV * peakOfSine;
  if (!rectified) return highestV;
  const volts = rectifiedPeaks(panel, supply);
  const known = volts.filter((one) => one !== null);
  return known.length === 0 || known.length < volts.length ? null : Math.max(...known);
}

/** The wait of one supply with stored charge; null for a supply that stores none. */
export function waitOf(panel: Panel, supply: Supply): Wait | null {
  const { bulk } = supply;
  if (bulk === 'none') return null;
  const startV = startVolts(panel, supply);
  const seconds = (endV: number): number | null =>
    startV === null || bulk.bleedOhm === undefined
      ? null
      : dischargeSeconds(bulk.bleedOhm, bulk.uF * 1e-6 * capacitanceHigh, startV, endV);
  const wait = { supply: supply.tag, t60S: seconds(mayApproachV), t1S: seconds(expectedToPassV) };
  return bulk.dischargeS === undefined ? wait : { ...wait, statedS: bulk.dischargeS };
}

/** The longer of two: a time that one description cannot tell is not known. */
const longer = (a: number | null, b: number | null): number | null =>
  a === null || b === null ? null : Math.max(a, b);

/** Two revisions may describe one supply differently: people wait once, for both. */
function together(a: Wait, b: Wait): Wait {
  const stated = Math.max(a.statedS ?? 0, b.statedS ?? 0);
  const wait = { supply: a.supply, t60S: longer(a.t60S, b.t60S), t1S: longer(a.t1S, b.t1S) };
  // A time that one description states says nothing of the other, which nobody could reckon.
  const isStated = a.statedS !== undefined && b.statedS !== undefined;
  const isKnown = wait.t60S !== null && stated > 0;
  return isStated || isKnown ? { ...wait, statedS: stated } : wait;
}

/**
 * One wait for every worked supply with stored charge. A time is null when the file cannot tell it: then it is
 * measured and none is promised (unless the maker's stands in `statedS`).
 */
export function waits(panel: Panel, scope: readonly string[]): Wait[] {
  const worked = workedSupplies(panel, scope);
  const found = new Map<string, Wait>();
  for (const supply of [...panel.supplies].sort((a, b) => asRead(a.tag, b.tag))) {
    const wait = worked.has(supply.tag) ? waitOf(panel, supply) : null;
    const known = found.get(supply.tag);
    if (wait) found.set(supply.tag, known ? together(known, wait) : wait);
  }
  return [...found.values()];
}
