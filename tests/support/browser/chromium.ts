/** Debian's Chromium, and the windows the tests look through. */
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

export const launch = (): Promise<Browser> =>
  chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
    ],
  });

/** A phone held upright, as small as we promise to work. */
export const phoneSize = { width: 360, height: 740 };
export const deskSize = { width: 1280, height: 800 };

export const phoneContext = (browser: Browser, baseURL: string): Promise<BrowserContext> =>
  browser.newContext({
    baseURL,
    viewport: phoneSize,
    hasTouch: true,
    isMobile: true,
    serviceWorkers: 'allow',
    locale: 'en-GB',
  });

export const deskContext = (browser: Browser, baseURL: string): Promise<BrowserContext> =>
  browser.newContext({ baseURL, viewport: deskSize, locale: 'en-GB' });

/** Fails the test on what a person would not see: an exception in the page. */
export function watchErrors(page: Page): string[] {
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(String(error)));
  return errors;
}
