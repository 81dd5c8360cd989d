import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { layEverythingOut } from '../e2e/looks/lay-everything-out';

/** What axe objects to on the page that is open, in both themes at each width. */
export async function violationsOf(page: Page, path: string, widths: readonly number[]): Promise<string[]> {
  const found: string[] = [];
  for (const theme of ['light', 'dark'] as const)
    for (const width of widths) {
      await page.emulateMedia({ colorScheme: theme });
      await page.setViewportSize({ width, height: width < 600 ? 844 : 1000 });
      await page.goto(path);
      await page.waitForLoadState('networkidle');
      await layEverythingOut(page);
      const { violations } = await new AxeBuilder({ page }).analyze();
      found.push(...violations.map(({ id, nodes }) => `${id} at ${width}, ${theme}: ${nodes[0]?.html.slice(0, 120)}`));
    }
  return found;
}
