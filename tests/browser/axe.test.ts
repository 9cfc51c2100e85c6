/** axe finds nothing on any page of the office, by day and by night, at the desk and at 320 px; nothing sticks out. */
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword } from '../../server/commands/demo/people';
import { seedDemo } from '../../server/commands/demo/seedDemo';
import type { JobRow } from '../../shared/api/jobs';
import { paths } from '../../src/app/paths';
import { deskSize, launch } from '../support/browser/chromium';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { looker, narrow } from '../support/browser/looker';
import { signInOnPage } from '../support/browser/signInPage';

describe('the office under axe', () => {
  let server: LiveServer;
  let browser: Browser;
  const eye = looker();

  beforeAll(async () => {
    server = await liveServer();
    await seedDemo(server.services);
    browser = await launch();
  });
  keepPicturesOfFailures(() => browser);
  afterAll(async () => {
    await browser.close();
    await server.close();
  });

  const contextFor = (locale: string): Promise<BrowserContext> =>
    browser.newContext({ baseURL: server.url, viewport: deskSize, locale });

  async function as(address: string): Promise<Page> {
    const page = await (await contextFor('en-GB')).newPage();
    await signInOnPage(page, `${address}@halden-quay.example`, demoPassword);
    return page;
  }
  const read = <T>(page: Page, url: string): Promise<T> =>
    page.evaluate(async (from) => (await fetch(from)).json() as Promise<never>, url);
  const ends = [deskSize, narrow];

  it.each(['en-GB', 'es-ES'])('the pages before signing in, %s', async (locale) => {
    const page = await (await contextFor(locale)).newPage();
    for (const path of [paths.signIn, paths.passwordReset, paths.invitation, paths.verify, '/no-such-page'])
      await eye.visit(page, path);
    expect(eye.found()).toEqual([]);
  });

  it('the pages of the foreman', async () => {
    const page = await as('ruth');
    await eye.visit(page, paths.jobs);
    await eye.visit(page, paths.newJob);
    const { items } = await read<{ items: JobRow[] }>(page, '/api/jobs');
    expect(items.length).toBeGreaterThan(3);
    for (const { id } of items.slice(0, 3)) await eye.visit(page, paths.job(id), ends);
    await page.evaluate(() => {
      localStorage.setItem('coldloop.language', 'es');
    });
    await eye.visit(page, paths.jobs);
    await eye.visit(page, paths.job(items[0]?.id ?? ''), ends);
    expect(eye.found()).toEqual([]);
  });

  it('the pages of the engineer', async () => {
    const page = await as('nora');
    await eye.visit(page, paths.panels);
    const { items } = await read<{ items: { id: string; revision: number | null }[] }>(page, '/api/panels');
    const draft = items.find(({ revision }) => revision === null);
    const issued = items.find(({ revision }) => revision !== null);
    expect([draft, issued]).not.toContain(undefined);
    await eye.visit(page, paths.panel(draft?.id ?? ''), ends);
    await eye.visit(page, paths.panel(issued?.id ?? ''), ends);
    await eye.visit(page, paths.panelRevision(issued?.id ?? '', issued?.revision ?? 0), ends);
    expect(eye.found()).toEqual([]);
  });

  it('the pages of safety officer and administrator', async () => {
    const officer = await as('oskar');
    await eye.visit(officer, paths.records);
    const { items } = await read<{ items: { id: string }[] }>(officer, '/api/records');
    expect(items.length).toBeGreaterThan(0);
    await eye.visit(officer, paths.record(items[0]?.id ?? ''));
    const administrator = await as('ada');
    await eye.visit(administrator, paths.people);
    await eye.visit(administrator, paths.sites);
    const sites = await read<{ items: { id: string }[] }>(administrator, '/api/sites');
    await eye.visit(administrator, paths.site(sites.items[0]?.id ?? ''));
    expect(eye.found()).toEqual([]);
  });
});
