import type { TimeAxis } from './time-axis';
import { withJumps } from './water-curve';

/** Free chlorine of a week hour by hour [ms, mg/L], and when it jumps [ms]. */
type HourlyCourse = { at: readonly number[]; levels: readonly number[]; jumps: readonly number[] };

/**
 * Two weeks at the same instants, a quarter of an hour apart, so that one line can turn into another: dose hours are
 * quarter hours.
 */
export type TriedLevels = {
  from: number;
  plan: readonly number[];
  tried: readonly number[];
  /** The first place at which the two can be told apart; undefined where they never can. */
  differsAt: number | undefined;
};

export const LEVEL_STEP = 900_000;
/** A pixel of the lane [mg/L]. */
const TOLD_APART = 0.03;

/** Both weeks from now on. */
export function triedLevels(plan: HourlyCourse, tried: HourlyCourse, now: number): TriedLevels {
  const first = Math.max(now, plan.at[0] ?? now);
  const from = Math.ceil(first / LEVEL_STEP) * LEVEL_STEP;
  const sampled = { plan: sampledFrom(from, plan), tried: sampledFrom(from, tried) };
  const differing = sampled.tried.findIndex((level, place) => Math.abs(level - sampled.plan[place]!) > TOLD_APART);
  return { from, ...sampled, differsAt: differing < 0 ? undefined : differing };
}

/** The line in a lane, from just before the first difference on, cut to the axis; y of a level is given. */
export function triedPath(
  { from, differsAt = 0 }: Pick<TriedLevels, 'from' | 'differsAt'>,
  levels: readonly number[],
  { axis, x, y }: { axis: TimeAxis; x: (at: number) => number; y: (level: number) => number },
): string {
  const round = (value: number) => Math.round(value * 10) / 10;
  const points: string[] = [];
  for (let place = Math.max(0, differsAt - 1); place < levels.length; place++) {
    const at = from + place * LEVEL_STEP;
    if (at >= axis.from && at <= axis.to) points.push(`${round(x(at))} ${round(y(levels[place]!))}`);
  }
  return points.length < 2 ? '' : `M${points.join('L')}`;
}

function sampledFrom(from: number, { at, levels, jumps }: HourlyCourse): number[] {
  const points = withJumps(
    at.map((hour, index) => ({ at: hour, level: levels[index]! })),
    jumps,
  );
  const sampled: number[] = [];
  let after = 0;
  for (let instant = from; instant <= (at.at(-1) ?? from); instant += LEVEL_STEP) {
    // At the instant of a jump two points stand: what holds from then on is the later one.
    while (after < points.length && points[after]!.at <= instant) after++;
    const [before, next] = [points[after - 1], points[after]];
    if (before === undefined) continue;
    const share = next === undefined ? 0 : (instant - before.at) / (next.at - before.at);
    sampled.push(before.level + share * ((next ?? before).level - before.level));
  }
  return sampled;
}
