import type { Piece } from './piece';

const RUNS = 7;
/** Long enough for the clock, and for the machine's other work to spread evenly over a run [ms]. */
const LEAST_MILLISECONDS = 30;
/** And over so many inputs, whatever one takes. */
const LEAST_PASSES = 3;
/** The compiler has seen enough of a piece after so many passes, if they are long. */
const WARM_PASSES = 9;

/** A long run stands between longer stretches of the loop, one loop for so much of it [ms], up to so many. */
const MILLISECONDS_PER_LOOP = 100;
const MOST_LOOPS = 6;

/** What a piece costs: time of one pass, and the same as a multiple of the reference loop. */
export type Cost = { milliseconds: number; multiple: number };

/** 1e6 times exp and log10: what this machine can do. */
export const referenceLoop: Piece = {
  name: 'reference loop: 1e6 x exp + log10',
  run: (n) => {
    let sum = 0;
    for (let round = 0; round < n; round++)
      for (let index = 1; index <= 1e6; index++) sum += Math.exp(-index * 1e-6) + Math.log10(index);
    return sum;
  },
};

let kept = 0;

/**
 * The median of seven runs after a warm-up, and the median of their ratios to the reference loop. The loop is timed
 * before and after each run, and a ratio is taken of neighbours, so that a machine that grows slower for a while makes
 * both slower. The clock counts this process's own time on the processor: another process that is busy does not count.
 */
export function costOf({ run }: Piece): Cost {
  const { passes, took: atFirst } = warmUp(run);
  const loops = Math.min(MOST_LOOPS, Math.ceil(atFirst / MILLISECONDS_PER_LOOP));
  const times: number[] = [];
  const multiples: number[] = [];
  let loopBefore = timed(referenceLoop.run, loops) / loops;
  for (let round = 0; round < RUNS; round++) {
    const took = timed(run, passes) / passes;
    const loopAfter = timed(referenceLoop.run, loops) / loops;
    times.push(took);
    multiples.push(took / ((loopBefore + loopAfter) / 2));
    loopBefore = loopAfter;
  }
  return { milliseconds: median(times), multiple: median(multiples) };
}

/** Runs until the compiler has done its work; tells how many passes make a run long enough, and how long it then is [ms]. */
function warmUp(run: Piece['run']): { passes: number; took: number } {
  timed(referenceLoop.run, 2);
  for (let spent = 0, seen = 0; spent < 10 * LEAST_MILLISECONDS || seen < WARM_PASSES; seen += LEAST_PASSES)
    spent += timed(run, LEAST_PASSES) + 0.01;
  let passes = LEAST_PASSES;
  let last = timed(run, passes);
  for (; last < LEAST_MILLISECONDS; last = timed(run, passes)) passes *= 2;
  return { passes, took: last };
}

/** Processor time of this process [ms]. */
function timed(run: Piece['run'], passes: number): number {
  const before = process.cpuUsage();
  kept += run(passes);
  const { user, system } = process.cpuUsage(before);
  if (!Number.isFinite(kept)) throw new Error('A piece gave no number.');
  return (user + system) / 1000;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = (sorted.length - 1) / 2;
  return (sorted[Math.floor(middle)]! + sorted[Math.ceil(middle)]!) / 2;
}
