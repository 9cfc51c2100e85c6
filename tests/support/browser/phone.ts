/** Does a job on the phone's own screens, as a thumb would: reads the step, answers it, goes on. */
import type { Page } from 'playwright-core';
import type { Checklist, ReadingAsk, Step } from '../../../shared/checklist/types';
import { en } from '../../../shared/wording/en';
import { render } from '../../../shared/wording/render';
import { paths } from '../../../src/app/paths';

export const pin = '246810';

export interface Phone {
  page: Page;
  /** Who works on it. */
  name: string;
  job: string;
  checklist: Checklist;
  /** Lock numbers by isolator: one padlock hangs in one place. */
  locks: Record<string, string>;
}

/** A reading in the middle of what is accepted, with no more digits than a meter shows. */
export function goodReading({ low, high, dead }: ReadingAsk): number {
  if (dead) return 0;
  const value =
    low !== undefined && high !== undefined
      ? (low + high) / 2
      : high !== undefined
        ? high * 0.5
        : low !== undefined
          ? low * 1.2 + 0.1
          : 1;
  for (const digits of [0, 1, 2, 3]) {
    const rounded = Number(value.toFixed(digits));
    if ((low === undefined || rounded >= low) && (high === undefined || rounded <= high)) return rounded;
  }
  return value;
}

/** The step that the address names. */
export function stepOnScreen({ page, checklist }: Phone): Step | undefined {
  const found = /\/steps\/(.+)$/.exec(new URL(page.url()).pathname);
  const id = found?.[1] === undefined ? undefined : decodeURIComponent(found[1]);
  return checklist.steps.find((step) => step.id === id);
}

const saveButton = (page: Page) => page.locator('footer button[aria-busy]');

async function save(phone: Phone): Promise<void> {
  const before = phone.page.url();
  await saveButton(phone.page).click();
  await phone.page.waitForURL((url) => url.href !== before);
}

export async function typeReading(page: Page, value: number): Promise<void> {
  await page.locator('input[inputmode="none"]').first().focus();
  await page.keyboard.type(String(value));
}

export async function enterPin(page: Page): Promise<void> {
  await page.getByLabel(en['field.pin.yours']).fill(pin);
  await page.getByRole('button', { name: en['field.pin.go'] }).click();
}

/** A square of grey: enough of a picture for the phone to shrink. */
const picture = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAgAAAAICAIAAABLbSncAAAAEklEQVR4nGNsaGhgwAaYsIoOWgkABNMBH4T5NMsAAAAASUVORK5CYII=',
  'base64',
);

type Answer = (phone: Phone, step: Step) => Promise<void>;

const answers: { [K in Step['ask']['kind']]: Answer } = {
  done: save,
  reading: async (phone, step) => {
    if (step.ask.kind === 'reading') await typeReading(phone.page, goodReading(step.ask));
    await save(phone);
  },
  choice: async (phone, step) => {
    const good = step.ask.kind === 'choice' ? step.ask.options.find(({ ok }) => ok) : undefined;
    await phone.page.locator(`input[type="radio"][value="${good?.value ?? ''}"]`).check();
    await save(phone);
  },
  text: async (phone) => {
    await phone.page.locator('textarea').first().fill('Checked against the label');
    await save(phone);
  },
  photo: async (phone) => {
    const file = { name: 'photo.png', mimeType: 'image/png', buffer: picture };
    await phone.page.locator('input[type="file"]').last().setInputFiles(file);
    await phone.page.locator('img').waitFor();
    await save(phone);
  },
  wait: save,
  scan: async (phone, step) => {
    const expected = step.ask.kind === 'scan' ? step.ask.expect : '';
    await phone.page.getByLabel(en['field.scan.type']).fill(expected);
    await save(phone);
  },
  instrument: async (phone) => {
    await phone.page.locator('input[type="radio"]').first().check();
    await save(phone);
  },
  'lock-on': async (phone, step) => {
    const isolator = step.ask.kind === 'lock-on' ? step.ask.isolator : '';
    const lock = (phone.locks[isolator] ??= String(17 + Object.keys(phone.locks).length));
    await phone.page.getByLabel(en['field.lockOn.number']).fill(lock);
    await save(phone);
  },
  'lock-off': async (phone) => {
    const before = phone.page.url();
    await saveButton(phone.page).click();
    await enterPin(phone.page);
    await phone.page.waitForURL((url) => url.href !== before);
  },
  close: async (phone) => {
    await typeReading(phone.page, 0);
    await save(phone);
  },
};

/** On a step that waits for it: says with the own PIN that hands, tools and people are out. */
async function sayClear({ page, name }: Phone): Promise<void> {
  const say = render('en', { key: 'field.clear.say', params: { name } });
  await page.getByRole('button', { name: say }).click();
  const sheet = page.getByRole('dialog');
  await sheet.getByLabel(render('en', { key: 'field.clear.pin', params: { name } })).fill(pin);
  await sheet.getByRole('button', { name: say }).click();
  await sheet.waitFor({ state: 'hidden' });
}

/** Answers the step on the screen as somebody who does the work well. */
export async function answerWell(phone: Phone): Promise<Step> {
  const step = stepOnScreen(phone);
  if (!step) throw new Error(`no step at ${phone.page.url()}`);
  const shut = phone.page.getByText(en['field.gate.notYet']);
  await saveButton(phone.page).or(shut).first().waitFor({ timeout: 10_000 });
  if (step.ask.kind === 'close' && (await shut.isVisible())) await sayClear(phone);
  await answers[step.ask.kind](phone, step);
  return step;
}

export const carryOn = async ({ page, job }: Phone): Promise<boolean> => {
  if (new URL(page.url()).pathname !== paths.myJob(job)) await page.goto(paths.myJob(job));
  const link = page.getByRole('link', { name: en['field.job.carryOn'] });
  const other = page.locator('footer a[href$="/sign"]');
  await link.or(other).first().waitFor();
  if (!(await link.isVisible())) return false;
  await link.click();
  await page.waitForURL(/\/steps\//);
  return true;
};

/** Goes on, well, until the screen shows a step that `until` names; false when no step is left. */
export async function workUntil(phone: Phone, until: (step: Step) => boolean): Promise<boolean> {
  for (let answered = 0; answered < 2000; answered += 1) {
    const step = stepOnScreen(phone);
    if (!step) {
      if (!(await carryOn(phone))) return false;
      continue;
    }
    if (until(step)) return true;
    await answerWell(phone);
  }
  throw new Error('the job has no end');
}

export async function drawSignature(page: Page): Promise<void> {
  const canvas = page.locator('canvas');
  await canvas.scrollIntoViewIfNeeded();
  const box = await canvas.boundingBox();
  if (!box) throw new Error('no signature pad');
  await page.mouse.move(box.x + 30, box.y + 60);
  await page.mouse.down();
  for (let at = 0; at < 12; at += 1)
    await page.mouse.move(box.x + 40 + at * 14, box.y + 60 + (at % 2 ? 30 : -20));
  await page.mouse.up();
}
