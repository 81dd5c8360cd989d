import type { Page } from 'playwright-core';

export type BoxFaults = {
  /** Text or controls that lie over each other. */
  overlaps: string[];
  /** Text that is cut off, or leaves the page at its side. */
  clipped: string[];
  /** Controls that are smaller than a finger; told on a touch screen only. */
  small: string[];
};

/** Measures where text and controls stand. An overlay that is meant says so with data-overlay on itself. */
export function boxFaults(page: Page): Promise<BoxFaults> {
  return page.evaluate(() => {
    type Box = { left: number; top: number; right: number; bottom: number };
    type Thing = { element: Element; box: Box; words: string; layer: Element | null; control: boolean };
    const tolerance = 1;
    const controls = 'a[href], button, input, select, textarea, [role=button], [role=tab], [role=option]';

    const layers = new Map<Element, Element | null>();
    /** The nearest thing that is fixed, sticks or was declared an overlay: it lies over the page on purpose. */
    const layerOf = (element: Element | null): Element | null => {
      if (element === null || element === document.documentElement) return null;
      const known = layers.get(element);
      if (known !== undefined) return known;
      const floats =
        ['fixed', 'sticky'].includes(getComputedStyle(element).position) || element.hasAttribute('data-overlay');
      const layer = floats ? element : layerOf(element.parentElement);
      layers.set(element, layer);
      return layer;
    };

    /** What can be seen of a box inside everything that cuts it; undefined when nothing can. */
    const cut = (
      box: Box,
      element: Element,
    ): { seen: Box | undefined; cutter: Element | undefined; scrolls: boolean } => {
      let seen: Box = { ...box };
      let cutter: Element | undefined;
      let scrolls = false;
      for (let at: Element | null = element; at && at !== document.body; at = at.parentElement) {
        const style = getComputedStyle(at);
        const inner = at.tagName === 'svg' && at.parentElement?.closest('svg');
        if ((style.overflowX === 'visible' && style.overflowY === 'visible') || inner) continue;
        if (at === element && getComputedStyle(at).display === 'inline') continue;
        const frame = at.getBoundingClientRect();
        const before = seen;
        seen = {
          left: style.overflowX === 'visible' ? seen.left : Math.max(seen.left, frame.left),
          right: style.overflowX === 'visible' ? seen.right : Math.min(seen.right, frame.right),
          top: style.overflowY === 'visible' ? seen.top : Math.max(seen.top, frame.top),
          bottom: style.overflowY === 'visible' ? seen.bottom : Math.min(seen.bottom, frame.bottom),
        };
        const lost =
          seen.left - before.left > tolerance ||
          before.right - seen.right > tolerance ||
          seen.top - before.top > tolerance ||
          before.bottom - seen.bottom > tolerance;
        if (!lost) continue;
        const scroller = ['auto', 'scroll'].includes(style.overflowX) || ['auto', 'scroll'].includes(style.overflowY);
        scrolls ||= scroller;
        if (!scroller) cutter ??= at;
      }
      const visible = seen.right - seen.left > 1 && seen.bottom - seen.top > 1;
      return { seen: visible ? seen : undefined, cutter, scrolls };
    };

    const nameOf = (element: Element, words: string) =>
      `<${element.tagName.toLowerCase()}> "${words.replace(/\s+/g, ' ').trim().slice(0, 44)}"`;
    const hidden = (element: Element) =>
      !element.checkVisibility({ visibilityProperty: true, opacityProperty: true }) ||
      element.closest('script, style, template, next-route-announcer, title, desc, defs, [data-base-ui-inert]') !==
        null;
    /** Read out, not seen. */
    const forReaders = (element: Element): boolean => {
      for (let at: Element | null = element; at; at = at.parentElement) {
        const style = getComputedStyle(at);
        if (style.clipPath === 'inset(50%)' || style.clip === 'rect(0px, 0px, 0px, 0px)') return true;
      }
      return false;
    };

    const things: Thing[] = [];
    const clipped = new Set<string>();
    const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
    for (let node = walker.nextNode(); node; node = walker.nextNode()) {
      const element = node.parentElement;
      const words = node.textContent ?? '';
      if (!element || words.trim() === '' || hidden(element) || forReaders(element)) continue;
      const size = Number.parseFloat(getComputedStyle(element).fontSize);
      const range = document.createRange();
      range.selectNodeContents(node);
      for (const rect of range.getClientRects()) {
        if (rect.width < 1 || rect.height < 1) continue;
        // The letters stand within one em round the middle of their line; the rest of the box is air.
        const air = Math.max(0, (rect.height - size) / 2);
        const box = { left: rect.left, right: rect.right, top: rect.top + air, bottom: rect.bottom - air };
        const { seen, cutter, scrolls } = cut(box, element);
        if (cutter && !scrolls)
          clipped.add(
            `${nameOf(element, words)} cut by <${cutter.tagName.toLowerCase()} class="${(cutter.getAttribute('class') ?? '').slice(0, 50)}">`,
          );
        if (!seen) continue;
        if (!scrolls && (seen.left < -tolerance || seen.right > innerWidth + tolerance))
          clipped.add(
            `${nameOf(element, words)} leaves the page: ${Math.round(seen.left)} to ${Math.round(seen.right)} of ${innerWidth}`,
          );
        things.push({ element, box: seen, words, layer: layerOf(element), control: false });
      }
    }

    const small = new Set<string>();
    const touch = matchMedia('(pointer: coarse)').matches;
    for (const element of document.querySelectorAll(controls)) {
      if (hidden(element) || forReaders(element)) continue;
      const rect = element.getBoundingClientRect();
      const { seen } = cut(rect, element);
      if (!seen) continue;
      const words = element.getAttribute('aria-label') ?? element.textContent ?? '';
      const inSentence = getComputedStyle(element).display === 'inline';
      const style = getComputedStyle(element, '::before');
      const grown =
        style.content !== 'none' && style.position === 'absolute' ? Number.parseFloat(style.height) || 0 : 0;
      const labelled = element instanceof HTMLInputElement && element.closest('label')?.getBoundingClientRect();
      const height = Math.max(rect.height, grown, labelled ? labelled.height : 0);
      if (touch && !inSentence && height < 43.5)
        small.add(`${nameOf(element, words)} ${Math.round(rect.width)} x ${Math.round(height)}`);
      // A line of a sentence is measured as text.
      if (!inSentence) things.push({ element, box: seen, words, layer: layerOf(element), control: true });
    }

    const overlaps = new Set<string>();
    const sorted = things.toSorted((a, b) => a.box.top - b.box.top);
    for (const [index, one] of sorted.entries())
      for (const other of sorted.slice(index + 1)) {
        if (other.box.top >= one.box.bottom - tolerance) break;
        if (one.layer !== other.layer || one.element === other.element) continue;
        // Text may stand in its own control; the letters of one sentence are measured line by line.
        if (one.element.contains(other.element) || other.element.contains(one.element)) {
          if (one.control || other.control) continue;
        }
        const across = Math.min(one.box.right, other.box.right) - Math.max(one.box.left, other.box.left);
        const down = Math.min(one.box.bottom, other.box.bottom) - Math.max(one.box.top, other.box.top);
        if (across > tolerance && down > tolerance)
          overlaps.add(
            `${nameOf(one.element, one.words)} and ${nameOf(other.element, other.words)} by ${across.toFixed(1)} x ${down.toFixed(1)}`,
          );
      }
    return { overlaps: [...overlaps], clipped: [...clipped], small: [...small] };
  });
}

/** How far the page is wider than the screen [px]. */
export function sidewaysScroll(page: Page): Promise<number> {
  return page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
}
