import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import subsetFont from 'subset-font';

/**
 * `npm run fonts`: cuts the two faces down to what the pages use of them, into app/fonts. Of Fraunces that leaves the optical
 * sizes and weights of the type scale at one softness: with every axis it is 121 kB, and a phone at the pool waits for it.
 */
type Face = {
  family: string;
  /** The npm package, and its files' names without their subset. */
  source: string;
  file: (subset: string) => string;
  name: string;
  style: 'normal' | 'italic';
  subsets: readonly string[];
  weights: { min: number; max: number };
  otherAxes: Record<string, number | { min: number; max: number }>;
};

const fraunces = (style: 'normal' | 'italic'): Face => ({
  family: 'Fraunces Variable',
  source: 'fraunces',
  file: (subset) => `fraunces-${subset}-full-${style}.woff2`,
  name: style === 'normal' ? 'fraunces' : 'fraunces-italic',
  style,
  subsets: ['vietnamese', 'latin-ext', 'latin'],
  weights: { min: 420, max: 680 },
  otherAxes: { WONK: 0, SOFT: 70, opsz: { min: 14, max: 72 } },
});
const atkinson: Face = {
  family: 'Atkinson Hyperlegible Next Variable',
  source: 'atkinson-hyperlegible-next',
  file: (subset) => `atkinson-hyperlegible-next-${subset}-wght-normal.woff2`,
  name: 'atkinson',
  style: 'normal',
  subsets: ['latin-ext', 'latin'],
  weights: { min: 420, max: 760 },
  otherAxes: {},
};

const folder = join(import.meta.dirname, '../../app/fonts');
mkdirSync(folder, { recursive: true });
const rules: string[] = [];
for (const face of [fraunces('normal'), fraunces('italic'), atkinson])
  for (const subset of face.subsets) rules.push(await cut(face, subset));
writeFileSync(join(folder, 'faces.css'), `/* Written by npm run fonts. */\n${rules.join('')}`);

async function cut(face: Face, subset: string): Promise<string> {
  const source = join(import.meta.dirname, '../../node_modules/@fontsource-variable', face.source);
  const ranges = rangesOf(join(source, 'unicode.json'), subset);
  const whole = readFileSync(join(source, 'files', face.file(subset)));
  const part = await subsetFont(whole, charactersIn(ranges), {
    targetFormat: 'woff2',
    variationAxes: { wght: face.weights, ...face.otherAxes },
  });
  const file = `${face.name}-${subset}.woff2`;
  writeFileSync(join(folder, file), part);
  console.log(`${file}: ${whole.length} bytes, now ${part.length}`);
  return `
@font-face {
  font-family: '${familyOf(face, subset)}';
  font-style: ${face.style};
  font-display: swap;
  font-weight: ${face.weights.min} ${face.weights.max};
  src: url(./${file}) format('woff2');
  unicode-range: ${ranges};
}
`;
}

/**
 * The other subsets are a family of their own, named after the first in every list of families: while a face of one family
 * has not come, Chromium looks up the device's own faces beside it for every size of text.
 */
function familyOf({ family }: Face, subset: string): string {
  return subset === 'latin' ? family : `${family} Extended`;
}

function rangesOf(file: string, subset: string): string {
  const ranges: unknown = JSON.parse(readFileSync(file, 'utf8'))[subset];
  if (typeof ranges !== 'string') throw new Error(`${file} has no subset ${subset}.`);
  return ranges;
}

function charactersIn(ranges: string): string {
  return ranges
    .split(',')
    .flatMap((range) => {
      const [from = '', to = from] = range.replace('U+', '').split('-');
      const first = parseInt(from, 16);
      return Array.from({ length: parseInt(to, 16) - first + 1 }, (_, index) => String.fromCodePoint(first + index));
    })
    .join('');
}
