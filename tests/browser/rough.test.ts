/** Rough handling of the phone: double taps, Back, reloads, two windows, two people, wrong PINs, a server that goes away. */
import type { Browser, BrowserContext, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoPassword } from '../../server/commands/demo/people';

import type { Pack } from '../../shared/api/jobs';
import type { Step } from '../../shared/checklist/types';
import { en } from '../../shared/wording/en';
import { render } from '../../shared/wording/render';
import { paths } from '../../src/app/paths';
import { launch, phoneContext, watchErrors } from '../support/browser/chromium';
import { enrolOnPage } from '../support/browser/enrolOnPage';
import { keepPicturesOfFailures } from '../support/browser/keepPictures';
import { liveServer, type LiveServer } from '../support/browser/liveServer';
import { pin, stepOnScreen, typeReading, workUntil, type Phone } from '../support/browser/phone';
import { seedOneJob } from '../support/browser/oneJob';
import { signInOnPage } from '../support/browser/signInPage';

const t = (key: keyof typeof en, params: Record<string, string | number> = {}) =>
  render('en', { key, params });
const saveButton = (page: Page) => page.locator('footer button[aria-busy]');
const rubbish = `\u202edrawn\u200e \u0000\u0007 <b>"';--\t\n\n${'très long 線 '.repeat(400)}`;
/** As a paste does: the field's own limit of length counts. */
async function paste(field: Locator, words: string): Promise<void> {
  await field.fill('');
  await field.focus();
  await field.page().keyboard.insertText(words);
}
const is =
  (kind: Step['ask']['kind'], stage?: Step['stage']) =>
  (step: Step): boolean =>
    step.ask.kind === kind && (stage === undefined || step.stage === stage);

describe('rough handling of the phone', () => {
  let server: LiveServer;
  let browser: Browser;
  let context: BrowserContext;
  let phone: Phone;
  let errors: string[];

  beforeAll(async () => {
    server = await liveServer();
    await seedOneJob(server.services);
    browser = await launch();
    context = await phoneContext(browser, server.url);
    const page = await context.newPage();
    errors = watchErrors(page);
    await signInOnPage(page, 'ines@halden-quay.example', demoPassword);
    await enrolOnPage(page);
    const { packs } = await page.evaluate(
      async () => (await fetch('/api/my/packs')).json() as Promise<{ packs: Pack[] }>,
    );
    const pack = packs.find(({ job }) => job.words?.startsWith('The eyewash'));
    if (!pack) throw new Error('the demo sent no new job to this electrician');
    phone = { page, name: 'Ines Varga', job: pack.job.id, checklist: pack.checklist, locks: {} };
    await page.goto(paths.myJob(phone.job));
  });
  keepPicturesOfFailures(() => browser);
  afterAll(async () => {
    await browser.close();
    await server.close();
  });

  interface Held {
    log: string;
    seq: number;
    kind: string;
    content: { body: { step?: string; words?: string; lock?: string }; previous: string | null };
  }
  const held = (): Promise<Held[]> =>
    server.services.database.query<Held[]>(
      'SELECT log, seq, kind, content::jsonb AS content FROM entry WHERE job = $1 ORDER BY "order"',
      [phone.job],
    );
  const sent = (page = phone.page) =>
    page.getByText(en['field.unsent.none']).first().waitFor({ timeout: 40_000 });
  const answersTo = async (step: string) => {
    await sent();
    return (await held()).filter(({ content }) => content.body.step === step);
  };
  const signOut = () =>
    phone.page.evaluate(async () => {
      await fetch('/api/session', { method: 'DELETE' });
    });
  const here = (): Step => {
    const step = stepOnScreen(phone);
    if (!step) throw new Error(`no step at ${phone.page.url()}`);
    return step;
  };
  const leaves = (id: string, page = phone.page) =>
    page.waitForURL((url) => !decodeURIComponent(url.pathname).endsWith(id));

  it('a double tap accepts once and answers once', async () => {
    await phone.page.getByRole('button', { name: en['field.job.accept'] }).dblclick();
    await phone.page.getByRole('link', { name: en['field.job.carryOn'] }).waitFor();
    expect(await workUntil(phone, is('done'))).toBe(true);
    const { id } = here();
    await saveButton(phone.page).dblclick();
    await leaves(id);
    await phone.page.waitForTimeout(600);
    const next = here().id;
    expect(next).not.toBe(id);
    expect(await answersTo(id)).toHaveLength(1);
    expect(await answersTo(next)).toHaveLength(0);
    expect((await held()).filter(({ kind }) => kind === 'accepted')).toHaveLength(1);
  });

  it('Back after an answer shows what stands and answers nothing', async () => {
    expect(await workUntil(phone, is('done'))).toBe(true);
    const { id } = here();
    await saveButton(phone.page).click();
    await leaves(id);
    const before = (await answersTo(id)).length;
    await phone.page.goBack();
    await phone.page.getByText(en['field.standing.again']).waitFor();
    expect(here().id).toBe(id);
    await phone.page.reload();
    await phone.page.getByText(en['field.standing.again']).waitFor();
    expect(await answersTo(id)).toHaveLength(before);
    await phone.page.goto(paths.myJob(phone.job));
  });

  it('a wrong PIN waits longer and longer, says how long, and never locks out', async () => {
    const stranger = await context.newPage();
    await stranger.goto(paths.myJobs);
    await stranger.getByRole('button', { name: phone.name }).click();
    const box = stranger.getByLabel(en['field.pin.yours']);
    const open = stranger.getByRole('button', { name: en['field.pin.open'] });
    const waits: number[] = [];
    for (let wrong = 0; wrong < 3; wrong += 1) {
      await box.fill('000000');
      await open.click();
      const says = stranger.getByText(/Try again in \d+ s/);
      await says.waitFor();
      waits.push(Number(/in (\d+) s/.exec((await says.textContent()) ?? '')?.[1]));
      await stranger.getByText(t('field.pin.wrong')).waitFor({ timeout: 20_000 });
    }
    expect(waits).toEqual([...waits].sort((a, b) => a - b));
    expect(waits[2]).toBeGreaterThan(waits[0] ?? 0);
    await box.fill(pin);
    await open.click();
    await stranger.getByRole('heading', { level: 1 }).waitFor();
    await box.waitFor({ state: 'hidden' });
    await stranger.close();
  });

  it('unseen signs, markup and far too many words are kept as plain words, in every sheet', async () => {
    const { page } = phone;
    const sheet = page.getByRole('dialog');
    for (const view of ['note', 'differs', 'temporary'] as const) {
      await page.getByRole('button', { name: en['field.more'], exact: true }).click();
      await page.getByRole('button', { name: t(`field.more.${view}`), exact: true }).click();
      if (view === 'temporary') await sheet.getByRole('radio').first().check();
      await paste(sheet.locator('textarea, input:not([type="radio"])').first(), rubbish);
      await sheet.locator('button').first().click();
      await sheet.waitFor({ state: 'hidden' });
    }
    await page.getByRole('button', { name: en['field.more'], exact: true }).click();
    await page.getByRole('button', { name: en['field.more.temporary'], exact: true }).click();
    await sheet.getByRole('button', { name: en['field.temporary.undone'] }).click();
    await sheet.getByRole('button', { name: en['field.temporary.undone'] }).waitFor({ state: 'hidden' });
    await page.keyboard.press('Escape');
    await sent();
    const words = JSON.stringify((await held()).slice(-4).map(({ content }) => content.body));
    expect(words).toContain('drawn');
    expect(words).not.toMatch(/\\u0000|\\u0007|\u202e|\u200e|\\n/);
    await page.getByRole('button', { name: en['field.more'], exact: true }).click();
    await page.getByRole('button', { name: en['field.more.jump'], exact: true }).click();
    await paste(sheet.getByRole('textbox'), rubbish);
    await sheet.getByText(t('field.jump.found', { n: 0 })).waitFor();
    await page.keyboard.press('Escape');
  });

  it('unseen signs around a lock’s number are dropped, the number stays', async () => {
    const { page } = phone;
    expect(await workUntil(phone, is('lock-on'))).toBe(true);
    const { id } = here();
    await page.getByLabel(en['field.lockOn.number']).fill('\u200e 4\u00007 ');
    await saveButton(page).click();
    await leaves(id);
    const [lock] = await answersTo(id);
    expect(lock?.content.body.lock).toBe('47');
  });

  it('a reload in the middle of typing keeps the step, and pasted words never become a reading', async () => {
    const { page } = phone;
    expect(await workUntil(phone, is('reading'))).toBe(true);
    const { id } = here();
    await typeReading(page, 4.2);
    await page.reload();
    await saveButton(page).waitFor();
    expect(here().id).toBe(id);
    expect(await answersTo(id)).toHaveLength(0);
    expect(await saveButton(page).isDisabled()).toBe(true);
    await page.locator('input[inputmode="none"]').first().focus();
    await page.keyboard.insertText('12 V <script>');
    expect(await saveButton(page).isDisabled()).toBe(true);
  });

  it('two windows of one phone on one step: both answers are kept, the log stays one chain', async () => {
    expect(await workUntil(phone, is('done'))).toBe(true);
    const { id } = here();
    const second = await context.newPage();
    await second.goto(paths.step(phone.job, id));
    await second.getByRole('button', { name: phone.name }).click();
    await second.getByLabel(en['field.pin.yours']).fill(pin);
    await second.getByRole('button', { name: en['field.pin.open'] }).click();
    await saveButton(second).waitFor();
    await Promise.all([saveButton(phone.page).click(), saveButton(second).click()]);
    await Promise.all([leaves(id), leaves(id, second)]);
    expect((await answersTo(id)).length).toBe(2);
    const all = await held();
    const parents = all.map(({ log, content }) => `${log} ${content.previous ?? ''}`);
    expect(new Set(parents).size).toBe(all.length);
    await second.close();
  });

  it('two people share the phone: each opens it with their own PIN and has their own log', async () => {
    const second = await context.newPage();
    // The first one signed out; their key and their log stay on the phone.
    await signOut();
    await signInOnPage(second, 'ruth@halden-quay.example', demoPassword);
    await second.goto(paths.device);
    await second.getByLabel(en['device.enrol.pin']).fill('975310');
    await second.getByLabel(en['device.enrol.again']).fill('975310');
    await second.getByRole('button', { name: en['device.enrol.save'] }).click();
    await second.waitForURL((url) => url.pathname === paths.myJobs);
    await second.goto(paths.myJob(phone.job));
    await second.getByRole('button', { name: en['field.more'], exact: true }).click();
    await second.getByRole('button', { name: en['field.more.note'], exact: true }).click();
    await second.getByRole('dialog').locator('textarea').fill('from the foreman on the same phone');
    await second.getByRole('dialog').getByRole('button', { name: en['field.save'], exact: true }).click();
    await second.getByRole('dialog').waitFor({ state: 'hidden' });
    await sent(second);
    const all = await held();
    const note = all.find(({ content }) => content.body.words?.startsWith('from the foreman'));
    const answer = all.find(({ kind }) => kind === 'lock-on');
    expect(note?.log).not.toBe(answer?.log);
    await second.close();
    expect(errors).toEqual([]);
  });

  it('the session ends while answers are unsent: it says sign in, keeps all, and delivers all the same', async () => {
    const { page } = phone;
    await signOut();
    await signInOnPage(page, 'ines@halden-quay.example', demoPassword);
    await page.goto(paths.myJob(phone.job));
    await context.setOffline(true);
    expect(await workUntil(phone, is('done'))).toBe(true);
    const { id } = here();
    await saveButton(page).click();
    await leaves(id);
    await page
      .getByText(/not sent/)
      .first()
      .waitFor();
    await server.services.database.query('DELETE FROM session');
    await context.setOffline(false);
    await expect
      .poll(async () => (await held()).some((each) => each.content.body.step === id), { timeout: 60_000 })
      .toBe(true);
    await page.goto(paths.myJobs);
    await page.getByRole('link', { name: en['app.signIn'] }).waitFor({ timeout: 30_000 });
    await page
      .getByRole('link', { name: /Open job/ })
      .first()
      .waitFor();
  });

  it('the server stops while they work: the line says what is unsent and since when; later all is sent', async () => {
    const { page } = phone;
    await signInOnPage(page, 'ines@halden-quay.example', demoPassword);
    await page.goto(paths.myJob(phone.job));
    await sent();
    const restart = await server.stop();
    let answered = 0;
    await workUntil(phone, (step) => step.ask.kind === 'close' || (answered += 1) > 3);
    await page
      .getByText(/not sent: no server since \d\d:\d\d/)
      .first()
      .waitFor({ timeout: 30_000 });
    await page.reload();
    await page
      .getByText(/not sent/)
      .first()
      .waitFor();
    await restart();
    await sent();
    expect(errors).toEqual([]);
  });
});
