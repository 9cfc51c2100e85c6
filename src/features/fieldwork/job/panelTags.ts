/** Every name that stands on the drawing of a panel: what a sentence shows in a box. */
import type { Panel } from '../../../../shared/panel/panelSchema';

const tagsOf = (things: { tag?: string | undefined }[]): string[] =>
  things.flatMap(({ tag }) => (tag === undefined ? [] : [tag]));

function pointTags(panel: Panel): string[] {
  return panel.points.flatMap((point) => [
    point.address,
    point.terminal,
    point.wire,
    ...(point.conductors ?? []).flatMap(({ terminal, wire }) => [terminal, wire]),
    ...tagsOf([point.device, ...(point.series ?? []), point.cable ?? {}, point.fuse ?? {}]),
  ]);
}

/** Tags of sources, isolators, supplies with their terminals, modules, groups, points, wires and cables. */
export function panelTags(panel: Panel): Set<string> {
  return new Set([
    panel.tag,
    panel.earthTerminal,
    ...tagsOf(panel.sources),
    ...tagsOf(panel.isolators),
    ...panel.supplies.flatMap(({ tag, terminals }) => [tag, ...Object.values(terminals)]),
    ...panel.modules.flatMap(({ tag, terminals }) => [tag, ...(terminals ?? [])]),
    ...panel.groups.flatMap(({ tag, terminal, fuse }) => [tag, terminal, ...tagsOf([fuse ?? {}])]),
    ...pointTags(panel),
    ...tagsOf(panel.stopControls),
  ]);
}
