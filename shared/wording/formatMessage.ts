/** The part of ICU MessageFormat that our messages use: {name}, and {n, plural, =0 {…} one {…} other {… # …}}. */
import type { Language } from '../api/common';

type Part =
  | string
  | { kind: 'value'; name: string }
  /** The number of the plural form around it. */
  | { kind: 'count' }
  | { kind: 'plural'; name: string; forms: Record<string, Part[]> };
type Values = Record<string, string | number>;

/** Numbers in the trade's way: a decimal point in both languages (meters and drawings show one), at most 3 decimals, no thousands mark. */
export function formatNumber(value: number): string {
  return String(Number(value.toFixed(Math.abs(value) >= 100 ? 1 : 3)));
}

/** Reads a message once from left to right; what it cannot read is a fault of the message and thrown. */
class MessageReader {
  private at = 0;

  constructor(private readonly message: string) {}

  /** Text and arguments up to the end, or up to the brace that closes this plural form. */
  parts(isInPlural = false): Part[] {
    const parts: Part[] = [];
    while (this.at < this.message.length && this.message[this.at] !== '}') parts.push(this.part(isInPlural));
    return parts;
  }

  private part(isInPlural: boolean): Part {
    if (this.message[this.at] === '{') return this.argument();
    if (isInPlural && this.message[this.at] === '#') {
      this.at += 1;
      return { kind: 'count' };
    }
    return this.take(isInPlural ? /[^{}#]+/y : /[^{}]+/y);
  }

  private argument(): Part {
    const name = this.take(/\{\s*\w+\s*/y)
      .slice(1)
      .trim();
    if (this.message[this.at] === '}') {
      this.at += 1;
      return { kind: 'value', name };
    }
    this.take(/,\s*plural\s*,\s*/y);
    const forms: Record<string, Part[]> = {};
    while (this.message[this.at] !== '}') {
      const form = this.take(/(=\d+|\w+)\s*\{/y).replace(/\s*\{$/, '');
      forms[form] = this.parts(true);
      this.take(/\}\s*/y);
    }
    this.at += 1;
    return { kind: 'plural', name, forms };
  }

  private take(pattern: RegExp): string {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.message)?.[0];
    if (found === undefined) throw new Error(`cannot read "${this.message}" at ${this.at}`);
    this.at += found.length;
    return found;
  }

  /** @throws Error when something is left, e.g. a brace that nothing opened */
  whole(): Part[] {
    const parts = this.parts();
    if (this.at < this.message.length) throw new Error(`cannot read "${this.message}" at ${this.at}`);
    return parts;
  }
}

const read = new Map<string, Part[]>();
const rules: Record<Language, Intl.PluralRules> = {
  en: new Intl.PluralRules('en'),
  es: new Intl.PluralRules('es'),
};

function valueOf(values: Values, name: string): string | number {
  const value = values[name];
  if (value === undefined) throw new Error(`nothing was given for {${name}}`);
  return value;
}

function say(language: Language, parts: Part[], values: Values, count: string): string {
  return parts
    .map((part) => {
      if (typeof part === 'string') return part;
      if (part.kind === 'count') return count;
      const value = valueOf(values, part.name);
      const shown = typeof value === 'number' ? formatNumber(value) : value;
      if (part.kind === 'value') return shown;
      const form = part.forms[`=${value}`] ?? part.forms[rules[language].select(Number(value))];
      return say(language, form ?? part.forms.other ?? [], values, shown);
    })
    .join('');
}

/** @throws Error when the message cannot be read or a value it names is missing */
export function formatMessage(language: Language, message: string, values: Values): string {
  let parts = read.get(message);
  if (!parts) {
    parts = new MessageReader(message).whole();
    read.set(message, parts);
  }
  return say(language, parts, values, '');
}
