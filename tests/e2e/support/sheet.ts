import type { Page } from 'playwright-core';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { Stage } from './journey';

/** The lines that are drawn in the charts of the week sheet: the curves, and the limits, which run level. */
export const curves = 'path.recharts-line-curve';

/** Waits for a curve to be drawn. On a phone that of today is drawn once somebody scrolls near it. */
export async function curvesDrawn(page: Page): Promise<void> {
  const today = page.locator('[data-plot="today"]:visible');
  if ((page.viewportSize()?.width ?? 0) < 600) await today.scrollIntoViewIfNeeded();
  await page.locator(curves).first().waitFor({ state: 'attached' });
}

/** The colours in which the three curves are drawn, by what they show. */
const strokes = { freeChlorine: 'rgb(14, 124, 134)', pH: 'rgb(107, 76, 122)', stabilizer: 'rgb(174, 126, 34)' };

/** Which of the three quantities have a curve of more than a few hours on a light page. */
export async function quantitiesDrawn(page: Page): Promise<string[]> {
  const drawn = await page.locator(curves).evaluateAll((found) =>
    found.map((path) => ({
      stroke: getComputedStyle(path).stroke,
      points: (path.getAttribute('d') ?? '').split(/[ML]/).length,
    })),
  );
  return Object.entries(strokes)
    .filter(([, colour]) => drawn.some(({ stroke, points }) => stroke === colour && points > 24))
    .map(([quantity]) => quantity);
}

type Point = { x: number; y: number };

/** All curves that are drawn, each as its points [px]. */
export async function drawnCurves(page: Page): Promise<Point[][]> {
  const paths = await page.locator(curves).evaluateAll((found) => found.map((path) => path.getAttribute('d') ?? ''));
  return paths.map((path) =>
    [...path.matchAll(/(-?[\d.]+),(-?[\d.]+)/g)].map(([, x = '', y = '']) => ({ x: Number(x), y: Number(y) })),
  );
}

/** How far apart two drawings are at most [px]; time may have moved on by some seconds between them. */
export function apart(one: readonly Point[][], other: readonly Point[][]): number {
  if (one.length !== other.length) return Number.POSITIVE_INFINITY;
  const distances = one.flatMap((curve, index) =>
    curve.map(({ x, y }) => {
      const near = (other[index] ?? [])
        .filter((point) => Math.abs(point.x - x) < 3)
        .map((point) => Math.abs(point.y - y));
      return near.length === 0 ? 0 : Math.min(...near);
    }),
  );
  return Math.max(0, ...distances);
}

const standingLine =
  'Before anyone goes in: you can see the bottom drain and its cover is whole, an adult is watching and doing nothing else, no thunder in the last 30 minutes.';

/** What the care rules say about the headline, whatever the state. */
export async function readSheet(stage: Stage, page: Page, sheet: WeekSheet): Promise<void> {
  const verdict = page.locator('[data-verdict]').first();
  const state = await verdict.getAttribute('data-verdict');
  stage.equal('the page shows the verdict that the server gave', state, sheet.verdict.state);
  const headline = (await verdict.getByRole('heading', { level: 1 }).innerText()).trim();
  const form = {
    'stay-out': /^Stay out: .+\.$/,
    wait: /^Wait until .+\.$/,
    'test-first': /^Test before anyone swims\.$/,
    fine: /^The water is fine for swimming until .+\.$/,
  }[sheet.verdict.state];
  stage.check('the headline is one of the four sentences', form.test(headline), headline);
  const text = await page.locator('main').innerText();
  stage.check(
    'nothing is called safe',
    !/\bsafe\b/i.test(text.replace(/keeping safe/gi, '')),
    text.match(/.{40}\bsafe\b.{40}/i),
  );
  if (sheet.verdict.state === 'fine')
    stage.check('the standing line is under a Fine', (await verdict.innerText()).includes(standingLine), headline);
}
