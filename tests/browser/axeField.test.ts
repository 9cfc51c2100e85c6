/** One job worked to its end with axe looking at each kind of screen on the way: every answer, sheet, the red screen, signatures. */
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword } from '../../server/commands/demo/people';

import type { Pack } from '../../shared/api/jobs';
import type { Step } from '../../shared/checklist/types';
import { en } from '../../shared/wording/en';
import { render } from '../../shared/wording/render';
import { paths } from '../../src/app/paths';
import { launch, phoneContext } from '../support/browser/chromium';
import { enrolOnPage } from '../support/browser/enrolOnPage';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { fieldSizes, looker } from '../support/browser/looker';
import { drawSignature, enterPin, typeReading, workUntil, type Phone } from '../support/browser/phone';
import { seedOneJob } from '../support/browser/oneJob';
import { signInOnPage } from '../support/browser/signInPage';

const t = (key: keyof typeof en, params: Record<string, string | number> = {}) =>
  render('en', { key, params });
const saveButton = (page: Page) => page.locator('footer button[aria-busy]');
const press = (page: Page, key: keyof typeof en) =>
  page.getByRole('button', { name: t(key), exact: true }).click();
const isDeadTest = ({ stage, ask }: Step) =>
  stage === 'prove-dead' && ask.kind === 'reading' && ask.dead !== undefined;

describe('the field under axe', () => {
  let server: LiveServer;
  let browser: Browser;
  let context: BrowserContext;
  let phone: Phone;
  const eye = looker();
  const look = (where: string) => eye.look(phone.page, where, fieldSizes);
  const visit = (path: string) => eye.visit(phone.page, path, fieldSizes);

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

  async function as(address: string): Promise<[BrowserContext, Page]> {
    const theirs = await phoneContext(browser, server.url);
    const page = await theirs.newPage();
    await signInOnPage(page, `${address}@halden-quay.example`, demoPassword);
    return [theirs, page];
  }

  it('this device, my jobs, a job, and who is here', async () => {
    const [theirs, page] = await as('ines');
    context = theirs;
    await eye.visit(page, paths.device, fieldSizes);
    await enrolOnPage(page);
    const { packs } = await page.evaluate(
      async () => (await fetch('/api/my/packs')).json() as Promise<{ packs: Pack[] }>,
    );
    const pack = packs.find(({ job }) => job.words?.startsWith('The eyewash'));
    if (!pack) throw new Error('the demo sent no new job to this electrician');
    phone = { page, name: 'Ines Varga', job: pack.job.id, checklist: pack.checklist, locks: {} };
    await visit(paths.device);
    await visit(paths.myJobs);
    await visit(paths.myJob(phone.job));
    const stranger = await context.newPage();
    await eye.visit(stranger, paths.myJobs, fieldSizes);
    await stranger.getByRole('button', { name: phone.name }).click();
    await eye.look(stranger, 'who is here: PIN', fieldSizes);
    await stranger.close();
    expect(eye.found()).toEqual([]);
  });

  it('one step of every kind of answer on the way to the first dead test', async () => {
    await press(phone.page, 'field.job.accept');
    await lookAtNewKinds(isDeadTest);
    expect(eye.found()).toEqual([]);
  });

  const seen = new Set<string>();
  /** Works on, and looks at the first step of each kind in each stage. */
  async function lookAtNewKinds(until: (step: Step) => boolean): Promise<void> {
    const isNew = ({ ask }: Step) => !seen.has(ask.kind);
    while (await workUntil(phone, (step) => until(step) || isNew(step))) {
      const id = decodeURIComponent(new URL(phone.page.url()).pathname.split('/').at(-1) ?? '');
      const step = phone.checklist.steps.find((each) => each.id === id);
      if (!step || until(step)) return;
      seen.add(step.ask.kind);
      await look(`step: ${step.ask.kind}`);
    }
  }

  it('the sheets of a step', async () => {
    const { page } = phone;
    const close = async () => {
      await page.keyboard.press('Escape');
      await page.getByRole('dialog').waitFor({ state: 'hidden' });
    };
    for (const key of ['field.more', 'field.stop.title', 'field.hold.cant'] as const) {
      await press(page, key);
      await look(`sheet: ${key}`);
      await close();
    }
    for (const view of ['jump', 'left', 'differs', 'temporary', 'note'] as const) {
      await press(page, 'field.more');
      await press(page, `field.more.${view}`);
      await look(`sheet: ${view}`);
      await close();
    }
    expect(eye.found()).toEqual([]);
  });

  it('the red screen, its measuring, and the locks that are on', async () => {
    const { page } = phone;
    await typeReading(page, 118);
    await look('number pad with a reading out of limits');
    await saveButton(page).click();
    await page.waitForURL(/\/live\//);
    await look('live');
    await press(page, 'field.out.again');
    await look('live: measuring');
    await typeReading(page, 0);
    await saveButton(page).click();
    await page.waitForURL((url) => !url.pathname.includes('/live/'));
    await visit(paths.jobLocks(phone.job));
    expect(eye.found()).toEqual([]);
  });

  it('Spanish: a job, a step, its sheet, the locks', async () => {
    const { page } = phone;
    const speak = (language: string) =>
      page.evaluate((chosen) => {
        localStorage.setItem('coldloop.language', chosen);
      }, language);
    await speak('es');
    await visit(paths.myJobs);
    await visit(paths.myJob(phone.job));
    await visit(paths.jobLocks(phone.job));
    for (const kind of ['reading', 'lock-on', 'close'] as const) {
      const step = phone.checklist.steps.find(({ ask }) => ask.kind === kind);
      await visit(paths.step(phone.job, step?.id ?? ''));
    }
    await speak('en');
    await page.goto(paths.myJob(phone.job));
    expect(eye.found()).toEqual([]);
  });

  it('the rest of the kinds, a reading out of limits, a PIN', async () => {
    const { page } = phone;
    const checked = ({ stage, ask }: Step) => stage === 'check-cold' && ask.kind === 'reading';
    await lookAtNewKinds(checked);
    await typeReading(page, 99999);
    await saveButton(page).click();
    await page.getByRole('alert').first().waitFor();
    await look('out of limits');
    await press(page, 'field.out.fixed');
    await look('sheet: fixed');
    await page.keyboard.press('Escape');
    await press(page, 'field.out.again');
    await lookAtNewKinds(({ ask }) => ask.kind === 'lock-off');
    await saveButton(page).click();
    await page.getByLabel(en['field.pin.yours']).waitFor();
    await look('sheet: PIN');
    await page.keyboard.press('Escape');
    await lookAtNewKinds(() => false);
    expect([...seen].sort()).toEqual([...new Set(phone.checklist.steps.map(({ ask }) => ask.kind))].sort());
    expect(eye.found()).toEqual([]);
  });

  it('signing, and the foreman who reads and countersigns', async () => {
    const { page } = phone;
    await visit(paths.sign(phone.job));
    await drawSignature(page);
    await page.getByRole('button', { name: t('field.sign.save', { name: phone.name }) }).click();
    await enterPin(page);
    await page.waitForURL((url) => url.pathname === paths.myJob(phone.job));
    await page.getByText(en['field.unsent.none']).waitFor({ timeout: 30_000 });
    const [, foreman] = await as('ruth');
    await enrolOnPage(foreman);
    await foreman.goto(paths.review(phone.job));
    await foreman.locator('canvas').waitFor({ timeout: 30_000 });
    await eye.look(foreman, 'review', fieldSizes);
    expect(eye.found()).toEqual([]);
  });
});
