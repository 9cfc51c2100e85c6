/** Pulls a job's entries page by page; the cursor moves in the same transaction as what it counts. */
import { entriesPage, type EntriesPage } from '../../shared/api/deviceWire';
import type { Entry } from '../../shared/job/entry';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { keepEntries } from './keepEntries';
import { done, outcomeOf, type RoundOutcome } from './roundOutcome';
import { serverCall } from './serverCall';

// A bound on one round, far above any job: a server that says "more" for ever is left for the next round.
const maxPages = 500;

type Received = EntriesPage['entries'][number];
/** The entry as it was signed, without what the server added; an unknown kind stays as it came. */
const asSigned = ({ order: _order, receivedAt: _receivedAt, ...entry }: Received): Entry => entry;

/** `from` is the cursor the page was asked with: a store wiped meanwhile starts from zero, not from this page. */
async function keepPage(
  env: DeviceEnvironment,
  { work }: Databases,
  job: string,
  from: number,
  page: EntriesPage,
): Promise<void> {
  await work.write(['jobs', 'entries', 'logs'], async (transaction) => {
    const row = await transaction.objectStore('jobs').get(job);
    if (row?.after !== from) return;
    const held = page.entries.map((received) => ({ entry: asSigned(received), setAside: false }));
    const moved = await keepEntries(transaction, row, held);
    for (const log of page.logs) await transaction.objectStore('logs').put({ ...log, job });
    const pulledAt = new Date(env.now()).toISOString();
    await transaction.objectStore('jobs').put({ ...moved, status: page.status, after: page.after, pulledAt });
  });
}

/** What the server now folds is set aside no more. */
async function forgetAside({ outbox }: Databases, page: EntriesPage): Promise<void> {
  const aside = new Set(await outbox.run((database) => database.getAllKeys('attention')));
  const taken = page.entries.filter(({ id }) => aside.has(id));
  if (taken.length === 0) return;
  await outbox.write(['attention'], async (transaction) => {
    for (const { id } of taken) await transaction.objectStore('attention').delete(id);
  });
}

/** Everything after the cursor. A page this version cannot read leaves the cursor before it. */
export async function pullEntries(
  env: DeviceEnvironment,
  databases: Databases,
  job: string,
): Promise<RoundOutcome> {
  for (let page = 0; page < maxPages; page += 1) {
    const row = await databases.work.run((database) => database.get('jobs', job));
    if (!row) return done;
    const url = `/api/jobs/${job}/entries?after=${row.after}`;
    const answer = await serverCall(env, entriesPage, url);
    if (answer.kind !== 'ok') return outcomeOf(answer);
    await keepPage(env, databases, job, row.after, answer.value);
    await forgetAside(databases, answer.value);
    if (!answer.value.more || answer.value.after <= row.after) return done;
  }
  return done;
}
