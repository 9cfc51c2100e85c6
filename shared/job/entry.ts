/** Entries: what happens on a job, one signed line at a time. The zod schema is the type and the wire format. */
import { z } from 'zod';
import { text } from '../panel/units';

const id = z.uuid();
const sha256 = z.string().regex(/^[0-9a-f]{64}$/);
const stepId = text(160);
const tag = text(40);
const words = text(2000);

export const answerValue = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('done') }),
  z.strictObject({ kind: z.literal('reading'), value: z.number() }),
  z.strictObject({ kind: z.literal('choice'), value: text(80) }),
  z.strictObject({ kind: z.literal('text'), text: words }),
  z.strictObject({ kind: z.literal('photo'), sha256 }),
  z.strictObject({ kind: z.literal('wait'), waitedS: z.number().nonnegative() }),
  z.strictObject({ kind: z.literal('scan'), text: text(200), typed: z.boolean() }),
  z.strictObject({
    kind: z.literal('instrument'),
    make: text(80),
    number: text(80),
    category: z.enum(['CAT II', 'CAT III', 'CAT IV']),
    ratedV: z.number().positive(),
    checkDue: z.iso.date(),
  }),
]);

const language = z.enum(['en', 'es']);
/** A drawn signature as strokes of [x, y, pressure], or a typed name. */
export const signaturePicture = z.union([
  z.strictObject({ strokes: z.array(z.array(z.tuple([z.number(), z.number(), z.number()]))).min(1) }),
  z.strictObject({ typed: text(120) }),
]);
const signatureBody = {
  name: text(120),
  zone: text(60),
  meaning: words,
  digest: sha256,
  language,
  picture: signaturePicture,
};
const heads = z.record(z.string(), z.int().positive());

const bodies = {
  accepted: z.strictObject({}),
  /** `shown` is the step's text as the person saw it. */
  answer: z.strictObject({
    step: stepId,
    value: answerValue,
    shown: words,
    language,
    watched: id.optional(),
  }),
  hold: z.strictObject({
    step: stepId,
    words,
    reason: z.enum([
      'cannot-reach',
      'part-missing',
      'part-damaged',
      'drawing-differs',
      'not-safe',
      'out-of-limit',
      'other',
    ]),
  }),
  'hold-decided': z.strictObject({ hold: id, decision: z.enum(['rework', 'accept', 'out-of-scope']), words }),
  chosen: z.strictObject({ step: stepId, entry: id, words }),
  photo: z.strictObject({
    sha256,
    type: z.enum(['image/jpeg', 'image/png', 'image/webp']),
    bytes: z.int().positive(),
    step: stepId.optional(),
  }),
  'lock-on': z.strictObject({ isolator: tag, lock: tag, step: stepId.optional() }),
  'lock-off': z.strictObject({ isolator: tag, lock: tag, step: stepId.optional() }),
  'lock-removed-by-supervisor': z.strictObject({
    isolator: tag,
    lock: tag,
    owner: id,
    notOnSite: words,
    effort: words,
    toldBeforeReturn: words,
    witness: id,
  }),
  closed: z.strictObject({ isolator: tag, step: stepId, counted: z.int().nonnegative() }),
  /** A fault or a return sends these points back through isolation; the round's name is this entry's id. */
  'round-started': z.strictObject({
    points: z.array(tag),
    reason: z.enum(['fault', 'returned', 'plan-changed', 'break']),
    words,
  }),
  handover: z.strictObject({ from: id, to: id, isolators: z.array(tag), lock: tag }),
  clear: z.strictObject({ person: id }),
  signed: z.strictObject({ ...signatureBody, steps: z.array(stepId) }),
  countersigned: z.strictObject({ ...signatureBody, heads }),
  returned: z.strictObject({ steps: z.array(z.strictObject({ step: stepId, words })).min(1) }),
  'drawing-differs': z.strictObject({ step: stepId.optional(), says: words, proposed: words.optional() }),
  temporary: z.strictObject({
    what: z.enum(['wire-lifted', 'jumper', 'earth']),
    place: words,
    removes: id.optional(),
  }),
  note: z.strictObject({ words }),
} as const;

export type EntryKind = keyof typeof bodies;
export const entryKinds = Object.keys(bodies) as EntryKind[];
export type BodyOf<K extends EntryKind> = z.infer<(typeof bodies)[K]>;
export const bodySchemas: { readonly [K in EntryKind]: z.ZodType<BodyOf<K>> } = bodies;

/** The outside of an entry; kinds this version does not know keep their body as it came. */
export const entryEnvelope = z.strictObject({
  id,
  job: id,
  log: id,
  seq: z.int().positive(),
  /** SHA-256 of the log's entry before it, signature included; null for the first. */
  previous: sha256.nullable(),
  /** Version vector of the other logs this one knew: log → seq. */
  seen: z.record(z.string(), z.int().positive()),
  kind: z.string().min(1).max(60),
  body: z.record(z.string(), z.unknown()),
  /** Digest of the checklist pack it answers. */
  pack: sha256,
  /** The device's clock, for showing only. */
  at: z.iso.datetime({ offset: true }),
  /** ECDSA P-256, P1363, base64url, over the RFC 8785 bytes of all other fields. */
  signature: z.string().regex(/^[A-Za-z0-9_-]{86}$/),
});
export type Entry = z.infer<typeof entryEnvelope>;
export type EntryOf<K extends EntryKind> = Omit<Entry, 'kind' | 'body'> & { kind: K; body: BodyOf<K> };
export type KnownEntry = { [K in EntryKind]: EntryOf<K> }[EntryKind];
export type AnswerValue = z.infer<typeof answerValue>;
