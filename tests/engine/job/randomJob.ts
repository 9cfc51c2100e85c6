/** Jobs that go on in random ways: one to four people and a foreman, several phones, hearing each other or not. */
import type { Checklist, Stage } from '../../../shared/checklist/types';
import type { JobPerson } from '../../../shared/job/types';
import { idOf, ilya, mara, newJob, tomas, walk, type Device, type Job } from '../../support/jobScenario';
import { attacks, workers } from './randomActs';
import { at, Turn } from './randomTurn';

export interface Move {
  who: number;
  phone: number;
  /** 0: hears nothing; 1: one log and all that it had heard; else everything. */
  hear: number;
  /** Below zero: follows the app. */
  act: number;
  pick: number;
}

const rosa: JobPerson = { id: idOf('rosa'), name: 'Rosa Vik', part: 'electrician' };
const sven: JobPerson = { id: idOf('sven'), name: 'Sven Dahl', part: 'electrician' };
const electricians = [mara, ilya, rosa, sven];
const phones = ['phone', 'phone', 'phone', 'tablet', 'spare', 'borrowed'];

export const actCount = attacks.length;
export const workerCount = workers.length;
export const crews = [1, 2, 2, 3, 4];

/** Everybody of a crew has come to a stage, as far as the crew lets each. */
export function startAt(checklist: Checklist, crew: number, until: Stage): Job {
  const job = newJob(checklist, [...electricians.slice(0, crew), tomas]);
  job.write(mara, 'accepted', {});
  for (let before = -1; before !== job.entries.length;) {
    before = job.entries.length;
    for (const person of electricians.slice(0, crew))
      walk(job, person, until, () => {
        if (job.entries.length > 1000) throw new Error(`nobody comes to ${until}`);
        return false;
      });
  }
  return job;
}

/** Hearing is whole: whoever hears a log also hears what that log had heard. */
function hear(job: Job, device: Device, { hear: how, pick }: Move): void {
  if (how === 0) return;
  if (how > 1) {
    job.hear(device);
    return;
  }
  const other = at([...job.devices.values()], pick);
  if (!other || other === device) return;
  const known = new Map([...other.heard, [other.log, other.head?.seq ?? 0] as const]);
  for (const [log, seq] of known)
    if (log !== device.log && seq > (device.heard.get(log) ?? 0)) device.heard.set(log, seq);
}

/** Plays the moves on a job; answers that a phone let through are named by their entry. */
export function play(job: Job, moves: readonly Move[]): Set<string> {
  const letThrough = new Set<string>();
  for (const move of moves) {
    const person = at(job.facts.people, move.who) ?? mara;
    const device = job.device(person, at(phones, move.phone));
    hear(job, device, move);
    const act = move.act < 0 ? at(workers, -move.act) : at(attacks, move.act);
    act?.(new Turn(job, person, device, move.pick, letThrough));
  }
  return letThrough;
}
