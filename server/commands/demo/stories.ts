/** What happened on each job of the demo, so that every state can be looked at. */
import type { Language } from '../../../shared/api/common';
import type { Step } from '../../../shared/checklist/types';
import { mixedScope } from './panels/mixed';
import type { DemoPanel } from './seedPanels';
import type { DemoJob, Otherwise } from './played/demoJob';

interface Crew {
  worker: string;
  foreman: string;
}

export interface DemoStory {
  state:
    'planned' | 'sent' | 'accepted' | 'running' | 'held' | 'signed' | 'returned' | 'sealed' | 'cancelled';
  panel: DemoPanel;
  points: readonly string[];
  electricians: string[];
  foreman: string;
  dueInDays: number;
  daysAgo: number;
  language?: Language;
  words?: string;
  work: (job: DemoJob, crew: Crew) => void;
}

const nothing = (): void => undefined;
const accept = (job: DemoJob, { worker }: Crew): void => void job.write(worker, 'accepted', {});
const workAndSign = (job: DemoJob, crew: Crew, otherwise?: Otherwise): void => {
  accept(job, crew);
  job.walk(crew.worker, undefined, otherwise);
  job.sign(crew.worker);
};
const workUntil = (job: DemoJob, crew: Crew, until: (step: Step) => boolean): void => {
  accept(job, crew);
  job.walk(crew.worker, until);
};

const isDeadReading = ({ ask, stage }: Step): boolean =>
  stage === 'prove-dead' && ask.kind === 'reading' && ask.dead !== undefined;

/** The third reading finds a live terminal, once: then it is found, opened, and read good. */
function findsItLive(worker: string): Otherwise {
  let count = 0;
  return (step, job) => {
    if (!isDeadReading(step)) return false;
    count += 1;
    if (count !== 3) return false;
    job.answer(worker, step, { kind: 'reading', value: 118 });
    return true;
  };
}

/** A point that fails while it is proved goes back through isolation, once. */
function failsOnce(worker: string, point: string): Otherwise {
  let failed = false;
  return (step, job) => {
    if (failed || step.stage !== 'prove-points' || step.where?.point !== point || step.ask.kind !== 'reading')
      return false;
    failed = true;
    job.answer(worker, step, { kind: 'reading', value: 3 });
    job.write(worker, 'round-started', {
      points: [point],
      reason: 'fault',
      words: 'Wire loose at the plug of the valve',
    });
    return true;
  };
}

const either =
  (...ways: Otherwise[]): Otherwise =>
  (step, job) =>
    ways.some((way) => way(step, job));

function returnOne(job: DemoJob, { foreman }: Crew): void {
  const step = job.pack.checklist.steps.find(
    ({ stage, ask }) => stage === 'prove-points' && ask.kind === 'reading',
  );
  if (step)
    job.write(foreman, 'returned', { steps: [{ step: step.id, words: 'Read it again with the tank full' }] });
}

export const demoStories: DemoStory[] = [
  {
    state: 'sealed',
    panel: 'mixed',
    points: mixedScope,
    electricians: ['ines'],
    foreman: 'ruth',
    dueInDays: -12,
    daysAgo: 12,
    work: (job, crew) => {
      workAndSign(job, crew, either(findsItLive(crew.worker), failsOnce(crew.worker, mixedScope[3])));
      job.countersign(crew.foreman);
    },
  },
  {
    state: 'sealed',
    panel: 'healthy',
    points: ['DI1.01', 'DI1.02', 'DO2.01'],
    electricians: ['mateo'],
    foreman: 'ruth',
    dueInDays: -8,
    daysAgo: 9,
    language: 'es',
    work: (job, crew) => {
      workAndSign(job, crew);
      job.countersign(crew.foreman);
    },
  },
  {
    state: 'signed',
    panel: 'healthy',
    points: ['DI1.05', 'DI1.06', 'DO2.03'],
    electricians: ['tove'],
    foreman: 'ruth',
    dueInDays: 0,
    daysAgo: 1,
    work: workAndSign,
  },
  {
    state: 'held',
    panel: 'healthy',
    points: ['DI1.09', 'DI1.10'],
    electricians: ['tove'],
    foreman: 'ruth',
    dueInDays: 1,
    daysAgo: 0.2,
    work: (job, crew) => {
      workUntil(job, crew, ({ stage, family }) => stage === 'wire' && family === 'land');
      const next = job.pack.checklist.steps.find(
        ({ stage, family }) => stage === 'wire' && family === 'land',
      );
      if (next)
        job.write(crew.worker, 'hold', {
          step: next.id,
          reason: 'cannot-reach',
          words: 'The cable is 40 cm too short',
        });
    },
  },
  {
    state: 'running',
    panel: 'longCables',
    points: ['AI1.01', 'AI1.02', 'AO2.01'],
    electricians: ['ines'],
    foreman: 'ruth',
    dueInDays: 1,
    daysAgo: 0.1,
    work: (job, crew) => workUntil(job, crew, ({ stage }) => stage === 'check-cold'),
  },
  {
    state: 'returned',
    panel: 'mixed',
    points: ['DI1.03', 'DO2.02'],
    electricians: ['mateo'],
    foreman: 'ruth',
    dueInDays: 0,
    daysAgo: 0.8,
    language: 'es',
    work: (job, crew) => {
      workAndSign(job, crew);
      returnOne(job, crew);
    },
  },
  {
    state: 'accepted',
    panel: 'benchRig',
    points: ['OB1.01', 'RB2.01'],
    electricians: ['pavel'],
    foreman: 'ruth',
    dueInDays: 2,
    daysAgo: 0.05,
    work: accept,
  },
  {
    state: 'cancelled',
    panel: 'healthy',
    points: ['DI1.12'],
    electricians: ['ines'],
    foreman: 'ruth',
    dueInDays: -2,
    daysAgo: 3,
    work: nothing,
  },
  {
    state: 'sent',
    panel: 'mixed',
    points: mixedScope,
    electricians: ['ines'],
    foreman: 'ruth',
    dueInDays: 2,
    daysAgo: 0,
    words: 'The eyewash must stay in service. Ask the dosing room before you start.',
    work: nothing,
  },
  {
    state: 'planned',
    panel: 'healthy',
    points: ['DI1.13', 'DI1.14', 'DO2.07', 'DO2.08'],
    electricians: ['tove', 'mateo'],
    foreman: 'pavel',
    dueInDays: 5,
    daysAgo: 0,
    work: nothing,
  },
];
