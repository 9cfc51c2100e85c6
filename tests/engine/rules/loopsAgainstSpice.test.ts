import { describe, expect, test } from 'vitest';
import { dischargeSeconds } from '../../../shared/isolation/dischargeSeconds';
import type { Device } from '../../../shared/panel/device';
import type { DigitalInput, OptoInput } from '../../../shared/panel/moduleIo';
import type { Panel } from '../../../shared/panel/panelSchema';
import { drawsOf } from '../../../shared/rules/input/draws';
import { offState } from '../../../shared/rules/input/offState';
import { solveInput } from '../../../shared/rules/input/solveInput';
import { ngspice } from '../../support/spice/ngspice';
import { random, type Random } from '../isolation/randomPanel';
import { acInput, acSupply, cable, dcInput, dcSupply, inputAt, inputPanel, optoInput } from './inputPanel';

// Every netlist is written from the panel file's own numbers: nothing here asks shared/electrical.

/** IEC 60228 class 5 at 20 °C, ohm/km, warmed to 70 °C by 0.00393 per kelvin. */
const class5: Record<number, number> = { 0.5: 39, 0.75: 26, 1: 19.5, 1.5: 13.3, 2.5: 7.98 };
const warm = 1 + 0.00393 * 50;

const between = (r: Random, low: number, high: number) => low + (r.below(1000) / 999) * (high - low);
const seeds = (count: number, from: number) => Array.from({ length: count }, (_, n) => from + n);

/** Only one point and one supply stand in these panels. */
function partsOf(panel: Panel) {
  const [point] = panel.points;
  const [supply] = panel.supplies;
  const io = panel.modules[0]?.io;
  if (!point || !supply || (io?.kind !== 'digital-input' && io?.kind !== 'opto-input'))
    throw new Error('no input in this panel');
  const { cable: laid } = point;
  const core =
    laid && 'mm2' in laid.size ? ((class5[laid.size.mm2] ?? NaN) * warm * laid.lengthM) / 1000 : NaN;
  return { point, supply, io, core };
}

/** The LED: an almost ideal diode before a source of the forward volts. */
const led = (from: string, to: string, Vf: number, name: string) => [
  `D${name} ${from} ${name}k ideal`,
  `V${name} ${name}k ${to} ${Vf}`,
];
const models = ['.model ideal D(is=1e-12 n=0.005)'];

/** Between the terminal `in` and 0: the input and what lies across it; `Vin` carries what the input draws. */
function inputNet(
  n: number,
  io: DigitalInput | OptoInput,
  bleederOhm: number | undefined,
  Vf: number,
): string[] {
  const bleeder = bleederOhm === undefined ? [] : [`Rb${n} in${n} 0 ${bleederOhm}`];
  const meter = `Vin${n} in${n} a${n} 0`;
  if (io.kind === 'opto-input')
    return [
      ...bleeder,
      meter,
      `Rs${n} a${n} led${n} ${io.seriesOhm}`,
      ...(io.parallelOhm === undefined ? [] : [`Rp${n} led${n} 0 ${io.parallelOhm}`]),
      ...led(`led${n}`, '0', Vf, `x${n}`),
    ];
  return io.characteristic === 'constant-current'
    ? [...bleeder, meter, `Iin${n} a${n} 0 ${(io.ratedmA ?? NaN) / 1000}`]
    : [...bleeder, meter, `Rin${n} a${n} 0 ${io.inputOhm ?? NaN}`];
}

function randomInput(r: Random): DigitalInput | OptoInput {
  const kind = r.below(4);
  if (kind === 0) return dcInput({ characteristic: 'constant-current', ratedmA: between(r, 2, 8) });
  if (kind === 1) return dcInput({ inputOhm: between(r, 1000, 12_000) });
  return optoInput({
    seriesOhm: between(r, 800, 5000),
    Vf: { min: between(r, 1, 1.2), max: between(r, 1.2, 1.7) },
    ...(kind === 2 ? { parallelOhm: between(r, 300, 3000) } : {}),
  });
}

function randomDevice(r: Random): Device {
  const three = { dropV: between(r, 0.3, 3.5), leakmA: 0.1, maxmA: 200, supplymA: between(r, 0, 30) };
  return r.pick<Device>([
    { kind: 'contact' },
    { kind: 'pnp', ...three },
    { kind: 'two-wire', current: 'dc', dropV: between(r, 2, 8), leakmA: 0.5, minmA: 2, maxmA: 100 },
    { kind: 'ssr-output', dropV: between(r, 0.5, 2), leakmA: 0.2 },
  ]);
}

function randomPanel(seed: number): Panel {
  const r = random(seed);
  return inputPanel(
    randomInput(r),
    {
      device: randomDevice(r),
      ...(r.chance(0.3) ? { series: [{ kind: 'ssr-output', dropV: between(r, 0.2, 2), leakmA: 0 }] } : {}),
      cable: cable({ size: { mm2: r.pick([0.5, 0.75, 1, 1.5, 2.5]) }, lengthM: between(r, 1, 800) }),
      ...(r.chance(0.4) ? { bleeder: { ohm: between(r, 500, 10_000), W: 5 } } : {}),
    },
    dcSupply({ V: r.pick([24, 48, 60]), tolerance: { minPct: -between(r, 0, 15), maxPct: 20 } }),
  );
}

/** Plus core, sensor with its own current back over the minus core, drops, signal core, input. */
function loopNet(n: number, panel: Panel): string[] {
  const { point, supply, io, core } = partsOf(panel);
  const devices = [point.device, ...(point.series ?? [])];
  const dropV = devices.reduce((sum, device) => sum + ('dropV' in device ? device.dropV : 0), 0);
  const ownmA = devices.reduce((sum, device) => sum + ('supplymA' in device ? device.supplymA : 0), 0);
  return [
    `Vs${n} plus${n} 0 ${supply.V * (1 + (supply.tolerance?.minPct ?? NaN) / 100)}`,
    `Rplus${n} plus${n} sensor${n} ${core}`,
    `Iown${n} sensor${n} back${n} ${ownmA / 1000}`,
    `Rback${n} back${n} 0 ${core}`,
    `Vdrop${n} sensor${n} out${n} ${dropV}`,
    `Rsig${n} out${n} in${n} ${core}`,
    ...inputNet(n, io, point.bleeder?.ohm, 'Vf' in io ? io.Vf.max : 0),
  ];
}

interface Compared {
  name: string;
  ours: number;
  theirs: number;
}

const read = (printed: Map<string, number>, name: string): number => {
  const value = printed.get(name);
  if (value === undefined) throw new Error(`ngspice printed no ${name}`);
  return value;
};

/** Shares of the greater value; a microampere or a millivolt is less than any limit asks about. */
function furthest(compared: Compared[]): { off: number; name: string } {
  const shares = compared.map(({ name, ours, theirs }) => ({
    name: `${name}: ${ours} against ${theirs}`,
    off:
      Math.abs(ours - theirs) < 1e-3
        ? 0
        : Math.abs(ours - theirs) / Math.max(Math.abs(ours), Math.abs(theirs)),
  }));
  return shares.reduce((worst, share) => (share.off > worst.off ? share : worst), { off: 0, name: 'none' });
}

describe('the loop solver against ngspice', () => {
  test('200 random DC loops that are on agree within 1 %', () => {
    const panels = seeds(200, 1).map(randomPanel);
    const printed = ngspice(
      [...models, ...panels.flatMap((panel, n) => loopNet(n, panel))],
      ['op', ...panels.flatMap((_, n) => [`print v(in${n})`, `print i(Vin${n})`, `print i(Vs${n})`])],
    );
    let conducting = 0;
    const compared = panels.flatMap((panel, n): Compared[] => {
      const { at } = inputAt(panel);
      const [draw] = drawsOf(at.io, 'max').models;
      if (!draw) throw new Error('no model of this input');
      const solved = solveInput(at, { V: at.volts.minV, draw, bleederOhm: at.point.bleeder?.ohm });
      // Dragged below what a constant current needs, the simulator's source would push on: not a loop to compare.
      if (draw.kind === 'constant-current' && read(printed, `v(in${n})`) < 0) return [];
      if (solved.mA > 0.1) conducting += 1;
      return [
        { name: `V of loop ${n}`, ours: solved.V, theirs: read(printed, `v(in${n})`) },
        { name: `mA of loop ${n}`, ours: solved.mA, theirs: 1000 * read(printed, `i(vin${n})`) },
      ];
    });
    expect(compared.length).toBeGreaterThan(2 * 190);
    expect(conducting).toBeGreaterThan(150);
    const { off, name } = furthest(compared);
    expect(off, name).toBeLessThan(0.01);
  });

  test('80 random DC loops that leak agree within 1 %', () => {
    const panels = seeds(80, 1001).map((seed) => {
      const r = random(seed);
      const io = r.chance(0.5) ? dcInput({ inputOhm: between(r, 1000, 12_000) }) : randomInput(r);
      return inputPanel(io, {
        device: {
          kind: 'two-wire',
          current: 'dc',
          dropV: 4,
          leakmA: between(r, 0.1, 2.5),
          minmA: 2,
          maxmA: 100,
        },
        ...(r.chance(0.5) ? { bleeder: { ohm: between(r, 500, 10_000), W: 5 } } : {}),
      });
    });
    const net = panels.flatMap((panel, n) => {
      const { point, supply, io } = partsOf(panel);
      const leak = 'leakmA' in point.device ? point.device.leakmA : NaN;
      const highest = supply.V * (1 + (supply.tolerance?.maxPct ?? NaN) / 100);
      // At low volts an input of constant current is its resistance (the maker's inputOhm).
      const off = io.kind === 'digital-input' ? { ...io, characteristic: 'resistive' as const } : io;
      return [
        `Vs${n} plus${n} 0 ${highest}`,
        `Ileak${n} plus${n} in${n} ${leak / 1000}`,
        // The supply is the most that leakage can reach.
        `Dlim${n} in${n} plus${n} ideal`,
        ...inputNet(n, off, point.bleeder?.ohm, 'Vf' in off ? off.Vf.min : 0),
      ];
    });
    const printed = ngspice(
      [...models, ...net],
      ['op', ...panels.flatMap((_, n) => [`print v(in${n})`, `print i(Vin${n})`])],
    );
    const { off, name } = furthest(
      panels.flatMap((panel, n): Compared[] => {
        const { at } = inputAt(panel);
        const state = offState(at);
        if ('missing' in state) throw new Error(state.missing);
        const opto = at.io.kind === 'opto-input' && at.io.parallelOhm !== undefined;
        return [
          { name: `V of leak ${n}`, ours: state.is.V, theirs: read(printed, `v(in${n})`) },
          // Of an LED with a resistor across it ours is the LED's share: the volts alone are compared.
          ...(opto
            ? []
            : [{ name: `mA of leak ${n}`, ours: state.is.mA, theirs: 1000 * read(printed, `i(vin${n})`) }]),
        ];
      }),
    );
    expect(off, name).toBeLessThan(0.01);
  });

  test('60 open contacts on long AC cables agree within 2 %', () => {
    const panels = seeds(60, 2001).map((seed) => {
      const r = random(seed);
      const panel = inputPanel(
        acInput({ inputOhm: between(r, 5000, 80_000) }),
        {
          cable: cable({ lengthM: between(r, 20, 2000), pFperM: between(r, 60, 300) }),
          ...(r.chance(0.4) ? { bleeder: { ohm: between(r, 3000, 50_000), W: 10 } } : {}),
        },
        acSupply(),
      );
      return { ...panel, frequencyHz: r.pick([50, 60] as const) };
    });
    const compared = ([50, 60] as const).flatMap((hz) => {
      const mine = panels.filter(({ frequencyHz }) => frequencyHz === hz);
      const net = mine.flatMap((panel, n) => {
        const { point, supply, io } = partsOf(panel);
        const farad = (point.cable?.pFperM ?? NaN) * 1e-12 * (point.cable?.lengthM ?? NaN);
        return [
          `Vs${n} plus${n} 0 dc 0 ac ${supply.V * (1 + (supply.tolerance?.maxPct ?? NaN) / 100)}`,
          `Cc${n} plus${n} in${n} ${farad}`,
          ...inputNet(n, io, point.bleeder?.ohm, 0),
        ];
      });
      const printed = ngspice(net, [`ac lin 1 ${hz} ${hz}`, ...mine.map((_, n) => `print vm(in${n})`)]);
      return mine.map((panel, n): Compared => {
        const state = offState(inputAt(panel).at);
        if ('missing' in state) throw new Error(state.missing);
        return { name: `V of cable ${n} at ${hz} Hz`, ours: state.is.V, theirs: read(printed, `vm(in${n})`) };
      });
    });
    expect(compared).toHaveLength(60);
    const { off, name } = furthest(compared);
    expect(off, name).toBeLessThan(0.02);
  });

  test('30 optocouplers with LEDs both ways on AC agree within 2 %', () => {
    const panels = seeds(30, 3001).map((seed) => {
      const r = random(seed);
      return inputPanel(
        optoInput({
          seriesOhm: between(r, 1000, 20_000),
          seriesW: 10,
          ...(r.chance(0.4) ? { parallelOhm: between(r, 300, 3000) } : {}),
        }),
        { cable: cable({ lengthM: between(r, 1, 500) }) },
        acSupply({ V: r.pick([24, 48, 120, 230]), tolerance: { minPct: -15, maxPct: 10 } }),
      );
    });
    const net = panels.flatMap((panel, n) => {
      const { supply, io, core } = partsOf(panel);
      if (io.kind !== 'opto-input') throw new Error('not an optocoupler');
      const peak = supply.V * (1 + (supply.tolerance?.minPct ?? NaN) / 100) * Math.SQRT2;
      return [
        `Vs${n} plus${n} 0 sin(0 ${peak} 50)`,
        `Rs${n} plus${n} led${n} ${2 * core + io.seriesOhm}`,
        ...(io.parallelOhm === undefined ? [] : [`Rp${n} led${n} 0 ${io.parallelOhm}`]),
        ...led(`led${n}`, '0', io.Vf.max, `p${n}`),
        ...led('0', `led${n}`, io.Vf.max, `m${n}`),
      ];
    });
    const printed = ngspice(
      [...models, ...net],
      [
        'tran 20u 40m 0 20u',
        ...panels.flatMap((_, n) => [
          `meas tran p${n} rms i(Vp${n}) from=20m to=40m`,
          `meas tran m${n} rms i(Vm${n}) from=20m to=40m`,
        ]),
      ],
    );
    const { off, name } = furthest(
      panels.map((panel, n): Compared => {
        const { at } = inputAt(panel);
        const [draw] = drawsOf(at.io, 'max').models;
        if (!draw) throw new Error('no model of this input');
        const { ledmA = NaN } = solveInput(at, { V: at.volts.minV, draw });
        return {
          name: `mA of LED ${n}`,
          ours: ledmA,
          theirs: 1000 * Math.hypot(read(printed, `p${n}`), read(printed, `m${n}`)),
        };
      }),
    );
    expect(off, name).toBeLessThan(0.02);
  });

  test('30 supplies discharge through their bleeders within 1 %', () => {
    const charged = seeds(30, 4001).map((seed) => {
      const r = random(seed);
      const uF = between(r, 100, 22_000);
      return {
        V: between(r, 61, 400),
        uF,
        bleedOhm: (between(r, 0.05, 0.4) / uF) * 1e6,
        toV: between(r, 5, 60),
      };
    });
    const printed = ngspice(
      charged.flatMap(({ V, uF, bleedOhm }, n) => [
        `C${n} c${n} 0 ${uF * 1e-6} ic=${V}`,
        `R${n} c${n} 0 ${bleedOhm}`,
      ]),
      ['tran 500u 2.5 0 500u uic', ...charged.map(({ toV }, n) => `meas tran t${n} when v(c${n})=${toV}`)],
    );
    const { off, name } = furthest(
      charged.map(({ V, uF, bleedOhm, toV }, n) => ({
        name: `s of capacitor ${n}`,
        ours: dischargeSeconds(bleedOhm, uF * 1e-6, V, toV),
        theirs: read(printed, `t${n}`),
      })),
    );
    expect(off, name).toBeLessThan(0.01);
  });
});
