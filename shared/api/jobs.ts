/** Jobs, packs, entries, devices and keys. */
import { z } from 'zod';
import { stages, type Checklist } from '../checklist/types';
import type { Finding } from '../rules/finding';
import type { LockPlan, StillLive, Wait } from '../isolation/types';
import type { Panel } from '../panel/panelSchema';
import { tag, text } from '../panel/units';
import { digest, id, instant, page, pageQuery } from './common';
import type { Language } from './common';
import { jobStatus } from './deviceWire';
import type { SiteSettings } from './sites';
import { acceptance, panelCheck, placedFinding } from './panels';

export * from './deviceWire';

export const jobRequest = z.strictObject({
  id,
  panel: id,
  revision: z.int().positive(),
  points: z.array(tag).min(1),
  electricians: z.array(id).min(1),
  foreman: id,
  due: z.iso.date(),
  words: text(1000).optional(),
  acceptances: z.array(acceptance),
});
export type JobRequest = z.infer<typeof jobRequest>;
/** What a job on these points would be, computed while choosing: plan, findings in scope, whether it can start. */
export const jobPreviewRequest = z.strictObject({
  panel: id,
  revision: z.int().positive(),
  points: z.array(tag),
});
export const jobPreview = z.object({
  /** Nothing blocks and nothing is left to accept. */
  canStart: z.boolean(),
  /** What no acceptance lifts: no points, no lock plan, a finding that hurts. */
  blocked: z.array(
    z.object({ code: z.enum(['no-points', 'unknown-point', 'no-plan', 'hurts']), says: z.string() }),
  ),
  points: z.int(),
  of: z.int(),
  plan: z
    .object({
      isolators: z.array(
        z.object({
          tag: z.string(),
          location: z.string(),
          lock: z.enum(['hasp', 'device-needed', 'cannot-lock']),
          lockDevice: z.string().nullable(),
          tell: z.array(z.string()),
          afterDoor: z.boolean(),
          currentMustBeZero: z.boolean(),
          extraMeasure: z.boolean(),
        }),
      ),
      weight: z.number(),
      guarded: z.array(z.object({ supply: z.string(), reason: z.string(), guard: z.string() })),
      otherEnergy: z.array(z.string()),
      proven: z.boolean(),
    })
    .nullable(),
  stillLive: panelCheck.shape.isolation.shape.stillLive,
  waits: panelCheck.shape.isolation.shape.waits,
  /** Findings in the scope; `needsAcceptance` until the revision or the job accepts them. */
  findings: z.array(placedFinding.extend({ needsAcceptance: z.boolean() })),
  /** How many checks ran on the panel, and those of the scope that could not: "no findings" is never shown without them. */
  checks: z.int(),
  couldNotRun: panelCheck.shape.couldNotRun,
  checklist: panelCheck.shape.checklist,
});
export type JobPreview = z.infer<typeof jobPreview>;
export const cancelRequest = z.strictObject({ words: text(500) });

const personName = z.object({ id, name: z.string() });
export const jobRow = z.object({
  id,
  number: z.string(),
  site: id,
  panel: id,
  panelTag: z.string(),
  panelName: z.string(),
  revision: z.int(),
  status: jobStatus,
  points: z.int(),
  of: z.int(),
  due: z.iso.date(),
  isolators: z.array(z.string()),
  electricians: z.array(personName),
  foreman: personName,
  /** Progress as the server has heard it. */
  stage: z.string().nullable(),
  stageDone: z.int(),
  stageOf: z.int(),
  stagesDone: z.int(),
  locks: z.array(z.object({ isolator: z.string(), lock: z.string(), person: z.string() })),
  lastHeard: instant.nullable(),
  /** Why it waits for the foreman, with the number each. */
  waiting: z.array(
    z.object({
      what: z.enum(['countersign', 'hold', 'two-answers', 'drawing-differs', 'contradiction', 'late']),
      count: z.int(),
      since: instant,
    }),
  ),
  newerRevision: z.boolean(),
  record: id.nullable(),
});
export type JobRow = z.infer<typeof jobRow>;
export const jobQuery = pageQuery.extend({
  site: id.optional(),
  panel: id.optional(),
  status: jobStatus.optional(),
  /** `me`: only jobs that wait for the foreman who asks. */
  waiting: z.literal('me').optional(),
});
export const jobsPage = page(jobRow);
export const jobView = jobRow.extend({
  scope: z.array(z.string()),
  words: z.string().nullable(),
  acceptances: z.array(acceptance.extend({ by: z.string() })),
  /** Digest of the pack that was sent, or null while planned. */
  pack: digest.nullable(),
  sentAt: instant.nullable(),
  cancelled: z.object({ at: instant, by: z.string(), words: z.string() }).nullable(),
});
export type JobView = z.infer<typeof jobView>;

/** `GET /api/jobs/:id/state`: the job folded from what the server has heard, in the language asked for. */
export const jobStateView = z.object({
  round: z.int(),
  stages: z.array(
    z.object({
      stage: z.enum(stages),
      status: z.enum(['done', 'current', 'locked', 'open']),
      done: z.int(),
      of: z.int(),
    }),
  ),
  steps: z.array(
    z.object({
      id: z.string(),
      stage: z.enum(stages),
      title: z.string(),
      status: z.enum(['open', 'done', 'held', 'out', 'two-answers', 'out-of-scope', 'accepted']),
      /** Newest last; `found` is the answer in words or as a reading with its unit. */
      answers: z.array(
        z.object({
          person: z.string(),
          at: instant,
          found: z.string(),
          verdict: z.enum(['ok', 'out', 'refused']),
          round: z.int(),
        }),
      ),
      hold: z.object({ person: z.string(), at: instant, words: z.string() }).nullable(),
      returned: z.string().nullable(),
    }),
  ),
});
export type JobStateView = z.infer<typeof jobStateView>;

export interface PackPerson {
  id: string;
  name: string;
  part: 'electrician' | 'foreman';
  /** Public keys known when the pack was made; later ones come with the entries. */
  keys: { key: string; publicKey: JsonWebKey }[];
}
/** Everything a phone needs to do the job with no signal. `digest` is SHA-256 of the canonical JSON of the rest. */
export interface Pack {
  format: 'coldloop-pack/1';
  digest: string;
  job: {
    id: string;
    number: string;
    due: string;
    words?: string;
    site: { id: string; name: string; settings: SiteSettings };
  };
  panel: Panel;
  revision: number;
  checklist: Checklist;
  plan: LockPlan;
  stillLive: StillLive[];
  waits: Wait[];
  findings: { finding: Finding; accepted?: { reason: string; by: string } }[];
  people: PackPerson[];
  /** The message templates its texts use, per language, as they were at issue. */
  wording: Record<Language, Record<string, string>>;
}

export const deviceView = z.object({
  id,
  name: z.string(),
  registeredAt: instant,
  revokedAt: instant.nullable(),
  people: z.array(personName),
  lastHeard: instant.nullable(),
});
export type DeviceView = z.infer<typeof deviceView>;
export interface PackList {
  packs: Pack[];
  current: { job: string; digest: string; status: z.infer<typeof jobStatus> }[];
}
