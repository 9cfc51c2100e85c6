/** The analogue cards of HQ-OP9: loops with too little power, with two, with none, and the wrong cables. */
import type { AnalogueInput } from '../../../../../shared/panel/moduleIo';
import type { Panel, Point } from '../../../../../shared/panel/panelSchema';
import { face, inputPoint, terminalRange } from '../../panelParts';

const hall = 'Old pump hall';
const loop: AnalogueInput = {
  kind: 'analogue-input',
  signal: '4-20mA',
  inputOhm: 250,
  powersLoop: true,
  isolated: false,
};

const cards: [tag: string, points: number, io: AnalogueInput][] = [
  ['AI1', 2, loop],
  ['AI2', 1, { ...loop, powersLoop: false }],
  ['AI3', 1, { ...loop, signal: 'rtd', powersLoop: false, leads: 3 }],
  ['AI4', 1, { ...loop, signal: 'thermocouple', powersLoop: false, tcType: 'K' }],
];
export const analogueModules: Panel['modules'] = cards.map(([tag, points, io], index) => ({
  tag,
  slot: String(31 + index),
  description: `Analogue inputs, ${io.signal}`,
  pluggable: true,
  terminals: face(tag, 1, points, `${tag}:C`),
  terminalRange,
  io,
}));
export const analogueGroups: Panel['groups'] = cards.map(([tag]) => ({
  tag: `G-${tag}`,
  module: tag,
  terminal: `${tag}:C`,
  supply: 'S24',
  common: 'negative',
  fuse: { tag: `F-${tag}`, A: 0.5, kind: 'miniature-T' },
}));

const point = (module: string, number: number, description: string, device: Point['device']): Point => {
  const made = inputPoint({
    module,
    number,
    group: `G-${module}`,
    description,
    device,
    lengthM: 70,
  });
  return {
    ...made,
    conductors: made.conductors?.filter(({ role }) => role === 'signal'),
    cable: made.cable && { ...made.cable, screened: true, screenEarthed: 'panel', type: 'Copper pair' },
  };
};

export const analoguePoints = (): Point[] => {
  const flow = point('AI1', 2, 'Flow in the rising main', {
    kind: 'transmitter',
    tag: 'B82',
    location: 'Rising main',
    wires: 4,
  });
  return [
    point('AI1', 1, 'Level in the wet well', {
      kind: 'transmitter',
      tag: 'B81',
      location: 'Wet well',
      wires: 2,
      minV: 18,
    }),
    { ...flow, cable: flow.cable && { ...flow.cable, screenEarthed: 'both' } },
    point('AI2', 1, 'Pressure before pump 2', {
      kind: 'transmitter',
      tag: 'B83',
      location: hall,
      wires: 2,
      minV: 10,
    }),
    point('AI3', 1, 'Bearing temperature, pump 1', { kind: 'rtd', tag: 'B84', location: 'Pump 1', wires: 2 }),
    point('AI4', 1, 'Exhaust of the standby engine', {
      kind: 'thermocouple',
      tag: 'B85',
      location: 'Engine room',
      type: 'K',
    }),
  ];
};
