import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { rules } from '../../../shared/rules/registry';

const tables = import.meta.glob<Record<string, unknown>>('./cases/*.ts', { eager: true });
const table = z.array(z.object({ rule: z.string(), expected: z.string() }));
const cases = Object.values(tables)
  .flatMap((module) => Object.values(module))
  .flatMap((exported) => table.parse(exported));

type Kind = 'triggers' | 'inside' | 'missing';
/** Rules whose own finding is that a datum is missing: `doubt` counts as triggered. */
function kindsOf(expected: string): Kind[] {
  const parts = expected.split(', ');
  return [
    ...(parts.some((part) => /^(hurts|damages|fails|doubt|tells)$/.test(part)) ? ['triggers' as const] : []),
    ...(parts.some((part) => part === 'ok' || part === 'nothing') ? ['inside' as const] : []),
    ...(parts.some((part) => part.startsWith('missing ')) ? ['missing' as const] : []),
  ];
}

/** Rules that cannot lack a datum, each with the reason. */
const needsNothingOptional: Record<string, string> = {
  'supply.missing': 'it is itself the finding that the datum is missing',
  'supply.no-tolerance': 'it is itself the finding that the datum is missing',
  'supply.unearthed-control': 'earthed is required; a monitor that is not stated counts as none',
  'input.leakage': 'without the resistance of the input it raises a doubt of its own (wiring.md)',
  'input.mixed-on-common': 'compares the kinds of the sensors, which are required',
  'output.ssr-heat': 'a heat sink that is not stated is the doubt itself',
  'data.duplicate-address': 'the address is required',
  'data.duplicate-terminal': 'the terminal is required',
  'data.duplicate-wire': 'the wire number is required',
  'data.unused-terminal': 'a module that lists no terminals has none to be unused',
  'data.spare-connected': 'asks only of points that say they are spare',
};

const tried = (id: string): Set<Kind> =>
  new Set(cases.filter(({ rule }) => rule === id).flatMap(({ expected }) => kindsOf(expected)));

describe('every registered rule', () => {
  test.each(rules.map(({ id }) => id))(
    '%s is triggered, passed just inside, and left without its datum',
    (id) => {
      const kinds = tried(id);
      const asked: Kind[] = [
        'triggers',
        'inside',
        ...(id in needsNothingOptional ? [] : (['missing'] as const)),
      ];
      expect(asked.filter((kind) => !kinds.has(kind))).toEqual([]);
    },
  );

  test('a rule that is said to lack nothing has indeed no case without its datum', () => {
    expect(Object.keys(needsNothingOptional).filter((id) => tried(id).has('missing'))).toEqual([]);
    const ids = new Set(rules.map(({ id }) => id));
    expect(Object.keys(needsNothingOptional).filter((id) => !ids.has(id))).toEqual([]);
  });

  test('no case names a rule that is not registered', () => {
    const ids = new Set(rules.map(({ id }) => id));
    expect(cases.filter(({ rule }) => !ids.has(rule))).toEqual([]);
    expect(cases.length).toBeGreaterThan(3 * rules.length);
  });
});
