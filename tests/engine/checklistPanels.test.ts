import { describe, expect, test } from 'vitest';
import { generateChecklist } from '../../shared/checklist/generate';
import { partSize } from '../../shared/checklist/intoParts';
import { conductorsOf } from '../../shared/checklist/steps/wire/conductorsOf';
import { inputsOfPanels } from '../support/demoInputs';

describe.each(inputsOfPanels())('the checklist by the engines: %s', (_name, input) => {
  const { steps, isolators } = generateChecklist(input);
  const ids = steps.map(({ id }) => id);
  const dead = steps.flatMap(({ id, stage, by, personal, where, ask }, at) =>
    ask.kind === 'reading' && ask.dead
      ? [{ id, stage, by, personal, where, at, unit: ask.unit, ...ask.dead }]
      : [],
  );

  test('locks what the plan locks, in its order', () => {
    expect(isolators).toEqual(input.plan.isolators.map(({ isolator }) => isolator.tag));
    for (const tag of isolators)
      for (const id of [
        `isolate.${tag}.open`,
        `isolate.${tag}.lock`,
        `isolate.${tag}.tag`,
        `off.${tag}`,
        `close.${tag}`,
      ])
        expect(ids).toContain(id);
  });

  test('reads every pair that the isolation engine asks for, as AC and as DC, before any landing of that place', () => {
    const read = new Set(dead.map(({ terminal, second, unit }) => `${terminal} ${second} ${unit}`));
    const missing = input.deadTests.flatMap(({ terminal, second }) =>
      ['V AC', 'V DC'].map((unit) => `${terminal} ${second} ${unit}`).filter((reading) => !read.has(reading)),
    );
    expect(missing).toEqual([]);
  });

  test('lands nothing on a terminal that was not read dead before', () => {
    const unread = input.panel.points.flatMap((point) =>
      conductorsOf(point)
        .filter(
          ({ role, terminal }) =>
            !['screen', 'earth'].includes(role) && terminal !== input.panel.earthTerminal,
        )
        .flatMap(({ name, terminal }) => {
          const landing = ids.indexOf(`wire.${point.address}.land.${name}`);
          const before = dead.filter((each) => each.terminal === terminal && each.at < landing);
          const units = new Set(before.filter(({ proves }) => proves).map(({ unit }) => unit));
          return landing >= 0 && units.has('V AC') && units.has('V DC')
            ? []
            : [`${point.address} ${terminal}`];
        }),
    );
    expect(unread).toEqual([]);
  });

  test('keeps parts short', () => {
    const counts = new Map<string, number>();
    for (const { stage, part } of steps)
      counts.set(`${stage} ${part}`, (counts.get(`${stage} ${part}`) ?? 0) + 1);
    expect(Math.max(...counts.values())).toBeLessThanOrEqual(partSize);
  });

  test('personal readings are in Wire, readings by each in Prove dead', () => {
    for (const { stage, by, personal } of dead.filter((each) => each.stage !== 'isolate'))
      expect([stage, by, personal]).toEqual(
        stage === 'wire' ? ['wire', 'one', true] : ['prove-dead', 'each', undefined],
      );
  });
});
