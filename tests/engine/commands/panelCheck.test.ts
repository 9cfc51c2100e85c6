/** The command line twin, run as people run it: on files, in a process of its own. */
import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { panelCheck, type PanelCheck } from '../../../shared/api/panels';
import { digestOf } from '../../../shared/panel/canonical';
import { maxPanelBytes, type Panel } from '../../../shared/panel/panelSchema';
import { mixedPanel, mixedScope } from '../../../server/commands/demo/panels/mixed';

const root = resolve(import.meta.dirname, '../../..');
let folder = '';

interface Ended {
  code: number;
  out: string;
  errors: string[];
}
const run = (...args: string[]): Promise<Ended> =>
  new Promise((done) => {
    execFile(
      process.execPath,
      ['--import', 'tsx', join(root, 'server/commands/panelCheck.ts'), ...args],
      // No database anywhere: the command must not look for one.
      { cwd: root, env: { PATH: process.env.PATH }, maxBuffer: 64 * 1024 * 1024 },
      (error, out, err) =>
        done({
          code: typeof error?.code === 'number' ? error.code : error ? -1 : 0,
          out,
          errors: err.split('\n').filter((line) => line !== ''),
        }),
    );
  });
async function file(name: string, content: string | Uint8Array): Promise<string> {
  const path = join(folder, name);
  await writeFile(path, content);
  return path;
}
const panelFile = (name: string, panel: unknown) => file(`${name}.panel.json`, JSON.stringify(panel));
const answerOf = ({ out }: Ended): PanelCheck => panelCheck.parse(JSON.parse(out));

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'panel-check-'));
});
afterAll(async () => {
  await rm(folder, { recursive: true });
});

describe('a clean panel', () => {
  it('ends with 0 and answers the contract, with how many checks ran', async () => {
    const ended = await run('check', await panelFile('mixed', mixedPanel), '--json');
    expect([ended.code, ended.errors]).toEqual([0, []]);
    const answer = answerOf(ended);
    expect(answer.panel).toBe('HQ-LP3');
    expect(answer.digest).toBe(digestOf(mixedPanel));
    expect(answer.isolation.plan?.isolators).toEqual(['Q1', 'F12']);
    expect(answer.isolation.plan?.tell).toEqual(['Packaging line conveyor control']);
    expect(answer.checks).toBeGreaterThan(answer.couldNotRun.length);
    expect(answer.checklist.steps).toBe(answer.checklist.stages.reduce((sum, { steps }) => sum + steps, 0));
    expect(answer.checklist.steps).toBeGreaterThan(100);
  });

  it('shows by default what its own disconnect leaves live, and with --open what that leaves', async () => {
    const path = await panelFile('open', mixedPanel);
    const places = async (...args: string[]) =>
      answerOf(await run('check', path, '--json', ...args)).isolation.stillLive.map(
        ({ terminal, place }) => terminal ?? place,
      );
    const usual = await places();
    expect(usual).toContain('X5:C2');
    expect(usual).toContain('incoming terminals of Q1');
    expect(usual).not.toContain('X1:3');
    expect(await places('--open', 'Q1,F12')).toEqual(['incoming terminals of Q1']);
    expect(await places('--open', 'F12')).toContain('X1:3');
  });

  it('takes a scope', async () => {
    const path = await panelFile('scope', mixedPanel);
    const [all, some] = await Promise.all([
      run('check', path, '--json'),
      run('check', path, '--json', '--scope', mixedScope.join(',')),
    ]);
    expect(some.code).toBe(0);
    expect(answerOf(some).checklist.steps).toBeLessThan(answerOf(all).checklist.steps);
    const atPoints = answerOf(some).isolation.deadTests.flatMap(({ at }) =>
      'point' in at ? [at.point] : [],
    );
    expect([...new Set(atPoints)].sort()).toEqual([...mixedScope].sort());
  });

  it('says the same in words', async () => {
    const { code, out } = await run('check', await panelFile('words', mixedPanel));
    expect(code).toBe(0);
    expect(out).toMatch(/^Panel HQ-LP3, 20 points\./);
    expect(out).toMatch(/\n\d+ checks, \d+ could not run\.\n/);
    expect(out).toContain('Open and lock, in this order: Q1, F12.');
    expect(out).toContain('X5:C2: 120 V by HQ-MC2 → F12 → S120');
  });
});

describe('a panel that can hurt', () => {
  const only = (kind: 'contactor'): Panel => ({
    ...mixedPanel,
    isolators: mixedPanel.isolators.map((one) => (one.tag === 'F12' ? { ...one, kind } : one)),
  });
  it('ends with 1: no safe isolation', async () => {
    const ended = await run('check', await panelFile('none', only('contactor')), '--json');
    expect([ended.code, ended.errors]).toEqual([1, []]);
    const { isolation, findings, checklist } = answerOf(ended);
    expect([isolation.plan, isolation.deadTests, checklist.steps]).toEqual([null, [], 0]);
    const hurting = findings.filter(({ harm }) => harm === 'hurts').map(({ rule }) => rule);
    expect(hurting).toEqual(
      expect.arrayContaining(['isolation.none', 'isolation.control-device-as-isolator']),
    );
  });
  it('says so in words', async () => {
    const { code, out } = await run('check', await panelFile('none', only('contactor')));
    expect(code).toBe(1);
    expect(out).toContain('No safe isolation exists. No job may start on these points.');
  });
  it('ends with 1 when something hurts although a plan exists', async () => {
    const air: Panel = {
      ...mixedPanel,
      sources: [
        ...mixedPanel.sources,
        { tag: 'AIR', kind: 'pneumatic', description: 'Valve air', location: 'Room' },
      ],
    };
    const ended = await run('check', await panelFile('air', air), '--json', '--scope', 'DI1.02');
    expect(ended.code).toBe(1);
    expect(answerOf(ended).isolation.plan).not.toBeNull();
  });
});

describe('a draft with gaps', () => {
  it('is checked all the same, and what stands in the way of issuing it is on standard error', async () => {
    const points = mixedPanel.points.map((one, index) =>
      index === 1 ? { ...one, otherSupply: undefined } : one,
    );
    const ended = await run('check', await panelFile('draft', { ...mixedPanel, points }), '--json');
    expect(ended.code).toBe(1);
    expect(ended.errors).toEqual(['points.1.otherSupply: is missing: name the other supply, or "none"']);
    expect(answerOf(ended).isolation.plan).toBeNull();
  });
  it('with an address that stands twice has no checklist', async () => {
    const points = [...mixedPanel.points, ...mixedPanel.points.slice(0, 1)];
    const ended = await run('check', await panelFile('twice', { ...mixedPanel, points }), '--json');
    expect(ended.errors).toEqual(['points.20.address: "DI1.01" already stands at points.0']);
    expect(answerOf(ended).checklist.steps).toBe(0);
  });
});

describe('what cannot be read ends with 2, nothing on standard output, and path: says on standard error', () => {
  const latin = new Uint8Array([0x7b, 0x22, 0xe9, 0x22, 0x7d]);
  it.each([
    [
      'rubbish',
      () => file('rubbish.json', new Uint8Array([0, 255, 254, 1, 2])),
      /rubbish\.json: is not UTF-8 text$/,
    ],
    ['another encoding', () => file('latin.json', latin), /latin\.json: is not UTF-8 text$/],
    ['half a file', () => file('half.json', '{"format":'), /half\.json: is not JSON: /],
    ['an empty file', () => file('empty.json', ''), /empty\.json: is not JSON: /],
    ['another document', () => file('list.json', '[]'), /list\.json: /],
    ['a file that is not there', () => Promise.resolve(join(folder, 'gone.json')), /gone\.json: ENOENT/],
    ['a folder', () => Promise.resolve(folder), /: EISDIR/],
    [
      'a file of more than 40 MB',
      () => file('large.json', ' '.repeat(maxPanelBytes + 1)),
      /large\.json: holds more than 40 MB$/,
    ],
    ['an unknown key', () => panelFile('key', { ...mixedPanel, owner: 'x' }), /^owner: is not known here$/],
    ['a wrong type', () => panelFile('type', { ...mixedPanel, supplies: 3 }), /^supplies: /],
  ] as [string, () => Promise<string>, RegExp][])('%s', async (_name, make, expected) => {
    const ended = await run('check', await make(), '--json');
    expect([ended.code, ended.out]).toEqual([2, '']);
    expect(ended.errors).toHaveLength(1);
    expect(ended.errors[0]).toMatch(expected);
  });

  it.each([
    ['no command', [], /^arguments: use npm run -s panel -- check FILE/],
    ['no file', ['check'], /^arguments: use /],
    ['two files', ['check', 'a', 'b'], /^arguments: use /],
    ['an unknown option', ['check', 'a', '--colour'], /^arguments: Unknown option '--colour'/],
    ['an empty scope', ['check', 'a', '--scope', ''], /^arguments: --scope holds an empty name$/],
    ['a hole in a list', ['check', 'a', '--open', 'Q1,,F12'], /^arguments: --open holds an empty name$/],
  ] as [string, string[], RegExp][])('%s', async (_name, args, expected) => {
    const ended = await run(...args);
    expect([ended.code, ended.out]).toEqual([2, '']);
    expect(ended.errors[0]).toMatch(expected);
  });

  it('a scope and an isolator that the panel does not have', async () => {
    const ended = await run(
      'check',
      await panelFile('strange', mixedPanel),
      '--scope',
      'DI1.01,DI9.99',
      '--open',
      'Q9',
    );
    expect([ended.code, ended.out]).toEqual([2, '']);
    expect(ended.errors).toEqual([
      'scope.1: no point "DI9.99" in this panel',
      'open.0: no isolator "Q9" in this panel',
    ]);
  });
});
