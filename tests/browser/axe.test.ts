/** axe finds nothing on any screen, in both themes, on the phone and at the desk; nothing sticks out at 320 px. */
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword } from '../../server/commands/demo/people';
import { seedDemo } from '../../server/commands/demo/seedDemo';
import type { JobRow } from '../../shared/api/jobs';
import type { Pack } from '../../shared/api/jobs';
import { paths } from '../../src/app/paths';
import { axeFindings, sticksOut } from '../support/browser/axe';
import { deskSize, launch, phoneSize } from '../support/browser/chromium';
import { enrolOnPage } from '../support/browser/enrolOnPage';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { signInOnPage } from '../support/browser/signInPage';

const themes = ['light', 'dark'] as const;
const narrow = { width: 320, height: 640 };

describe('axe', () => {
  let server: LiveServer;
  let browser: Browser;
  const found: string[] = [];

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

  async function look(page: Page, path: string, sizes = [deskSize, phoneSize, narrow]): Promise<void> {
    await page.goto(path);
    await page.locator('h1, [role="dialog"]').first().waitFor();
    await page.waitForLoadState('networkidle');
    for (const colorScheme of themes) {
      await page.emulateMedia({ colorScheme });
      for (const size of sizes) {
        await page.setViewportSize(size);
        const where = `${path} ${colorScheme} ${size.width}`;
        for (const finding of await axeFindings(page)) found.push(`${where}: ${finding}`);
        if (await sticksOut(page)) found.push(`${where}: something sticks out to the right`);
      }
    }
  }
  const clean = () => expect(found.splice(0)).toEqual([]);

  async function as(address: string): Promise<{ context: BrowserContext; page: Page }> {
    const context = await browser.newContext({ baseURL: server.url, viewport: deskSize, locale: 'en-GB' });
    const page = await context.newPage();
    await signInOnPage(page, `${address}@halden-quay.example`, demoPassword);
    return { context, page };
  }
  const read = <T>(page: Page, url: string): Promise<T> =>
    page.evaluate(async (from) => (await fetch(from)).json() as Promise<never>, url);

  it('the pages before signing in', async () => {
    const page = await browser.newPage({ baseURL: server.url });
    for (const path of [paths.signIn, paths.passwordReset, paths.invitation, paths.verify, '/no-such-page'])
      await look(page, path);
    clean();
  });

  it('the pages of foreman and engineer', async () => {
    const foreman = await as('ruth');
    await look(foreman.page, paths.jobs);
    await look(foreman.page, paths.newJob);
    const { items } = await read<{ items: JobRow[] }>(foreman.page, '/api/jobs');
    expect(items.length).toBeGreaterThan(3);
    for (const { id } of items.slice(0, 4)) await look(foreman.page, paths.job(id), [deskSize, narrow]);
    const engineer = await as('nora');
    await look(engineer.page, paths.panels);
    const panels = await read<{ items: { id: string; revision: number | null }[] }>(
      engineer.page,
      '/api/panels',
    );
    for (const { id, revision } of panels.items) {
      await look(engineer.page, paths.panel(id), [deskSize, narrow]);
      if (revision !== null) await look(engineer.page, paths.panelRevision(id, revision), [deskSize, narrow]);
    }
    clean();
  });

  it('the pages of safety officer and administrator', async () => {
    const officer = await as('oskar');
    await look(officer.page, paths.records);
    const { items } = await read<{ items: { id: string }[] }>(officer.page, '/api/records');
    expect(items.length).toBeGreaterThan(0);
    await look(officer.page, paths.record(items[0]?.id ?? ''));
    const administrator = await as('ada');
    await look(administrator.page, paths.people);
    await look(administrator.page, paths.sites);
    const sites = await read<{ id: string }[]>(administrator.page, '/api/sites');
    await look(administrator.page, paths.site(sites[0]?.id ?? ''));
    clean();
  });

  it('the field screens, one step of every kind of answer', async () => {
    const { page } = await as('ines');
    const sizes = [phoneSize, narrow];
    await look(page, paths.device, sizes);
    await enrolOnPage(page);
    await look(page, paths.myJobs, sizes);
    const { packs } = await read<{ packs: Pack[] }>(page, '/api/my/packs');
    const pack = packs[0];
    if (!pack) throw new Error('no job for the electrician of the demo');
    await look(page, paths.myJob(pack.job.id), sizes);
    await look(page, paths.jobLocks(pack.job.id), sizes);
    await look(page, paths.sign(pack.job.id), sizes);
    const kinds = new Map(pack.checklist.steps.map((step) => [step.ask.kind, step.id]));
    expect(kinds.size).toBeGreaterThan(7);
    for (const step of kinds.values()) await look(page, paths.step(pack.job.id, step), sizes);
    clean();
  });
});
