/** One sending round: push every log, then pull packs and entries. Push comes first, so a pull never hides what is unsent. */
import { pullEntries } from './pullEntries';
import { pruneSealed } from './pruneSealed';
import { pullPacks } from './pullPacks';
import { pushLog, type PushContext } from './pushLog';
import { done, worse, type RoundOutcome } from './roundOutcome';
import { unsentLogs } from './unsentEntries';

export interface RoundScope {
  /** Jobs to pull; undefined: ask for packs and pull every job of the signed-in person. */
  only?: string[];
}

/** A log that is refused does not keep the next from being sent; a server that is not there ends the push. */
async function pushAll(context: PushContext): Promise<RoundOutcome> {
  let outcome = done;
  for (const unsent of await unsentLogs(context.databases)) {
    outcome = worse(outcome, await pushLog(context, unsent));
    if (outcome.end === 'wait') return outcome;
  }
  return outcome;
}

async function pullJobs(
  { env, databases, changed }: PushContext,
  jobs: string[],
  before: RoundOutcome,
): Promise<RoundOutcome> {
  let outcome = before;
  for (const job of jobs) {
    outcome = worse(outcome, await pullEntries(env, databases, job));
    await changed();
    if (outcome.end === 'wait') return outcome;
  }
  return outcome;
}

/** @returns the worst outcome of its parts */
export async function sendingRound(context: PushContext, { only }: RoundScope): Promise<RoundOutcome> {
  const pushed = await pushAll(context);
  if (pushed.end === 'wait') return pushed;
  if (only) return pullJobs(context, only, pushed);
  const { outcome, jobs } = await pullPacks(context.env, context.databases);
  const pulled = worse(pushed, outcome);
  if (jobs === null) return pulled;
  await pruneSealed(context.databases, jobs);
  await context.changed();
  return pullJobs(context, jobs, pulled);
}
