/** Field devices, suppressors and cables: what hangs on a terminal. */
import { z } from 'zod';
import { nonNegative, percent, positive, tag, text } from './units';

export const suppressor = z.strictObject({
  kind: z.enum(['diode', 'tvs', 'zener', 'rc', 'mov', 'none']),
  at: z.enum(['load', 'contact']),
  V: positive.optional(),
  A: positive.optional(),
  ohm: positive.optional(),
  uF: positive.optional(),
  reversed: z.boolean().optional(),
});

export const loadKind = z.enum(['resistive', 'coil', 'solenoid', 'lamp', 'led', 'motor', 'electronic']);
const current = z.enum(['dc', 'ac']);
const named = { tag: tag.optional(), location: text(120).optional() };

const threeWire = { dropV: nonNegative, leakmA: nonNegative, maxmA: positive, supplymA: nonNegative };
const wires = z.union([z.literal(2), z.literal(3), z.literal(4)]);

export const device = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('contact'), ...named }),
  z.strictObject({
    kind: z.literal('two-wire'),
    ...named,
    current,
    dropV: nonNegative,
    leakmA: nonNegative,
    minmA: nonNegative,
    maxmA: positive,
  }),
  z.strictObject({ kind: z.literal('npn'), ...named, ...threeWire }),
  z.strictObject({ kind: z.literal('pnp'), ...named, ...threeWire }),
  z.strictObject({ kind: z.literal('push-pull'), ...named, ...threeWire }),
  z.strictObject({ kind: z.literal('namur'), ...named }),
  z.strictObject({ kind: z.literal('ssr-output'), ...named, leakmA: nonNegative, dropV: nonNegative }),
  z.strictObject({
    kind: z.literal('transmitter'),
    ...named,
    wires,
    minV: positive.optional(),
    maxmA: positive.optional(),
  }),
  z.strictObject({ kind: z.literal('rtd'), ...named, wires }),
  z.strictObject({ kind: z.literal('thermocouple'), ...named, type: text(4) }),
  z.strictObject({
    kind: z.literal('load'),
    ...named,
    load: loadKind,
    V: positive,
    current,
    A: positive,
    inrushA: positive.optional(),
    inrushMs: positive.optional(),
    LRms: positive.optional(),
    pickUpPct: percent.optional(),
    dropOutPct: percent.optional(),
    polarised: z.boolean(),
    reversed: z.boolean().optional(),
    suppressed: z.boolean().optional(),
  }),
  z.strictObject({
    kind: z.literal('ssr-control'),
    ...named,
    Vmin: nonNegative,
    Vmax: positive,
    mA: positive,
    polarised: z.boolean(),
    reversed: z.boolean().optional(),
    rating: z.strictObject({
      V: positive,
      current,
      A: positive,
      polarised: z.boolean(),
      dropV: nonNegative.optional(),
      leakmA: nonNegative.optional(),
      heatSink: z.boolean().optional(),
    }),
    load: z.strictObject({
      supply: tag,
      V: positive,
      current,
      A: positive,
      load: loadKind,
      reversed: z.boolean().optional(),
      suppressor: suppressor.optional(),
    }),
  }),
]);

export const cable = z.strictObject({
  tag: tag.optional(),
  size: z.union([z.strictObject({ mm2: positive }), z.strictObject({ awg: z.int().min(-3).max(40) })]),
  lengthM: nonNegative,
  conductor: z.enum(['class1-2', 'class5']).optional(),
  screened: z.boolean().optional(),
  screenEarthed: z.enum(['panel', 'field', 'both', 'none']).optional(),
  cores: z.int().positive().optional(),
  grouped: z.int().positive().optional(),
  colours: z.array(text(12)).optional(),
  pFperM: positive.optional(),
  insulationV: positive.optional(),
  type: text(60).optional(),
});

export const fuse = z.strictObject({
  tag: tag.optional(),
  A: positive,
  kind: z.enum(['gG', 'miniature-F', 'miniature-T', 'breaker']).optional(),
});

export type Device = z.infer<typeof device>;
export type DeviceOf<K extends Device['kind']> = Extract<Device, { kind: K }>;
export type LoadKind = z.infer<typeof loadKind>;
export type Suppressor = z.infer<typeof suppressor>;
export type Cable = z.infer<typeof cable>;
export type Fuse = z.infer<typeof fuse>;
