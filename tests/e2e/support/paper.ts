import type { Page } from 'playwright-core';
import { join } from 'node:path';
import type { Stage } from './journey';
import { shotsFolder } from './place';

/** Inside margins of 12 mm: as wide as A4, which is the narrower, as high as Letter, which is the shorter. */
export const paperSize = { width: 703, height: 965 };
const margin = { top: '12mm', bottom: '12mm', left: '12mm', right: '12mm' };

const pagesIn = (file: Buffer) => file.toString('latin1').match(/\/Type\s*\/Page\b/g)?.length ?? 0;

/** Prints a page on both papers and looks how many it takes. */
export async function takesOnePage(stage: Stage, page: Page, name: string): Promise<void> {
  for (const format of ['A4', 'Letter'] as const) {
    const path = join(shotsFolder, `${name}-${format}.pdf`);
    stage.equal(`${name}: one page of ${format}`, pagesIn(await page.pdf({ format, margin, path })), 1);
  }
}

/** What is neither black nor white nor nothing, of words, grounds, borders and drawings. */
export function inkOf(page: Page): Promise<string[]> {
  return page.locator('main, main *').evaluateAll((found) => {
    const allowed = ['rgb(0, 0, 0)', 'rgb(255, 255, 255)', 'rgba(0, 0, 0, 0)', 'none'];
    const inks = found
      .filter((each) => each.checkVisibility())
      .flatMap((each) => {
        const { color, backgroundColor, fill, stroke, opacity } = getComputedStyle(each);
        const drawn = each instanceof SVGElement ? [fill, stroke].filter((ink) => !ink.startsWith('url')) : [];
        return [color, backgroundColor, ...drawn, ...(opacity === '1' ? [] : [`opacity ${opacity}`])];
      });
    return [...new Set(inks.filter((ink) => !allowed.includes(ink)))];
  });
}
