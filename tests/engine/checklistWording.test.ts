import { describe, expect, test } from 'vitest';
import type { Language } from '../../shared/api/common';
import { generateChecklist } from '../../shared/checklist/generate';
import { textsOf, wordingKeys } from '../../shared/checklist/textsOf';
import type { Checklist, Warning } from '../../shared/checklist/types';
import type { Text } from '../../shared/panel/says';
import { checklist as english } from '../../shared/wording/en/checklist';
import { render } from '../../shared/wording/render';
import { inputsOfPanels } from '../support/demoInputs';
import { countsOf, fleschKincaidGrade, syllablesIn } from '../support/readability';
import { exampleInput } from '../support/smallPanel';

const checklists: [string, Checklist][] = [
  ['small panel, plan by hand', generateChecklist(exampleInput())],
  ...inputsOfPanels().map(([name, input]): [string, Checklist] => [name, generateChecklist(input)]),
];
const languages: Language[] = ['en', 'es'];

describe.each(checklists)('the words of the checklist: %s', (_name, { steps }) => {
  test.each(languages)('every text renders in %s with nothing missing', (language) => {
    for (const step of steps)
      for (const text of textsOf(step)) {
        const said = render(language, text);
        expect(said.trim(), step.id).not.toBe('');
        expect(said, step.id).not.toMatch(/[{}]|undefined|\bNaN\b|\[object/);
      }
  });

  test('no title is longer than 20 words', () => {
    const long = steps
      .map(({ title }) => render('en', title))
      .filter((title) => title.split(/\s+/).length > 20);
    expect(long).toEqual([]);
  });

  test('signal words keep their meaning (ANSI Z535.4: DANGER will, WARNING and CAUTION could; reference §10)', () => {
    const words: Record<Warning['signal'], RegExp> = {
      danger: /\bwill (kill|crush or kill)\b/,
      warning: /\bcould\b/,
      caution: /\bcould\b/,
      notice: /^(?!.*\b(kill|hurt|crush|you)\b)/,
    };
    for (const { warnings = [], id } of steps)
      for (const { signal, says } of warnings) {
        const said = render('en', says);
        expect(said, `${id} ${signal}`).toMatch(words[signal]);
        if (signal !== 'danger') expect(said, id).not.toMatch(/\bwill\b/);
      }
  });

  test('a step reads at a Flesch–Kincaid grade of 5 at most in the middle, 8 at the 95th percentile', () => {
    // What an engineer or another engine wrote (a description, a finding) is theirs; the step is title, own details, warnings.
    const own = ({ key }: Text) => key.startsWith('checklist.') && key !== 'checklist.said';
    const grades = steps
      .map(({ title, detail = [], warnings = [] }) =>
        [title, ...detail.filter(own), ...warnings.map(({ says }) => says)]
          .map((text) => render('en', text))
          .join(' '),
      )
      .map((said) => fleschKincaidGrade(countsOf(said)))
      .sort((a, b) => a - b);
    expect(grades[Math.floor(grades.length / 2)]).toBeLessThanOrEqual(5);
    expect(grades[Math.floor(grades.length * 0.95)]).toBeLessThanOrEqual(8);
  });
});

describe('the readability measure', () => {
  test('gives the grade of a worked example (reference/standards.md §13 row 37)', () => {
    expect(fleschKincaidGrade({ words: 100, sentences: 10, syllables: 150 })).toBeCloseTo(6.01, 2);
  });

  // Syllables as a dictionary splits them (from memory).
  test.each([
    ['read', 1],
    ['terminal', 3],
    ['voltage', 2],
    ['controller', 3],
    ['isolate', 3],
    ['resistance', 3],
    ['employer', 3],
    ['discharge', 2],
    ['closed', 1],
    ['rated', 2],
    ['emergency', 4],
    ['module', 2],
    ['fuses', 2],
    ['AC', 2],
    ['X3:14', 1],
  ])('%s has %i', (word, syllables) => {
    expect(syllablesIn(word)).toBe(syllables);
  });

  test('would refuse office prose', () => {
    const prose =
      'Ensure that appropriate verification of the de-energised condition has been accomplished in accordance with applicable organisational procedures.';
    expect(fleschKincaidGrade(countsOf(prose))).toBeGreaterThan(8);
  });

  test('a decimal point ends no sentence', () => {
    expect(countsOf('Tighten to 0.5 Nm. Tug it.')).toMatchObject({ sentences: 2, words: 6 });
  });
});

describe('the wording area of the checklist', () => {
  const used = new Set(checklists.flatMap(([, list]) => wordingKeys(list)));

  test('says nothing vague', () => {
    for (const [key, message] of Object.entries(english))
      expect(message, key).not.toMatch(/\b(ensure|appropriate(ly)?|as required|properly|make sure)\b/i);
  });

  test('holds the keys that checklists use', () => {
    const own = [...used].filter((key) => key.startsWith('checklist.'));
    expect(own.length).toBeGreaterThan(150);
    expect(own.filter((key) => !(key in english))).toEqual([]);
  });
});
