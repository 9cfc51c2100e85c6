/** The highest voltage the file names: what a place of unknown origin has to be taken for. */
import type { Panel } from '../panel/panelSchema';

/** V; 0 for a panel that names no voltage at all. */
export const highestVolts = (panel: Panel): number =>
  Math.max(0, ...panel.supplies.map((supply) => supply.V), ...panel.sources.map((source) => source.V ?? 0));
