import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { describeLearnt, learnFrom, type PoolHistory } from '@/lib/learning';
import { bandOfCourses, settingOf } from '@/lib/projection';
import { choleskyFactor } from '@/lib/projection/cholesky';
import { ensembleOf } from '@/lib/projection/ensemble';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import { learntStart } from '@/lib/projection/learnt-start';
import { measuredQuantities, measuredRange } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import { type PosteriorStep, posteriorStepSchema } from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { propertySeed } from '../support/property-seed';
import { aPool, aWeek } from '../projection/pools';
import { HOUR } from './simulated-pools';

const runs = process.env.LONG === '1' ? 1500 : 60;
const beginning = Date.parse('2026-02-20T12:00:00Z');
const LONGEST = 150 * 24;

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const instant = fc.oneof(fc.integer({ min: 0, max: LONGEST }), fc.constantFrom(100, 100, 124, 268));
const ms = (hour: number) => beginning + hour * HOUR;

const pool = fc
  .record({
    volume: real(1, 1000),
    meanDepth: real(0.2, 4),
    latitude: real(-66, 66),
    timeZone: fc.constantFrom('America/New_York', 'Europe/Madrid', 'Indian/Mauritius', 'Australia/Lord_Howe'),
    sunExposure: real(0, 1),
    cover: fc.constantFrom('none', 'floating', 'opaque'),
    waterFeatures: fc.boolean(),
    pump: fc.constantFrom([], [{ from: '08:00', to: '16:00' }], [{ from: '22:00', to: '06:00' }]),
    feeder: fc.constantFrom({ kind: 'none' }, { kind: 'floating', ingredient: 'trichlor', capacity: 4 }),
  })
  .map((changes) => aPool(changes));

/** Values that a schema lets through, the usual ones more often than the ends of the range. */
const usualRange: Record<(typeof measuredQuantities)[number], [number, number]> = {
  freeChlorine: [0, 12],
  combinedChlorine: [0, 2],
  pH: [6.8, 8.4],
  totalAlkalinity: [20, 200],
  calciumHardness: [0, 600],
  cyanuricAcid: [0, 150],
  temperature: [5, 38],
};
const value = (quantity: (typeof measuredQuantities)[number]) => {
  const usual = real(...usualRange[quantity]);
  const possible = real(measuredRange[quantity][0], measuredRange[quantity][1]);
  const interval = fc.tuple(usual, usual).map(([a, b]) => ({ low: Math.min(a, b), high: Math.max(a, b) }));
  return fc.option(fc.oneof({ weight: 5, arbitrary: usual }, { weight: 1, arbitrary: possible }, interval), {
    nil: undefined,
  });
};
const reading: fc.Arbitrary<Reading> = fc
  .tuple(
    instant,
    fc.constantFrom<Reading['method']>('strip', 'drop-kit', 'slip'),
    fc.record(Object.fromEntries(measuredQuantities.map((quantity) => [quantity, value(quantity)]))),
  )
  .map(([hour, method, values]) => ({ ...values, method, takenAt: new Date(ms(hour)).toISOString() }));

const dose: fc.Arbitrary<(volume: number) => WeekDose> = fc.oneof(
  fc
    .tuple(instant, fc.integer({ min: 1, max: 8 }), fc.constantFrom(20, 200, 227), real(1, 91))
    .map(([hour, count, tabletMass, strength]) => (): WeekDose => ({
      at: ms(hour),
      kind: 'tablets',
      load: { count, tabletMass, strength, erodedShare: 0 },
    })),
  fc
    .tuple(
      instant,
      fc.constantFrom(
        'sodium-hypochlorite',
        'hydrochloric-acid',
        'sodium-carbonate',
        'dichlor',
        'sodium-thiosulfate' as const,
      ),
      real(0.1, 60),
    )
    .map(
      ([hour, substance, perCubicMetre]) =>
        (volume: number): WeekDose =>
          weekDose(ms(hour), { substance, amount: perCubicMetre * volume }, volume),
    ),
);

const history: fc.Arbitrary<PoolHistory> = fc
  .record({
    pool,
    readings: fc.array(reading, { minLength: 1, maxLength: 6 }),
    again: fc.boolean(),
    doses: fc.array(dose, { maxLength: 8 }),
    weather: fc.array(
      fc.record({ sky: real(0, 1), rain: real(0, 200), swimmerHours: real(0, 200), backwash: real(0, 20) }),
      { maxLength: 30 },
    ),
    tabletsLeft: fc.array(
      fc.record({ at: instant.map((hour) => new Date(ms(hour)).toISOString()), tablets: real(0, 9) }),
      {
        maxLength: 3,
      },
    ),
  })
  .map(({ pool: made, readings, again, doses, weather, tabletsLeft }) => ({
    pool: made,
    readings: again ? [...readings, ...readings.slice(0, 2)] : readings,
    doses: doses.map((each) => each(made.volume)),
    days: Object.fromEntries(
      weather.map((day, index) => [new Date(ms(5 * 24 * index)).toISOString().slice(0, 10), day]),
    ),
    tabletsLeft,
    loads: [],
  }));

function requireSound({ posterior, state }: PosteriorStep): void {
  for (const covariance of [posterior.covariance, state.covariance]) {
    const transposed = covariance.map((_, at) => covariance.map((row) => row[at]!));
    expect(covariance).toEqual(transposed);
    const factor = choleskyFactor(covariance);
    expect(factor.every((row, at) => row.every(Number.isFinite) && row[at]! > 0)).toBe(true);
  }
  expect(Math.min(...Object.values(posterior.sigmas))).toBeGreaterThan(0);
}

/** The hours at which a band is not in order; NaN is in no order. */
function disorder({ p10, p50, p90 }: { p10: number[]; p50: number[]; p90: number[] }): number[] {
  return p50.flatMap((middle, hour) => (p10[hour]! <= middle && middle <= p90[hour]! ? [] : [hour]));
}

function requireOrderedBand(made: Pool, { posterior }: PosteriorStep): void {
  const { takenAt, water, errors, loads } = learntStart(posterior);
  const forcing = prepareForcing(made, takenAt, aWeek(), water.temperature);
  const setting = settingOf(made, water.temperature, posterior.medians);
  const members = ensembleOf(water, errors, loads, setting, { covariance: posterior.covariance });
  const bands = bandOfCourses(members.map((each) => integrateWeek(forcing, each.start, [], each.setting)));
  for (const band of Object.values(bands)) expect(disorder(band)).toEqual([]);
}

describe('learning from any history that a household might leave', () => {
  it('gives finite, ordered, definite answers, the same ones again, and never fails', { timeout: 600_000 }, () => {
    fc.assert(
      fc.property(history, (made) => {
        const steps = learnFrom(null, made);
        expect(steps.length).toBeGreaterThan(0);
        for (const step of steps) {
          posteriorStepSchema.parse(step);
          requireSound(step);
        }
        expect(steps.map(({ state }) => state.at)).toEqual(
          steps.map(({ state }) => state.at).toSorted((a, b) => a - b),
        );
        const last = steps.at(-1)!;
        requireOrderedBand(made.pool, last);
        const { parameters, dailyLoss } = describeLearnt(last.posterior, made.pool);
        for (const { p10, p50, p90 } of [dailyLoss.prior, dailyLoss.learnt, ...parameters.map(({ learnt }) => learnt)])
          expect(disorder({ p10: [p10], p50: [p50], p90: [p90] })).toEqual([]);
        const middle = steps[Math.floor(steps.length / 2)]!;
        if (steps.filter(({ state }) => state.at === middle.state.at).at(-1) === middle)
          expect(learnFrom(middle.state, made)).toEqual(steps.slice(steps.indexOf(middle) + 1));
      }),
      { seed: propertySeed, numRuns: runs },
    );
  });
});
