import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { areaMm2 } from '../../../shared/electrical/size';
import type { Device, DeviceOf } from '../../../shared/panel/device';
import type { DigitalInput, ModuleIo } from '../../../shared/panel/moduleIo';
import type { Group, Panel, Point } from '../../../shared/panel/panelSchema';
import { checkWiring } from '../../../shared/rules/checkWiring';
import type { Finding } from '../../../shared/rules/finding';
import {
  acInput,
  acSupply,
  cable,
  dcInput,
  dcSupply,
  group,
  inputPanel,
  inputPoint,
  module,
  optoInput,
  panelOf,
} from './inputPanel';
import { findingOf, outcomes, verdict } from './verdict';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const twoWire = fc.record<DeviceOf<'two-wire'>>({
  kind: fc.constant('two-wire'),
  current: fc.constant('dc'),
  dropV: number(0.5, 8),
  leakmA: number(0, 6),
  minmA: number(0.5, 20),
  maxmA: number(20, 200),
});
const threeWire = fc.record({
  kind: fc.constantFrom('npn', 'pnp', 'push-pull'),
  dropV: number(0.5, 4),
  leakmA: number(0, 3),
  maxmA: fc.constant(200),
  supplymA: number(0, 30),
});
const device: fc.Arbitrary<Device> = fc.oneof(
  twoWire,
  threeWire,
  fc.constant<Device>({ kind: 'contact' }),
  fc.constant<Device>({ kind: 'namur' }),
);
const polarity = fc.constantFrom('either', 'positive-only', 'negative-only');
const digital: fc.Arbitrary<DigitalInput> = fc
  .record({ type: fc.constantFrom(1, 2, 3), inputOhm: number(800, 15_000), polarity })
  .map((more) => dcInput(more));
const dcIo: fc.Arbitrary<ModuleIo> = fc.oneof(
  digital,
  fc
    .record({ seriesOhm: number(800, 5000), offmA: number(0.2, 1), polarity })
    .map((more) => optoInput({ ...more, seriesW: 5, maxmA: 60 })),
);
const laid = fc
  .record({ size: fc.constant({ mm2: 0.75 }), lengthM: number(0, 500) })
  .map((more) => cable(more));

/** Findings that name a cause, without those of conductors and outputs. */
const ofInputs = (panel: Panel): Finding[] =>
  checkWiring(panel).findings.filter(({ rule }) => /^(input|supply|group|data)\./.test(rule));

describe('leakage', () => {
  test('more of it never clears the finding', () => {
    fc.assert(
      fc.property(dcIo, twoWire, laid, number(0, 5), (io, sensor, wires, more) => {
        const at = (leakmA: number) =>
          verdict(inputPanel(io, { device: { ...sensor, leakmA }, cable: wires }), 'input.leakage');
        if (at(sensor.leakmA) === 'fails') expect(at(sensor.leakmA + more)).toBe('fails');
      }),
    );
  });
});

describe('the offered resistor', () => {
  /** The panel with the resistor that a finding offers; undefined where it offers none. */
  const mended = (panel: Panel, rule: string): Panel | undefined => {
    const { addsSteps = [] } = findingOf(panel, rule);
    const { ohm, W } = addsSteps.find(({ family }) => family === 'fit-bleeder')?.params ?? {};
    if (typeof ohm !== 'number' || typeof W !== 'number') return undefined;
    return { ...panel, points: panel.points.map((point) => ({ ...point, bleeder: { ohm, W } })) };
  };
  const clears = (panel: Panel, rule: string): boolean => {
    if (verdict(panel, rule) !== 'fails') return false;
    const fitted = mended(panel, rule);
    if (!fitted) return false;
    for (const each of [rule, 'input.never-on', 'input.never-off', 'input.undefined', 'input.resistor-hot'])
      expect(verdict(fitted, each), each).toMatch(/^(ok|nothing)$/);
    expect(verdict(fitted, 'input.overcurrent')).not.toMatch(/damages/);
    return true;
  };

  test.each([
    [
      'input.leakage',
      fc
        .tuple(dcIo, twoWire, laid)
        .map(([io, sensor, wires]) => inputPanel(io, { device: sensor, cable: wires })),
    ],
    [
      'input.min-load',
      fc
        .tuple(dcIo, twoWire, laid)
        .map(([io, sensor, wires]) => inputPanel(io, { device: sensor, cable: wires })),
    ],
    [
      'input.cable-capacitance',
      fc
        .tuple(number(10_000, 90_000), number(10, 1500))
        .map(([inputOhm, lengthM]) =>
          inputPanel(acInput({ inputOhm }), { cable: cable({ lengthM }) }, acSupply()),
        ),
    ],
  ] as const)('clears %s and breaks nothing else', (rule, panels) => {
    let cleared = 0;
    fc.assert(
      fc.property(panels, (panel) => {
        if (clears(panel, rule)) cleared += 1;
      }),
      { numRuns: 400, seed: 7 },
    );
    // The property must have had something to hold for.
    expect(cleared).toBeGreaterThan(10);
  });
});

describe('units and order', () => {
  test('a gauge and the same cross-section in mm² give the same findings', () => {
    fc.assert(
      fc.property(
        dcIo,
        device,
        fc.integer({ min: 10, max: 26 }),
        number(0, 2000),
        (io, sensor, awg, lengthM) => {
          const say = (size: { awg: number } | { mm2: number }) =>
            ofInputs(inputPanel(io, { device: sensor, cable: cable({ size, lengthM }) }));
          const brief = (findings: Finding[]) =>
            findings.map(({ rule, harm, says }) => [rule, harm, says.key]);
          expect(brief(say({ awg }))).toEqual(brief(say({ mm2: areaMm2({ awg }) })));
        },
      ),
    );
  });

  const points = (devices: Device[]): Point[] =>
    devices.map((one, n) =>
      inputPoint({
        // Duplicates on purpose: rows of one address must not depend on their order either.
        address: `DI.${n % 5}`,
        terminal: `DI:${n % 7}`,
        wire: `W${n % 6}`,
        group: n % 3 === 0 ? 'G2' : 'G1',
        device: one,
        cable: cable({ tag: `K${n % 4}` }),
      }),
    );

  test('the order of rows changes nothing', () => {
    fc.assert(
      fc.property(fc.array(device, { minLength: 2, maxLength: 10 }), fc.integer(), (devices, seed) => {
        const panel = panelOf({
          supplies: [dcSupply(), acSupply({ tag: 'S2' })],
          modules: [module(dcInput(), { commonInsulationV: 50 })],
          groups: [
            group({ linkedTo: ['G2'] }),
            group({ tag: 'G2', terminal: 'DI:C2', supply: 'S2', common: 'line' }),
          ],
          points: points(devices),
        });
        const turned = (n: number) => Math.abs(seed + n) % Math.max(1, devices.length);
        const shuffled = [...panel.points.slice(turned(1)), ...panel.points.slice(0, turned(1))].reverse();
        const other = {
          ...panel,
          supplies: [...panel.supplies].reverse(),
          groups: [...panel.groups].reverse(),
          points: shuffled,
        };
        expect(checkWiring(other)).toEqual(checkWiring(panel));
      }),
    );
  });
});

describe('mirrored panels', () => {
  const otherPole: Record<Group['common'], Group['common']> = {
    positive: 'negative',
    negative: 'positive',
    line: 'line',
    neutral: 'neutral',
  };
  const otherWay = {
    either: 'either',
    'positive-only': 'negative-only',
    'negative-only': 'positive-only',
  } as const;
  const mirrorDevice = (one: Device): Device =>
    one.kind === 'npn' ? { ...one, kind: 'pnp' } : one.kind === 'pnp' ? { ...one, kind: 'npn' } : one;
  const mirrorIo = (io: ModuleIo): ModuleIo =>
    'polarity' in io ? { ...io, polarity: otherWay[io.polarity] } : io;
  const mirror = (panel: Panel): Panel => ({
    ...panel,
    modules: panel.modules.map((one) => ({ ...one, io: mirrorIo(one.io) })),
    groups: panel.groups.map((one) => ({ ...one, common: otherPole[one.common] })),
    points: panel.points.map((one) => ({ ...one, device: mirrorDevice(one.device) })),
  });
  const twin: Record<string, string> = {
    'input.npn-on-sinking': 'input.pnp-on-sourcing',
    'input.pnp-on-sourcing': 'input.npn-on-sinking',
  };

  test('on unearthed supplies the mirrored panel has the mirrored findings', () => {
    const common = fc.constantFrom('positive', 'negative');
    let found = 0;
    fc.assert(
      fc.property(
        dcIo,
        fc.array(device, { minLength: 1, maxLength: 4 }),
        common,
        laid,
        (io, devices, pole, wires) => {
          const panel = panelOf({
            supplies: [dcSupply({ earthed: false })],
            modules: [module(io)],
            groups: [group({ common: pole })],
            points: devices.map((one, n) =>
              inputPoint({
                address: `DI.${n}`,
                terminal: `DI:${n}`,
                wire: `W${n}`,
                device: one,
                cable: wires,
              }),
            ),
          });
          const brief = (findings: Finding[], name: (rule: string) => string) =>
            findings.map(({ rule, harm, where }) => `${name(rule)} ${harm} ${JSON.stringify(where)}`).sort();
          const here = ofInputs(panel);
          found += here.length;
          expect(brief(ofInputs(mirror(panel)), (rule) => twin[rule] ?? rule)).toEqual(
            brief(here, (rule) => rule),
          );
        },
      ),
    );
    expect(found).toBeGreaterThan(100);
  });
});

describe('a panel of 2,000 points', () => {
  const panel = panelOf({
    modules: Array.from({ length: 125 }, (_, n) =>
      module(dcInput(), { tag: `M${n}`, terminals: Array.from({ length: 16 }, (_each, t) => `M${n}:${t}`) }),
    ),
    groups: Array.from({ length: 125 }, (_, n) =>
      group({ tag: `G${n}`, module: `M${n}`, terminal: `M${n}:C`, linkedTo: n > 0 ? [`G${n - 1}`] : [] }),
    ),
    points: Array.from({ length: 2000 }, (_, n) =>
      inputPoint({
        address: `P${n}`,
        terminal: `M${Math.floor(n / 16)}:${n % 16}`,
        wire: `W${n}`,
        group: `G${Math.floor(n / 16)}`,
        device: { kind: 'pnp', dropV: 2, leakmA: 0.1, maxmA: 200, supplymA: 10 },
      }),
    ),
  });

  test('asks every point once a rule', () => {
    expect(outcomes(panel, 'input.never-on')).toHaveLength(2000);
  });
});
