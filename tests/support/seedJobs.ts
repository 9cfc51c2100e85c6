/** Panels, revisions and jobs made through the API, as the office makes them. */
import { v7 } from 'uuid';
import { packList, type JobPreview, type JobRequest, type Pack } from '../../shared/api/jobs';
import type { Acceptance, FindingsAnswer } from '../../shared/api/panels';
import type { Panel } from '../../shared/panel/panelSchema';
import { packIntegrity } from '../../src/offline/packIntegrity';
import type { Agent } from './seedPeople';

type Found = FindingsAnswer['findings'][number];

/** One acceptance for each finding that may be accepted: a doubt by its rule, the rest by place. */
export function acceptancesFor(findings: readonly Found[]): Acceptance[] {
  const open = findings.filter(({ harm }) => harm !== 'hurts' && harm !== 'tells');
  const given = open.map(({ rule, harm, place }): Acceptance =>
    harm === 'doubt' ? { rule, reason: 'Settled on site' } : { rule, place, reason: 'Known and agreed' },
  );
  return [...new Map(given.map((each) => [`${each.rule} ${each.place ?? ''}`, each])).values()];
}

/** Acceptances for everything that a draft's findings leave open. */
export async function acceptAll(engineer: Agent, panel: string): Promise<Acceptance[]> {
  const answer = await engineer.get(`/api/panels/${panel}/draft/findings`).expect(200);
  return acceptancesFor((answer.body as FindingsAnswer).findings);
}

/** Uploads a panel and issues its first revision. @returns its id. */
export async function issuePanel(engineer: Agent, site: string, panel: Panel): Promise<string> {
  const id = v7();
  await engineer.post('/api/panels').send({ id, site, panel }).expect(201);
  await issueDraft(engineer, id, 1);
  return id;
}

export async function issueDraft(engineer: Agent, panel: string, version: number): Promise<void> {
  const acceptances = await acceptAll(engineer, panel);
  await engineer.post(`/api/panels/${panel}/revisions`).send({ version, acceptances }).expect(201);
}

export interface Crew {
  electricians: string[];
  foreman: string;
}

/** The request of a job on these points, with everything accepted that its preview leaves open. */
export async function jobRequestFor(
  foreman: Agent,
  panel: string,
  points: string[],
  crew: Crew,
  revision = 1,
): Promise<JobRequest> {
  const answer = await foreman.post('/api/jobs/preview').send({ panel, revision, points }).expect(200);
  const { findings } = answer.body as JobPreview;
  const acceptances = acceptancesFor(findings.filter(({ needsAcceptance }) => needsAcceptance));
  return { id: v7(), panel, revision, points, ...crew, due: '2099-12-04', acceptances };
}

/** Plans and sends a job. @returns its id and the digest of its pack. */
export async function sendJob(
  foreman: Agent,
  panel: string,
  points: string[],
  crew: Crew,
): Promise<{ job: string; pack: string }> {
  const body = await jobRequestFor(foreman, panel, points, crew);
  await foreman.post('/api/jobs').send(body).expect(201);
  const sent = await foreman.post(`/api/jobs/${body.id}/send`).expect(200);
  return { job: body.id, pack: (sent.body as { pack: string }).pack };
}

/** The whole pack of a job as this person's phone gets it. */
export async function packOf(agent: Agent, job: string): Promise<Pack> {
  const { packs } = packList.parse((await agent.get('/api/my/packs').expect(200)).body);
  const found = packs.map(packIntegrity).find((each) => each.ok && each.pack.job.id === job);
  if (!found?.ok) throw new Error(`no whole pack of job ${job}`);
  return found.pack;
}

export function firstOf<T>(items: readonly T[]): T {
  const [first] = items;
  if (first === undefined) throw new Error('there is none');
  return first;
}
