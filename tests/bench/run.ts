import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { chemistryPieces } from './chemistry';
import { learningPieces } from './learning';
import type { Piece } from './piece';
import { type Cost, costOf, referenceLoop } from './stopwatch';
import { ALLOWED, type Ratios, verdictsOn } from './verdict';
import { weekPieces } from './week';

const ratiosFile = join(import.meta.dirname, 'ratios.json');
/** A piece over its bound is measured again: what the machine did meanwhile does not come back, a slower piece does. */
const TRIES = 3;

const { values: asked } = parseArgs({
  options: {
    check: { type: 'boolean', default: false },
    keep: { type: 'boolean', default: false },
    browser: { type: 'boolean', default: false },
  },
});

const pieces = [...chemistryPieces, ...weekPieces, ...learningPieces];
const committed = asked.check ? (JSON.parse(readFileSync(ratiosFile, 'utf8')) as Ratios) : {};

console.log(`${referenceLoop.name}: ${inWords(costOf(referenceLoop).milliseconds)}`);
const ratios: Record<string, number> = {};
for (const piece of pieces) {
  const cost = steadyCost(piece);
  ratios[piece.name] = cost.multiple;
  const target = piece.target === undefined ? '' : `target ${inWords(piece.target)}`;
  console.log(
    `${piece.name.padEnd(52)}${inWords(cost.milliseconds).padStart(9)}  ${times(cost.multiple)} x the loop  ${target}`,
  );
}
if (asked.browser) await browse();
if (asked.keep) keep(ratios);
if (asked.check) check(ratios);

/**
 * A check goes by the best of up to three tries; kept for later checks is the worst of three. The loop calls compiled code
 * that another program on the same core slows more than it slows a piece (1.6 times, measured), so that on a busy core a
 * piece looks cheap: what is kept comes from the calmest of the three.
 */
function steadyCost(piece: Piece): Cost {
  const bound = asked.keep ? 0 : ALLOWED * (committed[piece.name] ?? Infinity);
  const costs = [costOf(piece)];
  while (costs.length < TRIES && costs[0]!.multiple > bound) {
    costs.push(costOf(piece));
    costs.sort((a, b) => a.multiple - b.multiple);
  }
  return asked.keep ? costs.at(-1)! : costs[0]!;
}

function keep(measured: Ratios): void {
  const rounded = Object.entries(measured).map(([name, multiple]) => [name, Number(multiple.toPrecision(3))]);
  writeFileSync(ratiosFile, `${JSON.stringify(Object.fromEntries(rounded), null, 2)}\n`);
}

/** A what-if in Chromium; beside the loop's time there is no multiple of it, the page has a clock of its own. */
async function browse(): Promise<void> {
  const { timeInChromium } = await import('./what-if/in-chromium');
  const { median, band, kilobytes } = await timeInChromium();
  const line = (name: string, { first, after }: { first: number; after: number }, target: number) =>
    console.log(
      `${name.padEnd(52)}${inWords(after).padStart(9)}  first time ${inWords(first)}  target ${inWords(target)}`,
    );
  line('what-if in Chromium, the median on the page', median, 16);
  line('what-if in Chromium, the band in a worker', band, 100);
  console.log(`engine for it: ${kilobytes.toFixed(0)} kB minified`);
}

/** The last line is read by the suite. */
function check(measured: Ratios): void {
  const verdicts = verdictsOn(measured, committed);
  const failed = verdicts.filter(({ passed }) => !passed);
  for (const { name, words } of failed) console.log(`TOO SLOW ${name}: ${words}`);
  if (failed.length > 0) process.exitCode = 1;
  console.log(`BENCH ${verdicts.length - failed.length} passed, ${failed.length} failed`);
}

function inWords(milliseconds: number): string {
  return milliseconds < 0.1 ? `${(milliseconds * 1000).toPrecision(3)} us` : `${milliseconds.toPrecision(3)} ms`;
}

function times(multiple: number): string {
  return multiple.toExponential(2);
}
