/** The panel file (`coldloop-panel/1`): one schema, from which every type and the published JSON Schema come. */
import { z } from 'zod';
import { cable, device, fuse, suppressor } from './device';
import { moduleIo } from './moduleIo';
import { nonNegative, positive, tag, text } from './units';

export const maxPoints = 20_000;
export const maxPanelBytes = 40 * 1024 * 1024;

/** Kinds of source that make something live; the others are blocked and released. */
export const electricalSources = ['feeder', 'other-panel', 'battery', 'generator'] as const;
const otherSources = ['pneumatic', 'hydraulic', 'gravity', 'spring', 'thermal'] as const;

export const source = z.strictObject({
  tag,
  kind: z.enum([...electricalSources, ...otherSources]),
  description: text(200),
  location: text(120),
  V: positive.optional(),
  phases: z.union([z.literal(1), z.literal(3), z.literal('dc')]).optional(),
  arcFlash: z
    .strictObject({
      calPerCm2: nonNegative.optional(),
      category: z.int().min(0).max(4).optional(),
      boundaryM: nonNegative.optional(),
    })
    .optional(),
  isolators: z.array(tag).optional(),
  dissipate: text(300).optional(),
  verify: text(300).optional(),
});

export const isolator = z.strictObject({
  tag,
  kind: z.enum([
    'disconnect',
    'breaker',
    'fuse-carrier',
    'plug',
    'valve',
    'blocking-device',
    'contactor',
    'interlock',
  ]),
  location: text(120),
  inPanel: z.boolean(),
  inSight: z.boolean(),
  operatedFrom: z.enum(['outside', 'door-open']),
  opens: z.enum(['all-conductors', 'all-live', 'one-conductor']),
  loadBreak: z.boolean(),
  suitableForIsolation: z.boolean(),
  purpose: z.enum(['control', 'motive', 'both']),
  lock: z.enum(['hasp', 'device-needed', 'cannot-lock']),
  lockDevice: text(120).optional(),
  alsoFeeds: z.array(text(120)).optional(),
});

const terminals = z.union([
  z.strictObject({ plus: tag, minus: tag }),
  z.strictObject({ L: tag, N: tag }),
  z.strictObject({ L1: tag, L2: tag, L3: tag, N: tag.optional() }),
  z.strictObject({ L1: tag, L2: tag }),
]);

export const supply = z.strictObject({
  tag,
  description: text(200),
  kind: z.enum(['dc', 'ac1', 'ac3']),
  purpose: z.enum(['field', 'logic']),
  V: positive,
  tolerance: z
    .strictObject({ minPct: z.number().min(-100).max(0), maxPct: z.number().min(0).max(100) })
    .optional(),
  earthed: z.boolean(),
  earthFaultMonitor: z.boolean().optional(),
  terminals,
  feeds: z.array(z.strictObject({ from: tag, through: z.array(tag) })),
  ratedA: positive.optional(),
  otherLoadA: nonNegative.optional(),
  protectionA: positive.optional(),
  bulk: z.union([
    z.literal('none'),
    z.strictObject({
      uF: positive,
      bleedOhm: positive.optional(),
      dischargeS: nonNegative.optional(),
      rectified: z.boolean().optional(),
    }),
  ]),
  extraLow: z.enum(['SELV', 'PELV', 'none']),
  mayStayLive: z.strictObject({ reason: text(200), guard: text(200) }).optional(),
});

export const panelModule = z.strictObject({
  tag,
  slot: text(40),
  description: text(200),
  pluggable: z.boolean().optional(),
  terminals: z.array(tag).optional(),
  commonInsulationV: positive.optional(),
  terminalRange: z
    .strictObject({ minMm2: positive, maxMm2: positive, torqueNm: positive.optional() })
    .optional(),
  io: moduleIo,
});

export const group = z.strictObject({
  tag,
  module: tag,
  terminal: tag,
  // A draft may not know yet which supply feeds a common; an issued revision must (see panelIssue.ts).
  supply: tag.optional(),
  common: z.enum(['positive', 'negative', 'line', 'neutral']),
  phase: z.enum(['L1', 'L2', 'L3']).optional(),
  linkedTo: z.array(tag).optional(),
  fuse: fuse.optional(),
});

export const conductorRole = z.enum([
  'signal',
  'plus',
  'minus',
  'line',
  'neutral',
  'return',
  'screen',
  'earth',
]);

export const point = z.strictObject({
  address: tag,
  terminal: tag,
  wire: tag,
  description: text(200),
  group: tag,
  conductors: z
    .array(z.strictObject({ role: conductorRole, wire: tag, colour: text(12).optional(), terminal: tag }))
    .optional(),
  device,
  series: z.array(device).optional(),
  parallel: z.array(device).optional(),
  spare: z.boolean().optional(),
  cable: cable.optional(),
  fuse: fuse.optional(),
  suppressor: suppressor.optional(),
  bleeder: z.strictObject({ ohm: positive, W: positive }).optional(),
  // Absent = nobody has said yet whether foreign voltage reaches this terminal: never treated as none.
  otherSupply: z.union([z.literal('none'), tag]).optional(),
});

export const stopControl = z.strictObject({
  tag,
  location: text(120),
  stop: text(200),
  start: text(200),
  beforeTry: text(300).optional(),
});

export const panelSchema = z.strictObject({
  format: z.literal('coldloop-panel/1'),
  tag,
  name: text(120),
  location: text(120),
  drawing: z.strictObject({ number: text(60), revision: text(20) }),
  practice: z.enum(['IEC 60204-1', 'NFPA 79']),
  frequencyHz: z.union([z.literal(50), z.literal(60)]),
  ambientC: z.number().min(-40).max(85).optional(),
  wiringMethod: z.enum(['B1', 'B2', 'C', 'E']).optional(),
  disconnect: tag.nullable(),
  earthTerminal: tag,
  sources: z.array(source),
  isolators: z.array(isolator),
  supplies: z.array(supply),
  modules: z.array(panelModule),
  groups: z.array(group),
  points: z.array(point).max(maxPoints, `holds more than ${maxPoints} points`),
  stopControls: z.array(stopControl),
});

export type Panel = z.infer<typeof panelSchema>;
export type Source = z.infer<typeof source>;
export type Isolator = z.infer<typeof isolator>;
export type Supply = z.infer<typeof supply>;
export type Module = z.infer<typeof panelModule>;
export type Group = z.infer<typeof group>;
export type Point = z.infer<typeof point>;
export type ConductorRole = z.infer<typeof conductorRole>;
