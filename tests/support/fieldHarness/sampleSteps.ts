/** One step of every kind of answer, in the order of the stages; for looking at the screens and for axe. */
import type { Step } from '../../../shared/checklist/types';
import { say } from '../../../shared/panel/says';

type Given = Pick<Step, 'id' | 'stage' | 'ask'> & Partial<Step>;

const step = (given: Given): Step => ({
  part: 1,
  family: 'harness',
  title: say(`harness.${given.id}`, {
    terminal: 'X3:14',
    second: 'PE1',
    isolator: given.where?.isolator ?? 'Q1',
  }),
  by: 'one',
  needsIsolation: false,
  everyRound: false,
  ...given,
});

const done = (label: string): Step['ask'] => ({ kind: 'done', label: say(`harness.label.${label}`) });
const dead = (terminal: string, unit: 'V AC' | 'V DC', supply: string): Step['ask'] => ({
  kind: 'reading',
  unit,
  high: 1,
  dead: { supply, pair: 'L/PE', terminal, second: 'PE1', proves: true },
});

const land = { where: { point: 'DI3.07', terminal: 'X3:14' }, needsIsolation: true, stage: 'wire' } as const;

const lockSteps = ['Q1', 'F12'].map((isolator) =>
  step({
    id: `lock-${isolator}`,
    stage: 'isolate',
    by: 'each',
    everyRound: true,
    title: say('harness.lock', { isolator }),
    ask: { kind: 'lock-on', isolator },
    where: { isolator },
    picture: { kind: 'energy' },
    warnings: [{ signal: 'danger', says: say('harness.warn.live') }],
  }),
);
const deadSteps = [
  { id: 'dead-c2', ask: dead('X5:C2', 'V AC', 'C2'), terminal: 'X5:C2' },
  { id: 'dead-s24', ask: dead('X1:1', 'V DC', 'S24'), terminal: 'X1:1' },
].map(({ id, ask, terminal }) =>
  step({
    id,
    stage: 'prove-dead',
    by: 'each',
    everyRound: true,
    title: say('harness.dead', { terminal }),
    ask,
  }),
);
const closeSteps = ['Q1', 'F12'].flatMap((isolator) => [
  step({
    id: `off-${isolator}`,
    stage: 'locks-off',
    by: 'each',
    everyRound: true,
    title: say('harness.off', { isolator }),
    ask: { kind: 'lock-off', isolator },
  }),
  step({
    id: `close-${isolator}`,
    stage: 'close',
    everyRound: true,
    title: say('harness.close', { isolator }),
    ask: { kind: 'close', isolator },
  }),
]);

export const sampleSteps: Step[] = [
  step({ id: 'panel', stage: 'get-ready', ask: { kind: 'scan', expect: 'HQ-LP3' } }),
  step({
    id: 'tester',
    stage: 'get-ready',
    by: 'each',
    ask: { kind: 'instrument', minCategory: 'CAT III', minV: 300 },
  }),
  step({ id: 'permit', stage: 'get-ready', ask: { kind: 'text', maxLength: 200 } }),
  ...lockSteps,
  step({ id: 'photo', stage: 'isolate', ask: { kind: 'photo' } }),
  step({ id: 'wait', stage: 'prove-dead', everyRound: true, ask: { kind: 'wait', seconds: 5 } }),
  ...deadSteps,
  step({
    ...land,
    id: 'land-dead',
    by: 'each',
    title: say('harness.dead', { terminal: 'X3:14' }),
    ask: dead('X3:14', 'V DC', 'S24'),
  }),
  step({
    ...land,
    id: 'size',
    ask: {
      kind: 'choice',
      options: ['bn', 'bk', 'bu'].map((value) => ({
        value,
        label: say(`harness.colour.${value}`),
        ok: value === 'bk',
      })),
    },
  }),
  step({
    ...land,
    id: 'land',
    ask: done('landed'),
    detail: [say('harness.ferrule', { Nm: 0.5 })],
    picture: { kind: 'loop', point: 'DI3.07', mark: 'signal' },
  }),
  step({
    ...land,
    id: 'loop',
    stage: 'check-cold',
    ask: { kind: 'reading', unit: 'ohm', low: 1.6, high: 3.1, why: say('harness.why.loop') },
  }),
  step({ id: 'tools', stage: 'close-up', ask: done('counted') }),
  ...closeSteps.filter(({ stage }) => stage === 'locks-off'),
  ...closeSteps.filter(({ stage }) => stage === 'close'),
  step({
    id: 'prove-07',
    stage: 'prove-points',
    where: { point: 'DI3.07', terminal: 'X3:14' },
    ask: { kind: 'reading', unit: 'V DC', low: 18.2, high: 26.4, why: say('harness.why.on') },
    warnings: [{ signal: 'warning', says: say('harness.warn.energised') }],
  }),
];
