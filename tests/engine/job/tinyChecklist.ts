/** A checklist with one of each thing that a gate looks at, so short that random jobs come to its end. */
import type { Ask, Checklist, Step } from '../../../shared/checklist/types';
import { say } from '../../../shared/panel/says';

const yesNo: Ask = {
  kind: 'choice',
  options: [
    { value: 'yes', label: say('checklist.said', { words: 'Yes' }), ok: true },
    { value: 'no', label: say('checklist.said', { words: 'No' }), ok: false },
  ],
};
const deadAt = (terminal: string): Ask => ({
  kind: 'reading',
  unit: 'V AC',
  high: 1,
  dead: { supply: 'S230', pair: 'L/PE', terminal, second: 'PE', proves: true },
});
const known: Ask = { kind: 'reading', unit: 'V AC', low: 207, high: 253 };

type More = Partial<Step>;
const step = (id: string, stage: Step['stage'], ask: Ask, more: More = {}): Step => ({
  id,
  stage,
  part: 1,
  family: id,
  title: say('checklist.said', { words: id }),
  ask,
  by: 'one',
  needsIsolation: false,
  everyRound: !['get-ready', 'wire', 'check-cold', 'sign'].includes(stage),
  ...more,
});

const each: More = { by: 'each' };
const tester: More = { by: 'each', family: 'tester-proved' };
const isolators = ['Q1', 'F7'];
const points = ['P1', 'P2'];
const at = (point: string, more: More = {}): More => ({ where: { point }, needsIsolation: true, ...more });

/** Two isolators, two dead tests, two points. */
export const tinyChecklist: Checklist = {
  format: 'coldloop-checklist/1',
  ruleSet: 'tiny',
  panelDigest: 'a'.repeat(64),
  scope: points,
  isolators,
  steps: [
    step('ready.drawing', 'get-ready', yesNo),
    step('ready.fit', 'get-ready', yesNo, each),
    ...isolators.flatMap((isolator) => [
      step(`isolate.${isolator}.open`, 'isolate', yesNo),
      step(`isolate.${isolator}.lock`, 'isolate', { kind: 'lock-on', isolator }, each),
    ]),
    step('isolate.try', 'isolate', yesNo),
    step('dead.before', 'prove-dead', known, tester),
    step('dead.A', 'prove-dead', deadAt('X1:1'), each),
    step('dead.B', 'prove-dead', deadAt('X1:2'), each),
    step('dead.after', 'prove-dead', known, tester),
    step('dead.try', 'prove-dead', yesNo),
    ...points.flatMap((point) => [
      step(`wire.${point}.dead`, 'wire', deadAt(point), at(point, { personal: true })),
      step(`wire.${point}.land`, 'wire', yesNo, at(point)),
    ]),
    ...points.map((point) => step(`cold.${point}.loop`, 'check-cold', yesNo, at(point))),
    step('closeup.temporary', 'close-up', yesNo),
    step('closeup.tools', 'close-up', yesNo),
    ...isolators.map((isolator) =>
      step(`off.${isolator}`, 'locks-off', { kind: 'lock-off', isolator }, each),
    ),
    ...isolators.map((isolator) => step(`close.${isolator}`, 'close', { kind: 'close', isolator })),
    ...points.map((point) => step(`prove.${point}.on`, 'prove-points', yesNo, { where: { point } })),
    step('sign.read', 'sign', { kind: 'done', label: say('checklist.said', { words: 'Read' }) }, each),
  ],
};
