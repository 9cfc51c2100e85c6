/** Colours of conductors as letter codes, and the ones that each practice gives a conductor. */
import type { ConductorRole, Panel, Supply } from '../../panel/panelSchema';

/** IEC 60757, in the order in which codes are joined. */
const names: [code: string, name: string][] = [
  ['BK', 'BLACK'],
  ['BN', 'BROWN'],
  ['RD', 'RED'],
  ['OG', 'ORANGE'],
  ['YE', 'YELLOW'],
  ['GN', 'GREEN'],
  ['BU', 'BLUE'],
  ['VT', 'VIOLET'],
  ['GY', 'GREY'],
  ['WH', 'WHITE'],
  ['PK', 'PINK'],
  ['GD', 'GOLD'],
  ['TQ', 'TURQUOISE'],
  ['SR', 'SILVER'],
];
const codes = new Map([...names.map(([code, name]) => [name, code] as const), ['GRAY', 'GY']]);
const rank = new Map(names.map(([code], index) => [code, index]));

/** "GN-YE", "YEGN" and "green/yellow" are one colour: the codes joined in the order of the table. */
export function colourCode(written: string): string {
  const words = written.toUpperCase().split(/[^A-Z]+/);
  const parts = words.flatMap((word) => codes.get(word) ?? word.match(/.{1,2}/g) ?? []);
  return [...new Set(parts)].sort((a, b) => (rank.get(a) ?? 99) - (rank.get(b) ?? 99)).join('');
}

const both = 'YEGN';
/** Kept for the protective conductor alone (IEC 60204-1 13.2.2); NFPA 79 keeps plain green as well. */
export const isProtective = (code: string, practice: Panel['practice']): boolean =>
  code === both || (practice === 'NFPA 79' && code === 'GN');

interface Circuit {
  supply: Supply;
  /** Another supply reaches the point: what stays live with the disconnect off has colours of its own. */
  foreign: boolean;
}

// IEC 60204-1 13.2.4: black power, red AC control, blue DC control, orange for what stays live; 13.2.3: blue neutral.
function byIec(role: ConductorRole, { supply, foreign }: Circuit): string[] {
  const stays = foreign ? ['OG'] : [];
  if (supply.kind === 'dc') return ['BU', 'BK', ...stays];
  if (role === 'neutral') return ['BU', ...stays];
  return ['RD', 'BK', ...stays, ...(role === 'return' ? ['BU'] : [])];
}

// NFPA 79 13.2: black power, red AC control, blue DC control; white or grey, white with blue, for what is earthed.
function byNfpa(role: ConductorRole, { supply, foreign }: Circuit): string[] {
  const stays = foreign ? ['YE', 'OG', 'YEWH', 'OGWH'] : [];
  const earthed = role === 'neutral' || role === 'minus' || role === 'return';
  if (supply.kind === 'dc') {
    const minus = earthed && supply.earthed ? ['BUWH'] : [];
    return role === 'minus' && supply.earthed ? [...minus, ...stays] : ['BU', 'BK', ...minus, ...stays];
  }
  if (role === 'neutral' && supply.earthed) return ['WH', 'GY', ...stays];
  return ['RD', 'BK', ...stays, ...(earthed ? ['WH', 'GY'] : [])];
}

/** The colours that a practice gives a conductor of this role in this circuit. */
export function expectedColours(
  role: ConductorRole,
  circuit: Circuit,
  practice: Panel['practice'],
): string[] {
  if (role === 'earth') return practice === 'NFPA 79' ? [both, 'GN'] : [both];
  return practice === 'NFPA 79' ? byNfpa(role, circuit) : byIec(role, circuit);
}
