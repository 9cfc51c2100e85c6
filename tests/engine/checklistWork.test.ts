import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../shared/checklist/generate';
import type { Checklist, Step } from '../../shared/checklist/types';
import { exampleInput, smallPanel, smallScope } from '../support/smallPanel';

const checklist = generateChecklist(exampleInput());
const ids = (list: Checklist) => list.steps.map(({ id }) => id);
const of = (stage: Step['stage'], list = checklist) => list.steps.filter((step) => step.stage === stage);
const position = (id: string) => {
  const at = ids(checklist).indexOf(id);
  if (at < 0) throw new Error(`no step ${id}`);
  return at;
};

describe('wiring', () => {
  test.each(smallScope)('%s: its terminals are read dead before anything is landed', (address) => {
    const steps = of('wire').filter(({ where }) => where?.point === address);
    const firstOther = steps.findIndex(({ family }) => family !== 'terminal-dead');
    expect(firstOther).toBeGreaterThanOrEqual(4);
    expect(steps.slice(firstOther).some(({ family }) => family === 'terminal-dead')).toBe(false);
    const dead = steps.slice(0, firstOther);
    expect(dead.every(({ personal, by, needsIsolation }) => personal && by === 'one' && needsIsolation)).toBe(
      true,
    );
    const landed = steps.filter(({ family }) => family === 'land').map(({ where }) => where?.terminal);
    const proved = new Set(exampleInput().deadTests.map(({ terminal }) => terminal));
    for (const terminal of landed) {
      const units = dead
        .filter(({ where }) => where?.terminal === terminal)
        .map(({ ask }) => (ask.kind === 'reading' ? `${ask.unit} ${ask.dead?.second}` : ''));
      if (units.length === 0) expect(proved).toContain(terminal);
      else expect(units).toEqual(expect.arrayContaining(['V AC PE', 'V DC PE']));
    }
  });

  test('reads a terminal with foreign voltage against every pole that can reach it', () => {
    const seconds = of('wire').flatMap(({ where, ask }) =>
      where?.point === 'DO5.01' && ask.kind === 'reading' && ask.dead ? [ask.dead.second] : [],
    );
    expect(new Set(seconds)).toEqual(new Set(['PE', 'X3:2', 'X1:1', 'X1:2']));
  });

  test('counts a point nobody has asked about as reached by foreign voltage', () => {
    const panel = smallPanel();
    const points = panel.points.map(({ otherSupply, ...rest }) =>
      rest.address === 'DI3.02' ? rest : { ...rest, otherSupply },
    );
    const steps = ids(generateChecklist(exampleInput({ ...panel, points })));
    expect(steps).toContain('dead.backfeed.DI3.02');
    expect(steps).toContain('dead.DI3.02.+-PE.ac');
  });

  test('names ferrule and torque: the maker value on its own terminal, the test values elsewhere', () => {
    const keys = (id: string) => checklist.steps[position(id)]?.detail?.map(({ key }) => key);
    expect(keys('wire.DO4.01.land.signal')).toContain('checklist.wire.torque');
    expect(keys('wire.DI3.01.land.minus')).toContain('checklist.wire.torque.test');
    expect(checklist.steps[position('wire.DI3.02.land.signal')]?.detail).toContainEqual({
      key: 'checklist.wire.ferrule',
      params: { mm2: 1.5, colour: { key: 'checklist.colour.black' }, scheme: 'DIN 46228-4' },
    });
  });

  test('tells of a dry contact that it suits either common, and of no other kind here', () => {
    const saying = of('wire').filter(({ detail }) =>
      detail?.some(({ key }) => key.startsWith('checklist.wire.polarity.either')),
    );
    expect(saying.map(({ id }) => id)).toEqual(['wire.DI3.02.polarity']);
  });

  test('takes the bleeder from the remedy of a finding, measured before it is fitted', () => {
    expect(checklist.steps[position('wire.DI3.02.bleeder.value')]?.ask).toMatchObject({
      unit: 'ohm',
      low: 3135,
      high: 3465,
    });
    expect(position('wire.DI3.02.bleeder.value')).toBeLessThan(position('wire.DI3.02.bleeder'));
  });

  test('asks nothing that relies on isolation before Wire, and everything in Wire and Check cold', () => {
    for (const { stage, needsIsolation } of checklist.steps)
      expect(needsIsolation).toBe(stage === 'wire' || stage === 'check-cold');
  });
});

describe('checking cold', () => {
  test('measures through no electronic device', () => {
    expect(ids(checklist).filter((id) => /^cold\..*\.loop$/.test(id))).toEqual([
      'cold.DI3.02.loop',
      'cold.DO4.01.loop',
      'cold.DO5.01.loop',
    ]);
  });

  test('tests insulation only where a finding asks, at 250 V on PELV', () => {
    const tested = ids(checklist).filter((id) => id.endsWith('.insulation.read'));
    expect(tested).toEqual(['cold.DO4.01.insulation.read']);
    // 0.5 Mohm at 250 V for SELV and PELV: checklist.md, from memory.
    expect(checklist.steps[position('cold.DO4.01.insulation.read')]?.ask).toMatchObject({
      unit: 'Mohm',
      low: 0.5,
    });
  });
});

describe('proving points', () => {
  const ask = (id: string) => checklist.steps[position(id)]?.ask;

  test('warns before anything is energised, stops first, inputs before outputs', () => {
    const walk = [
      'prove.rule',
      'prove.stop.S0',
      'prove.DI3.01.on',
      'prove.AI6.01.signal',
      'prove.DO4.01.clear',
    ];
    const places = walk.map(position);
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  test('computes what a switched-on output shows at worst', () => {
    // 230 V − 10 % and + 10 %; closed relay contacts keep nothing and no cable is stated.
    expect(ask('prove.DO5.01.on-volts')).toMatchObject({ unit: 'V AC', low: 207, high: 253 });
  });

  test('gives no low limit where a part of the sum is not known', () => {
    const panel = smallPanel();
    const modules = panel.modules.map((module) =>
      module.io.kind === 'digital-output'
        ? { ...module, io: { ...module.io, technology: 'triac' as const, onDropV: undefined } }
        : module,
    );
    const list = generateChecklist(exampleInput({ ...panel, modules }));
    const on = list.steps.find(({ id }) => id === 'prove.DO5.01.on-volts')?.ask;
    expect(on).toMatchObject({ high: 253 });
    expect(on).not.toHaveProperty('low');
  });

  test('wants an output off below its drop-out, either way round', () => {
    // 10 % of 24 V, wiring.md's default for DC, from memory.
    expect(ask('prove.DO4.01.off-volts')).toMatchObject({ low: -2.4, high: 2.4 });
  });

  test('reads the current only near the rating', () => {
    expect(ids(checklist)).toContain('prove.DO4.01.current');
    expect(ids(checklist)).not.toContain('prove.DO5.01.current');
  });

  test('proves an output whose supply is motive only in Restore motion', () => {
    const input = exampleInput();
    const isolators = input.plan.isolators.map((each) =>
      each.isolator.tag === 'F7'
        ? { ...each, isolator: { ...each.isolator, purpose: 'motive' as const } }
        : each,
    );
    const list = generateChecklist({ ...input, plan: { ...input.plan, isolators } });
    const stageOf = (id: string) => list.steps.find((step) => step.id === id)?.stage;
    expect(stageOf('prove.DO5.01.command')).toBe('restore-motion');
    expect(stageOf('close.supply.S230.L-N')).toBe('restore-motion');
    expect(stageOf('off.F7')).toBe('restore-motion');
    expect(stageOf('prove.DO4.01.command')).toBe('prove-points');
  });
});

describe('getting ready', () => {
  test('asks for a tester that bears the highest source', () => {
    const step = (list: Checklist) => list.steps.find(({ id }) => id === 'ready.instrument')?.ask;
    expect(step(checklist)).toEqual({ kind: 'instrument', minCategory: 'CAT III', minV: 400 });
    const panel = smallPanel();
    const sources = panel.sources.map(({ V, ...rest }) =>
      rest.tag === 'MCC-2' ? rest : { ...rest, ...(V === undefined ? {} : { V }) },
    );
    // A source whose volts nobody stated is taken for the highest there is.
    expect(step(generateChecklist(exampleInput({ ...panel, sources })))).toMatchObject({ minV: 1000 });
  });

  test('asks for a permit only where the site does', () => {
    const input = exampleInput();
    const none = generateChecklist({ ...input, settings: { ...input.settings, permitAsked: false } });
    expect(ids(none)).not.toContain('ready.permit');
    expect(ids(checklist)).toContain('ready.permit');
  });

  test('reads two findings of one rule at one place, and one told twice once', () => {
    const input = exampleInput();
    const [first] = input.findings;
    if (!first) throw new Error('no finding');
    const other = { ...first, says: { key: 'checklist.said', params: { words: 'Another' } } };
    const read = ids(generateChecklist({ ...input, findings: [first, other, { ...first }] })).filter((id) =>
      id.startsWith('ready.stays'),
    );
    expect(read).toEqual([
      'ready.stays.output.earth-fault-starts.DO4.01',
      'ready.stays.output.earth-fault-starts.DO4.01.2',
    ]);
  });

  test('reads findings of points that share a group with the worked ones, and of no others', () => {
    const few = generateChecklist({ ...exampleInput(), scope: ['DI3.01'] });
    expect(ids(few).filter((id) => id.startsWith('ready.stays'))).toEqual([
      'ready.stays.input.leakage.DI3.02',
      'ready.stays.supply.no-tolerance.S24',
    ]);
  });
});
