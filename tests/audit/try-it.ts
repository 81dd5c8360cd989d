import type { Page } from 'playwright-core';
import { words } from '../e2e/support/words';
import { median } from './median';

const SLOWER = 4;

/** From one more swimmer until the sentence and the curve are painted, on a quarter of this machine's speed [ms]; medians. */
export async function tryItTimes(page: Page, runs: number): Promise<{ sentence: number; curve: number }> {
  await page.setViewportSize({ width: 1440, height: 1000 });
  await page.goto('/week');
  await page.waitForLoadState('networkidle');
  const more = page.getByRole('button', { name: words('try-out.more') }).first();
  const press = async () => {
    await page.evaluate(() => performance.clearMarks());
    await more.click();
    await page.waitForFunction(() => performance.getEntriesByName('try-it:curve').length > 0);
    await page.waitForTimeout(1000);
  };
  // The first press fetches engine and start; it is the ones after it that somebody plays with.
  await press();
  const session = await page.context().newCDPSession(page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWER });
  const times: { sentence: number; curve: number }[] = [];
  for (let run = 0; run < runs; run++) {
    await press();
    times.push(
      await page.evaluate(() => {
        const at = (mark: string) => performance.getEntriesByName(mark)[0]?.startTime ?? NaN;
        const input = at('try-it:input');
        return { sentence: at('try-it:sentence') - input, curve: at('try-it:curve') - input };
      }),
    );
  }
  return { sentence: median(times.map(({ sentence }) => sentence)), curve: median(times.map(({ curve }) => curve)) };
}
