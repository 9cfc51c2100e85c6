/** A panel file whose supplies could not all be read dead is not issued. */
import { expect, test } from 'vitest';
import { panelProblems } from '../../../shared/panel/panelIssue';
import type { Supply } from '../../../shared/panel/panelSchema';
import { dc24, panel, source, supply } from '../isolation/parts';

const feed = [['FEED']];
const says = (one: Supply) =>
  panelProblems(panel({ sources: [source('FEED')], supplies: [one] })).map(({ says: words }) => words);

test.each([
  ['DC with plus and minus', dc24('S', feed), 0],
  ['AC between two phases', supply('S', feed, { terminals: { L1: 'A', L2: 'B' } }), 0],
  [
    'three phases and a neutral in another order of keys',
    supply('S', feed, { kind: 'ac3', terminals: { N: 'D', L3: 'C', L2: 'B', L1: 'A' } }),
    0,
  ],
  ['both poles on one terminal', dc24('S', feed, { terminals: { plus: 'A', minus: 'A' } }), 1],
  ['three phases of which one has a terminal', supply('S', feed, { kind: 'ac3' }), 1],
  ['DC with a line and a neutral', dc24('S', feed, { terminals: { L: 'A', N: 'B' } }), 1],
] as const)('%s', (_name, one, problems) => {
  expect(says(one)).toHaveLength(problems);
});
