/** After a failed browser test: a picture of every open window, under .local/browser, for whoever looks into it. */
import { mkdirSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { afterEach } from 'vitest';
import { localPath } from '../../../server/commands/localFolder';

export function keepPicturesOfFailures(browser: () => Browser): void {
  afterEach(async ({ task }) => {
    if (task.result?.state !== 'fail') return;
    const folder = localPath('browser');
    mkdirSync(folder, { recursive: true });
    const pages = browser()
      .contexts()
      .flatMap((context) => context.pages());
    for (const [index, page] of pages.entries()) {
      const name = `${task.name.replace(/\W+/g, '-').slice(0, 50)}-${index}.png`;
      await page.screenshot({ path: `${folder}/${name}`, timeout: 5000 }).catch(() => undefined);
      console.log(`${name}: ${page.url()}`);
    }
  });
}
