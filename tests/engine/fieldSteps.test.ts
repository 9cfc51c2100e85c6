import { describe, expect, it } from 'vitest';
import { say } from '../../shared/panel/says';
import { render } from '../../shared/wording/render';
import { markTags, tagEnd, tagStart, withoutMarks } from '../../src/components/field/tagMarks';
import { panelTags } from '../../src/features/fieldwork/job/panelTags';
import { stepsAt } from '../../src/features/fieldwork/more/stepsAt';
import { placeLine } from '../../src/features/fieldwork/step/placeLine';
import { samplePack } from '../support/fieldHarness/samplePack';
import { samplePanel } from '../support/fieldHarness/samplePanel';

const stepOf = (id: string) => {
  const step = samplePack.checklist.steps.find((each) => each.id === id);
  if (!step) throw new Error(`no step ${id}`);
  return step;
};

describe('tags in a sentence', () => {
  const tags = panelTags(samplePanel);
  const isTag = (word: string) => tags.has(word);
  it.each([
    'HQ-LP3',
    'Q1',
    'F12',
    'S24',
    'X1:2',
    'X3:14',
    'DI3.07',
    '3014',
    'DI3.A',
    'F7',
    'B7',
    'W21',
    'PE1',
    'HQ-MC2',
  ])('knows %s', (tag) => {
    expect(tags.has(tag)).toBe(true);
  });
  it('marks them inside texts within texts, and leaves other words alone', () => {
    const said = say('a', { inner: say('b', { terminal: 'X3:14' }), word: 'earth', n: 3 });
    const marked = markTags(said, isTag);
    expect(marked).toEqual(
      say('a', { inner: say('b', { terminal: `${tagStart}X3:14${tagEnd}` }), word: 'earth', n: 3 }),
    );
  });
  it('leaves the words an entry keeps without marks', () => {
    const { wording } = samplePack;
    const marked = render('en', markTags(stepOf('land').title, isTag), wording.en);
    expect(marked).toContain(tagStart);
    expect(withoutMarks(marked)).toBe(render('en', stepOf('land').title, wording.en));
  });
});

describe('where a step is', () => {
  it('counts points in Wire', () => {
    expect(placeLine(samplePack.checklist, stepOf('land'))).toEqual({
      in: 'point',
      point: 1,
      points: 1,
      step: 3,
      steps: 3,
    });
  });
  it('counts parts elsewhere', () => {
    expect(placeLine(samplePack.checklist, stepOf('dead-s24'))).toEqual({
      in: 'part',
      part: 1,
      parts: 1,
      step: 3,
      steps: 3,
      readings: false,
    });
  });
});

describe('jump to terminal', () => {
  it.each([
    ['an isolator', 'f12', ['lock-F12']],
    ['a terminal in another case', 'x5:c2', ['dead-c2']],
    ['a wire', '3014', ['land-dead', 'size', 'land', 'loop', 'prove-07']],
    ['a cable core by its point', 'DI3.07', ['land-dead', 'size', 'land', 'loop', 'prove-07']],
    ['nothing typed', '  ', []],
    ['nothing of that name', 'X99', []],
  ])('%s', (_name, typed, ids) => {
    expect(stepsAt(samplePack, typed).map(({ id }) => id)).toEqual(ids);
  });
});
