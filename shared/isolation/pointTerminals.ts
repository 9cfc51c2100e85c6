/** The terminals of a point that can be live. */
import type { Panel, Point } from '../panel/panelSchema';

/** The point's own terminal and those of its conductors, without screens and earth, each once. */
export function pointTerminals(panel: Panel, point: Point): string[] {
  const conductors = (point.conductors ?? []).filter(
    (one) => one.role !== 'earth' && one.role !== 'screen' && one.terminal !== panel.earthTerminal,
  );
  return [...new Set([point.terminal, ...conductors.map((one) => one.terminal)])];
}
