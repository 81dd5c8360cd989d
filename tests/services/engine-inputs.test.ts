import { describe, expect, it } from 'vitest';
import { enginePool, feederMassAt } from '@/lib/services/engine-pool';
import { goneProducts, productIdOf } from '@/lib/services/engine-shelf';
import { identityOf } from '@/lib/services/plan-identity';
import { swimWaitUntil } from '@/lib/services/swim-wait';
import { weekAheadOf } from '@/lib/services/week-ahead';
import type { PoolRow } from '@/db/queries/pools';
import { shelfProductSchema } from '@/lib/schemas/shelf-product';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import { designPool } from '@/tests/support/pool-household';

const HOUR = 3_600_000;
const zone = 'America/New_York';
const row = (changes: Partial<PoolRow> = {}) => ({ ...designPool, ...changes }) as PoolRow;

describe('enginePool', () => {
  it('takes the profile over, and the usual where it is silent', () => {
    const pool = enginePool(row({ meanDepth: null, fillPH: null, surface: 'unsure' }), zone);
    expect(pool).toMatchObject({ volume: 75.7, meanDepth: 1.5, surface: 'plaster', timeZone: zone });
    expect(pool?.fillWater.pH).toBe(7.6);
    expect(pool?.feeder).toMatchObject({ kind: 'inline', ingredient: 'trichlor', capacity: 8 });
  });

  it.each([{ completedAt: null }, { volume: null }, { volume: 0.5 }])('is none for %j', (changes) => {
    expect(enginePool(row(changes), zone)).toBeNull();
  });
});

describe('feederMassAt', () => {
  const pool = enginePool(row({ feederLoaded: 454 }), zone)!;
  const profiledAt = Date.parse('2026-07-05T12:00:00Z');

  it('erodes what the profile found, while the pump runs', () => {
    expect(feederMassAt(pool, profiledAt, profiledAt)).toBe(454);
    // A tablet lasts 48 running hours; the pump runs 8 hours a day.
    const halfWay = feederMassAt(pool, profiledAt, profiledAt + 3 * 24 * HOUR);
    expect(halfWay).toBeCloseTo(454 * (1 - 0.5 / 3) ** 2 * 0.5, 6);
    expect(feederMassAt(pool, profiledAt, profiledAt + 6 * 24 * HOUR)).toBe(0);
  });

  it('erodes a floater by the clock', () => {
    const floater = { ...pool, feeder: { ...pool.feeder, kind: 'floating' as const } };
    expect(feederMassAt(floater, profiledAt, profiledAt + 48 * HOUR)).toBe(0);
  });

  it('knows nothing better of the time before the profile', () => {
    expect(feederMassAt(pool, profiledAt, profiledAt - 100 * HOUR)).toBe(454);
  });
});

describe('goneProducts', () => {
  const granules = shelfProductSchema.parse({
    id: 'gran',
    form: 'granular',
    substance: 'calcium-hypochlorite',
    strength: 68,
  });
  const dose = { productId: 'gran', substance: 'calcium-hypochlorite', form: 'granular' } as const;

  it('knows a product that left the shelf by what the shelf said at the time', () => {
    expect(goneProducts([dose], [], [granules])).toEqual([{ ...granules, stock: 0 }]);
    expect(goneProducts([dose], [granules], [])).toEqual([]);
  });

  it('knows what was bought for a dose by what shops sell, once', () => {
    const bought = { ...dose, productId: null };
    const gone = goneProducts([bought, bought], [], []);
    expect(gone).toMatchObject([{ id: productIdOf(bought), strength: 65, stock: 0 }]);
  });
});

describe('identityOf', () => {
  it('does not hang on the order of keys, nor on keys without a value', () => {
    expect(identityOf({ a: 1, b: { c: [1, 2], d: 'x' } })).toBe(
      identityOf({ b: { d: 'x', c: [1, 2] }, a: 1, e: undefined }),
    );
  });

  it.each([[{ a: 2 }], [{ a: '1' }], [{ a: [1] }], [{ b: 1 }], [{ a: null }]])('tells %j from { a: 1 }', (other) => {
    expect(identityOf(other)).not.toBe(identityOf({ a: 1 }));
  });
});

describe('weekAheadOf', () => {
  const day = (name: string, values: object = {}) => ({
    ...{ day: name, sky: null, rainMillimetres: null, swimmerHours: null, waterTemperature: null },
    ...{ evaporationMillimetres: null, backwashCubicMetres: null },
    ...values,
  });

  it('is the usual week where nothing was said, in eight days', () => {
    const week = weekAheadOf([], '2026-07-05');
    expect(week.sky).toEqual(Array(8).fill(weekAheadSchema.parse({}).sky[0]));
    expect(week.swimmerHours).toEqual(Array(8).fill(0));
    expect(week.waterTemperature).toBeUndefined();
  });

  it('puts what was said on its day, and lets the temperature last', () => {
    const rows = [
      day('2026-07-07', { sky: 0.3, waterTemperature: 27 }),
      day('2026-07-10', { rainMillimetres: 12, waterTemperature: 24 }),
    ];
    const week = weekAheadOf(rows, '2026-07-05');
    expect(week.sky[2]).toBe(0.3);
    expect(week.rain).toEqual([0, 0, 0, 0, 0, 12, 0, 0]);
    expect(week.waterTemperature).toEqual([27, 27, 27, 27, 27, 24, 24, 24]);
  });
});

describe('swimWaitUntil', () => {
  const start = Date.parse('2026-07-05T00:00:00Z');
  const flat = (value: number) => Array(13).fill(value) as number[];
  const planWith = (chlorine: number[], pH = flat(7.5)) => {
    const band = { p10: chlorine, p50: chlorine, p90: chlorine };
    return {
      hours: chlorine.map((_, hour) => new Date(start + hour * HOUR).toISOString()),
      projection: {
        freeChlorine: { ...band, lowestLevel: flat(2.5), swimLimit: flat(4) },
        pH: { p10: pH, p50: pH, p90: pH },
        cyanuricAcid: { p10: flat(50), p50: flat(50), p90: flat(50) },
        median: {
          freeChlorine: chlorine,
          pH,
          cyanuricAcid: flat(50),
          calciumHardness: flat(220),
          totalAlkalinity: flat(90),
        },
      },
    };
  };
  const falling = Array.from({ length: 13 }, (_, hour) => 6.05 - 0.25 * hour);

  it.each([
    ['calcium-hypochlorite', planWith(flat(3)), 4],
    ['sodium-bicarbonate', planWith(flat(3)), 2],
    ['trichlor', planWith(flat(9)), 0.25],
    // 6.05 - 0.25 h is at or under 4 from the ninth hour on.
    ['calcium-hypochlorite', planWith(falling), 9],
    ['sodium-hypochlorite', planWith(flat(5)), 12],
    ['hydrochloric-acid', planWith(flat(3), [...Array<number>(7).fill(7.1), ...Array<number>(6).fill(7.25)]), 7],
    ['calcium-hypochlorite', null, 4],
  ] as const)('after %s it ends when the water is open again', (substance, plan, hours) => {
    expect((swimWaitUntil({ substance }, start, plan) - start) / HOUR).toBe(hours);
  });
});
