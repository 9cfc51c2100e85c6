/** What the terminals of a module are electrically: the `io` part of a module in the panel file. */
import { z } from 'zod';
import { nonNegative, positive, percent, text } from './units';

export const polarity = z.enum(['either', 'positive-only', 'negative-only']);

export const digitalInput = z.strictObject({
  kind: z.literal('digital-input'),
  V: positive,
  current: z.enum(['dc', 'ac']),
  type: z.union([z.literal(1), z.literal(2), z.literal(3), z.literal('custom')]),
  thresholds: z
    .strictObject({ UL_V: nonNegative, UH_V: positive, IT_mA: nonNegative, IH_mA: nonNegative })
    .optional(),
  inputOhm: positive.optional(),
  ratedmA: positive.optional(),
  characteristic: z.enum(['resistive', 'constant-current']).optional(),
  maxV: positive.optional(),
  reverseV: positive.optional(),
  bridge: z.boolean().optional(),
  polarity,
});

export const optoInput = z.strictObject({
  kind: z.literal('opto-input'),
  seriesOhm: positive,
  parallelOhm: positive.optional(),
  seriesW: positive,
  Vf: z.strictObject({ min: positive, max: positive }).default({ min: 1.2, max: 1.7 }),
  onmA: positive,
  offmA: nonNegative,
  maxmA: positive,
  reverseV: positive,
  polarity,
  ctr: z
    .strictObject({
      minPct: positive,
      loadOhm: positive,
      logicV: positive,
      vceSat: nonNegative.optional(),
      agePct: percent,
    })
    .optional(),
});

const acContactCodes = [
  'A150',
  'A300',
  'A600',
  'B150',
  'B300',
  'B600',
  'C150',
  'C300',
  'C600',
  'D150',
  'D300',
  'E150',
] as const;
const dcContactCodes = [
  'N150',
  'N300',
  'N600',
  'P150',
  'P300',
  'P600',
  'Q150',
  'Q300',
  'Q600',
  'R150',
  'R300',
] as const;
export const contactCode = z.enum([...acContactCodes, ...dcContactCodes]);

export const digitalOutput = z.strictObject({
  kind: z.literal('digital-output'),
  technology: z.enum(['relay', 'sinking', 'sourcing', 'triac', 'mosfet-ac-dc']),
  Vmin: nonNegative,
  Vmax: positive,
  pointA: positive,
  groupA: positive.optional(),
  inrush: z.strictObject({ A: positive, ms: positive }).optional(),
  leakmA: nonNegative.optional(),
  onDropV: nonNegative.optional(),
  minLoadmA: nonNegative.optional(),
  suppression: z.enum(['none', 'diode', 'tvs', 'rc', 'mov']).optional(),
  contact: z.array(contactCode).optional(),
  dc13: z.strictObject({ V: positive, A: positive }).optional(),
  ac15: z.strictObject({ V: positive, A: positive }).optional(),
});

export const analogueInput = z.strictObject({
  kind: z.literal('analogue-input'),
  signal: z.enum(['4-20mA', '0-20mA', '0-10V', 'rtd', 'thermocouple']),
  inputOhm: positive.optional(),
  powersLoop: z.boolean(),
  isolated: z.boolean(),
  leads: z.union([z.literal(2), z.literal(3), z.literal(4)]).optional(),
  tcType: text(4).optional(),
});

export const analogueOutput = z.strictObject({
  kind: z.literal('analogue-output'),
  signal: z.enum(['4-20mA', '0-10V']),
  maxLoadOhm: positive.optional(),
  minLoadOhm: positive.optional(),
});

export const moduleIo = z.discriminatedUnion('kind', [
  digitalInput,
  optoInput,
  digitalOutput,
  analogueInput,
  analogueOutput,
]);

export type DigitalInput = z.infer<typeof digitalInput>;
export type OptoInput = z.infer<typeof optoInput>;
export type DigitalOutput = z.infer<typeof digitalOutput>;
export type AnalogueInput = z.infer<typeof analogueInput>;
export type AnalogueOutput = z.infer<typeof analogueOutput>;
export type ModuleIo = z.infer<typeof moduleIo>;
export type ContactCode = z.infer<typeof contactCode>;
