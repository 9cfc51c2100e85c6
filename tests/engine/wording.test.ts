import { IntlMessageFormat } from 'intl-messageformat';
import { describe, expect, test } from 'vitest';
import { en } from '../../shared/wording/en';
import { es } from '../../shared/wording/es';
import { formatMessage } from '../../shared/wording/formatMessage';

type Elements = ReturnType<IntlMessageFormat['getAst']>;
const areas: Record<'en' | 'es', Record<string, string>> = { en, es };

/** Names of the arguments of a message, those inside plural branches too. */
function placeholders(message: string): string[] {
  const names = new Set<string>();
  const walk = (elements: Elements) => {
    for (const element of elements) {
      // Type 0 is plain text; the # of a plural has no value: neither names an argument.
      const type: number = element.type;
      if (type !== 0 && 'value' in element) names.add(element.value);
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

  test.each(['en', 'es'] as const)('reads every message as ICU MessageFormat does (%s)', (language) => {
    for (const message of Object.values(areas[language]))
      for (const n of [0, 1, 2, 5, 21]) {
        const values = Object.fromEntries(placeholders(message).map((name) => [name, n]));
        const whole = new IntlMessageFormat(message, language, undefined, { ignoreTag: true });
        expect(formatMessage(language, message, values)).toBe(whole.format(values));
      }
  });

  test.each([
    ['a value that is not given', 'at {place}', {}],
    ['a brace that nothing closes', 'at {place', { place: 'Q1' }],
    ['a brace that nothing opened', 'at place}', {}],
    ['a form it does not know', '{n, select, a {b} other {c}}', { n: 1 }],
  ])('throws on %s', (_name, message, values) => {
    expect(() => formatMessage('en', message, values)).toThrow();
  });

  test('shows numbers as the trade writes them, in forms too', () => {
    const message = '{n, plural, one {# lock} other {# locks at {v} V}}';
    expect(formatMessage('es', message, { n: 1200, v: 230.04 })).toBe('1200 locks at 230 V');
    expect(formatMessage('en', message, { n: 2, v: 0.0125 })).toBe('2 locks at 0.013 V');
  });
});
