import { describe, expect, test } from 'vitest';
import { foldJob } from '../../../shared/job/fold';
import { sealRefusals } from '../../../shared/job/seal/sealChecks';
import type { JobState } from '../../../shared/job/types';
import { render } from '../../../shared/wording/render';
import { completeJob, ilya, mara, people } from '../../support/jobScenario';
import { tinyChecklist as checklist } from './tinyChecklist';

const gapSaid = (state: JobState): string[] =>
  sealRefusals({ checklist, state })
    .filter(({ code }) => code === 'gap')
    .map(({ says }) => render('en', says));

/** A colleague wrote three notes; the worker had heard all of them before signing. */
function jobWithNotes() {
  const job = completeJob(checklist);
  job.facts.people.push(ilya);
  return job;
}

describe('a seal', () => {
  test('finds no log wanting when all have come', () => {
    expect(sealRefusals({ checklist, state: completeJob(checklist).state() })).toEqual([]);
  });

  test.each([
    ['the middle of a log', 2, 1],
    ['the end of a log that somebody has heard', 3, 2],
    ['a whole log', 1, 0],
  ])('waits for %s, and says whose phone it is', (_name, from, heard) => {
    const job = jobWithNotes();
    const notes = ['One', 'Two', 'Three'].map((words) => job.write(ilya, 'note', { words }));
    job.write(mara, 'note', { words: 'Heard' });
    const lost = from === 2 ? notes.slice(1, 2) : notes.slice(from - 1);
    const state = foldJob(
      checklist,
      job.entries.filter((entry) => !lost.includes(entry)),
      job.facts,
    );
    expect(gapSaid(state)).toEqual([`Reports on the phone of Ilya Ron have not arrived: heard to ${heard}.`]);
    expect(gapSaid(job.state())).toEqual([]);
  });

  test('asks for nothing of a log that nobody has heard of', () => {
    const job = jobWithNotes();
    const note = job.write(ilya, 'note', { words: 'Alone' });
    const held = job.entries.filter((entry) => entry !== note);
    expect(gapSaid(foldJob(checklist, held, job.facts))).toEqual([]);
  });

  test('misses nothing of a person who left the job and whose entries are here', () => {
    const job = jobWithNotes();
    job.write(ilya, 'note', { words: 'One' });
    job.write(mara, 'note', { words: 'Heard' });
    const left = { ...job.facts, people: people.filter(({ id }) => id !== ilya.id) };
    expect(foldJob(checklist, job.entries, left).gaps).toEqual([]);
  });
});
