/** Everything a phone needs for a job with no signal, under one digest. */
import type { Language } from '../../../shared/api/common';
import type { Pack, PackPerson } from '../../../shared/api/jobs';
import type { SiteView } from '../../../shared/api/sites';
import { wordingKeys } from '../../../shared/checklist/textsOf';
import { digestOf } from '../../../shared/panel/canonical';
import type { Panel } from '../../../shared/panel/panelSchema';
import type { Text } from '../../../shared/panel/says';
import { messageOf } from '../../../shared/wording/render';
import type { PreparedJob } from './prepare';

export interface PackParts {
  job: { id: string; number: string; due: string; words: string | null };
  site: SiteView;
  panel: Panel;
  revision: number;
  prepared: PreparedJob;
  people: PackPerson[];
}

const keysOf = ({ key, params = {} }: Text): string[] => [
  key,
  ...Object.values(params).flatMap((value) => (typeof value === 'object' ? keysOf(value) : [])),
];

function findingKeys({ findings }: PreparedJob): string[] {
  return findings.flatMap(({ finding }) => [
    ...keysOf(finding.says),
    ...(finding.remedy ? keysOf(finding.remedy.says) : []),
    // A quantity may be named by a plain word that needs no translation.
    ...finding.because.map(({ name }) => name).filter((name) => messageOf('en', name) !== undefined),
  ]);
}

/** @throws Error when a language lacks a message: a phone must not learn that in a basement. */
function messages(language: Language, keys: readonly string[]): Record<string, string> {
  return Object.fromEntries(
    keys.map((key) => {
      const message = messageOf(language, key);
      if (message === undefined) throw new Error(`no wording for "${key}" in ${language}`);
      return [key, message];
    }),
  );
}

/** @throws Error without a plan: such a job is refused before. */
export function makePack({ job, site, panel, revision, prepared, people }: PackParts): Pack {
  const { plan, checklist, stillLive, waits, findings } = prepared;
  if (!plan || !checklist) throw new Error(`job ${job.id} has no plan`);
  const keys = [...new Set([...wordingKeys(checklist), ...findingKeys(prepared)])].sort();
  const rest: Omit<Pack, 'digest'> = {
    format: 'coldloop-pack/1',
    job: {
      id: job.id,
      number: job.number,
      due: job.due,
      ...(job.words === null ? {} : { words: job.words }),
      site: { id: site.id, name: site.name, settings: site.settings },
    },
    panel,
    revision,
    checklist,
    plan,
    stillLive,
    waits,
    findings: findings.map(({ finding, accepted }) => ({
      finding,
      ...(accepted ? { accepted: { reason: accepted.reason, by: accepted.by } } : {}),
    })),
    people,
    wording: { en: messages('en', keys), es: messages('es', keys) },
  };
  return { ...rest, digest: digestOf(rest) };
}
