/** The panel file: what is accepted, and what every refusal names. */
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { maxPoints, panelSchema } from '../../../shared/panel/panelSchema';
import { schemaErrors } from '../../../shared/panel/schemaErrors';
import { healthyPanel } from '../../../server/commands/demo/panels/healthy';
import { mixedPanel } from '../../../server/commands/demo/panels/mixed';
import { smallPanel } from '../../support/smallPanel';

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };
const isObject = (value: Json | undefined): value is { [key: string]: Json } =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** The small panel as JSON with the value at one path replaced; undefined takes it away. */
function changed(path: string, value: Json | undefined): Json {
  const document = JSON.parse(JSON.stringify(smallPanel())) as Json;
  const keys = path.split('.');
  const last = keys.pop() ?? '';
  let at: Json | undefined = document;
  for (const key of keys) at = Array.isArray(at) ? at[Number(key)] : isObject(at) ? at[key] : undefined;
  if (Array.isArray(at) && value !== undefined) at[Number(last)] = value;
  else if (isObject(at) && value !== undefined) at[last] = value;
  else if (isObject(at)) Reflect.deleteProperty(at, last);
  else throw new Error(`nothing at ${path}`);
  return document;
}
function errorsOf(document: unknown): string[] {
  const parsed = panelSchema.safeParse(document);
  return parsed.success ? [] : schemaErrors(parsed.error).map(({ path, says }) => `${path}: ${says}`);
}

describe('accepted', () => {
  it.each([
    ['the small panel', smallPanel()],
    ['the healthy demo panel', healthyPanel],
    ['the mixed demo panel', mixedPanel],
  ])('%s', (_name, panel) => {
    expect(errorsOf(JSON.parse(JSON.stringify(panel)))).toEqual([]);
  });
  it.each([
    ['no disconnect of its own', 'disconnect', null],
    ['a draft row without otherSupply', 'points.0.otherSupply', undefined],
    ['a draft common without a supply', 'groups.0.supply', undefined],
    ['tags that begin with = + -', 'points.0.wire', '=A1+K2-X3:4'],
    ['a wire size of 2/0', 'points.0.cable.size', { awg: -1 }],
  ] as [string, string, Json | undefined][])('%s', (_name, path, value) => {
    expect(errorsOf(changed(path, value))).toEqual([]);
  });
});

describe('refused, with path and reason', () => {
  it.each([
    ['another format', 'format', 'coldloop-panel/2', 'format: '],
    ['an unknown key at the top', 'colour', 'red', 'colour: is not known here'],
    ['an unknown key deep inside', 'points.0.cable.length', 12, 'points.0.cable.length: is not known here'],
    ['an unknown key in a device', 'points.0.device.volts', 24, 'points.0.device.volts: is not known here'],
    ['a missing field', 'earthTerminal', undefined, 'earthTerminal: '],
    ['a text where a number belongs', 'supplies.0.V', '24', 'supplies.0.V: '],
    ['no voltage at all', 'supplies.0.V', 0, 'supplies.0.V: '],
    ['a negative length', 'points.0.cable.lengthM', -1, 'points.0.cable.lengthM: '],
    ['a frequency that no grid has', 'frequencyHz', 55, 'frequencyHz: '],
    ['an unknown kind of device', 'points.0.device.kind', 'magic', 'points.0.device.kind: '],
    ['an unknown kind of module', 'modules.0.io.kind', 'magic', 'modules.0.io.kind: '],
    ['half a pair of terminals', 'supplies.0.terminals', { plus: 'X1:1' }, 'supplies.0.terminals.minus: '],
    [
      'terminals of two kinds',
      'supplies.0.terminals',
      { L: 'X1:1', N: 'X1:2', plus: 'X1:3' },
      'supplies.0.terminals.plus: is not known here',
    ],
    [
      'a size in two systems',
      'points.0.cable.size',
      { mm2: 1.5, awg: 16 },
      'points.0.cable.size.awg: is not known here',
    ],
    ['stored charge in words', 'supplies.0.bulk', 'little', 'supplies.0.bulk: '],
    ['a tolerance above 100 %', 'supplies.0.tolerance.maxPct', 101, 'supplies.0.tolerance.maxPct: '],
    ['an empty tag', 'points.0.address', '', 'points.0.address: '],
    ['a tag of spaces', 'points.0.address', '   ', 'points.0.address: '],
    ['a tag of 41 characters', 'points.0.address', 'x'.repeat(41), 'points.0.address: '],
    [
      'a tag that reads backwards',
      'points.0.address',
      'A\u202e1',
      'points.0.address: holds a control or direction character',
    ],
    [
      'a tag with a line break in it',
      'points.0.address',
      'A\n1',
      'points.0.address: holds a control or direction character',
    ],
    ['a list where an object belongs', 'drawing', [], 'drawing: '],
    ['an object where a list belongs', 'points', {}, 'points: '],
    ['points that are null', 'points', null, 'points: '],
  ] as [string, string, Json | undefined, string][])('%s', (_name, path, value, expected) => {
    const errors = errorsOf(changed(path, value));
    expect(errors.filter((one) => one.startsWith(expected))).toHaveLength(1);
    expect(errors.every((one) => one.split(': ').slice(1).join(': ').length > 0)).toBe(true);
  });

  it.each([
    ['null', null],
    ['a number', 7],
    ['a list', []],
    ['a text', 'panel'],
  ])('%s as the document', (_name, document) => {
    expect(errorsOf(document)).toHaveLength(1);
  });
  it('numbers that are none', () => {
    for (const V of [Number.NaN, Number.POSITIVE_INFINITY])
      expect(errorsOf({ ...smallPanel(), ambientC: V })[0]).toMatch(/^ambientC: /);
  });
  it('every error at once, not the first alone', () => {
    const document = changed('supplies.0.V', 'x');
    expect(errorsOf(isObject(document) ? { ...document, frequencyHz: 1 } : document)).toHaveLength(2);
  });
});

describe('20,000 points', () => {
  const [first] = smallPanel().points;
  const withPoints = (count: number) => ({
    ...smallPanel(),
    points: Array.from({ length: count }, (_, index) => ({ ...first, address: `P${index}` })),
  });
  it('are accepted', () => {
    expect(errorsOf(withPoints(maxPoints))).toEqual([]);
  });
  it('and one more are refused in words', () => {
    expect(errorsOf(withPoints(maxPoints + 1))).toEqual(['points: holds more than 20000 points']);
  });
});

describe('the published JSON Schema', () => {
  it('comes from the same schema and forbids unknown keys', () => {
    const published = z.toJSONSchema(panelSchema, { io: 'input' });
    expect(published).toMatchObject({ type: 'object', additionalProperties: false });
    expect(published.required).toContain('earthTerminal');
  });
});
