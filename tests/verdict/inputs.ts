import type { SwimProjection, SwimVerdictInput } from '@/lib/verdict';

export const HOUR = 3_600_000;
/** Sunday evening in New York, an hour after the test. */
export const now = Date.parse('2026-07-05T20:00:00-04:00');
export const takenAt = now - HOUR;

type Level = number | readonly number[];
export type Levels = { p10?: Level; p50?: Level; p90?: Level; lowestLevel?: Level; swimLimit?: Level; pH?: Level };

/** A week of good water from `start` on; a level is held, or follows the given values and then holds the last. */
export function outlook(levels: Levels = {}, start = takenAt, count = 169): SwimProjection {
  const hours = Array.from({ length: count }, (_, hour) => start + hour * HOUR);
  const series = (level: Level) =>
    hours.map((_, hour) => (typeof level === 'number' ? level : (level[Math.min(hour, level.length - 1)] as number)));
  const { p10 = 2.6, p50 = 3, p90 = 3.4, lowestLevel = 2.2, swimLimit = 4, pH = 7.5 } = levels;
  return {
    hours,
    freeChlorine: {
      p10: series(p10),
      p50: series(p50),
      p90: series(p90),
      lowestLevel: series(lowestLevel),
      swimLimit: series(swimLimit),
    },
    pH: { p50: series(pH) },
  };
}

/** Water about which there is nothing to say: fine. */
export const good: SwimVerdictInput = {
  now,
  volume: 75.7,
  swimDay: false,
  limits: { codeMinimum: 2, lowestLevel: 2.2, swimLimit: 4 },
  readings: { freeChlorine: { value: 3, takenAt }, pH: { value: 7.5, takenAt } },
  projection: outlook(),
  waits: [],
  sinceReading: {
    rainMillimetres: 0,
    storm: false,
    swimmerHoursInADay: 0,
    pumpFailure: false,
    dueDoseOpen: false,
    doubtfulTick: false,
    coverOffAfterAWeek: false,
    situationEndedEarly: false,
  },
  open: {
    cloudy: false,
    green: false,
    accident: false,
    drainCoverBroken: false,
    electricitySuspected: false,
    situationOpen: false,
    suspectedDoubleDose: false,
    falseZero: false,
  },
};

export function withSince(since: Partial<SwimVerdictInput['sinceReading']>): SwimVerdictInput {
  return { ...good, sinceReading: { ...good.sinceReading, ...since } };
}

export function withOpen(open: Partial<SwimVerdictInput['open']>): SwimVerdictInput {
  return { ...good, open: { ...good.open, ...open } };
}

export function withOutlook(levels: Levels, start?: number, count?: number): SwimVerdictInput {
  return { ...good, projection: outlook(levels, start, count) };
}

export function withReadings(readings: SwimVerdictInput['readings']): SwimVerdictInput {
  return { ...good, readings: { ...good.readings, ...readings } };
}

export function withoutOutlook(input: SwimVerdictInput): SwimVerdictInput {
  const rest = { ...input };
  delete rest.projection;
  return rest;
}
