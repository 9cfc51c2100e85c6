/** Sends one log's unsent entries of one job until none is left, the server refuses, or nobody answers. */
import { entriesAnswer, headsProblem } from '../../shared/api/deviceWire';
import type { Entry } from '../../shared/job/entry';
import { acknowledge } from './acknowledge';
import { batch, maxBatchEntries } from './batch';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { done, outcomeOf, type RoundOutcome } from './roundOutcome';
import { rememberSent } from './sendStatus';
import { serverCall, type ServerAnswer } from './serverCall';
import { unsentOfLog, wholeLog, type UnsentLog } from './unsentEntries';

export interface PushContext {
  env: DeviceEnvironment;
  databases: Databases;
  /** Called after each acknowledged batch, so that screens count down. */
  changed: () => Promise<void>;
}

/** What is still to send and how carefully; each answer of the server makes the next one, or ends the push. */
interface Progress {
  queue: Entry[];
  limit: number;
  /** How often the server said that it does not hold what comes before. */
  rewinds: number;
}
type Next = { go: Progress } | { end: RoundOutcome };
type Acknowledged = { id: string; setAside: boolean }[];
type Refusal = Extract<ServerAnswer<unknown>, { kind: 'refused' }>;

async function attend({ env, databases }: PushContext, entry: Entry, says: string): Promise<void> {
  const row = { entry: entry.id, job: entry.job, says, at: new Date(env.now()).toISOString() };
  await databases.outbox.run((database) => database.put('attention', row));
}

async function afterSuccess(
  context: PushContext,
  progress: Progress,
  sent: Entry[],
  acknowledged: Acknowledged,
): Promise<Next> {
  const answers = new Map(acknowledged.map((answer) => [answer.id, answer.setAside]));
  const held = sent
    .filter(({ id }) => answers.has(id))
    .map((entry) => ({ entry, setAside: answers.get(entry.id) === true }));
  const [first] = held;
  // An answer that acknowledges nothing we sent would be asked for ever.
  if (!first) return { end: { end: 'refused', says: { key: 'device.store.error.not-acknowledged' } } };
  await acknowledge(context.databases, first.entry.job, held);
  for (const { entry, setAside } of held)
    if (setAside) await attend(context, entry, context.env.say({ key: 'device.store.setAside' }));
  await rememberSent(context.databases, new Date(context.env.now()).toISOString());
  await context.changed();
  const queue = progress.queue.filter(({ id }) => !answers.has(id));
  return { go: { ...progress, queue, limit: maxBatchEntries } };
}

/** First from the head the server names; when that does not join either, the whole log, once. */
async function rewound(
  { databases }: PushContext,
  { log }: UnsentLog,
  progress: Progress,
  head: number,
): Promise<Progress> {
  const fromHead = progress.rewinds === 0 ? await wholeLog(databases, log, head + 1) : [];
  const queue = fromHead.length > 0 ? fromHead : await wholeLog(databases, log, 1);
  return { ...progress, queue, rewinds: fromHead.length > 0 ? 1 : 2 };
}

async function afterRefusal(
  context: PushContext,
  unsent: UnsentLog,
  progress: Progress,
  sent: Entry[],
  answer: Refusal,
): Promise<Next> {
  const heads = headsProblem.safeParse(answer.body);
  if (heads.success && progress.rewinds < 2)
    return { go: await rewound(context, unsent, progress, heads.data.heads[unsent.log] ?? 0) };
  const outcome = outcomeOf(answer);
  if (outcome.end !== 'refused') return { end: outcome };
  // Halved until the one entry that is refused stands alone: those before it get through.
  if (sent.length > 1) return { go: { ...progress, limit: Math.ceil(sent.length / 2) } };
  for (const entry of sent) await attend(context, entry, answer.problem.detail ?? answer.problem.title);
  await context.changed();
  return { end: outcome };
}

async function step(context: PushContext, unsent: UnsentLog, progress: Progress): Promise<Next> {
  const { job, log, key } = unsent;
  const sent = batch(progress.queue, progress.limit);
  if (sent.length === 0) return { end: done };
  const body = { logs: { [log]: key }, entries: sent };
  const url = `/api/jobs/${job}/entries`;
  const answer = await serverCall(context.env, entriesAnswer, url, { method: 'POST', body });
  if (answer.kind === 'ok') return afterSuccess(context, progress, sent, answer.value.acknowledged);
  if (answer.kind === 'refused') return afterRefusal(context, unsent, progress, sent, answer);
  return { end: outcomeOf(answer) };
}

const wasRefused = async ({ databases }: PushContext, entry: Entry | undefined): Promise<boolean> =>
  entry !== undefined &&
  (await databases.outbox.run((database) => database.getKey('attention', entry.id))) !== undefined;

/** Everything of one log, in batches; bounded, because each step acknowledges, halves or rewinds. */
export async function pushLog(context: PushContext, unsent: UnsentLog): Promise<RoundOutcome> {
  const queue = await unsentOfLog(context.databases, unsent.log);
  let progress: Progress = {
    queue,
    // One that was refused before is asked about alone: the rest of its log cannot go without it.
    limit: (await wasRefused(context, queue[0])) ? 1 : maxBatchEntries,
    rewinds: 0,
  };
  for (;;) {
    const next = await step(context, unsent, progress);
    if ('end' in next) return next.end;
    progress = next.go;
  }
}
