/** Tables of what a conductor may carry, by practice. */

export type WiringMethod = 'B1' | 'B2' | 'C' | 'E';

/**
 * IEC 60204-1 table 6, amperes: PVC, copper, 40 °C, steady state. Columns B2, C, E cross-checked with IEC 60364-5-52;
 * the decimals and B1 from memory, where in doubt (4 and 6 mm², B1) the lower value.
 */
export const iecPower: readonly (readonly [number, Record<WiringMethod, number>])[] = [
  [0.75, { B1: 8.6, B2: 8.5, C: 9.8, E: 10.4 }],
  [1, { B1: 10.3, B2: 10.1, C: 11.7, E: 12.4 }],
  [1.5, { B1: 13.5, B2: 13.1, C: 15.2, E: 16.1 }],
  [2.5, { B1: 18.3, B2: 17.4, C: 21, E: 22 }],
  [4, { B1: 24, B2: 23, C: 28, E: 30 }],
  [6, { B1: 31, B2: 30, C: 36, E: 37 }],
  [10, { B1: 44, B2: 40, C: 50, E: 52 }],
  [16, { B1: 59, B2: 54, C: 66, E: 70 }],
];

/** IEC 60204-1 table 6, electronic pairs, column B2 (from memory): used below 0.75 mm² for every method. */
export const iecElectronics: readonly (readonly [number, number])[] = [
  [0.2, 4.3],
  [0.5, 7.5],
];

/** PVC correction by ambient °C (IEC 60204-1 table D.1, IEC 60364-5-52; from memory, pattern confirmed). Above 60 °C there is none. */
export const iecAmbient: readonly (readonly [number, number])[] = [
  [30, 1.15],
  [35, 1.08],
  [40, 1],
  [45, 0.91],
  [50, 0.82],
  [55, 0.71],
  [60, 0.58],
];

/** Factor by number of loaded circuits together, in conduit or bunched (IEC 60364-5-52 table B.52.17, from memory). */
export const iecBunched: readonly (readonly [number, number])[] = [
  [1, 1],
  [2, 0.8],
  [3, 0.7],
  [4, 0.65],
  [5, 0.6],
  [6, 0.57],
  [7, 0.54],
  [8, 0.52],
  [9, 0.5],
  [12, 0.45],
  [16, 0.41],
  [20, 0.38],
];
/** Same table, one layer on a wall (C) and on a perforated tray (E). From nine on it falls no further. */
export const iecOnWall: readonly (readonly [number, number])[] = [
  [1, 1],
  [2, 0.85],
  [3, 0.79],
  [4, 0.75],
  [5, 0.73],
  [6, 0.72],
  [8, 0.71],
  [9, 0.7],
  [Infinity, 0.7],
];
export const iecOnTray: readonly (readonly [number, number])[] = [
  [1, 1],
  [2, 0.88],
  [3, 0.82],
  [4, 0.77],
  [5, 0.75],
  [7, 0.73],
  [9, 0.72],
  [Infinity, 0.72],
];

/** NFPA 79 table 12.5.1, amperes by AWG: inside the enclosure, in cable or raceway; 30 °C (18 to 26 AWG from memory). */
export const nfpaSmall: readonly (readonly [number, { enclosure: number; cable: number }])[] = [
  [30, { enclosure: 0.5, cable: 0.5 }],
  [28, { enclosure: 0.8, cable: 0.8 }],
  [26, { enclosure: 1, cable: 1 }],
  [24, { enclosure: 2, cable: 2 }],
  [22, { enclosure: 3, cable: 3 }],
  [20, { enclosure: 5, cable: 5 }],
  [18, { enclosure: 7, cable: 7 }],
  [16, { enclosure: 10, cable: 10 }],
  [14, { enclosure: 20, cable: 15 }],
  [12, { enclosure: 25, cable: 20 }],
  [10, { enclosure: 40, cable: 30 }],
];

/** NEC table 310.15(B)(1), 60 °C conductors (from memory). Cooler than 30 °C gains nothing here: the small table is a cap. */
export const necAmbient: readonly (readonly [number, number])[] = [
  [30, 1],
  [35, 0.91],
  [40, 0.82],
  [45, 0.71],
  [50, 0.58],
  [55, 0.41],
];

/** NEC table 310.15(C)(1) by current-carrying conductors together (from memory). */
export const necGrouped: readonly (readonly [number, number])[] = [
  [3, 1],
  [6, 0.8],
  [9, 0.7],
  [20, 0.5],
  [30, 0.45],
  [40, 0.4],
  [Infinity, 0.35],
];
