/** What axe finds on the page as it stands, in words a failing test can show. */
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

const source = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

export async function axeFindings(page: Page): Promise<string[]> {
  // The page's policy refuses script tags: the debugger's own evaluation is not one.
  if (!(await page.evaluate<boolean>('"axe" in window'))) await page.evaluate(source);
  // Behind an open sheet nothing can be reached: the sheet alone is the screen.
  const { violations } = await page.evaluate<AxeResults>(
    'axe.run(document.querySelector("dialog[open]") ?? document, { resultTypes: ["violations"] })',
  );
  return violations.flatMap(({ id, help, nodes }) =>
    nodes.map(
      ({ target, failureSummary }) => `${id}: ${help} at ${target.join(' ')} (${failureSummary ?? ''})`,
    ),
  );
}

/** Text wider than the window hides behind its edge on a phone. */
export const sticksOut = (page: Page): Promise<boolean> =>
  page.evaluate(() => {
    const room = document.documentElement.clientWidth + 1;
    const open = document.querySelector('dialog[open]');
    return (
      document.documentElement.scrollWidth > room || (open ? open.scrollWidth > open.clientWidth + 1 : false)
    );
  });
