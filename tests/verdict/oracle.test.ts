import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type SwimState, swimVerdict, type SwimVerdictInput } from '@/lib/verdict';
import { HOUR, now } from './inputs';

/**
 * care.md 2 read a second time, by somebody who has not seen lib/verdict: one long list of conditions with the printed
 * numbers, looked up hour by hour. Slow and plain on purpose.
 */
function oracle(input: SwimVerdictInput, t: number): SwimState {
  const { readings, limits, open, sinceReading, projection: p } = input;
  const fc0 = readings.freeChlorine;
  const ph0 = readings.pH && !(fc0 && fc0.takenAt === readings.pH.takenAt && fc0.value > 10) ? readings.pH : undefined;
  const newest = Math.max(...[fc0, readings.pH].map((r) => r?.takenAt ?? -Infinity));

  let water: { low: number; mid: number; high: number; lowest: number; limit: number; pH: number } | undefined;
  if (p && newest <= p.hours[0]! + 60_000 && t >= p.hours[0]! - 60_000 && t <= p.hours.at(-1)!) {
    const clamped = Math.max(t, p.hours[0]!);
    for (let i = 0; i < p.hours.length; i++) {
      const a = p.hours[i]!;
      const b = p.hours[i + 1] ?? a;
      if (clamped < a || (clamped >= b && b > a)) continue;
      const doses = input.waits.map((w) => w.from).filter((d) => d > a && d <= b);
      const s = b === a ? 0 : doses.length === 0 ? (clamped - a) / (b - a) : doses.some((d) => clamped >= d) ? 1 : 0;
      const at = (xs: readonly number[]) => xs[i]! + s * ((xs[i + 1] ?? xs[i]!) - xs[i]!);
      const f = p.freeChlorine;
      water = {
        low: at(f.p10),
        mid: at(f.p50),
        high: at(f.p90),
        lowest: at(f.lowestLevel),
        limit: at(f.swimLimit),
        pH: at(p.pH.p50),
      };
      break;
    }
  }
  const counts = (r: { takenAt: number } | undefined) => r && t - r.takenAt <= (water ? HOUR : 48 * HOUR);
  const chlorines = [
    ...(fc0 && counts(fc0) ? [{ v: fc0.value, lowest: limits.lowestLevel, limit: limits.swimLimit }] : []),
    ...(water ? [{ v: water.mid, lowest: water.lowest, limit: water.limit }] : []),
  ];
  const pHs = ph0 ? [...(counts(ph0) ? [ph0.value] : []), ...(water ? [water.pH] : [])] : [];

  if (
    open.cloudy ||
    open.green ||
    open.accident ||
    open.drainCoverBroken ||
    open.electricitySuspected ||
    open.situationOpen ||
    open.suspectedDoubleDose
  )
    return 'stay-out';
  if (chlorines.some((c) => c.v < limits.codeMinimum || c.v > 10)) return 'stay-out';
  if (pHs.some((v) => v < 7.0 || v > 8.0)) return 'stay-out';

  if (input.waits.some((w) => w.from <= t && t < w.until)) return 'wait';
  if (chlorines.some((c) => c.v > c.limit || c.v < c.lowest)) return 'wait';
  if (pHs.some((v) => v < 7.2 || v > 7.8)) return 'wait';
  if (readings.combinedChlorine && readings.combinedChlorine.value > 0.4) return 'wait';

  if (!fc0 || !ph0 || t - fc0.takenAt > 48 * HOUR || t - ph0.takenAt > 48 * HOUR || !water) return 'test-first';
  if (water.low < limits.codeMinimum || water.high > 10) return 'test-first';
  let rain = sinceReading.rainMillimetres;
  for (const r of input.ahead?.rain ?? []) {
    const span = Math.min(r.until, t) - Math.max(r.from, input.now);
    if (span > 0) rain += (r.amount / (r.until - r.from)) * span;
  }
  if (rain > 10 || sinceReading.storm || sinceReading.pumpFailure || sinceReading.dueDoseOpen) return 'test-first';
  if (
    sinceReading.doubtfulTick ||
    sinceReading.coverOffAfterAWeek ||
    sinceReading.situationEndedEarly ||
    open.falseZero
  )
    return 'test-first';
  let swimmers = sinceReading.swimmerHoursInADay;
  for (const d of input.ahead?.swimmerHours ?? []) {
    const share = Math.min(1, Math.max(0, (t - d.from) / (d.until - d.from)));
    swimmers = Math.max(swimmers, share * d.amount);
  }
  if (swimmers * 4 > input.volume) return 'test-first';
  return 'fine';
}

const seldom = fc.integer({ min: 0, max: 39 }).map((die) => die === 0);
const hours = (min: number, max: number) => fc.integer({ min: min * 60, max: max * 60 }).map((m) => m * 60_000);

/** Walks from a start value: mostly inside the good range, often near a limit, with a jump now and then. */
const walk = (start: number, step: number, jump: number) =>
  fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 12, maxLength: 169 }).map((moves) => {
    let value = start;
    return moves.map((move) => {
      value += Math.abs(move) > 0.97 ? jump * Math.sign(move) : move * step;
      // Hundredths and a bit: never so near to a limit that the last digit of the arithmetic decides.
      return Math.round(value * 100) / 100 + 0.003;
    });
  });

const anyInput: fc.Arbitrary<SwimVerdictInput> = fc
  .record({
    middle: walk(3, 0.15, 1.5),
    spreadLow: fc.integer({ min: 5, max: 120 }).map((hundredths) => hundredths / 100),
    spreadHigh: fc.integer({ min: 5, max: 750 }).map((hundredths) => hundredths / 100),
    pH: walk(7.5, 0.03, 0.3),
    lowest: fc.constantFrom(1, 2, 2.2, 2.5, 3),
    swimLimit: fc.constantFrom(4, 5, 10),
    chlorineAge: hours(0, 60),
    pHAge: fc.option(hours(0, 60), { nil: undefined }),
    chlorine: fc.double({ min: 1, max: 12, noNaN: true }),
    readPH: fc.double({ min: 6.9, max: 8.1, noNaN: true }),
    combined: fc.option(fc.double({ min: 0, max: 0.45, noNaN: true }), { nil: undefined }),
    outlookAge: fc.option(hours(0, 3), { nil: undefined, freq: 12 }),
    waits: fc.array(fc.record({ from: hours(-10, 80), length: hours(0, 6) }), { maxLength: 2 }),
    rainSoFar: fc.double({ min: 0, max: 10.5, noNaN: true }),
    rainAhead: fc.array(
      fc.record({ from: hours(-10, 40), length: hours(1, 24), amount: fc.integer({ min: 0, max: 15 }) }),
      {
        maxLength: 2,
      },
    ),
    swimmersAhead: fc.array(
      fc.record({ from: hours(-5, 40), length: hours(1, 10), amount: fc.integer({ min: 0, max: 24 }) }),
      { maxLength: 2 },
    ),
    volume: fc.constantFrom(40, 75.7, 114),
    sinceReading: fc.record({
      storm: seldom,
      pumpFailure: seldom,
      dueDoseOpen: seldom,
      doubtfulTick: seldom,
      coverOffAfterAWeek: seldom,
      situationEndedEarly: seldom,
    }),
    open: fc.record({
      cloudy: seldom,
      green: seldom,
      accident: seldom,
      drainCoverBroken: seldom,
      electricitySuspected: seldom,
      situationOpen: seldom,
      suspectedDoubleDose: seldom,
      falseZero: seldom,
    }),
    together: fc.boolean(),
    bland: fc.boolean(),
  })
  .map((r): SwimVerdictInput => {
    const fcAt = now - r.chlorineAge;
    const phAt = r.together ? fcAt : r.pHAge === undefined ? undefined : now - r.pHAge;
    const start = Math.max(fcAt, phAt ?? fcAt) + (r.outlookAge ?? 0) - 30_000;
    const series = r.middle;
    const spread = (list: typeof r.rainAhead) =>
      list.map(({ from, length, amount }) => ({ from: now + from, until: now + from + length, amount }));
    return {
      now,
      volume: r.volume,
      swimDay: true,
      limits: { codeMinimum: Math.min(2, r.lowest), lowestLevel: r.lowest, swimLimit: r.swimLimit },
      readings: {
        // Half of the time a reading as good as the outlook, so that fine is met often enough.
        freeChlorine: { value: r.bland ? series[0]! : r.chlorine, takenAt: fcAt },
        ...(phAt !== undefined && { pH: { value: r.bland ? 7.5 : r.readPH, takenAt: phAt } }),
        ...(r.combined !== undefined && { combinedChlorine: { value: r.combined, takenAt: fcAt } }),
      },
      ...(r.outlookAge !== undefined && {
        projection: {
          hours: series.map((_, i) => start + i * HOUR),
          freeChlorine: {
            p10: series.map((v) => v - r.spreadLow),
            p50: series,
            p90: series.map((v) => v + r.spreadHigh),
            lowestLevel: series.map(() => r.lowest),
            swimLimit: series.map(() => r.swimLimit),
          },
          pH: { p50: series.map((_, i) => r.pH[Math.min(i, r.pH.length - 1)]!) },
        },
      }),
      waits: r.waits.map(({ from, length }) => ({ from: now + from, until: now + from + length })),
      sinceReading: { ...r.sinceReading, rainMillimetres: r.rainSoFar, swimmerHoursInADay: 0 },
      open: r.open,
      ahead: { rain: spread(r.rainAhead), swimmerHours: spread(r.swimmersAhead) },
    };
  });

describe('against an independent reading of care.md', () => {
  it('gives the same state, and fine only when none of the conditions holds', () => {
    const seen = new Map<SwimState, number>();
    fc.assert(
      fc.property(anyInput, (input) => {
        const { state, reasons } = swimVerdict(input);
        seen.set(state, (seen.get(state) ?? 0) + 1);
        expect(state).toBe(oracle(input, input.now));
        expect(reasons.length === 0).toBe(state === 'fine');
      }),
      { numRuns: 2000 },
    );
    // A property that only ever meets one state would prove nothing.
    for (const state of ['stay-out', 'wait', 'test-first', 'fine'] as const)
      expect(seen.get(state) ?? 0).toBeGreaterThan(100);
  });

  it('keeps a fine for all of its time and not a moment longer', () => {
    let fines = 0;
    fc.assert(
      fc.property(
        anyInput,
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 30, maxLength: 30 }),
        (input, shares) => {
          const { state, until } = swimVerdict(input);
          if (state !== 'fine') return;
          fines++;
          const end = until as number;
          for (const share of shares) expect(oracle(input, now + share * Math.max(0, end - 1 - now))).toBe('fine');
          expect(oracle(input, end + 2)).not.toBe('fine');
        },
      ),
      { numRuns: 2000 },
    );
    expect(fines).toBeGreaterThan(100);
  });

  it('ends a wait when nothing asks to wait any more and not before', () => {
    let waits = 0;
    const waiting = (state: SwimState) => state === 'wait' || state === 'stay-out';
    fc.assert(
      fc.property(
        anyInput,
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 30, maxLength: 30 }),
        (input, shares) => {
          const { state, until, then } = swimVerdict(input);
          if (state !== 'wait' || until === undefined) return;
          waits++;
          for (const share of shares)
            expect(waiting(oracle(input, now + share * Math.max(0, until - 2 - now)))).toBe(true);
          expect(oracle(input, until + 2)).toBe(then?.state);
        },
      ),
      { numRuns: 2000 },
    );
    expect(waits).toBeGreaterThan(100);
  });
});
