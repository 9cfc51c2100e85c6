/** Where the poles of a supply are met, seen from a group's common. */
import { supplyTerminals } from '../../../isolation/supplyTerminals';
import type { Group, Supply } from '../../../panel/panelSchema';

/** The terminal of the pole that the group's common is wired to; undefined where the panel file does not tell. */
function commonPole({ common, phase }: Group, { terminals }: Supply): string | undefined {
  if ('plus' in terminals) return common === 'positive' ? terminals.plus : terminals.minus;
  if ('L' in terminals) return common === 'line' ? terminals.L : terminals.N;
  if (common === 'neutral' && 'N' in terminals) return terminals.N;
  if (phase === 'L3') return 'L3' in terminals ? terminals.L3 : undefined;
  return phase ? terminals[phase] : undefined;
}

/**
 * The terminals to read a worked terminal against: the pole that is not the common's.
 * On three phases that is the neutral where there is one, else every other line; unknown phase: all of them.
 */
export function otherPoles(group: Group, supply: Supply): string[] {
  const own = commonPole(group, supply);
  const { terminals } = supply;
  if (group.common !== 'neutral' && 'N' in terminals && terminals.N !== undefined) return [terminals.N];
  return supplyTerminals(supply).filter((terminal) => terminal !== own);
}
