import type { Page } from 'playwright-core';

/** What a browser leaves for later, because it is far below, keeps the colours and the size of before until it comes near. */
export async function layEverythingOut(page: Page): Promise<void> {
  await page.evaluate(() => {
    const sheet = new CSSStyleSheet();
    sheet.replaceSync('* { content-visibility: visible !important; }');
    document.adoptedStyleSheets = [...document.adoptedStyleSheets, sheet];
  });
}
