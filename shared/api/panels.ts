/** Panels, drafts, revisions, findings and the stateless check. */
import { z } from 'zod';
import { panelSchema } from '../panel/panelSchema';
import { tag, text } from '../panel/units';
import { digest, id, instant, page, pageQuery } from './common';

export const panelUpload = z.strictObject({ id, site: id, panel: panelSchema });
export const draftSave = z.strictObject({ version: z.int(), panel: panelSchema });
export const acceptance = z.strictObject({
  rule: z.string().max(80),
  /** Absent: every place of this rule (a doubt may be accepted in groups). */
  place: z.string().max(200).optional(),
  reason: text(500),
});
export type Acceptance = z.infer<typeof acceptance>;
export const revisionIssue = z.strictObject({ version: z.int(), acceptances: z.array(acceptance) });

export const panelRow = z.object({
  id,
  site: id,
  tag: z.string(),
  name: z.string(),
  location: z.string(),
  points: z.int(),
  /** Newest issued revision, or null. */
  revision: z.int().nullable(),
  draftChanged: z.boolean(),
  openJobs: z.int(),
});
export type PanelRow = z.infer<typeof panelRow>;
export const revisionRow = z.object({
  number: z.int(),
  digest,
  issuedAt: instant,
  issuedBy: z.string(),
  ruleSet: z.string(),
  standing: z.array(z.object({ rule: z.string(), place: z.string(), reason: z.string(), by: z.string() })),
});
export type RevisionRow = z.infer<typeof revisionRow>;
export const panelView = panelRow.extend({
  draft: z.object({ version: z.int(), panel: panelSchema, changedAt: instant, changedBy: z.string() }),
  revisions: z.array(revisionRow),
});
export type PanelView = z.infer<typeof panelView>;
export const panelQuery = pageQuery.extend({ site: id.optional() });
export const panelsPage = page(panelRow);

const quantity = z.object({ name: z.string(), value: z.number(), unit: z.string(), basis: z.string() });
const where = z.object({
  point: z.string().optional(),
  group: z.string().optional(),
  module: z.string().optional(),
  supply: z.string().optional(),
  isolator: z.string().optional(),
  source: z.string().optional(),
  terminal: z.string().optional(),
});
export const findingView = z.object({
  rule: z.string(),
  harm: z.enum(['hurts', 'damages', 'fails', 'doubt', 'tells']),
  where,
  says: z.string(),
  because: z.array(quantity),
  remedy: z
    .object({ says: z.string(), values: z.record(z.string(), z.union([z.number(), z.string()])).optional() })
    .nullable(),
});
export type FindingView = z.infer<typeof findingView>;

/** Findings of a draft or a revision. `place` is what an acceptance names. */
export const placedFinding = findingView.extend({
  place: z.string(),
  accepted: z.object({ reason: z.string(), by: z.string() }).nullable(),
});
export const findingsAnswer = z.object({
  ruleSet: z.string(),
  checks: z.int(),
  couldNotRun: z.array(z.object({ rule: z.string(), where, missing: z.string() })),
  findings: z.array(placedFinding),
  /** Why it cannot be issued yet; empty for a revision. */
  problems: z.array(z.object({ path: z.string(), says: z.string() })),
});
export type FindingsAnswer = z.infer<typeof findingsAnswer>;
export const revisionView = revisionRow.extend({ panel: panelSchema });
export type RevisionView = z.infer<typeof revisionView>;

export const panelCheckRequest = z.strictObject({
  panel: panelSchema,
  scope: z.array(tag).optional(),
  open: z.array(tag).optional(),
  language: z.enum(['en', 'es']).default('en'),
});
export const panelCheck = z.object({
  panel: z.string(),
  digest,
  ruleSet: z.string(),
  checks: z.int(),
  couldNotRun: z.array(z.object({ rule: z.string(), where, missing: z.string() })),
  findings: z.array(findingView),
  isolation: z.object({
    plan: z
      .object({
        isolators: z.array(z.string()),
        weight: z.number(),
        tell: z.array(z.string()),
        guarded: z.array(z.string()),
      })
      .nullable(),
    stillLive: z.array(
      z.object({
        terminal: z.string().optional(),
        place: z.string().optional(),
        supply: z.string().optional(),
        V: z.number(),
        maybe: z.boolean(),
        path: z.array(z.string()),
      }),
    ),
    deadTests: z.array(
      z.object({
        id: z.string(),
        at: z.union([
          z.object({ supply: z.string() }),
          z.object({ group: z.string() }),
          z.object({ point: z.string() }),
        ]),
        terminal: z.string(),
        supply: z.string(),
        pair: z.string(),
        limitV: z.number(),
      }),
    ),
    waits: z.array(
      z.object({
        supply: z.string(),
        t60S: z.number().nullable(),
        t1S: z.number().nullable(),
        statedS: z.number().optional(),
      }),
    ),
  }),
  checklist: z.object({
    steps: z.int(),
    stages: z.array(z.object({ stage: z.string(), steps: z.int() })),
  }),
});
export type PanelCheck = z.infer<typeof panelCheck>;
