/** Rough handling at the desk: rubbish in every form, wrong files, the same file twice, stale drafts in two windows. */
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword } from '../../server/commands/demo/people';
import { mixedPanel } from '../../server/commands/demo/panels/mixed';

import { maxPanelBytes, type Panel } from '../../shared/panel/panelSchema';
import { en } from '../../shared/wording/en';
import { render } from '../../shared/wording/render';
import { paths } from '../../src/app/paths';
import { deskContext, launch } from '../support/browser/chromium';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { choosePeopleAndSend, choosePoints, issueRevision, uploadPanel } from '../support/browser/office';
import { seedOneJob } from '../support/browser/oneJob';
import { signInOnPage } from '../support/browser/signInPage';

const t = (key: keyof typeof en, params: Record<string, string | number> = {}) =>
  render('en', { key, params });
const rubbish = `\u202edrawn\u200e \u0007 <b>"';-- ${'très long 線 '.repeat(200)}`;
const plain = '\u202eQuay\u200e  <b>"\'; 線';
const panel: Panel = { ...mixedPanel, tag: 'PLC9', name: 'Second dosing panel' };

const renamed = (name: string) => Buffer.from(JSON.stringify({ ...panel, name }));

describe('rough handling at the desk', () => {
  let server: LiveServer;
  let browser: Browser;
  const errors: string[] = [];

  beforeAll(async () => {
    server = await liveServer();
    await seedOneJob(server.services);
    browser = await launch();
  });
  keepPicturesOfFailures(() => browser);
  afterAll(async () => {
    await browser.close();
    await server.close();
  });

  async function stranger(): Promise<Page> {
    const page = await (await deskContext(browser, server.url)).newPage();
    page.on('pageerror', (error) => errors.push(String(error)));
    return page;
  }
  async function as(address: string): Promise<Page> {
    const page = await stranger();
    await signInOnPage(page, `${address}@halden-quay.example`, demoPassword);
    return page;
  }
  const choose = (page: Page, name: string, buffer: Buffer) =>
    page.locator('input[type="file"]').setInputFiles({ name, mimeType: 'application/json', buffer });
  const says = (page: Page, key: keyof typeof en, params: Record<string, string | number> = {}) =>
    page.getByText(t(key, params)).first().waitFor();
  /** Every field that is wrong says why, and is tied to what it says. */
  async function wrongFields(page: Page): Promise<string[]> {
    const wrong = page.locator('[aria-invalid="true"]');
    await wrong.first().waitFor();
    return wrong.evaluateAll((fields) =>
      fields.map((field) => {
        const ids = (field.getAttribute('aria-describedby') ?? '').split(' ');
        return document.getElementById(ids.at(-1) ?? '')?.textContent ?? '';
      }),
    );
  }

  it('signing in: no address, a wrong address, a wrong password, far too much', async () => {
    const page = await stranger();
    await page.goto(paths.signIn);
    const go = page.getByRole('button', { name: en['app.signIn'] });
    await go.click();
    expect(await wrongFields(page)).toHaveLength(2);
    await page.getByLabel(en['app.signIn.email']).fill(rubbish);
    await page.getByLabel(en['app.signIn.password']).fill(rubbish);
    await go.click();
    for (const words of await wrongFields(page)) expect(words.length).toBeGreaterThan(10);
    await page.getByLabel(en['app.signIn.email']).fill('nobody@halden-quay.example');
    await page.getByLabel(en['app.signIn.password']).fill('not the password');
    await go.click();
    await page.getByRole('alert').waitFor();
    expect(await page.getByLabel(en['app.signIn.email']).inputValue()).toBe('nobody@halden-quay.example');
  });

  it('an invitation: unseen signs are dropped, wrong fields say so, nothing is lost', async () => {
    const page = await as('ada');
    await page.goto(paths.people);
    await page.getByRole('button', { name: en['office.people.invite'] }).click();
    const dialog = page.getByRole('dialog');
    const send = dialog.getByRole('button', { name: en['office.people.sendInvitation'] });
    await dialog.getByLabel(en['office.people.name'], { exact: true }).fill(rubbish);
    await dialog.getByLabel(en['app.signIn.email']).fill('not an address');
    await send.click();
    expect((await wrongFields(page)).every((words) => words.length > 10)).toBe(true);
    await dialog.getByLabel(en['office.people.name'], { exact: true }).fill(plain);
    await dialog.getByLabel(en['app.signIn.email']).fill('quay@halden-quay.example');
    await dialog.getByRole('checkbox').first().check();
    await send.click();
    await dialog.waitFor({ state: 'hidden' });
    await page.getByText('Quay <b>"\'; 線').first().waitFor();
  });

  it('site settings: a number that is none, too many words, and a change made meanwhile in another window', async () => {
    const page = await as('ada');
    const { items } = await page.evaluate(
      async () => (await fetch('/api/sites')).json() as Promise<{ items: { id: string }[] }>,
    );
    const path = paths.site(items[0]?.id ?? '');
    const other = await page.context().newPage();
    for (const each of [page, other]) await each.goto(path);
    const muster = (each: Page) => each.getByLabel(en['office.site.muster']);
    const save = (each: Page) => each.getByRole('button', { name: en['app.save'] }).click();
    await page.getByLabel(en['office.site.deadLimit']).fill('50');
    await muster(page).fill(rubbish);
    await save(page);
    expect(await wrongFields(page)).toHaveLength(2);
    await page.getByLabel(en['office.site.deadLimit']).fill('0.5');
    await muster(page).fill('\u200eGate 3');
    await save(page);
    await says(page, 'app.saved');
    await muster(other).fill('Gate 4');
    await save(other);
    await other.getByRole('alert').waitFor();
    expect(await muster(other).inputValue()).toBe('Gate 4');
    await page.reload();
    expect(await muster(page).inputValue()).toBe('Gate 3');
  });

  it('panel files that are none: words, binary, another shape, too big; nothing is stored', async () => {
    const page = await as('nora');
    await page.goto(paths.panels);
    await page.locator('tbody tr').first().waitFor();
    const rows = await page.locator('tbody tr').count();
    await choose(page, 'words.json', Buffer.from('not JSON at all'));
    await says(page, 'office.panel.file.not-json', { name: 'words.json' });
    await choose(
      page,
      'noise.bin',
      Buffer.from(Uint8Array.from({ length: 5000 }, (_, at) => (at * 37) % 256)),
    );
    await says(page, 'office.panel.file.not-json', { name: 'noise.bin' });
    await choose(page, 'list.json', Buffer.from(JSON.stringify([1, 2, { tag: 'PLC1' }])));
    await says(page, 'office.panel.file.not-a-panel', { name: 'list.json' });
    await choose(page, 'deep.json', Buffer.from('['.repeat(200_000)));
    await says(page, 'office.panel.file.not-json', { name: 'deep.json' });
    const big = join(mkdtempSync(join(tmpdir(), 'coldloop-big-')), 'big.json');
    writeFileSync(big, Buffer.alloc(maxPanelBytes + 1, 32));
    await page.locator('input[type="file"]').setInputFiles(big);
    await says(page, 'office.panel.file.too-big', { name: 'big.json' });
    await page.reload();
    await page.locator('tbody tr').first().waitFor();
    expect(await page.locator('tbody tr').count()).toBe(rows);
  });

  it('the same panel uploaded twice makes one; a stale draft in a second window is refused and kept', async () => {
    const page = await as('nora');
    await uploadPanel(page, panel);
    const path = new URL(page.url()).pathname;
    await page.goto(paths.panels);
    await choose(page, 'PLC9.panel.json', Buffer.from(JSON.stringify(panel)));
    await says(page, 'problem.tag-taken');
    const second = await page.context().newPage();
    for (const each of [page, second]) {
      await each.goto(path);
      await each.getByRole('heading', { level: 1, name: panel.tag }).waitFor();
    }
    // The second window's person still looks at the draft they opened.
    await second.route('**/api/panels/*', (route) =>
      route.request().method() === 'GET' ? route.abort() : route.continue(),
    );
    await choose(page, 'PLC9.panel.json', renamed('Renamed first'));
    await page.getByRole('heading', { level: 1, name: /Renamed first/ }).waitFor();
    await choose(second, 'PLC9.panel.json', renamed('Renamed second'));
    await says(second, 'problem.stale');
    await page.reload();
    await page.getByRole('heading', { level: 1, name: /Renamed first/ }).waitFor();
    await issueRevision(page);
    await page.getByRole('link', { name: '1', exact: true }).waitFor();
  });

  it('a newer revision issued while the foreman opens a job: the job stays on the one they looked at', async () => {
    const foreman = await as('ruth');
    const points = panel.points.slice(0, 1).map(({ address }) => address);
    await choosePoints(foreman, { panel, points });
    const engineer = await as('nora');
    await engineer.goto(paths.panels);
    await engineer.getByRole('link', { name: panel.tag }).first().click();
    await engineer.waitForURL((url) => url.pathname.startsWith(`${paths.panels}/`));
    await choose(engineer, 'PLC9.panel.json', renamed('Renamed third'));
    await engineer.getByRole('heading', { level: 1, name: /Renamed third/ }).waitFor();
    await issueRevision(engineer);
    await engineer.getByRole('link', { name: '2', exact: true }).waitFor();
    await choosePeopleAndSend(foreman, { electrician: 'Ines Varga', foreman: 'Ruth Adeyemi' });
    await foreman.getByText(panel.tag).first().waitFor();
    const jobs = await server.services.database.query<{ revision: number; scope: string[] }[]>(
      'SELECT revision, scope FROM job WHERE panel_tag = $1',
      [panel.tag],
    );
    expect(jobs).toEqual([{ revision: 1, scope: points }]);
    expect(errors).toEqual([]);
  });
});
