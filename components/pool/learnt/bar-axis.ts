import type { LearntRange } from '@/lib/schemas/learnt';

export type BarAxis = { from: number; to: number; ticks: number[]; decimals: number };

/** So much of what both bars span stays free beside them, for their words. */
const BESIDE = 0.3;
/** An axis begins at nothing unless the bars stand far from it. */
const FAR = 0.35;
const steps = [1, 2, 2.5, 5, 10] as const;

/** One axis for two bars, in round steps that can be written with few figures. */
export function barAxis(before: LearntRange, learnt: LearntRange): BarAxis {
  const low = Math.min(before.p10, learnt.p10);
  const high = Math.max(before.p90, learnt.p90);
  const span = high - low;
  const start = low < FAR * high ? 0 : low - BESIDE * span;
  const step = roundStep((high + BESIDE * span - start) / 4.5);
  const first = Math.floor(start / step + 1e-9);
  const last = Math.ceil((high + BESIDE * span) / step - 1e-9);
  const ticks = Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step);
  return { from: first * step, to: last * step, ticks, decimals: decimalsOf(step) };
}

/** The smallest round number that is no smaller. */
function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return power * (steps.find((step) => step * power >= least * (1 - 1e-9)) ?? 10);
}

function decimalsOf(step: number): number {
  return (
    [0, 1, 2, 3].find((decimals) => Math.abs(step * 10 ** decimals - Math.round(step * 10 ** decimals)) < 1e-6) ?? 4
  );
}
