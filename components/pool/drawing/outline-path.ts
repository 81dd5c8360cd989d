import { breadth, type DrawnPool } from './drawn-pool';

/** Tenths of a pixel are as fine as a screen draws. */
export function px(value: number): number {
  return Math.round(value * 10) / 10;
}

/** The water's edge seen from above, its upper left corner at x, y; `scale` in pixels a metre. */
export function outlinePath(pool: DrawnPool, x: number, y: number, scale: number): string {
  const w = pool.length * scale;
  const h = breadth(pool) * scale;
  switch (pool.shape) {
    case 'rectangle':
      return `M${px(x)} ${px(y)}H${px(x + w)}V${px(y + h)}H${px(x)}Z`;
    case 'oval':
    case 'round': {
      const [rx, ry] = [px(w / 2), px(h / 2)];
      return `M${px(x)} ${px(y + h / 2)}a${rx} ${ry} 0 1 1 ${px(w)} 0a${rx} ${ry} 0 1 1 ${px(-w)} 0Z`;
    }
    case 'freeform':
      return kidney(x, y + h / 2, w, pool.width * scale, pool.secondWidth * scale);
  }
}

/** Two lobes of their own widths and a waist on one side. */
function kidney(x: number, middle: number, w: number, a: number, b: number): string {
  const waist = Math.min(a, b) * 0.24;
  const at = (share: number, off: number) => `${px(x + w * share)} ${px(middle + off)}`;
  return [
    `M${at(0, 0)}`,
    `C${at(0, -a * 0.32)} ${at(0.12, -a / 2)} ${at(0.27, -a / 2)}`,
    `C${at(0.4, -a / 2)} ${at(0.42, -waist)} ${at(0.5, -waist)}`,
    `C${at(0.58, -waist)} ${at(0.6, -b / 2)} ${at(0.73, -b / 2)}`,
    `C${at(0.88, -b / 2)} ${at(1, -b * 0.32)} ${at(1, 0)}`,
    `C${at(1, b * 0.32)} ${at(0.88, b / 2)} ${at(0.72, b / 2)}`,
    `C${at(0.56, b / 2)} ${at(0.44, a / 2)} ${at(0.28, a / 2)}`,
    `C${at(0.12, a / 2)} ${at(0, a * 0.32)} ${at(0, 0)}Z`,
  ].join('');
}
