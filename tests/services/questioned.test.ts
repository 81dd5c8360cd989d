import { beforeAll, describe, expect, it } from 'vitest';
import type { NewReading } from '@/lib/schemas/reading';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

let prepared: ServiceContext;
beforeAll(async () => {
  prepared = await aPoolHousehold(freshDatabase());
  await recordReading(prepared, aFullTest());
}, 60_000);

/** The sheet after further tests, a day apart. */
async function after(...values: Partial<NewReading['values']>[]): Promise<WeekSheet> {
  const owner = { ...prepared, db: await copyOf(prepared.db) };
  let when = prepared.now;
  for (const [index, changed] of values.entries()) {
    when = hoursLater(24 * (index + 1));
    await recordReading(at(owner, when), aFullTest(when, { values: { ...aFullTest().values, ...changed } }));
  }
  return showWeek(at(owner, when));
}

describe('what the newest test says that nobody expected', { timeout: 60_000 }, () => {
  it('is nothing where it was expected', async () => {
    expect(await after({ freeChlorine: 2.2 })).toMatchObject({ questioned: [], unrecorded: false });
  });

  it('is asked about, with what was expected', async () => {
    const { questioned, unrecorded, lastReading } = await after({ freeChlorine: 12 });
    expect(unrecorded).toBe(false);
    const [question, ...others] = questioned.filter(({ quantity }) => quantity === 'freeChlorine');
    expect(others).toEqual([]);
    expect(question).toMatchObject({ measured: 12 });
    // A good day after 3 mg/L.
    expect(question!.low).toBeGreaterThan(1);
    expect(question!.high).toBeLessThan(3.2);
    expect(Date.parse(question!.takenAt)).toBe(Date.parse(lastReading!.takenAt));
  });

  it('is believed of a second test, and then chlorine was added that nobody recorded', async () => {
    const sheet = await after({ freeChlorine: 12 }, { freeChlorine: 11 });
    expect(sheet.questioned.map(({ quantity }) => quantity)).not.toContain('freeChlorine');
    expect(sheet.unrecorded).toBe(true);
  });

  it('is forgotten with the next test that is as expected', async () => {
    const sheet = await after({ freeChlorine: 12 }, { freeChlorine: 1.6 });
    expect(sheet).toMatchObject({ questioned: [], unrecorded: false });
  });

  it('leaves chlorine that reads as none to the question about zero', async () => {
    const { questioned, verdict } = await after({ freeChlorine: 0, combinedChlorine: 0 });
    expect(verdict.reasons.map(({ code }) => code)).toContain('false-zero-open');
    expect(questioned.map(({ quantity }) => quantity)).not.toContain('freeChlorine');
  });
});
