/** What engineer and foreman do at their desks, on the office's own pages. */
import type { Page } from 'playwright-core';
import type { Panel } from '../../../shared/panel/panelSchema';
import { en } from '../../../shared/wording/en';
import { paths } from '../../../src/app/paths';

export async function uploadPanel(page: Page, panel: Panel): Promise<void> {
  await page.goto(paths.panels);
  await page.locator('input[type="file"]').setInputFiles({
    name: `${panel.tag}.panel.json`,
    mimeType: 'application/json',
    buffer: Buffer.from(JSON.stringify(panel)),
  });
  await page.getByRole('heading', { level: 1, name: panel.tag }).waitFor();
}

/** Issues the draft on the screen; what may stand is accepted with a reason. */
export async function issueRevision(page: Page): Promise<void> {
  await page.getByRole('button', { name: en['office.issue'] }).click();
  const dialog = page.getByRole('dialog');
  for (const box of await dialog.getByLabel(en['office.accept.reason']).all())
    await box.fill('Checked on site with the supplier');
  await dialog.getByRole('button', { name: en['office.issue'] }).click();
  await dialog.waitFor({ state: 'hidden' });
}

interface NewJob {
  panel: Panel;
  points: readonly string[];
  electrician: string;
  foreman: string;
}

const next = (page: Page) => page.getByRole('button', { name: en['app.next'] }).click();

/** The first half: the panel as it is issued now, and its points. */
export async function choosePoints(
  page: Page,
  { panel, points }: Pick<NewJob, 'panel' | 'points'>,
): Promise<void> {
  await page.goto(paths.newJob);
  await page.getByRole('radio', { name: new RegExp(panel.tag) }).check();
  await next(page);
  for (const address of points) await page.getByRole('checkbox', { name: new RegExp(address) }).check();
  await next(page);
}

/** The second half: who does it, until when, and off it goes. */
export async function choosePeopleAndSend(
  page: Page,
  { electrician, foreman }: Pick<NewJob, 'electrician' | 'foreman'>,
): Promise<void> {
  await page.getByRole('checkbox', { name: electrician }).check();
  await page.getByLabel(en['office.new.foreman']).selectOption({ label: foreman });
  await page.getByLabel(en['office.due']).fill('2027-01-15');
  await next(page);
  for (const box of await page.getByLabel(en['office.accept.reason']).all())
    await box.fill('Agreed with the panel engineer');
  await page.getByRole('button', { name: en['office.send'], exact: true }).click();
  await page.waitForURL((url) => url.pathname === paths.jobs);
}

export async function sendJob(page: Page, job: NewJob): Promise<void> {
  await choosePoints(page, job);
  await choosePeopleAndSend(page, job);
}
