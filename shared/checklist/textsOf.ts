/** Every text a checklist can show, so that a pack carries its messages and a test can render them all. */
import type { Text } from '../panel/says';
import type { Checklist, Step } from './types';

/** Title, details, warnings, labels and sums of one step, in the order in which they are read. */
export function textsOf({ title, detail = [], warnings = [], ask }: Step): Text[] {
  const answers =
    ask.kind === 'done'
      ? [ask.label]
      : ask.kind === 'choice'
        ? ask.options.map(({ label }) => label)
        : ask.kind === 'reading' && ask.why
          ? [ask.why]
          : [];
  return [title, ...detail, ...warnings.map(({ says }) => says), ...answers];
}

const keysOf = ({ key, params = {} }: Text): string[] => [
  key,
  ...Object.values(params).flatMap((value) => (typeof value === 'object' ? keysOf(value) : [])),
];

/** The wording keys a checklist uses, each once, sorted. */
export const wordingKeys = ({ steps }: Checklist): string[] =>
  [...new Set(steps.flatMap(textsOf).flatMap(keysOf))].sort();
