import type { Page } from 'playwright-core';
import { en } from '../../../shared/wording/en';
import { paths } from '../../../src/app/paths';
import { testPassword } from '../seedPeople';

export async function signInOnPage(page: Page, email: string, password = testPassword): Promise<void> {
  await page.goto(paths.signIn);
  await page.getByLabel(en['app.signIn.email']).fill(email);
  await page.getByLabel(en['app.signIn.password']).fill(password);
  await page.getByRole('button', { name: en['app.signIn'] }).click();
  await page.waitForURL((url) => url.pathname !== paths.signIn);
}
