/** Terminals on which two circuits meet although nobody stated it: what one brings may reach the other. */
import type { Panel } from '../panel/panelSchema';
import { supplyTerminals } from './supplyTerminals';

export interface Meeting {
  /** Two or more groups whose points or commons stand on this one terminal. */
  groups: string[];
  /** Supplies measured at a terminal that is also a point's or a common's of a group on another supply. */
  supplies: string[];
  terminal: string;
}

function gatherGroups(panel: Panel): Map<string, Set<string>> {
  const at = new Map<string, Set<string>>();
  const add = (terminal: string, group: string) => {
    const known = at.get(terminal);
    if (known) known.add(group);
    else at.set(terminal, new Set([group]));
  };
  for (const { terminal, tag } of panel.groups) add(terminal, tag);
  for (const { terminal, group } of panel.points) add(terminal, group);
  return at;
}

/** Every such terminal. Conductors' own terminals are left out: plus, minus and neutral strips are shared by design. */
export function sharedTerminals(panel: Panel): Meeting[] {
  const at = gatherGroups(panel);
  const feeding = new Map<string, Set<string | undefined>>();
  for (const { tag, supply } of panel.groups) feeding.set(tag, (feeding.get(tag) ?? new Set()).add(supply));
  const measured = new Map<string, string[]>();
  for (const supply of panel.supplies)
    for (const terminal of supplyTerminals(supply))
      if (at.has(terminal)) measured.set(terminal, [...(measured.get(terminal) ?? []), supply.tag]);
  return [...at].flatMap(([terminal, groups]) => {
    const supplies = (measured.get(terminal) ?? []).filter((tag) =>
      [...groups].some((group) => !(feeding.get(group)?.size === 1 && feeding.get(group)?.has(tag))),
    );
    return groups.size > 1 || supplies.length > 0 ? [{ terminal, groups: [...groups], supplies }] : [];
  });
}
