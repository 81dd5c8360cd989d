import { performance } from 'node:perf_hooks';
import { type Bench, benches } from './chemistry';
import { weekBenches } from './week';

const RUNS = 7;
const LEAST_MILLISECONDS = 40;

/** 1e6 times exp and log10: what this machine can do; every time below is also given as a multiple of it. */
const reference: Bench = {
  name: 'reference loop: 1e6 x exp + log10',
  run: (n) => {
    let sum = 0;
    for (let round = 0; round < n; round++)
      for (let index = 1; index <= 1e6; index++) sum += Math.exp(-index * 1e-6) + Math.log10(index);
    return sum;
  },
};

let kept = 0;

/** Milliseconds of one piece: median of seven runs after a warm-up, each run long enough for the clock. */
function measure({ run }: Bench): number {
  let n = 1;
  for (let took = 0; took < LEAST_MILLISECONDS; n = took < LEAST_MILLISECONDS ? n * 2 : n) took = timed(run, n);
  const runs = Array.from({ length: RUNS }, () => timed(run, n) / n);
  return runs.sort((a, b) => a - b)[Math.floor(RUNS / 2)]!;
}

function timed(run: Bench['run'], n: number): number {
  const from = performance.now();
  kept += run(n);
  return performance.now() - from;
}

const loop = measure(reference);
const rows = [...benches, ...weekBenches].map((bench) => ({ name: bench.name, took: measure(bench) }));
const inWords = (milliseconds: number) =>
  milliseconds < 0.1 ? `${(milliseconds * 1000).toPrecision(3)} us` : `${milliseconds.toPrecision(3)} ms`;
console.log(`${reference.name}: ${inWords(loop)}`);
for (const { name, took } of rows)
  console.log(`${name.padEnd(76)} ${inWords(took).padStart(9)}  ${(took / loop).toExponential(2)} x the loop`);
if (!Number.isFinite(kept)) process.exitCode = 1;
