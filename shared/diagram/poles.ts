/** The two poles a loop hangs between, as the panel file names them: positive or line above, the other below. */
import type { Group, Supply } from '../panel/panelSchema';

export interface Pole {
  /** `+`, `0 V`, `L`, `N`, `L2`; `?` where the file does not tell. */
  name: string;
  terminal?: string;
}
export interface Poles {
  top: Pole;
  bottom: Pole;
  /** The pole that the module's common is wired to. */
  common: 'top' | 'bottom';
}

const unknown: Pole = { name: '?' };

/** A pole by its key in `terminals`, with its terminal where there is one. */
function pole(terminals: Supply['terminals'], key: string, name = key): Pole {
  const terminal = Object.entries(terminals).find(([each]) => each === key)?.[1];
  return terminal === undefined ? unknown : { name, terminal };
}

/** The line and its counterpart on a supply without plus and minus: neutral, or the other line. */
function linePoles(group: Group, terminals: Supply['terminals']): Pick<Poles, 'top' | 'bottom'> {
  if ('L' in terminals) return { top: pole(terminals, 'L'), bottom: pole(terminals, 'N') };
  const lines = Object.keys(terminals).filter((key) => key.startsWith('L'));
  const top = group.phase ? pole(terminals, group.phase) : unknown;
  if ('N' in terminals && terminals.N !== undefined) return { top, bottom: pole(terminals, 'N') };
  const others = lines.filter((key) => key !== group.phase);
  // Of three lines the file does not tell between which two a load hangs.
  return { top, bottom: others.length === 1 ? pole(terminals, others[0] ?? '') : unknown };
}

export function polesOfLoop(group: Group | undefined, supply: Supply | undefined): Poles {
  const common = group?.common === 'negative' || group?.common === 'neutral' ? 'bottom' : 'top';
  if (!group || !supply) return { top: unknown, bottom: unknown, common };
  const { terminals } = supply;
  if ('plus' in terminals)
    return { top: pole(terminals, 'plus', '+'), bottom: pole(terminals, 'minus', '0 V'), common };
  return { ...linePoles(group, terminals), common };
}
