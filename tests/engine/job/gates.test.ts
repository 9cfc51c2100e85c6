import { beforeAll, describe, expect, test } from 'vitest';
import { nextStep } from '../../../shared/job/next';
import {
  checklist,
  stepOf,
  codes,
  upTo,
  off,
  read,
  proveAfter,
  prepare,
  terminals,
  land,
  deadTest,
  hold,
  reachLand,
} from '../../support/gateJobs';
import {
  answerBody,
  answerWell,
  idOf,
  ilya,
  mara,
  newJob,
  sayClear,
  tomas,
  type Job,
} from '../../support/jobScenario';

/** Each row does something to a job that stands at landing a wire, and names what then stands against it. */
const wiring: [name: string, act: (job: Job) => unknown, codes: string[]][] = [
  ['nothing happened', () => undefined, []],
  ['own lock off one isolator', (job) => off(job, mara, 'Q1'), ['own-locks']],
  [
    'own lock off and on again, not measured again',
    (job) => [off(job, mara, 'Q1'), job.write(mara, 'lock-on', { isolator: 'Q1', lock: 'M-Q1' })],
    ['own-tests', 'own-terminal'],
  ],
  ["a colleague's lock comes off", (job) => off(job, ilya, 'Q1'), []],
  [
    'a lock of its number hangs elsewhere',
    (job) => job.write(ilya, 'lock-on', { isolator: 'F7', lock: 'M-Q1' }),
    ['contradiction'],
  ],
  ['a dead test read live', (job) => read(job, deadTest, 118), ['danger', 'order', 'own-tests']],
  [
    'read live, then dead again, the tester not proved after it',
    (job) => [read(job, deadTest, 118), read(job, deadTest, 0)],
    ['own-tests'],
  ],
  [
    'read live, then dead again, the tester proved after it',
    (job) => [read(job, deadTest, 118), read(job, deadTest, 0), ...proveAfter(job)],
    [],
  ],
  [
    'a negative reading is as live',
    (job) => read(job, 'dead.S24.+-0 V.dc', -24),
    ['danger', 'order', 'own-tests'],
  ],
  [
    'a colleague reads a terminal of another point live',
    (job) => {
      const other = checklist.steps.find(({ personal, where }) => personal && where?.point === 'DO4.01');
      if (other) job.write(ilya, 'answer', answerBody(other, { kind: 'reading', value: 230 }));
    },
    ['danger'],
  ],
  [
    'the tester fails after the part',
    (job) =>
      read(
        job,
        checklist.steps.find(({ id }) => id.startsWith('dead.') && id.includes('tester.after'))?.id ?? '',
        0,
      ),
    ['order', 'own-tests'],
  ],
  [
    'a break',
    (job) =>
      job.write(mara, 'round-started', { points: [...checklist.scope], reason: 'break', words: 'Lunch' }),
    ['order', 'own-tests', 'own-terminal'],
  ],
  ['a hold on an isolating step', (job) => hold(job, 'isolate.Q1.try'), ['stopped', 'order']],
  [
    'that hold accepted by the foreman',
    (job) => {
      const held = hold(job, 'isolate.Q1.try');
      job.write(tomas, 'hold-decided', { hold: held.id, decision: 'accept', words: 'Go on' });
    },
    ['stopped', 'order'],
  ],
  ['a hold on this step', (job) => hold(job, land), ['held']],
  ['a hold on another point', (job) => hold(job, 'wire.DO4.01.tug'), []],
  [
    'an isolator closed',
    (job) => job.write(ilya, 'closed', { isolator: 'Q1', step: 'close.Q1', counted: 0 }),
    ['contradiction', 'isolation-over'],
  ],
  [
    'padlocks counted, not closed',
    (job) => job.write(ilya, 'closed', { isolator: 'Q1', step: 'close.Q1', counted: 1 }),
    [],
  ],
  [
    'a supervised removal of somebody else',
    (job) => {
      job.write(ilya, 'lock-on', { isolator: 'Q1', lock: '99' });
      job.write(tomas, 'lock-removed-by-supervisor', {
        isolator: 'Q1',
        lock: '99',
        owner: ilya.id,
        notOnSite: 'Gate list',
        effort: 'Called twice',
        toldBeforeReturn: 'By phone',
        witness: mara.id,
      });
    },
    ['own-tests', 'own-terminal'],
  ],
  [
    'an entry of a kind this version does not know',
    (job) => {
      const last = job.write(ilya, 'note', { words: 'x' });
      job.entries[job.entries.indexOf(last)] = { ...last, kind: 'lock-moved' };
    },
    ['unreadable'],
  ],
  [
    'an entry of a person who is not on the job',
    (job) =>
      job.write({ id: idOf('stranger'), name: 'Stranger', part: 'electrician' }, 'closed', {
        isolator: 'Q1',
        step: 'close.Q1',
        counted: 0,
      }),
    [],
  ],
  [
    'the lock-off of a person whose lock it is not',
    (job) => job.write(ilya, 'lock-off', { isolator: 'Q1', lock: 'M-Q1' }),
    [],
  ],
];

describe('landing a wire', () => {
  let base: Job;
  beforeAll(() => {
    base = reachLand();
  });
  test.each(wiring)('%s', (_name, act, expected) => {
    const job = base.copy();
    act(job);
    expect(codes(job, mara, land)).toEqual(expected);
  });

  test('a colleague proves nothing for another', () => {
    expect(codes(base, ilya, land)).toEqual(expect.arrayContaining(['order', 'own-locks']));
  });

  test('a changed checklist needs new readings', () => {
    const job = base.copy();
    job.facts.pack = 'f'.repeat(64);
    expect(codes(job, mara, land)).toEqual(['own-tests', 'own-terminal']);
    expect(nextStep(checklist, job.state(), mara.id)?.stage).toBe('prove-dead');
  });

  test('a colleague who goes on with the point reads its terminals first', () => {
    const job = base.copy();
    for (const step of checklist.steps.filter(
      ({ by, stage }) => by === 'each' && ['get-ready', 'isolate', 'prove-dead'].includes(stage),
    ))
      answerWell(job, ilya, step);
    expect(codes(job, ilya, land)).toEqual(['own-terminal']);
    const state = job.state();
    const first = checklist.steps.find(({ id }) => id === nextStep(checklist, state, ilya.id)?.id);
    expect(first?.needsIsolation).toBe(true);
    for (const step of terminals) answerWell(job, ilya, step);
    expect(codes(job, ilya, land)).toEqual([]);
  });

  test('a watched reading counts only as the one that it names', () => {
    const job = base.copy();
    const early = job.entries.find(({ kind, body }) => kind === 'answer' && body.step === deadTest);
    prepare(job, ilya, deadTest);
    const mine = read(job, deadTest, 0.1);
    const watched = (value: number, entry = mine) =>
      job.write(ilya, 'answer', {
        ...answerBody(stepOf(deadTest), { kind: 'reading', value }),
        watched: entry.id,
      });
    watched(0.7);
    // Taken before the watcher had locked on.
    watched(0.1, early);
    watched(0.1);
    const history = job.state().steps[deadTest]?.history.filter(({ person }) => person === ilya.id);
    expect(history?.map(({ verdict }) => verdict)).toEqual(['refused', 'refused', 'ok']);
  });
});

/** Each row stands at closing the first isolator, locks off and both people clear. */
const closing: [name: string, act: (job: Job) => unknown, codes: string[]][] = [
  ['nothing happened', () => undefined, []],
  [
    'somebody locked on',
    (job) => job.write(ilya, 'lock-on', { isolator: 'Q1', lock: '88' }),
    ['order', 'locked', 'not-clear'],
  ],
  [
    'a lock on an isolator beside it',
    (job) => job.write(ilya, 'lock-on', { isolator: 'F7', lock: '88' }),
    ['order', 'not-clear'],
  ],
  [
    'a jumper is still in',
    (job) => job.write(ilya, 'temporary', { what: 'jumper', place: 'X1:4' }),
    ['temporaries', 'not-clear'],
  ],
  [
    'one lock number in two places',
    (job) => [
      job.write(ilya, 'lock-on', { isolator: 'V1', lock: '88' }),
      job.write(ilya, 'lock-on', { isolator: 'V9', lock: '88' }),
    ],
    ['contradiction', 'not-clear'],
  ],
];

describe('closing an isolator', () => {
  const close = checklist.steps.find(({ ask }) => ask.kind === 'close')?.id ?? '';
  const isolator = close.slice('close.'.length);
  let base: Job;
  beforeAll(() => {
    base = upTo(close);
    sayClear(base);
  });
  test.each(closing)('%s', (_name, act, expected) => {
    const job = base.copy();
    act(job);
    const found = codes(job, mara, close);
    const named = isolator === 'Q1' ? expected : expected.filter((code) => code !== 'locked');
    expect(found).toEqual(named);
  });

  test('waits for everybody given the job to be clear', () => {
    const job = upTo(close);
    expect(codes(job, mara, close)).toEqual(['not-clear']);
    job.write(mara, 'clear', { person: mara.id });
    expect(codes(job, mara, close)).toEqual(['not-clear']);
    // For one who never locked on the foreman may say it.
    job.write(tomas, 'clear', { person: ilya.id });
    expect(codes(job, mara, close)).toEqual([]);
  });

  test('a colleague cannot say it for another', () => {
    const job = upTo(close);
    job.write(mara, 'clear', { person: mara.id });
    job.write(mara, 'clear', { person: ilya.id });
    expect(codes(job, mara, close)).toEqual(['not-clear']);
  });

  test('without hearing of a lock it is a contradiction that ends when the lock comes off', () => {
    const job = upTo(close);
    const deaf = job.device(ilya);
    job.hear(deaf);
    job.writeDeaf(deaf, 'lock-on', { isolator, lock: '88' });
    const alone = job.device(mara, 'tablet');
    for (const [log, seq] of job.device(mara).heard) alone.heard.set(log, seq);
    alone.heard.set(job.device(mara).log, job.device(mara).head?.seq ?? 0);
    job.writeDeaf(alone, 'closed', { isolator, step: close, counted: 0 });
    const state = job.state();
    expect(state.contradictions.map(({ code }) => code)).toEqual(['closed-under-lock']);
    expect(state.isolators[isolator]?.status).toBe('not-known');
    job.write(ilya, 'lock-off', { isolator, lock: '88' });
    expect(job.state()).toMatchObject({ contradictions: [], settled: [{ code: 'closed-under-lock' }] });
  });
});

describe('the order of stages', () => {
  const rows: [step: string, prefix: string, expected: string[]][] = [
    ['isolate.Q1.open', 'ready.', ['order']],
    ['isolate.Q1.lock', 'isolate.Q1.open', ['order']],
    ['wire.DO4.01.tug', 'dead.', ['order', 'own-tests', 'own-terminal']],
    ['closeup.tools', 'wire.DO4.01.label', ['order']],
    ['off.Q1', 'closeup.door', ['order']],
    ['prove.DI3.02.on', 'close.supply', ['order']],
    ['motion.handback', 'prove.rule', ['order']],
  ];
  test.each(rows)('%s waits when %s is not reached', (step, prefix, expected) => {
    expect(codes(upTo(prefix), mara, step)).toEqual(expected);
  });

  test('a point is checked cold as soon as it is wired itself', () => {
    const job = upTo('wire.DO4.01');
    const cold = (point: string) =>
      checklist.steps.find(({ stage, where }) => stage === 'check-cold' && where?.point === point)?.id ?? '';
    const wired = terminals.length > 0 && job.state().steps['wire.DI3.02.label']?.status === 'done';
    expect(wired).toBe(true);
    expect(codes(job, mara, cold('DI3.02'))).toEqual([]);
    expect(codes(job, mara, cold('DO4.01'))).toContain('order');
  });

  test('nobody but an electrician of the job answers, and nobody before it is accepted', () => {
    const job = newJob(checklist);
    expect(codes(job, mara, 'ready.panel')).toEqual(['not-accepted']);
    job.write(mara, 'accepted', {});
    expect(codes(job, mara, 'ready.panel')).toEqual([]);
    expect(codes(job, tomas, 'ready.panel')).toEqual(['not-on-job']);
    expect(codes(job, mara, 'no.such.step')).toEqual(['unknown-step']);
    job.facts.cancelled = true;
    expect(codes(job, mara, 'ready.panel')).toEqual(['cancelled']);
  });
});
