/** Pushing and pulling one log of a job, as tests of the entries do. */
import request from 'supertest';
import { entriesPage, type EntriesPage } from '../../shared/api/jobs';
import type { Entry } from '../../shared/job/entry';
import { sendJob } from './seedJobs';
import { worksPoints, type Works } from './seedWorks';
import { signed, SignedLog, type SigningDevice } from './signingDevice';

/** A log on a job of its own. */
export async function newLog(works: Works, by: SigningDevice = works.device): Promise<SignedLog> {
  const { job, pack } = await sendJob(works.foreman, works.panel, worksPoints, works.crew);
  return new SignedLog(by, job, pack);
}

/** Delivery needs no session. */
export const push = (works: Works, log: SignedLog, entries: readonly Entry[] = log.entries) =>
  request(works.server.app).post(`/api/jobs/${log.job}/entries`).send(log.push(entries));

export async function pull(works: Works, log: SignedLog, after = 0): Promise<EntriesPage> {
  const answer = await works.electrician.get(`/api/jobs/${log.job}/entries?after=${after}`).expect(200);
  return entriesPage.parse(answer.body);
}

export const stored = (works: Works, log: SignedLog) =>
  works.server.services.database.query<{ id: string; order: number; hash: string; after_access: boolean }[]>(
    'SELECT id, "order", hash, after_access FROM entry WHERE job = $1 ORDER BY "order"',
    [log.job],
  );

export const withoutSignature = ({ signature: _signature, ...rest }: Entry): Omit<Entry, 'signature'> => rest;

/** The log's entries with a change, signed again. */
export const changed = (log: SignedLog, change: Partial<Entry>): Entry[] =>
  log.entries.map((entry) => signed(log.by, { ...withoutSignature(entry), ...change }));
