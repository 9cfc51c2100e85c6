/** The main job, end to end: a panel's file goes in; a sealed, signed, countersigned record comes out, done with no signal. */
import { execFileSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { mixedPanel, mixedScope } from '../../server/commands/demo/panels/mixed';
import type { Pack } from '../../shared/api/jobs';
import type { ReadingAsk, Step } from '../../shared/checklist/types';
import { en } from '../../shared/wording/en';
import { render } from '../../shared/wording/render';
import { paths } from '../../src/app/paths';
import { seedPerson, seedSite } from '../support/seedPeople';
import { enrolOnPage } from '../support/browser/enrolOnPage';
import { deskContext, launch, phoneContext } from '../support/browser/chromium';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { issueRevision, sendJob, uploadPanel } from '../support/browser/office';
import {
  carryOn,
  drawSignature,
  enterPin,
  pin,
  stepOnScreen,
  typeReading,
  workUntil,
  type Phone,
} from '../support/browser/phone';
import { signInOnPage } from '../support/browser/signInPage';

const electrician = 'Ines Varga';
const foreman = 'Ruth Adeyemi';
const engineer = 'Nora Castell';
const officer = 'Oskar Brandt';
const tester = {
  make: 'Two-pole tester',
  number: 'VT-031',
  category: 'CAT III' as const,
  ratedV: 690,
  checkDue: '2099-06-30',
};
const emailOf = (name: string) => `${name.toLowerCase().replaceAll(' ', '.')}@example.org`;
const t = (key: keyof typeof en, params: Record<string, string | number> = {}) =>
  render('en', { key, params });

const saveButton = (page: Page) => page.locator('footer button[aria-busy]');

/** Signs in, sets a PIN on this phone, and waits for the job to come. */
async function setUpPhone(page: Page, name: string): Promise<void> {
  await signInOnPage(page, emailOf(name));
  await enrolOnPage(page);
}

/** Presses whatever button stands beside a missing condition until the verdict is that it works. */
async function makeReady(page: Page): Promise<void> {
  const ready = page.getByText(en['field.ready.yes'], { exact: true });
  for (let tries = 0; tries < 8 && !(await ready.isVisible()); tries += 1) {
    const mend = page.locator('[role="status"] button:enabled').first();
    if (await mend.isVisible().catch(() => false)) await mend.click();
    await page.waitForTimeout(700);
  }
  await ready.waitFor({ timeout: 15_000 });
}

const isDeadTest = (step: Step): step is Step & { ask: ReadingAsk } =>
  step.ask.kind === 'reading' && step.ask.dead !== undefined && step.stage === 'prove-dead';

describe('the main job', () => {
  let server: LiveServer;
  let browser: Browser;
  let phones: BrowserContext;
  let phone: Phone;
  let desk: Page;
  let foremanPage: Page;
  let pack: Pack;
  const deskAs = async (name: string): Promise<Page> => {
    const page = await (await deskContext(browser, server.url)).newPage();
    await signInOnPage(page, emailOf(name));
    return page;
  };
  const unsent = () => phone.page.getByText(/not sent/);

  beforeAll(async () => {
    server = await liveServer();
    browser = await launch();
    const site = await seedSite(server.services, 'Halden Quay Water Works', [tester]);
    await seedPerson(server.services, electrician, [{ site, role: 'electrician' }]);
    await seedPerson(server.services, foreman, [{ site, role: 'foreman' }]);
    await seedPerson(server.services, engineer, [{ site, role: 'panel-engineer' }]);
    await seedPerson(server.services, officer, [{ site, role: 'safety-officer' }]);
  });
  keepPicturesOfFailures(() => browser);
  afterAll(async () => {
    await browser.close();
    await server.close();
  });

  it('the engineer uploads the mixed panel and issues it', async () => {
    desk = await deskAs(engineer);
    await uploadPanel(desk, mixedPanel);
    await issueRevision(desk);
    await desk.getByRole('link', { name: '1', exact: true }).waitFor();
  });

  it('the foreman sends a job of four points', async () => {
    foremanPage = await deskAs(foreman);
    await sendJob(foremanPage, { panel: mixedPanel, points: mixedScope, electrician, foreman });
    await foremanPage.getByText(mixedPanel.tag).first().waitFor();
  });

  it('the electrician sees that it works with no signal', async () => {
    phones = await phoneContext(browser, server.url);
    const page = await phones.newPage();
    await setUpPhone(page, electrician);
    await page.getByRole('link', { name: /Open job/ }).click();
    await page.waitForURL(/\/my\/jobs\/.+/);
    await makeReady(page);
    const answer = await page.evaluate(
      async () => (await fetch('/api/my/packs')).json() as Promise<{ packs: Pack[] }>,
    );
    const first = answer.packs[0];
    if (!first) throw new Error('the server gave no pack');
    pack = first;
    phone = { page, name: electrician, job: pack.job.id, checklist: pack.checklist, locks: {} };
  });

  it('with the network cut they accept it and isolate', async () => {
    await phones.setOffline(true);
    await phone.page.getByRole('button', { name: en['field.job.accept'] }).click();
    expect(await workUntil(phone, isDeadTest)).toBe(true);
  });

  it('118 V in a dead test holds them on the red screen until a good reading', async () => {
    await typeReading(phone.page, 118);
    await saveButton(phone.page).click();
    await phone.page.waitForURL(/\/live\//);
    await phone.page.getByRole('heading', { name: new RegExp(en['field.live.live']) }).waitFor();
    // Neither another address nor the way back leads off it.
    await phone.page.goto(paths.myJobs);
    await phone.page.waitForURL(/\/live\//);
    await phone.page.goBack();
    await phone.page.waitForURL(/\/live\//);
    await phone.page.getByRole('button', { name: en['field.out.again'] }).click();
    await typeReading(phone.page, 0);
    await saveButton(phone.page).click();
    await phone.page.waitForURL((url) => !url.pathname.includes('/live/'));
  });

  it('killed in the middle of an answer, the page opens cold with no network and nothing is lost', async () => {
    expect(await workUntil(phone, (step) => step.stage === 'wire' && step.ask.kind === 'reading')).toBe(true);
    const step = stepOnScreen(phone);
    const said = await unsent().first().textContent();
    await typeReading(phone.page, 0);
    const session = await phones.newCDPSession(phone.page);
    const crashed = phone.page.waitForEvent('crash');
    // Nobody is left to answer this.
    void session.send('Page.crash').catch(() => undefined);
    await crashed;
    await phone.page.close();
    phone.page = await phones.newPage();
    await phone.page.goto(paths.myJob(phone.job));
    await phone.page.getByRole('button', { name: electrician }).click();
    await phone.page.getByLabel(en['field.pin.yours']).fill(pin);
    await phone.page.getByRole('button', { name: en['field.pin.open'] }).click();
    await carryOn(phone);
    expect(stepOnScreen(phone)?.id).toBe(step?.id);
    expect(await unsent().first().textContent()).toBe(said);
  });

  it('a point fails while it is proved; a second round mends it', async () => {
    const provesValve = (step: Step) =>
      step.stage === 'prove-points' && step.where?.point === mixedScope[3] && step.ask.kind === 'reading';
    expect(await workUntil(phone, provesValve)).toBe(true);
    await typeReading(phone.page, 3);
    await saveButton(phone.page).click();
    await phone.page.getByRole('button', { name: en['field.out.round'] }).click();
    await phone.page.getByLabel(en['field.round.words']).fill('Valve wire loose at the plug');
    await phone.page.getByRole('button', { name: t('field.round.start', { n: 1 }) }).click();
    await phone.page.waitForURL((url) => url.pathname === paths.myJob(phone.job));
    const again: string[] = [];
    expect(
      await workUntil(phone, (step) => {
        again.push(step.stage);
        return step.stage === 'sign';
      }),
    ).toBe(true);
    // Nothing is rewired live: isolated, locked and proved dead again before the wire is touched.
    const first = (stage: Step['stage']) => again.indexOf(stage);
    expect(first('isolate')).toBeGreaterThanOrEqual(0);
    expect(first('prove-dead')).toBeGreaterThan(first('isolate'));
    expect(first('wire')).toBeGreaterThan(first('prove-dead'));
    expect(first('prove-points')).toBeGreaterThan(first('close'));
  });

  it('they sign, the network returns, all arrives', async () => {
    await workUntil(phone, () => false);
    await sign(phone.page);
    await phones.setOffline(false);
    await phone.page.getByText(en['field.unsent.none']).waitFor({ timeout: 30_000 });
    await foremanPage.goto(paths.jobs);
    await foremanPage
      .getByText(/Countersign/)
      .first()
      .waitFor({ timeout: 15_000 });
  });

  async function sign(page: Page): Promise<void> {
    await page.goto(paths.sign(phone.job));
    await drawSignature(page);
    await page.getByRole('button', { name: t('field.sign.save', { name: electrician }) }).click();
    await enterPin(page);
    await page.waitForURL((url) => url.pathname === paths.myJob(phone.job));
  }

  it('the foreman returns one step, it is redone, the foreman countersigns', async () => {
    const theirs = await phoneContext(browser, server.url);
    const page = await theirs.newPage();
    await setUpPhone(page, foreman);
    await page.goto(paths.review(phone.job));
    const again = pack.checklist.steps.find(
      ({ stage, where, ask }) =>
        stage === 'prove-points' && where?.point === mixedScope[0] && ask.kind === 'reading',
    );
    if (!again) throw new Error('nothing is measured on the sensor');
    await page
      .getByText(
        t('field.left.stage', {
          stage: en[`field.stage.${again.stage}`],
          n: pack.checklist.steps.filter(({ stage }) => stage === again.stage).length,
        }),
      )
      .click();
    const row = page
      .locator('li', { has: page.locator(`a[href$="${encodeURIComponent(again.id)}"]`) })
      .last();
    await row.getByLabel(en['field.review.tick']).check();
    await page.getByRole('button', { name: t('field.review.returnN', { n: 1 }) }).click();
    await page.getByRole('dialog').locator('textarea').fill('Read it again with the tank full');
    await page
      .getByRole('dialog')
      .getByRole('button', { name: t('field.review.returnN', { n: 1 }) })
      .click();
    await page.waitForURL((url) => url.pathname === paths.myJobs);
    await page.getByText(en['field.unsent.none']).waitFor({ timeout: 30_000 });

    await phone.page.goto(paths.myJobs);
    await phone.page.getByText(en['field.status.returned']).waitFor({ timeout: 30_000 });
    await workUntil(phone, () => false);
    await sign(phone.page);
    await phone.page.getByText(en['field.unsent.none']).waitFor({ timeout: 30_000 });

    await page.goto(paths.review(phone.job));
    await page.locator('canvas').waitFor({ timeout: 30_000 });
    await drawSignature(page);
    await page.getByRole('button', { name: t('field.review.countersign', { name: foreman }) }).click();
    await enterPin(page);
    await page.waitForURL((url) => url.pathname === paths.myJobs);
    await page.getByText(en['field.unsent.none']).waitFor({ timeout: 30_000 });
  });

  it('the safety officer finds the record; its PDF holds panel, readings and names; the seal verifies', async () => {
    const page = await deskAs(officer);
    await page.goto(`${paths.records}?panel=${mixedPanel.tag}`);
    await page.getByRole('link', { name: '1', exact: true }).click();
    await page.waitForURL((url) => url.pathname.startsWith(`${paths.records}/`));
    const id = /\/records\/(.+)$/.exec(new URL(page.url()).pathname)?.[1] ?? '';
    const file = join(mkdtempSync(join(tmpdir(), 'coldloop-pdf-')), 'record.pdf');
    const pdf = await page.evaluate(async (url) => {
      const bytes = new Uint8Array(await (await fetch(url)).arrayBuffer());
      return Array.from(bytes);
    }, `/api/records/${id}.pdf`);
    writeFileSync(file, Uint8Array.from(pdf));
    const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
    for (const expected of [mixedPanel.tag, electrician, foreman, '118']) expect(text).toContain(expected);
    const readings = await server.services.database.query<{ value: number }[]>(
      `SELECT DISTINCT (content::jsonb #>> '{body,value,value}')::float AS value FROM entry WHERE job = $1 AND kind = 'answer' AND content::jsonb #>> '{body,value,kind}' = 'reading'`,
      [phone.job],
    );
    expect(readings.length).toBeGreaterThan(3);
    for (const { value } of readings) expect(text).toContain(String(Number(value.toFixed(3))));
    await page.goto(paths.verify);
    await page.locator('input[type="file"]').setInputFiles(file);
    await page.getByText(en['records.verify.holds']).waitFor();
  });

  it('the database holds each entry once', async () => {
    const rows = await server.services.database.query<
      { n: string; ids: string; orders: string; logs: string }[]
    >(
      `SELECT count(*) n, count(DISTINCT id) ids, count(DISTINCT "order") orders, count(DISTINCT (log, seq)) logs FROM entry WHERE job = $1`,
      [phone.job],
    );
    const row = rows[0];
    expect(Number(row?.n)).toBeGreaterThan(100);
    expect(row).toEqual({ n: row?.n, ids: row?.n, orders: row?.n, logs: row?.n });
  });
});
