import type { Page } from 'playwright-core';

export type LaneFaults = {
  /** How many words and how many curves were looked at: none would show nothing. */
  words: number;
  curves: number;
  overlaps: string[];
  clipped: string[];
  onCurve: string[];
  small: string[];
};

/** The smallest figure that the visual language knows [px]. */
const SMALLEST = 11.5;

/** Measures every word in the lanes of the week sheet: over others, cut off, on a curve, or too small to be read. */
export function laneFaults(page: Page, lanesName: string): Promise<LaneFaults> {
  return page.evaluate(
    ({ name, smallest }) => {
      type Box = { left: number; top: number; right: number; bottom: number };
      type Word = Box & { text: string; element: Element; lane: Element; size: number };
      const tolerance = 0.75;
      const region = document.querySelector(`[role=region][aria-label="${name}"]`);
      if (region === null) throw new Error('There are no lanes on this page.');
      const lanes = [...region.querySelectorAll('div.grid')].filter(
        (grid) => grid.firstElementChild?.classList.contains('sticky') === true,
      );
      const laneOf = (element: Element) => lanes.find((lane) => lane.contains(element));
      const hidden = (element: Element) =>
        !element.checkVisibility({ visibilityProperty: true, opacityProperty: true }) ||
        getComputedStyle(element).clipPath === 'inset(50%)' ||
        element.closest('.sr-only') !== null;

      const words: Word[] = [];
      const walker = document.createTreeWalker(region, NodeFilter.SHOW_TEXT);
      for (let node = walker.nextNode(); node; node = walker.nextNode()) {
        const element = node.parentElement;
        const text = (node.textContent ?? '').trim();
        const lane = element && laneOf(element);
        if (!element || !lane || text === '' || hidden(element)) continue;
        const size = Number.parseFloat(getComputedStyle(element).fontSize);
        const range = document.createRange();
        range.selectNodeContents(node);
        for (const rect of range.getClientRects()) {
          if (rect.width < 1) continue;
          // The letters stand within one em round the middle of their line; the rest of the box is air.
          const air = Math.max(0, (rect.height - size) / 2);
          const box = { left: rect.left, right: rect.right, top: rect.top + air, bottom: rect.bottom - air };
          words.push({ ...box, text, element, lane, size });
        }
      }
      const said = ({ text, left, top }: Word) => `"${text.slice(0, 40)}" (${Math.round(left)}, ${Math.round(top)})`;

      const overlaps: string[] = [];
      for (const [index, one] of words.entries())
        for (const other of words.slice(index + 1)) {
          if (one.element === other.element) continue;
          const across = Math.min(one.right, other.right) - Math.max(one.left, other.left);
          const down = Math.min(one.bottom, other.bottom) - Math.max(one.top, other.top);
          if (across > tolerance && down > tolerance)
            overlaps.push(`${said(one)} and ${said(other)} by ${across.toFixed(1)} x ${down.toFixed(1)}`);
        }

      const clipped: string[] = [];
      for (const word of words) {
        const [gutter, plot] = [word.lane.children[0], word.lane.children[1]];
        const column = plot?.contains(word.element)
          ? ([...plot.children].find((child) => child.contains(word.element) && plot.children.length === 7) ?? plot)
          : gutter;
        const frame = (column ?? word.lane).getBoundingClientRect();
        if (
          word.left < frame.left - tolerance ||
          word.right > frame.right + tolerance ||
          word.top < frame.top - 1.5 ||
          word.bottom > frame.bottom + 1.5
        )
          clipped.push(
            `${said(word)} ${Math.round(word.right - word.left)} wide leaves ${[frame.left, frame.top, frame.right, frame.bottom].map(Math.round).join(', ')}`,
          );
      }

      const curves = [...region.querySelectorAll<SVGPathElement>('path.recharts-line-curve')];
      const onCurve: string[] = [];
      for (const curve of curves) {
        const matrix = curve.getScreenCTM();
        const lane = laneOf(curve);
        if (matrix === null || lane === undefined) continue;
        const beside = words.filter((word) => word.lane === lane && word.element.closest('svg') !== null);
        const struck = new Set<Word>();
        // Straight from hour to hour: the points of the path are all there is to follow, at steps of two pixels at most.
        for (const piece of (curve.getAttribute('d') ?? '').split('M')) {
          const points = [...piece.matchAll(/(-?[\d.]+),(-?[\d.]+)/g)].map(([, x, y]) =>
            new DOMPoint(Number(x), Number(y)).matrixTransform(matrix),
          );
          for (const [index, from] of points.entries()) {
            const to = points[index + 1] ?? from;
            const steps = Math.max(1, Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / 2));
            for (let step = 0; step <= steps; step += 1) {
              const [x, y] = [from.x + ((to.x - from.x) * step) / steps, from.y + ((to.y - from.y) * step) / steps];
              for (const word of beside)
                if (x > word.left && x < word.right && y > word.top + 1 && y < word.bottom - 1) struck.add(word);
            }
          }
        }
        for (const word of struck) onCurve.push(`${said(word)} on a line of ${getComputedStyle(curve).stroke}`);
      }

      const small = words.filter(({ size }) => size < smallest - 0.01).map((word) => `${said(word)} ${word.size} px`);
      return { words: words.length, curves: curves.length, overlaps, clipped, onCurve, small };
    },
    { name: lanesName, smallest: SMALLEST },
  );
}
