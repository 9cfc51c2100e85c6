/** Looks at a screen the way everybody may see it: small and large, by day and by night, and notes what axe finds. */
import type { Page } from 'playwright-core';
import { en } from '../../../shared/wording/en';
import { es } from '../../../shared/wording/es';
import { axeFindings, sticksOut } from './axe';
import { deskSize, phoneSize } from './chromium';

interface Size {
  width: number;
  height: number;
}

export const narrow: Size = { width: 320, height: 640 };
const onItsSide: Size = { width: 740, height: 360 };

export interface Looker {
  /** What was found so far; empties the list. */
  found: () => string[];
  /** Looks at the screen as it stands. */
  look: (page: Page, where: string, sizes?: Size[]) => Promise<void>;
  /** Opens a path and looks at it. */
  visit: (page: Page, path: string, sizes?: Size[]) => Promise<void>;
}

export const deskSizes = [deskSize, phoneSize, narrow];
export const fieldSizes = [phoneSize, onItsSide, narrow];

/** Day at the first size and night at the last one get the whole of axe; the sizes between are measured only. */
export function looker(): Looker {
  let found: string[] = [];
  async function look(page: Page, where: string, sizes = deskSizes): Promise<void> {
    for (const { 'app.loading': loading } of [en, es])
      await page.getByText(loading, { exact: true }).first().waitFor({ state: 'hidden' });
    for (const [index, size] of sizes.entries()) {
      const isLast = index === sizes.length - 1;
      // A colour on its way from day to night is neither: nothing moves while we look.
      await page.emulateMedia({ colorScheme: isLast ? 'dark' : 'light', reducedMotion: 'reduce' });
      await page.setViewportSize(size);
      if (await sticksOut(page)) found.push(`${where} ${size.width}: sticks out to the right`);
      if (index > 0 && !isLast) continue;
      for (const finding of await axeFindings(page))
        found.push(`${where} ${isLast ? 'night' : 'day'} ${size.width}: ${finding}`);
    }
    await page.emulateMedia({ colorScheme: 'light' });
    await page.setViewportSize(sizes[0] ?? deskSize);
  }
  return {
    found: () => {
      const all = found;
      found = [];
      return all;
    },
    look,
    visit: async (page, path, sizes) => {
      await page.goto(path);
      await page.locator('h1, [role="dialog"]').first().waitFor();
      await look(page, path, sizes);
    },
  };
}
