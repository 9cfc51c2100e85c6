/** The office's own small decisions: which section a job stands in, what an acceptance names, who lands where. */
import { describe, expect, it } from 'vitest';
import type { JobRow } from '../../../shared/api/jobs';
import { landing } from '../../../src/app/landing';
import { tabsFor } from '../../../src/app/tabs';
import {
  acceptanceGroups,
  acceptanceKey,
  acceptancesOf,
  mayBeAccepted,
} from '../../../src/components/findings/acceptances';
import { byHarm, harms } from '../../../src/components/findings/byHarm';
import { momentWords } from '../../../src/components/momentWords';
import { jobSections } from '../../../src/features/jobs/jobSections';
import { pointTree } from '../../../src/features/jobs/new/pointTree';
import { digestInFile } from '../../../src/features/records/digestInFile';
import { readPanelFile } from '../../../src/features/panels/readPanelFile';
import { smallPanel } from '../../support/smallPanel';
import { maxPanelBytes } from '../../../shared/panel/panelSchema';

const job = (id: string, more: Partial<JobRow>): JobRow => ({
  id,
  number: id,
  site: 's',
  panel: 'p',
  panelTag: 'HQ-LP3',
  panelName: 'filter gallery',
  revision: 1,
  status: 'running',
  points: 1,
  of: 2,
  due: '2026-12-03',
  isolators: [],
  electricians: [],
  foreman: { id: 'f', name: 'Marta Ferris' },
  stage: null,
  stageDone: 0,
  stageOf: 0,
  stagesDone: 0,
  locks: [],
  lastHeard: null,
  waiting: [],
  newerRevision: false,
  record: null,
  ...more,
});
const waits = (since: string): JobRow['waiting'] => [{ what: 'hold', count: 1, since }];

describe('the sections of the jobs sheet', () => {
  it('puts every job into exactly one section, a waiting one first', () => {
    const jobs = [
      job('late', { waiting: waits('2026-12-01T10:00:00Z') }),
      job('early', { status: 'planned', waiting: waits('2026-12-01T08:00:00Z') }),
      job('runs', {}),
      job('plan', { status: 'planned' }),
      job('sealed', { status: 'sealed' }),
      job('gone', { status: 'cancelled', waiting: waits('2026-12-01T08:00:00Z') }),
    ];
    const sections = jobSections(jobs);
    const ids = (rows: JobRow[]) => rows.map((row) => row.id);
    expect(ids(sections.waiting)).toEqual(['early', 'late']);
    expect(ids(sections.running)).toEqual(['runs']);
    expect(ids(sections.planned)).toEqual(['plan']);
    expect(ids(sections.done)).toEqual(['sealed', 'gone']);
  });
  it('shows a returned or countersigned job as running, never as done', () => {
    const sections = jobSections([job('a', { status: 'returned' }), job('b', { status: 'countersigned' })]);
    expect(sections.running).toHaveLength(2);
  });
});

const finding = (rule: string, harm: (typeof harms)[number], place: string) => ({ rule, harm, place });

describe('acceptances', () => {
  const doubts = [
    finding('supply.no-tolerance', 'doubt', 'S1'),
    finding('supply.no-tolerance', 'doubt', 'S2'),
  ];
  const fails = [finding('input.leakage', 'fails', 'DI1'), finding('input.leakage', 'fails', 'DI2')];
  it('groups doubts by rule and nothing else', () => {
    expect(acceptanceGroups([...doubts, ...fails]).map((group) => group.count)).toEqual([2, 1, 1]);
  });
  it('names the place of a failure, and no place for a doubt; an empty reason accepts nothing', () => {
    const [first, second] = fails;
    if (!first || !second || !doubts[0]) throw new Error('fixture');
    const reasons = {
      [acceptanceKey(doubts[0])]: ' measured ',
      [acceptanceKey(first)]: 'known',
      [acceptanceKey(second)]: '   ',
    };
    expect(acceptancesOf([...doubts, ...fails], reasons)).toEqual([
      { rule: 'supply.no-tolerance', reason: 'measured' },
      { rule: 'input.leakage', place: 'DI1', reason: 'known' },
    ]);
  });
  it('never offers to accept what hurts', () => {
    expect(harms.filter((harm) => mayBeAccepted({ harm }))).toEqual(['damages', 'fails', 'doubt']);
  });
  it('shows the worst first', () => {
    const mixed = [finding('c', 'tells', ''), finding('a', 'hurts', ''), finding('b', 'fails', '')];
    expect(byHarm(mixed).map((each) => each.rule)).toEqual(['a', 'b', 'c']);
  });
});

describe('landing and tabs', () => {
  it.each([
    [['electrician'], '/my/jobs'],
    [['foreman', 'safety-officer'], '/jobs'],
    [['panel-engineer'], '/panels'],
    [['safety-officer'], '/records'],
    [['administrator'], '/people'],
    [[], '/verify'],
  ] as const)('%j lands on %s', (roles, path) => {
    expect(landing([...roles])).toBe(path);
  });
  it('lands everybody on a tab they are shown', () => {
    for (const role of [
      'electrician',
      'foreman',
      'panel-engineer',
      'safety-officer',
      'administrator',
    ] as const)
      expect(tabsFor([role]).map((tab) => tab.to)).toContain(landing([role]));
  });
});

describe('points to choose from', () => {
  const panel = smallPanel();
  it('holds every point of the panel once without a filter', () => {
    const addresses = pointTree(panel, '').flatMap((module) => module.points.map((point) => point.address));
    expect([...addresses].sort()).toEqual(panel.points.map((point) => point.address).sort());
  });
  it('drops branches without a match', () => {
    const wanted = panel.points[0];
    if (!wanted) throw new Error('fixture');
    const tree = pointTree(panel, ` ${wanted.address.toLowerCase()} `);
    expect(tree.flatMap((module) => module.points)).toEqual([wanted]);
    expect(tree).toHaveLength(1);
  });
});

describe('moments', () => {
  const now = new Date('2026-12-01T15:00:00');
  it('says today only on the same day', () => {
    expect(momentWords('2026-12-01T11:42:00', 'when', 'en', 'today', now)).toBe('today 11:42');
    expect(momentWords('2026-11-30T11:42:00', 'when', 'en', 'today', now)).toBe('30 Nov 11:42');
  });
  it('keeps a plain date on its day', () => {
    expect(momentWords('2026-12-03', 'date', 'en', 'today', now)).toBe('3 Dec 2026');
  });
});

describe('a panel file', () => {
  const file = (content: BlobPart) => new File([content], 'x.panel.json');
  it('gives the panel of a good file', async () => {
    const read = await readPanelFile(file(JSON.stringify(smallPanel())), 'en');
    expect(read.ok && read.panel.tag).toBe('FG-01');
  });
  it('lists every misfit with its path', async () => {
    const broken = { ...smallPanel(), tag: 5, surprise: true };
    const read = await readPanelFile(file(JSON.stringify(broken)), 'en');
    expect(read).toMatchObject({ ok: false, code: 'not-a-panel' });
    if (read.ok) return;
    expect(read.errors.map((error) => error.path)).toContain('tag');
    expect(read.errors.some((error) => error.says.includes('surprise'))).toBe(true);
  });
  it('refuses rubbish, and what is too big without reading it', async () => {
    expect(await readPanelFile(file(new Uint8Array([0, 255, 1])), 'es')).toMatchObject({ code: 'not-json' });
    const big = Object.defineProperties(file('{}'), {
      size: { value: maxPanelBytes + 1 },
      text: { value: () => Promise.reject(new Error('it was read')) },
    });
    expect(await readPanelFile(big, 'en')).toMatchObject({ code: 'too-big' });
  });
});

describe('a file to verify', () => {
  const digest = 'a3'.repeat(32);
  it('takes JSON as a record', async () => {
    expect(await digestInFile(new File(['{"a":1}'], 'r.json'))).toEqual({ kind: 'record', record: { a: 1 } });
  });
  it('hashes a PDF and reads the digest it names', async () => {
    const found = await digestInFile(new File([`%PDF-1.7\n/Keywords (${digest})`], 'r.pdf'));
    expect(found).toMatchObject({ kind: 'pdf', printed: digest });
  });
  it('takes the SHA-256 of the empty-bodied PDF header as its own hash', async () => {
    // FIPS 180-4 through Node's own implementation, independent of the one the page uses.
    const { createHash } = await import('node:crypto');
    const found = await digestInFile(new File(['%PDF-'], 'r.pdf'));
    expect(found).toEqual({
      kind: 'pdf',
      file: createHash('sha256').update('%PDF-').digest('hex'),
      printed: undefined,
    });
  });
  it('finds nothing in anything else', async () => {
    expect(await digestInFile(new File(['[1]'], 'r.json'))).toEqual({ kind: 'nothing' });
    expect(await digestInFile(new File(['hello'], 'r.txt'))).toEqual({ kind: 'nothing' });
  });
});
