import type { Page } from 'playwright-core';
import { en } from '../../../shared/wording/en';
import { paths } from '../../../src/app/paths';
import { pin } from './phone';

/** Sets the signed-in person's PIN on this device and waits for their jobs to come. */
export async function enrolOnPage(page: Page): Promise<void> {
  await page.goto(paths.device);
  await page.getByLabel(en['device.enrol.pin']).fill(pin);
  await page.getByLabel(en['device.enrol.again']).fill(pin);
  await page.getByRole('button', { name: en['device.enrol.save'] }).click();
  await page.waitForURL((url) => url.pathname === paths.myJobs);
  await page.getByRole('button', { name: en['field.jobs.look'] }).click();
  await page
    .getByRole('link', { name: /Open job/ })
    .first()
    .waitFor();
}
