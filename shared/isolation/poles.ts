/** The poles of a supply and the pairs they are measured in. */
import type { ConductorRole, Group, Supply } from '../panel/panelSchema';
import type { Pair } from './types';

export type Pole = '+' | '0 V' | 'L' | 'N' | 'L1' | 'L2' | 'L3';

/** Pole and terminal, in the order in which pairs are named. */
export function polesOf({ terminals }: Supply): [Pole, string][] {
  if ('plus' in terminals)
    return [
      ['+', terminals.plus],
      ['0 V', terminals.minus],
    ];
  if ('L' in terminals)
    return [
      ['L', terminals.L],
      ['N', terminals.N],
    ];
  const lines: [Pole, string][] = [
    ['L1', terminals.L1],
    ['L2', terminals.L2],
  ];
  if (!('L3' in terminals)) return lines;
  const neutral: [Pole, string][] = terminals.N === undefined ? [] : [['N', terminals.N]];
  return [...lines, ['L3', terminals.L3], ...neutral];
}

export interface Probe {
  pair: Pair;
  terminal: string;
  second: string;
}

const order: Pole[] = ['+', '0 V', 'L', 'L1', 'L2', 'L3', 'N'];
const named = (a: Pole, b: Pole): Pair =>
  (order.indexOf(a) < order.indexOf(b) ? `${a}/${b}` : `${b}/${a}`) as Pair;

/** Every pair of the supply's own terminals, then each to earth. */
export function supplyProbes(supply: Supply, earth: string): Probe[] {
  const poles = polesOf(supply);
  const between = poles.flatMap(([pole, terminal], place) =>
    poles.slice(place + 1).map(([other, second]) => ({ pair: named(pole, other), terminal, second })),
  );
  const toEarth = poles.map(([pole, terminal]) => ({ pair: `${pole}/PE` as Pair, terminal, second: earth }));
  // A pole bonded at the earth terminal itself makes no pair with it.
  return [...between, ...toEarth].filter((probe) => probe.terminal !== probe.second);
}

/** A terminal that stands on a known pole: to the other poles and to earth. On an unknown one: to every pole and to earth. */
export function probesAt(terminal: string, pole: Pole | null, supply: Supply, earth: string): Probe[] {
  const poles = polesOf(supply);
  const known = pole !== null && poles.some(([one]) => one === pole);
  const against = poles.filter(([one]) => !known || one !== pole);
  return [
    ...against.map(([one, second]) => ({
      pair: known ? named(pole, one) : (`?/${one}` as Pair),
      terminal,
      second,
    })),
    { pair: (known ? `${pole}/PE` : '?/PE') as Pair, terminal, second: earth },
  ].filter((probe) => probe.second !== terminal);
}

/** The pole a common is wired to; null when the file does not say which. */
export function commonPole(group: Group, supply: Supply): Pole | null {
  if (group.common === 'positive') return '+';
  if (group.common === 'negative') return '0 V';
  if (group.common === 'neutral') return 'N';
  return 'L' in supply.terminals ? 'L' : (group.phase ?? null);
}

/**
 * The pole a point's terminal is read as. A signal is read against the return of its circuit, 0 V or neutral; where
 * there is no return (between phases) it is read against every pole.
 */
export function conductorPole(role: ConductorRole, supply: Supply): Pole | null {
  const [live, back]: (Pole | null)[] =
    'plus' in supply.terminals ? ['+', '0 V'] : 'L' in supply.terminals ? ['L', 'N'] : [null, null];
  const onReturn = role === 'minus' || role === 'neutral' || role === 'return';
  return (onReturn ? back : live) ?? null;
}
