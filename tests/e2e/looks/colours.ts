import type { Page } from 'playwright-core';
import { coloursOf, type Theme } from './tokens';

/** Every colour that is seen on the page and is no token, with the element it is on. */
export function foreignColours(page: Page, theme: Theme): Promise<string[]> {
  return page.evaluate((allowed) => {
    const canvas = document.createElement('canvas').getContext('2d');
    const known = new Map<string, boolean>();

    const channels = (colour: string): number[] => {
      const figures = colour.match(/-?[\d.]+(?:e-?\d+)?/g)?.map(Number) ?? [];
      if (colour.startsWith('rgb')) return [...figures.slice(0, 3), figures[3] ?? 1];
      // color(srgb 0.1 0.2 0.3 / 0.4)
      if (colour.startsWith('color(srgb')) return [...figures.slice(0, 3).map((part) => part * 255), figures[3] ?? 1];
      if (canvas === null) return [];
      canvas.fillStyle = colour;
      return channels(String(canvas.fillStyle));
    };
    const isToken = (colour: string): boolean => {
      const cached = known.get(colour);
      if (cached !== undefined) return cached;
      const [red = 0, green = 0, blue = 0, alpha = 1] = channels(colour);
      const yes =
        alpha === 0 ||
        allowed.some(
          ([r = 0, g = 0, b = 0, a = 1]) =>
            Math.abs(r - red) < 1.5 &&
            Math.abs(g - green) < 1.5 &&
            Math.abs(b - blue) < 1.5 &&
            Math.abs(a - alpha) < 0.006,
        );
      known.set(colour, yes);
      return yes;
    };
    const nameOf = (element: Element) => {
      const text = (element.textContent ?? '').trim().replace(/\s+/g, ' ').slice(0, 30);
      return `<${element.tagName.toLowerCase()} class="${(element.getAttribute('class') ?? '').slice(0, 60)}"> ${text}`;
    };

    const shapes = 'path, rect, circle, ellipse, line, polyline, polygon, text, tspan';
    const sides = ['Top', 'Right', 'Bottom', 'Left'] as const;
    const found = new Set<string>();
    const see = (element: Element, what: string, colour: string) => {
      if (!isToken(colour)) found.add(`${what} ${colour} on ${nameOf(element)}`);
    };
    const seeBox = (element: Element, style: CSSStyleDeclaration, part: string) => {
      see(element, `${part}background`, style.backgroundColor);
      for (const side of sides)
        if (style[`border${side}Style`] !== 'none' && Number.parseFloat(style[`border${side}Width`]) > 0)
          see(element, `${part}border`, style[`border${side}Color`]);
      if (style.outlineStyle !== 'none' && Number.parseFloat(style.outlineWidth) > 0)
        see(element, `${part}outline`, style.outlineColor);
      for (const list of [style.backgroundImage, style.boxShadow, style.filter])
        for (const colour of list.match(/(?:rgba?|color|oklch|oklab)\([^()]*\)/g) ?? [])
          see(element, `${part}drawn`, colour);
    };

    for (const element of document.querySelectorAll('html, body, body *')) {
      if (element.closest('clipPath, mask, script, style, template, next-route-announcer')) continue;
      const style = getComputedStyle(element);
      const inPattern = element.closest('defs, pattern') !== null;
      if (!inPattern && !element.checkVisibility({ visibilityProperty: true, opacityProperty: true })) continue;
      if (element instanceof SVGElement) {
        if (!element.matches(shapes)) continue;
        if (style.fill !== 'none' && !style.fill.startsWith('url')) see(element, 'fill', style.fill);
        if (style.stroke !== 'none' && !style.stroke.startsWith('url') && Number.parseFloat(style.strokeWidth) > 0)
          see(element, 'stroke', style.stroke);
        continue;
      }
      const hasText = [...element.childNodes].some(
        (node) => node.nodeType === 3 && (node.textContent ?? '').trim() !== '',
      );
      if (hasText || element instanceof HTMLInputElement) see(element, 'text', style.color);
      seeBox(element, style, '');
      for (const part of ['::before', '::after']) {
        const pseudo = getComputedStyle(element, part);
        if (pseudo.content !== 'none' && pseudo.content !== 'normal') seeBox(element, pseudo, `${part} `);
      }
      if (element instanceof HTMLInputElement && element.placeholder !== '')
        see(element, 'placeholder', getComputedStyle(element, '::placeholder').color);
    }
    return [...found];
  }, coloursOf(theme));
}
