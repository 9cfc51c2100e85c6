/** Which terminals stand beside which: what is landed on one may touch the other. */
import type { Module, Panel } from '../panel/panelSchema';
import { naturalCompare } from './naturalCompare';

const keyOf = (module: string, terminal: string) => `${module}\u0000${terminal}`;

/** The terminals of a module from left to right: its face as the panel file lists it, else its points in reading order. */
function facesOf(panel: Panel, modules: readonly Module[]): [string, string[]][] {
  const moduleOf = new Map(panel.groups.map(({ tag, module }) => [tag, module]));
  const used = new Map<string, Set<string>>(modules.map(({ tag }) => [tag, new Set()]));
  for (const { group, terminal } of panel.points) used.get(moduleOf.get(group) ?? '')?.add(terminal);
  return modules.map(({ tag, terminals }) => [
    tag,
    terminals ?? [...(used.get(tag) ?? [])].sort(naturalCompare),
  ]);
}

/** Looks the faces up once; a terminal that its module's face does not show has no known neighbours. */
export function neighboursIn(panel: Panel, modules: readonly Module[]) {
  const beside = new Map<string, string[]>();
  for (const [module, face] of facesOf(panel, modules))
    face.forEach((terminal, i) =>
      beside.set(
        keyOf(module, terminal),
        [face[i - 1], face[i + 1]].filter((each) => each !== undefined),
      ),
    );
  return (module: string, terminal: string): string[] => beside.get(keyOf(module, terminal)) ?? [];
}
