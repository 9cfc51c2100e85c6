import type { AnswerRecord, JobState } from '../../../../shared/job/types';
import type { LocalJob } from '../../../offline/types';

/** This person's newest answer on a step, found by the numbers of their logs and not by any clock. */
export function lastAnswered(
  local: LocalJob,
  state: JobState,
  person: string,
): { step: string; answer: AnswerRecord } | undefined {
  const records = new Map(
    Object.entries(state.steps).flatMap(([step, { history }]) =>
      history.map((answer) => [answer.entry, { step, answer }] as const),
    ),
  );
  const own = local.entries
    .filter(({ id, log }) => local.facts.logs[log] === person && records.has(id))
    .sort((a, b) => (a.log === b.log ? b.seq - a.seq : Date.parse(b.at) - Date.parse(a.at)));
  return own[0] && records.get(own[0].id);
}
