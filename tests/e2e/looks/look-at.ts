import { AxeBuilder } from '@axe-core/playwright';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import type { Stage } from '../support/journey';
import { shotsFolder } from '../support/place';
import { until } from '../support/waiting';
import { boxFaults, sidewaysScroll } from './boxes';
import { foreignColours } from './colours';
import { foreignFonts } from './fonts';
import { layEverythingOut } from './lay-everything-out';
import type { View } from './pages';
import type { Theme } from './tokens';

export const widths = [1440, 768, 390] as const;
/** LONG=1 looks in both themes and with axe at the middle width, too: what is found there shows at one of the others. */
const everything = process.env.LONG === '1';
const heights = { 1440: 1000, 768: 1024, 390: 844 } as const;

/**
 * Everything that a machine can tell about how one page looks at one width: overlaps, clipped text and room for fingers at
 * each; colours in both themes and axe at the widest and the narrowest.
 */
export async function lookAt(stage: Stage, page: Page, view: View, width: (typeof widths)[number]): Promise<void> {
  const here = (what: string) => `${view.name} at ${width}: ${what}`;
  await page.setViewportSize({ width, height: heights[width] });
  await page.goto(view.path);
  await page.waitForLoadState('networkidle');
  await layEverythingOut(page);
  await view.prepare?.(page);
  // A pointer that rests on something, or a field that is being typed in, would be measured in that state.
  await page.mouse.move(0, 0);

  const between = width === 768 && !everything;
  for (const theme of themesAt(between)) {
    await inTheme(page, theme);
    stage.none(here(`only colours of the tokens, ${theme}`), await settledColours(page, theme));
    // What dark changes are colours, and those are the same at every width.
    if (!between && (theme === 'light' || width === 1440))
      stage.none(here(`nothing that axe objects to, ${theme}`), await violations(page));
    await picture(page, `${view.name}-${width}-${theme}`);
  }
  stage.none(here('only the two families, loaded'), await foreignFonts(page));
  const { overlaps, clipped, small } = await boxFaults(page);
  stage.none(here('no box over another'), overlaps);
  stage.none(here('no text cut off'), clipped);
  stage.none(here('room for a finger'), small);
  stage.equal(here('no sideways scroll'), await sidewaysScroll(page), 0);
  if (width !== 390) return;
  await page.setViewportSize({ width: 320, height: 700 });
  // Charts draw themselves anew for the narrower screen.
  await until(async () => (await sidewaysScroll(page)) === 0, { seconds: 15 });
  stage.equal(`${view.name} at 320: no sideways scroll`, await sidewaysScroll(page), 0);
}

function themesAt(between: boolean): readonly Theme[] {
  return between ? ['light'] : ['light', 'dark'];
}

/** The whole page in one picture: as tall as its content, so that what sticks to the foot of the screen stands at its foot. */
async function picture(page: Page, name: string): Promise<void> {
  const screen = page.viewportSize();
  if (screen === null) return;
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  await page.setViewportSize({ ...screen, height: Math.max(screen.height, height) });
  await page.screenshot({ path: join(shotsFolder, `${name}.png`) });
  await page.setViewportSize(screen);
}

/** Puts the lights on or out, and waits until the page has been drawn so. */
async function inTheme(page: Page, theme: Theme): Promise<void> {
  await page.emulateMedia({ colorScheme: theme });
  await page.waitForFunction(
    (wanted) =>
      matchMedia(`(prefers-color-scheme: ${wanted})`).matches &&
      getComputedStyle(document.documentElement).colorScheme === wanted,
    theme,
  );
  await page.evaluate(
    () => new Promise((drawn) => requestAnimationFrame(() => requestAnimationFrame(() => setTimeout(drawn, 30)))),
  );
}

/** Measured again when something was found: it may have been on its way from one colour to another. */
async function settledColours(page: Page, theme: Theme): Promise<string[]> {
  const found = await foreignColours(page, theme);
  if (found.length === 0) return found;
  await page.waitForTimeout(300);
  return foreignColours(page, theme);
}

async function violations(page: Page): Promise<string[]> {
  const { violations: found } = await new AxeBuilder({ page }).analyze();
  return found.map(
    ({ id, nodes }) =>
      `${id}: ${nodes
        .map(({ html }) => html.slice(0, 140))
        .slice(0, 3)
        .join(' | ')}`,
  );
}
