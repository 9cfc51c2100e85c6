/** Every description of each isolator's tag: two revisions, or a draft's duplicate, may describe one device twice. */
import type { Isolator, Panel } from '../panel/panelSchema';

export function isolatorsByTag(panel: Panel): Map<string, Isolator[]> {
  const found = new Map<string, Isolator[]>();
  for (const isolator of panel.isolators)
    found.set(isolator.tag, [...(found.get(isolator.tag) ?? []), isolator]);
  return found;
}
