import { describe, expect, it } from 'vitest';
import type { PlannedDose } from '@/lib/schemas/dose';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { changesBetween } from '@/lib/services/plan-changes';
import { designScenario } from '@/tests/cli/plan-scenario';
import { aPlan } from '@/tests/support/stored-plan';
import { hoursLater } from '@/tests/support/pool-household';

const zone = 'America/New_York';
const snapshot = scenarioSchema.parse(designScenario);
type Compared = Parameters<typeof changesBetween>[0];

const dose = (day: string, amount: number, change: Partial<PlannedDose> = {}): PlannedDose => ({
  ...{
    at: `${day}T20:15:00-04:00`,
    product: 'gran',
    toBuy: false,
    substance: 'calcium-hypochlorite',
    form: 'granular',
  },
  ...{ amount, unit: 'g', rise: 0.4, reason: 'closes-gap', ...change },
});
const plan = (createdAt: Date, doses: PlannedDose[], change: Partial<Compared> = {}): Compared => {
  const made = aPlan('reading', { createdAt });
  return { ...made, engineVersion: '1', snapshot, result: { ...made.result, doses }, ...change };
};
const [monday, tuesday, wednesday] = ['2026-07-06', '2026-07-07', '2026-07-08'] as const;
const before = plan(hoursLater(0), [dose(monday, 50), dose(tuesday, 100), dose(wednesday, 60)]);
const given = [{ at: `${monday}T20:20:00-04:00`, product: 'gran', amount: 75, unit: 'g' as const }];

describe('what a new plan changed', () => {
  it('is each dose ahead that is new, gone or of another amount, with the cause', () => {
    const later = plan(hoursLater(26), [dose(tuesday, 50), dose('2026-07-09', 150)], {
      snapshot: {
        ...snapshot,
        given,
        shelf: snapshot.shelf.map((product) => ({ ...product, stock: product.stock - 75 })),
      },
    });
    expect(changesBetween(before, later, zone)).toEqual({
      at: '2026-07-06T21:00:00-04:00',
      causes: ['dose'],
      doses: [
        { ...{ day: tuesday, substance: 'calcium-hypochlorite', form: 'granular', unit: 'g' }, before: 100, after: 50 },
        {
          ...{ day: wednesday, substance: 'calcium-hypochlorite', form: 'granular', unit: 'g' },
          before: 60,
          after: null,
        },
        {
          ...{ day: '2026-07-09', substance: 'calcium-hypochlorite', form: 'granular', unit: 'g' },
          before: null,
          after: 150,
        },
      ],
    });
  });

  it('is nothing where the days ahead stay as they were', () => {
    expect(changesBetween(before, plan(hoursLater(26), [dose(tuesday, 100), dose(wednesday, 60)]), zone)).toBeNull();
  });

  it.each([
    ['new-reading', { snapshot: { ...snapshot, reading: { ...[snapshot.reading].flat()[0]!, freeChlorine: 2 } } }],
    ['week-ahead', { snapshot: { ...snapshot, week: { ...snapshot.week, sky: Array<number>(7).fill(0.2) } } }],
    ['pool', { snapshot: { ...snapshot, pool: { ...snapshot.pool, volume: 80 } } }],
    ['preferences', { snapshot: { ...snapshot, preferences: { ...snapshot.preferences, visits: 5 } } }],
    ['engine', { engineVersion: '2' }],
    // A skipped dose stands in neither snapshot.
    ['dose', {}],
  ] as const)('names its cause: %s', (cause, change) => {
    expect(changesBetween(before, plan(hoursLater(1), [dose(tuesday, 50)], change), zone)?.causes).toEqual([cause]);
  });
});
