import { IntlMessageFormat } from 'intl-messageformat';
import { describe, expect, test } from 'vitest';
import { en } from '../../shared/wording/en';
import { es } from '../../shared/wording/es';

type Elements = ReturnType<IntlMessageFormat['getAst']>;
const areas: Record<'en' | 'es', Record<string, string>> = { en, es };

/** Names of the arguments of a message, those inside plural branches too. */
function placeholders(message: string): string[] {
  const names = new Set<string>();
  const walk = (elements: Elements) => {
    for (const element of elements) {
      // Types 0 and 7 are plain text and the # of a plural: neither names an argument.
      if (element.type !== 0 && element.type !== 7) names.add(element.value);
      if ('options' in element) for (const option of Object.values(element.options)) walk(option.value);
    }
  };
  walk(new IntlMessageFormat(message, 'en', undefined, { ignoreTag: true }).getAst());
  return [...names].sort();
}

describe('wording', () => {
  test('has the same keys in both languages', () => {
    expect(Object.keys(es).sort()).toEqual(Object.keys(en).sort());
    expect(Object.keys(en).length).toBeGreaterThan(300);
  });

  test('asks for the same values in both languages', () => {
    const differing = Object.keys(en)
      .filter((key) => key in es)
      .map((key) => [key, placeholders(areas.en[key] ?? ''), placeholders(areas.es[key] ?? '')] as const)
      .filter(([, english, spanish]) => english.join() !== spanish.join());
    expect(differing).toEqual([]);
  });

  test('sees a placeholder that only one language has', () => {
    expect(placeholders('{n, plural, one {# of {who}} other {#}} at {place}')).toEqual(['n', 'place', 'who']);
  });
});
