import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';

export const wizardSteps = ['panel', 'points', 'people', 'send'] as const;
export type WizardStep = (typeof wizardSteps)[number];

const jobDraft = z.object({
  /** Made here, so that sending twice makes one job. */
  id: z.string(),
  site: z.string(),
  step: z.enum(wizardSteps),
  panel: z.string().nullable(),
  revision: z.number().nullable(),
  points: z.array(z.string()),
  electricians: z.array(z.string()),
  foreman: z.string(),
  due: z.string(),
  words: z.string(),
  reasons: z.record(z.string(), z.string()),
});
export type JobDraft = z.infer<typeof jobDraft>;

const storageKey = 'coldloop.newJob';

const fresh = (site: string, foreman: string): JobDraft => ({
  id: uuid(),
  site,
  step: 'panel',
  panel: null,
  revision: null,
  points: [],
  electricians: [],
  foreman,
  due: '',
  words: '',
  reasons: {},
});

function kept(site: string): JobDraft | undefined {
  try {
    const parsed = jobDraft.safeParse(JSON.parse(sessionStorage.getItem(storageKey) ?? 'null'));
    return parsed.success && parsed.data.site === site ? parsed.data : undefined;
  } catch {
    // Not JSON: written by something else; there is nothing of ours to keep.
    return undefined;
  }
}

export const forgetJobDraft = (): void => sessionStorage.removeItem(storageKey);

/** What the foreman has chosen so far; outlives a reload of the page, ends with the tab. */
export function useJobDraft(site: string, foreman: string): [JobDraft, (change: Partial<JobDraft>) => void] {
  const [draft, setDraft] = useState(() => kept(site) ?? fresh(site, foreman));
  const change = (changes: Partial<JobDraft>) =>
    setDraft((before) => {
      const after = { ...before, ...changes };
      sessionStorage.setItem(storageKey, JSON.stringify(after));
      return after;
    });
  return [draft, change];
}
