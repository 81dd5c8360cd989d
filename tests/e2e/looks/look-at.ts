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

const heights = { 1440: 1000, 768: 1024, 390: 844 } as const;
type Width = keyof typeof heights;

/** `npm run shots` keeps a picture of all that is looked at. */
const withPictures = process.env.SHOTS === '1';
/** What is found at the middle width is found at one of the others, too: it waits for LONG=1 and for the pictures. */
export const widths: readonly Width[] = withPictures || process.env.LONG === '1' ? [1440, 768, 390] : [1440, 390];

/**
 * Everything that a machine can tell about how one page looks at one width: overlaps, clipped text, room for fingers,
 * colours in both themes, and what axe says.
 */
export async function lookAt(stage: Stage, page: Page, view: View, width: Width): Promise<void> {
  const here = (what: string) => `${view.name} at ${width}: ${what}`;
  await page.setViewportSize({ width, height: heights[width] });
  await page.goto(view.path);
  await page.waitForLoadState('networkidle');
  await layEverythingOut(page);
  await view.prepare?.(page);
  // A pointer that rests on something, or a field that is being typed in, would be measured in that state.
  await page.mouse.move(0, 0);

  for (const theme of ['light', 'dark'] as const) {
    await inTheme(page, theme);
    stage.none(here(`only colours of the tokens, ${theme}`), await settledColours(page, theme));
    // What dark changes are colours, and those are the same at every width.
    if (theme === 'light' || width === 1440)
      stage.none(here(`nothing that axe objects to, ${theme}`), await violations(page));
    if (withPictures) await picture(page, `${view.name}-${width}-${theme}`);
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

/** In the page itself, which has no frames to look into from another one, and only what is wrong: that is half the time. */
async function violations(page: Page): Promise<string[]> {
  const axe = new AxeBuilder({ page }).options({ resultTypes: ['violations'] }).setLegacyMode(true);
  const { violations: found } = await axe.analyze();
  return found.map(
    ({ id, nodes }) =>
      `${id}: ${nodes
        .map(({ html }) => html.slice(0, 140))
        .slice(0, 3)
        .join(' | ')}`,
  );
}
