import { describe, expect, it } from 'vitest';
import { fitTag } from '../../../shared/diagram/fitLabel';
import { loopDiagram, type LoopPicture } from '../../../shared/diagram/loopDiagram';
import { loopFacts } from '../../../shared/diagram/loopFacts';
import { loopValues } from '../../../shared/diagram/loopValues';
import { loopSentences, loopWords } from '../../../shared/diagram/loopWords';
import type { Label, Place, Primitive } from '../../../shared/diagram/primitives';
import { render } from '../../../shared/wording/render';
import { loopCases } from '../../support/loopCases';
import { smallPanel } from '../../support/smallPanel';

const panel = loopCases();
const addresses = panel.points.map(({ address }) => address);

function picture(address: string, options = {}): LoopPicture {
  const drawn = loopDiagram(panel, address, options);
  if (!drawn) throw new Error(`no point ${address}`);
  return drawn;
}
const labels = ({ shapes }: LoopPicture): Label[] => shapes.filter((shape) => shape.kind === 'label');
const tags = (drawn: LoopPicture): string[] =>
  labels(drawn).flatMap(({ says }) => ('tag' in says ? [says.tag] : []));

function corners(shape: Primitive): Place[] {
  switch (shape.kind) {
    case 'line':
      return shape.through;
    case 'polygon':
      return shape.corners;
    case 'rect':
      return [
        [shape.x, shape.y],
        [shape.x + shape.width, shape.y + shape.height],
      ];
    case 'circle':
      return [
        [shape.x - shape.r, shape.y - shape.r],
        [shape.x + shape.r, shape.y + shape.r],
      ];
    case 'label':
      return [[shape.x, shape.y]];
  }
}

describe('the picture of a loop', () => {
  it.each(addresses)('%s stays within its sheet and names its terminal, common and wire', (address) => {
    const drawn = picture(address);
    const outside = drawn.shapes
      .flatMap(corners)
      .filter(([x, y]) => x < 0 || y < 0 || x > drawn.width || y > drawn.height);
    expect(outside).toEqual([]);
    const facts = loopFacts(panel, address);
    expect(tags(drawn)).toEqual(
      expect.arrayContaining([facts?.point.terminal, facts?.group?.terminal, facts?.module?.tag]),
    );
  });

  it.each(addresses)('%s holds its tags in their room at 10 units or more', (address) => {
    for (const { says, size, room } of labels(picture(address)))
      if ('tag' in says) {
        const fitted = fitTag(says.tag, size, room);
        expect(fitted.size).toBeGreaterThanOrEqual(10);
        if (room !== undefined)
          expect(fitted.text.length * fitted.size * 0.632).toBeLessThanOrEqual(room + 10);
      }
  });

  it.each([
    [
      'pnp',
      ['+24 V', '0 V', 'X1:1', 'X1:2', 'F7 0.5 A', 'B7', 'PNP', 'BK', '3014', 'BN 102', 'BU 103', 'X1:5'],
    ],
    ['npn', ['+24 V', '0 V', 'B8', 'NPN', 'F8 0.5 A', 'X4:C']],
    ['relay.coil', ['L 230 V', 'N', 'K4', '230 V 100 mA', 'RC', 'F12 2 A', 'X5:C2']],
    ['source.valve', ['Y1', '24 V 450 mA', '400 V', 'F42 1 A']],
    ['source.ssr', ['K9', '4–32 V 12 mA', 'S230']],
    ['contact.foreign', ['S230', 'S9']],
    ['nobody', ['?']],
  ])('%s shows %j', (address, expected) => {
    expect(tags(picture(address))).toEqual(expect.arrayContaining(expected));
  });

  it.each([
    ['signal', 'pnp'],
    ['plus', 'pnp'],
    ['minus', 'pnp'],
    ['screen', 'transmitter'],
  ])('draws the %s conductor of %s thick when it is in question, and nothing otherwise', (mark, address) => {
    const thick = (drawn: LoopPicture) =>
      drawn.shapes.filter((each) => 'weight' in each && each.weight === 'thick');
    expect(thick(picture(address, { mark }))).toHaveLength(1);
    expect(thick(picture(address))).toEqual([]);
  });

  it('sets the sign of each finding', () => {
    const marks = (['point', 'terminal', 'group', 'module', 'supply'] as const).map((at, n) => ({
      at,
      sign: `z${n}`,
    }));
    expect(tags(picture('pnp', { marks }))).toEqual(expect.arrayContaining(['z0', 'z1', 'z2', 'z3', 'z4']));
  });

  it('is nothing for a point that the panel does not hold', () => {
    expect(loopDiagram(panel, 'nowhere')).toBeUndefined();
  });
});

/** Where the arrow of the signal conductor points: its tip is the first corner, its foot the two others. */
function flow(address: string): 'to module' | 'to field' | 'none' {
  const drawn = picture(address);
  const facts = loopFacts(panel, address);
  const block = drawn.shapes.find(
    (each) => each.kind === 'rect' && each.width === 40 && each.height === 34 && each.x === 214,
  );
  if (!block || block.kind !== 'rect' || !facts) throw new Error('no terminal block');
  const arrow = drawn.shapes.find(
    (each) =>
      each.kind === 'polygon' &&
      each.corners[0]?.[1] === block.y + 17 &&
      each.corners.every(([x]) => x > 132),
  );
  if (!arrow || arrow.kind !== 'polygon') return 'none';
  const [tip, foot] = arrow.corners;
  return (tip?.[0] ?? 0) > (foot?.[0] ?? 0) ? 'to module' : 'to field';
}

describe('the current', () => {
  it.each([
    ['pnp', 'to module'],
    ['contact', 'to module'],
    ['npn', 'to field'],
    ['contact.source', 'to field'],
    ['sink.lamp', 'to module'],
    ['source.valve', 'to field'],
    ['relay.coil', 'none'],
    ['two-wire.ac', 'none'],
    ['rtd', 'none'],
    ['transmitter', 'to module'],
    ['analogue.out', 'to field'],
  ])('of %s runs %s', (address, direction) => {
    expect(flow(address)).toBe(direction);
  });
});

describe('computed values', () => {
  const valuesOf = (address: string) => {
    const facts = loopFacts(panel, address);
    return facts && loopValues(facts);
  };
  it('are those of Ohm’s law: 24 V over 18 m of 0.5 mm² (39 Ω/km, IEC 60228 class 5) and 6800 Ω', () => {
    const on = valuesOf('contact')?.on;
    const cable = (2 * 18 * 39) / 1000;
    expect(on?.mA).toBeCloseTo((24 / (6800 + cable)) * 1000, 6);
    expect(on?.V).toBeCloseTo((24 * 6800) / (6800 + cable), 6);
  });
  it('take the sensor’s drop on and its leakage off: 0.1 mA through 6800 Ω', () => {
    expect(valuesOf('pnp')?.on?.V).toBeCloseTo((22 * 6800) / (6800 + (2 * 32 * 39) / 1000), 6);
    expect(valuesOf('pnp')?.off?.V).toBeCloseTo(0.68, 3);
  });
  it.each(['npn', 'two-wire.ac', 'relay.coil', 'transmitter', 'nobody'])(
    'are not invented where data is missing or the kind is another: %s',
    (address) => {
      expect(valuesOf(address)).toBeUndefined();
    },
  );
});

describe('the loop in words', () => {
  it.each(addresses)('%s reads in both languages and names terminal and wires', (address) => {
    for (const language of ['en', 'es'] as const) {
      const said = render(language, loopWords(panel, address));
      const point = loopFacts(panel, address)?.point;
      expect(said).toContain(point?.terminal);
      for (const { wire, colour } of point?.conductors ?? []) {
        expect(said).toContain(wire);
        expect(said).toContain(colour);
      }
    }
  });

  it('says the foreign supply, and says when nobody has said it', () => {
    const said = (address: string) => render('en', loopWords(panel, address));
    expect(said('contact.foreign')).toContain('Supply S230, 230 V, also reaches X3:17.');
    expect(said('contact.unsaid')).toContain(
      'Nobody has said whether another supply reaches X3:18. Treat it as live.',
    );
    expect(said('nobody')).toContain('Nobody has said which supply feeds the common.');
    expect(said('source.ssr')).toContain('The load of this relay hangs on supply S230, 230 V.');
  });

  it('says a PNP sensor in the order in which it is read', () => {
    expect(
      loopSentences(panel, 'pnp')
        .map((each) => render('en', each))
        .slice(0, 3),
    ).toEqual([
      'Supply S24, 24 V.',
      'PNP sensor B7 on + at X1:1 and 0 V at X1:2; its output goes to terminal X3:14.',
      'Signal wire 3014, BK, on X3:14.',
    ]);
  });

  it('draws and says every point of the small panel', () => {
    const small = smallPanel();
    for (const { address } of small.points) {
      expect(loopDiagram(small, address)).toBeDefined();
      expect(render('es', loopWords(small, address)).length).toBeGreaterThan(40);
    }
  });
});
