import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../shared/checklist/generate';
import { partSize } from '../../shared/checklist/intoParts';
import { stages, type Checklist, type Step } from '../../shared/checklist/types';
import { canonicalJson } from '../../shared/panel/canonical';
import type { Panel } from '../../shared/panel/panelSchema';
import { exampleInput, smallPanel, smallScope } from '../support/smallPanel';

const checklist = generateChecklist(exampleInput());
const ids = (list: Checklist) => list.steps.map(({ id }) => id);
const of = (stage: Step['stage'], list = checklist) => list.steps.filter((step) => step.stage === stage);
const position = (id: string) => {
  const at = ids(checklist).indexOf(id);
  if (at < 0) throw new Error(`no step ${id}`);
  return at;
};

const reversed = (panel: Panel): Panel => ({
  ...panel,
  sources: [...panel.sources].reverse(),
  isolators: [...panel.isolators].reverse(),
  supplies: [...panel.supplies].reverse(),
  modules: [...panel.modules].reverse(),
  groups: [...panel.groups].reverse(),
  points: [...panel.points].reverse(),
  stopControls: [...panel.stopControls].reverse(),
});

describe('the checklist of the small panel', () => {
  test('has the steps a person counts by hand', () => {
    const counted = Object.fromEntries(stages.map((stage) => [stage, of(stage).length]));
    expect(counted).toEqual({
      // panel, drawing, fit, 5 × tester, label, equipment, permit, 2 people told, 3 findings
      'get-ready': 16,
      // live, equipment, still live, controller, S0; Q1 4; F7 5 (told); door, Q1 covered; F9: 4 + 4 readings and proofs,
      // then load, open, lock, tag, extra, try; fuse F41; V1 4; air let out and verified
      isolate: 5 + 4 + 5 + 2 + 8 + 6 + 1 + 4 + 2,
      // wait; S230: 3 pairs, G5, S24: 3 pairs, G4, the foreign point: 9 pairs × 2; 3 parts × 4 proofs; earth; try 3
      'prove-dead': 1 + 18 + 12 + 1 + 3,
      // 4 commons, F41; DI3.01: 3 roles, of which plus is proved by name: 8 dead (the signal's and the minus's)
      wire:
        5 +
        (8 + 2 + 3 + 1 + 2) +
        (4 + 2 + 1 + 1 + 2 + 2) +
        (4 + 2 + 1 + 2 + 1 + 2 + 2) +
        (8 + 1 + 1 + 1 + 1 + 2) +
        (4 + 2 + 1 + 1 + 1 + 2),
      // DI3.01 earth, one neighbour, polarity; DI3.02 loop 2, earth, two neighbours, polarity; DO4.01 insulation 8, loop 2, earth,
      // polarity; DO5.01 loop 2, earth, polarity; AI6.01 earth, polarity; 4 modules, earth bar, one doubt
      'check-cold': 3 + 6 + 12 + 4 + 2 + 6,
      'close-up': 7,
      'locks-off': 3,
      // told, 2 people, aside; 3 isolators; 2 supplies; 1 fuse
      close: 10,
      // 8 for the live panel, 1 stop; 2 × 4 inputs, 3 analogue, 6 (with its current) + 5 outputs
      'prove-points': 8 + 1 + 8 + 3 + 6 + 5,
      // clear, lock off V1, told, aside, close V1, air back, 2 watched, handed back
      'restore-motion': 9,
      sign: 1,
    });
  });

  test('is the same, byte for byte, from the same input', () => {
    expect(canonicalJson(generateChecklist(exampleInput()))).toBe(canonicalJson(checklist));
  });

  test('does not depend on the order of lists whose order means nothing', () => {
    const input = exampleInput(reversed(smallPanel()));
    const shuffled = generateChecklist({
      ...input,
      scope: [...input.scope].reverse(),
      findings: [...input.findings].reverse(),
      deadTests: [...input.deadTests].reverse(),
      waits: [...input.waits].reverse(),
      stillLive: [...input.stillLive].reverse(),
    });
    expect(JSON.stringify(shuffled)).toBe(JSON.stringify(checklist));
  });

  test('gives each step its own id, short enough for an entry', () => {
    expect(new Set(ids(checklist)).size).toBe(checklist.steps.length);
    // shared/job/entry.ts takes step ids of at most 160 characters.
    for (const id of ids(checklist)) expect(id.length, id).toBeLessThanOrEqual(160);
  });

  test('keeps the ids of all other steps when an unrelated point joins the job', () => {
    const without = generateChecklist({
      ...exampleInput(),
      scope: smallScope.filter((each) => each !== 'DI3.01'),
    });
    const after = new Set(ids(checklist));
    // Neighbours are named from the module, so they stay as well.
    expect(ids(without).filter((id) => !after.has(id))).toEqual([]);
  });

  test('keeps stages in order and no part above its size', () => {
    const order = checklist.steps.map(({ stage }) => stages.indexOf(stage));
    expect(order).toEqual([...order].sort((a, b) => a - b));
    const counts = new Map<string, number>();
    for (const { stage, part } of checklist.steps)
      counts.set(`${stage} ${part}`, (counts.get(`${stage} ${part}`) ?? 0) + 1);
    expect(counts.size).toBeGreaterThan(stages.length);
    for (const [name, items] of counts) expect(items, name).toBeLessThanOrEqual(partSize);
  });

  test('refuses a scope that names a point the panel does not have', () => {
    expect(() => generateChecklist({ ...exampleInput(), scope: ['DI9.99'] })).toThrow(
      'point DI9.99 is not in the panel',
    );
  });
});

describe('isolating', () => {
  test.each(checklist.isolators)(
    '%s is opened, locked, tagged, unlocked and closed, in that order',
    (tag) => {
      const order = [
        `isolate.${tag}.open`,
        `isolate.${tag}.lock`,
        `isolate.${tag}.tag`,
        `off.${tag}`,
        `close.${tag}`,
      ];
      const places = order.map(position);
      expect(places).toEqual([...places].sort((a, b) => a - b));
      const step = (id: string) => checklist.steps[position(id)];
      expect(step(`isolate.${tag}.lock`)).toMatchObject({
        by: 'each',
        ask: { kind: 'lock-on', isolator: tag },
      });
      expect(step(`off.${tag}`)).toMatchObject({ by: 'each', ask: { kind: 'lock-off', isolator: tag } });
      expect(step(`close.${tag}`)).toMatchObject({ by: 'one', ask: { kind: 'close', isolator: tag } });
    },
  );

  test('follows the plan, with the door between outside and inside, and other energy last', () => {
    expect(checklist.isolators).toEqual(['Q1', 'F7', 'F9', 'V1']);
    const walk = [
      'isolate.Q1.open',
      'isolate.F7.open',
      'isolate.door',
      'isolate.cover.incoming:Q1',
      'isolate.F9.incoming.poles.ac',
      'isolate.F9.load',
      'isolate.F9.open',
      'isolate.V1.open',
      'isolate.energy.AIR.release',
    ];
    const places = walk.map(position);
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  test('proves the tester before and after it reads an incoming side', () => {
    const behind = of('isolate')
      .map(({ id }) => id)
      .filter((id) => id.startsWith('isolate.F9.') && /tester|incoming/.test(id));
    expect(behind.slice(0, 2).every((id) => id.includes('tester.before'))).toBe(true);
    expect(behind.slice(-2).every((id) => id.includes('tester.after'))).toBe(true);
    // F9 is fed by 400 V AC: the tester is proved there, not at the 24 V of what it feeds.
    expect(behind).toContain('isolate.F9.tester.before.ac.400');
  });

  test('asks for leave instead of a dead reading where the incoming side cannot be dead', () => {
    const input = exampleInput();
    const cover = [...input.plan.cover, { incomingOf: 'F9', V: 400, maybe: false, path: ['MAIN'] }];
    const live = generateChecklist({ ...input, plan: { ...input.plan, cover } });
    const steps = ids(live);
    expect(steps).toContain('isolate.F9.live-work');
    expect(steps).not.toContain('isolate.F9.incoming.poles.ac');
    expect(steps.indexOf('isolate.F9.live-work')).toBeLessThan(steps.indexOf('isolate.F9.open'));
  });

  test('closes control before what also feeds motion, and valves only in Restore motion', () => {
    const closing = checklist.steps
      .filter(({ ask }) => ask.kind === 'close')
      .map(({ id, stage }) => `${stage} ${id}`);
    expect(closing).toEqual([
      'close close.F9',
      'close close.F7',
      'close close.Q1',
      'restore-motion close.V1',
    ]);
  });
});

describe('proving dead', () => {
  const readings = of('prove-dead').filter(({ ask }) => ask.kind === 'reading' && ask.dead);

  test('reads each pair as AC and as DC, everybody for themselves', () => {
    const pairs = exampleInput().deadTests.filter(({ id }) => !id.includes('DI3.02'));
    expect(readings.map(({ id }) => id).sort()).toEqual(
      pairs.flatMap(({ id }) => [`${id}.ac`, `${id}.dc`]).sort(),
    );
    expect(readings.every(({ by }) => by === 'each')).toBe(true);
  });

  test('takes −24 V for live: a DC reading is limited on both sides of zero', () => {
    for (const { ask } of readings) {
      if (ask.kind !== 'reading') throw new Error('not a reading');
      expect(ask.high).toBe(1);
      expect(ask.low).toBe(ask.unit === 'V DC' ? -1 : 0);
    }
  });

  test('begins and ends each part with the tester proved at the voltages of its readings', () => {
    const parts = [...new Set(readings.map(({ part }) => part))];
    expect(parts.length).toBeGreaterThan(1);
    for (const part of parts) {
      const steps = of('prove-dead').filter((step) => step.part === part);
      const kinds = steps.map(({ family, id }) =>
        family === 'tester-proved' ? (id.includes('.before.') ? 'before' : 'after') : 'read',
      );
      expect(kinds.join(' ')).toMatch(/^(before )+(read )+(after ?)+$/);
      expect(kinds.filter((kind) => kind === 'before').length).toBe(
        kinds.filter((kind) => kind === 'after').length,
      );
      const units = new Set(
        steps
          .filter(({ family }) => family === 'tester-proved')
          .map(({ ask }) => (ask.kind === 'reading' ? ask.unit : '')),
      );
      expect([...units].sort()).toEqual(['V AC', 'V DC']);
    }
  });

  test('reads the highest voltage first', () => {
    expect(readings[0]?.id).toBe('dead.S230.L-N.ac');
  });

  test('says of a pair to earth on an unearthed supply that it proves nothing', () => {
    const input = exampleInput();
    const unearthed = input.deadTests.map((each) => ({ ...each, proves: !each.pair.endsWith('/PE') }));
    const steps = generateChecklist({ ...input, deadTests: unearthed }).steps.filter(
      ({ family }) => family === 'dead-tests',
    );
    for (const { ask, detail } of steps) {
      if (ask.kind !== 'reading' || !ask.dead) throw new Error('not a dead test');
      const said = detail?.some(({ key }) => key === 'checklist.dead.proves-nothing') ?? false;
      expect(said).toBe(ask.dead.pair.endsWith('/PE'));
      expect(ask.dead.proves).toBe(!said);
    }
  });

  test('never lowers a limit of the site: the stricter of test and site holds', () => {
    const input = exampleInput();
    const strict = generateChecklist({ ...input, settings: { ...input.settings, deadLimitV: 0.5 } });
    for (const { ask } of strict.steps) if (ask.kind === 'reading' && ask.dead) expect(ask.high).toBe(0.5);
  });

  test('promises no time where none is known', () => {
    const input = exampleInput();
    const unknown = generateChecklist({ ...input, waits: [{ supply: 'S24', t60S: null, t1S: null }] });
    expect(ids(unknown)).toContain('dead.stored.S24');
    expect(ids(unknown)).not.toContain('dead.wait.S24');
  });

  test('waits for the longest of the known times, in whole seconds', () => {
    expect(checklist.steps[position('dead.wait.S24')]?.ask).toEqual({ kind: 'wait', seconds: 82 });
  });
});
