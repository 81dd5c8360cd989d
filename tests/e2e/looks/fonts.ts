import type { Page } from 'playwright-core';
import { families } from './tokens';

/** Text whose first family is none of the two that are shipped, families that are used and not loaded, text under 11.5 px. */
export function foreignFonts(page: Page): Promise<string[]> {
  return page.evaluate(async (shipped) => {
    await document.fonts.ready;
    const found = new Set<string>();
    const used = new Set<string>();
    for (const element of document.querySelectorAll('body, body *')) {
      if (element.closest('script, style, template, next-route-announcer')) continue;
      const own = [...element.childNodes]
        .filter((node) => node.nodeType === 3)
        .map((node) => node.textContent?.trim() ?? '');
      const isField = element instanceof HTMLInputElement || element instanceof HTMLTextAreaElement;
      if (own.join('') === '' && !isField) continue;
      if (!element.checkVisibility({ visibilityProperty: true })) continue;
      const style = getComputedStyle(element);
      const first = style.fontFamily.split(',')[0]?.replace(/["']/g, '').trim() ?? '';
      if (shipped.includes(first)) used.add(first);
      else found.add(`${style.fontFamily} on <${element.tagName.toLowerCase()}> ${own.join(' ').slice(0, 40)}`);
      const box = element.getBoundingClientRect();
      if (Number.parseFloat(style.fontSize) < 11.4 && box.width > 1)
        found.add(`${style.fontSize} on <${element.tagName.toLowerCase()}> ${own.join(' ').slice(0, 40)}`);
    }
    const loaded = new Set(
      [...document.fonts].filter(({ status }) => status === 'loaded').map(({ family }) => family.replace(/["']/g, '')),
    );
    for (const family of used) if (!loaded.has(family)) found.add(`${family} is used and not loaded`);
    return [...found];
  }, families);
}
