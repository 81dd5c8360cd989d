import { limits } from '@/lib/standards/limits';

/** A week as it is projected, hour by hour, from now on [ms, mg/L, pH]. */
export type SeenWeek = {
  at: readonly number[];
  middle: readonly number[];
  lowestLevel: readonly number[];
  pH: readonly number[];
  /** The low edge of the likely range, and what it must not go under; left out while only the median was asked. */
  edge?: { low: readonly number[]; codeMinimum: readonly number[] };
};

/** What both weeks share. */
export type SeenPool = {
  swimLimit: number;
  /** Whether somebody may swim at each of the hours. */
  swims: readonly boolean[];
};

/** One thing that is to be said of a tried week; instants in ms, levels in mg/L. */
export type TryOutFact =
  | { code: 'meets'; limit: MetLimit; at: number; level: number }
  | { code: 'meets-earlier' | 'meets-later'; limit: MetLimit; at: number; planAt: number; level: number }
  | { code: 'still-meets'; limit: MetLimit; at: number; level: number }
  | { code: 'no-longer-meets'; limit: MetLimit; planAt: number }
  | { code: 'hours-closed' | 'hours-opened'; hours: number }
  | { code: 'moves'; at: number; by: number }
  | { code: 'hardly-moves' };

export const metLimits = ['lowest-level', 'swim-limit', 'code-minimum', 'pH-low', 'pH-high'] as const;
export type MetLimit = (typeof metLimits)[number];

const HOUR = 3_600_000;
/** Two meetings nearer to each other are the same one: times ahead are parts of the day. */
const SAME_MEETING = 3 * HOUR;
/** What no test at a pool can tell from nothing [mg/L]. */
const NOTICED = 0.1;

/**
 * What a tried week does that the plan's own does not: limits first, in the order of the verdict, then swim hours, and
 * where no limit is concerned how far free chlorine moves.
 */
export function factsOf(plan: SeenWeek, tried: SeenWeek, pool: SeenPool): TryOutFact[] {
  const met = metLimits.flatMap((limit) => meetingsCompared(limit, plan, tried, pool));
  const open = openHours(tried, pool) - openHours(plan, pool);
  const hours: TryOutFact[] =
    open === 0 ? [] : [{ code: open < 0 ? 'hours-closed' : 'hours-opened', hours: Math.abs(open) }];
  const told = [...met, ...hours];
  // A limit that both weeks meet alike says nothing of what was tried; one is enough to say that the plan meets any.
  const still = told.find(({ code }) => code === 'still-meets');
  const news = told.filter(({ code }) => code !== 'still-meets');
  return [...(news.length > 0 ? news : [furthestMove(plan, tried)]), ...(still ? [still] : [])];
}

function meetingsCompared(limit: MetLimit, plan: SeenWeek, tried: SeenWeek, pool: SeenPool): TryOutFact[] {
  const planned = meetingOf(limit, plan, pool);
  const found = meetingOf(limit, tried, pool);
  if (!found) return planned ? [{ code: 'no-longer-meets', limit, planAt: planned.at }] : [];
  if (!planned) return [{ code: 'meets', limit, ...found }];
  if (Math.abs(found.at - planned.at) < SAME_MEETING) return [{ code: 'still-meets', limit, ...found }];
  const code = found.at < planned.at ? 'meets-earlier' : 'meets-later';
  return [{ code, limit, ...found, planAt: planned.at }];
}

/** The first hour at which a limit is met, and free chlorine or pH there. */
function meetingOf(limit: MetLimit, week: SeenWeek, pool: SeenPool): { at: number; level: number } | undefined {
  const isMet = (hour: number) => {
    switch (limit) {
      case 'lowest-level':
        return week.middle[hour]! < week.lowestLevel[hour]!;
      case 'swim-limit':
        return pool.swims[hour] === true && week.middle[hour]! > pool.swimLimit;
      case 'code-minimum':
        return week.edge !== undefined && week.edge.low[hour]! < week.edge.codeMinimum[hour]!;
      case 'pH-low':
        return week.pH[hour]! < limits.pHRangeLow.value;
      case 'pH-high':
        return week.pH[hour]! > limits.pHRangeHigh.value;
    }
  };
  const hour = week.at.findIndex((_, index) => isMet(index));
  if (hour < 0) return undefined;
  const level = limit === 'pH-low' || limit === 'pH-high' ? week.pH[hour]! : week.middle[hour]!;
  return { at: week.at[hour]!, level };
}

/** Swim hours in which free chlorine and pH keep the verdict's limits. */
function openHours({ at, middle, lowestLevel, pH }: SeenWeek, { swims, swimLimit }: SeenPool): number {
  const fits = (hour: number) =>
    middle[hour]! >= lowestLevel[hour]! &&
    middle[hour]! <= swimLimit &&
    pH[hour]! >= limits.pHRangeLow.value &&
    pH[hour]! <= limits.pHRangeHigh.value;
  return at.filter((_, hour) => swims[hour] === true && fits(hour)).length;
}

function furthestMove(plan: SeenWeek, tried: SeenWeek): TryOutFact {
  const moves = tried.middle.map((level, hour) => level - plan.middle[hour]!);
  const furthest = moves.reduce((far, move, hour) => (Math.abs(move) > Math.abs(moves[far]!) ? hour : far), 0);
  const by = moves[furthest] ?? 0;
  return Math.abs(by) < NOTICED ? { code: 'hardly-moves' } : { code: 'moves', at: tried.at[furthest]!, by };
}
