/** A record document of any number of points, for the PDF and the list; shaped like one of a real job. */
import type { RecordDocument } from '../../shared/api/recordDocument';
import { panelSchema, type Panel } from '../../shared/panel/panelSchema';
import { smallPanel } from './smallPanel';

const hash = (letter: string) => letter.repeat(64);
const id = (n: number) => `0198a000-0000-7000-8000-${String(n).padStart(12, '0')}`;

/** The small panel with `points` points, all PNP sensors on one module. */
export function widePanel(points: number): Panel {
  const small = smallPanel();
  const [first] = small.points;
  if (!first) throw new Error('the small panel has no points');
  return panelSchema.parse({
    ...small,
    points: Array.from({ length: points }, (_, index) => ({
      ...first,
      address: `DI3.${index + 1}`,
      terminal: `X3:${index + 1}`,
      description: `Filter ${index + 1} level high`,
      conductors: first.conductors?.map((each) =>
        each.role === 'signal' ? { ...each, terminal: `X3:${index + 1}` } : each,
      ),
    })),
  });
}

const shown = [
  'Identify the cable W21 by its tag at both ends',
  'Measure at X3:1 that the terminal is dead',
  'Land wire 101 on terminal X3:1, white ferrule, 0.5 mm², tighten to 0.5 Nm',
  'Land wire 102 on terminal X1:1, white ferrule, 0.5 mm², tighten to 0.5 Nm',
  'Land wire 103 on terminal X1:5, white ferrule, 0.5 mm², tighten to 0.5 Nm',
  'Compare polarity with the picture',
  'Pull each wire by hand',
  'Measure the resistance of the loop: at most 2.4 Ω',
  'Measure the insulation at 250 V: at least 1 MΩ',
  'Actuate the sensor: the input turns on. Measure U ≥ 11 V',
  'Release the sensor: the input turns off. Measure U ≤ 5 V',
  'Fit the terminal cover',
];

export function sampleRecord(points: number, language: 'en' | 'es' = 'en'): RecordDocument {
  const at = (minute: number) => new Date(Date.UTC(2026, 10, 30, 7, minute)).toISOString();
  const answer = (step: string, index: number, minute: number): RecordDocument['steps'][number] => ({
    step,
    stage: 'wire',
    shown: shown[index % shown.length] ?? '',
    answer: index % 3 === 1 ? `${(index / 7).toFixed(2)} Ω` : 'Done',
    person: minute % 2 ? 'Ana Ribera' : 'Tom Oakes',
    at: at(minute),
    round: 1,
    verdict: 'ok',
  });
  const panel = widePanel(points);
  return {
    format: 'coldloop-record/1',
    language,
    amends: null,
    site: { id: id(1), name: 'Halden Quay' },
    job: { id: id(2), number: '0231', due: '2026-11-30', words: null },
    panel: {
      tag: panel.tag,
      name: panel.name,
      location: panel.location,
      drawing: panel.drawing,
      revision: 3,
      digest: hash('a'),
    },
    pack: hash('b'),
    logs: [{ log: id(3), person: 'Ana Ribera', seq: 412, hash: hash('c') }],
    scope: panel.points.map(({ address }) => address),
    people: [
      { id: id(4), name: 'Ana Ribera', part: 'electrician' },
      { id: id(5), name: 'Tom Oakes', part: 'electrician' },
      { id: id(6), name: 'Íñigo Salas', part: 'foreman' },
    ],
    times: { sentAt: at(0), startedAt: at(5), signedAt: at(300), countersignedAt: at(330) },
    lockOut: ['Q1', 'F7', 'F9'].map((isolator, n) => ({
      isolator,
      lock: String(17 + n),
      person: 'Ana Ribera',
      onAt: at(6 + n),
      offAt: at(280 + n),
      removedBy: null,
      round: 1,
    })),
    deadTests: ['X1:1', 'X1:2', 'X3:1'].map((terminal, n) => ({
      terminal,
      second: 'PE',
      pair: '+/PE',
      supply: 'S24',
      value: 0.07 + n / 100,
      unit: 'V DC',
      person: 'Ana Ribera',
      at: at(20 + n),
      round: 1,
      verdict: 'ok',
    })),
    points: panel.points.map(({ address, terminal, description }, n) => ({
      address,
      terminal,
      description,
      answers: shown.map((_, index) => answer(`wire.${address}.${index}`, index + n, n)),
    })),
    steps: ['panel', 'lock', 'test'].map((name, index) => answer(name, index, 3)),
    findings: [
      {
        rule: 'input.leakage',
        harm: 'fails',
        place: 'point:DI3.1',
        says: 'Leakage keeps the input on',
        accepted: { reason: 'The resistor is fitted', by: 'Pia Engels' },
      },
    ],
    holds: [],
    rounds: [{ number: 1, reason: 'start', words: '', person: 'Ana Ribera', at: at(5), points: [] }],
    returned: [],
    chosen: [],
    drawingDiffers: [],
    notes: [],
    photos: [],
    signatures: [
      {
        kind: 'signed',
        name: 'Ana Ribera',
        meaning: 'I did this work and these answers are mine',
        at: at(300),
        zone: 'Europe/Madrid',
        digest: hash('d'),
        picture: {
          strokes: [
            [
              [0.1, 0.2, 0.5],
              [0.2, 0.05, 0.6],
              [0.3, 0.25, 0.5],
              [0.5, 0.1, 0.4],
            ],
            [
              [0.55, 0.2, 0.5],
              [0.8, 0.15, 0.5],
            ],
          ],
        },
      },
      {
        kind: 'countersigned',
        name: 'Íñigo Salas',
        meaning: 'I reviewed this work and accept it',
        at: at(330),
        zone: 'Europe/Madrid',
        digest: hash('e'),
        picture: { typed: 'Íñigo Salas' },
      },
    ],
  };
}
