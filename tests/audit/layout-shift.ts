import type { Page } from 'playwright-core';

declare global {
  /** Everything that moved on the page by itself so far. */
  var shifted: number;
}

type Shift = PerformanceEntry & { value: number; hadRecentInput: boolean };

/** Begins to add up what moves on every page that is opened from now on, its first paint included. */
export async function watchShifts(page: Page): Promise<void> {
  await page.addInitScript(() => {
    globalThis.shifted = 0;
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries() as Shift[]) if (!entry.hadRecentInput) globalThis.shifted += entry.value;
    }).observe({ type: 'layout-shift', buffered: true });
  });
}

/** How much moved while a page came, charts included: the sum of all shifts, which is more than the usual measure counts. */
export async function layoutShift(page: Page, path: string, width: number): Promise<number> {
  await page.setViewportSize({ width, height: width < 600 ? 844 : 1000 });
  await page.goto(path);
  await page.waitForLoadState('networkidle');
  await page.waitForTimeout(600);
  return page.evaluate(() => globalThis.shifted);
}
