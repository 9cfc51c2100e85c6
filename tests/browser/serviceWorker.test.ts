/** The built app with its real service worker in a real browser: any field screen opens cold with no network. */
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { en } from '../../shared/wording/en';
import { render } from '../../shared/wording/render';
import { paths } from '../../src/app/paths';
import { launch, phoneContext, watchErrors } from '../support/browser/chromium';
import { jobId, samplePack } from '../support/fieldHarness/samplePack';
import { mara } from '../support/offline/enrolled';
import { servedBuild, type ServedBuild } from '../support/offline/servedBuild';

const pin = '481516';
const session = {
  person: { id: mara.id, name: mara.name, email: mara.email, language: 'en' as const },
  roles: [{ site: samplePack.job.site.id, siteName: 'Halden Quay', role: 'electrician' as const }],
};
const t = (key: keyof typeof en, params: Record<string, string | number> = {}) =>
  render('en', { key, params });
const button = (page: Page, key: keyof typeof en) => page.getByRole('button', { name: t(key), exact: true });

async function enrol(page: Page): Promise<void> {
  await page.goto(paths.device);
  await page.getByLabel(t('device.enrol.pin')).fill(pin);
  await page.getByLabel(t('device.enrol.again')).fill(pin);
  await button(page, 'device.enrol.save').click();
  await page.getByRole('link', { name: t('field.jobs.open', { number: '0233' }) }).waitFor();
}

/** What a killed app asks for when it is opened again. */
async function enterPin(page: Page): Promise<void> {
  await page.getByRole('button', { name: mara.name }).click();
  await page.getByLabel(t('field.pin.yours')).fill(pin);
  await button(page, 'field.pin.open').click();
  // A page that is closed before the PIN was looked at has had a wrong try: the next would have to wait.
  await page.getByLabel(t('field.pin.yours')).waitFor({ state: 'hidden' });
}

const workerInControl = (page: Page) =>
  page.waitForFunction(async () => {
    await navigator.serviceWorker.ready;
    return navigator.serviceWorker.controller !== null;
  });

async function writeNote(page: Page, words: string): Promise<void> {
  await button(page, 'field.more').click();
  await button(page, 'field.more.note').click();
  await page.getByLabel(t('field.note.words')).fill(words);
  await page
    .getByRole('dialog')
    .getByRole('button', { name: t('field.save') })
    .click();
  await page.getByRole('dialog').waitFor({ state: 'hidden' });
}

describe('the service worker', () => {
  let browser: Browser;
  let served: ServedBuild;
  let context: BrowserContext;
  let page: Page;
  let errors: string[];

  beforeAll(async () => {
    browser = await launch();
  });
  afterAll(() => browser.close());
  beforeEach(async () => {
    served = await servedBuild(session);
    served.fake.packs = [samplePack];
    context = await phoneContext(browser, served.url);
    page = await context.newPage();
    errors = watchErrors(page);
  });
  afterEach(async () => {
    expect(errors).toEqual([]);
    await context.close();
    await served.close();
  });

  it('opens every field screen cold with no network, takes answers, and brings them over later', async () => {
    await enrol(page);
    await workerInControl(page);
    await context.setOffline(true);
    await page.close();

    const screens = [paths.myJobs, paths.myJob(jobId), paths.jobLocks(jobId), paths.sign(jobId)];
    for (const step of samplePack.checklist.steps) screens.push(paths.step(jobId, step.id));
    for (const path of [...screens, paths.review(jobId), paths.device]) {
      const cold = await context.newPage();
      const faults = watchErrors(cold);
      await cold.goto(path);
      if (path !== paths.device) await enterPin(cold);
      await cold.locator('.field-page h1, .field-page [role="timer"]').first().waitFor();
      expect([path, await cold.getByText(t('app.fault')).count(), faults]).toEqual([path, 0, []]);
      await cold.close();
    }

    const cold = await context.newPage();
    await cold.goto(paths.myJob(jobId));
    await enterPin(cold);
    await writeNote(cold, 'written in the basement');
    await cold
      .getByText(t('field.unsent.some', { n: 1 }))
      .or(cold.getByText('1 answer not sent'))
      .first()
      .waitFor();
    expect(served.fake.held).toEqual([]);
    await cold.close();

    const killed = await context.newPage();
    await killed.goto(paths.myJob(jobId));
    await enterPin(killed);
    await context.setOffline(false);
    await killed.getByText(t('field.unsent.none')).waitFor();
    expect(served.fake.held.map(({ entry }) => entry.body)).toEqual([{ words: 'written in the basement' }]);
    await killed.close();
  });

  it('says "Works with no signal" only after a test with the network refused, and keeps nothing of /api', async () => {
    await enrol(page);
    await workerInControl(page);
    const verdict = page.getByText(t('field.ready.yes'), { exact: true });
    expect(await verdict.count()).toBe(0);
    // What stands beside each missing condition mends it; the browser of a test refuses to promise storage.
    for (let tries = 0; tries < 10 && (await verdict.count()) === 0; tries += 1) {
      const mend = page.locator('[role="status"] button:enabled').first();
      if (await mend.isVisible()) await mend.click();
      await page.waitForTimeout(300);
    }
    await verdict.waitFor();
    const cached = await page.evaluate(async () => {
      const names = await caches.keys();
      const lists = await Promise.all(names.map(async (name) => (await caches.open(name)).keys()));
      return lists.flat().map(({ url }) => new URL(url).pathname);
    });
    expect(cached.filter((path) => path.startsWith('/api'))).toEqual([]);
    expect(cached).toContain('/index.html');
    // A file lost from the cache takes the verdict away at once.
    await page.evaluate(async () => {
      for (const name of await caches.keys()) {
        const cache = await caches.open(name);
        for (const request of await cache.keys())
          if (new URL(request.url).pathname.includes('fieldBranch')) await cache.delete(request);
      }
    });
    await page.reload();
    await page.getByText(t('device.store.ready.shell.missing')).waitFor();
    await button(page, 'device.store.ready.shell.button').click();
    await verdict.waitFor();
  });

  it('offers a new version and takes it only when asked', async () => {
    await enrol(page);
    await workerInControl(page);
    await page.goto(paths.device);
    served.releaseNewVersion();
    await button(page, 'device.version.look').click();
    await page.getByText(t('device.version.waits')).waitFor();
    await page.waitForTimeout(500);
    const states = () =>
      page.evaluate(async () => {
        const registration = await navigator.serviceWorker.getRegistration();
        return [registration?.active?.state, registration?.waiting?.state];
      });
    expect(await states()).toEqual(['activated', 'installed']);
    await Promise.all([page.waitForEvent('load'), button(page, 'device.version.apply').click()]);
    await button(page, 'device.version.look').waitFor();
    expect(await states()).toEqual(['activated', undefined]);
  });
});
