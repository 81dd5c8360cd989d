import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { findPosterior, listPosteriorHashes } from '@/db/queries/posteriors';
import type { NewReading } from '@/lib/schemas/reading';
import type { ServiceContext } from '@/lib/services/context';
import { editReading, removeReading } from '@/lib/services/edit-reading';
import { recordReading } from '@/lib/services/record-reading';
import { loadWeekSnapshot } from '@/lib/services/week-snapshot';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';
import { WatchedEngine } from '@/tests/support/watched-engine';

const engine = new WatchedEngine();
planWith(engine);

let db: Database;
let owner: ServiceContext;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aPoolHousehold(db, { pool: { feederLoaded: 0 } });
  engine.reset();
});

const hashes = () => listPosteriorHashes(db, owner.access.householdId);
const stepOf = async (id: string) => (await findPosterior(db, owner.access.householdId, id))!.step;

/** Tests a day apart, each with the chlorine given. */
async function testsOfDays(...levels: number[]): Promise<NewReading[]> {
  const readings = levels.map((freeChlorine, day) => {
    const reading = aFullTest(hoursLater(24 * day));
    return { ...reading, values: { ...reading.values, freeChlorine } };
  });
  for (const reading of readings) await recordReading(at(owner, new Date(reading.takenAt)), reading);
  return readings;
}

describe('learnPool', { timeout: 60_000 }, () => {
  it('keeps a posterior for each reading, and goes on from the one before', async () => {
    const [first, second, third] = await testsOfDays(4, 2.8, 2);
    expect([...(await hashes()).keys()]).toEqual([first!.id, second!.id, third!.id]);
    expect(engine.asked.learn.map(({ from }) => from?.at ?? null)).toEqual([
      null,
      Date.parse(first!.takenAt),
      Date.parse(second!.takenAt),
    ]);
    const { posterior } = await stepOf(third!.id);
    expect(Date.parse(posterior.readingAt)).toBe(Date.parse(third!.takenAt));
    expect(posterior.sigmas.sunStrength).toBeLessThan(0.25);
  });

  it('finds a reading again whose instant has parts of a second', async () => {
    const reading = aFullTest(new Date(owner.now.getTime() - 1_357));
    await recordReading(owner, reading);
    expect(await stepOf(reading.id)).toBeDefined();
    const snapshot = await loadWeekSnapshot(db, owner.access.householdId, owner.access.timeZone);
    expect(snapshot!.scenario.posterior?.readingAt).toBe([snapshot!.scenario.reading].flat()[0]!.takenAt);
  });

  it('gives the plan what was learnt by its reading', async () => {
    const readings = await testsOfDays(4, 2.8);
    const snapshot = await loadWeekSnapshot(db, owner.access.householdId, owner.access.timeZone);
    expect(snapshot!.scenario.posterior).toEqual((await stepOf(readings[1]!.id)).posterior);
  });

  it.each([
    [
      'edited',
      (context: ServiceContext, { id, ...rest }: NewReading) =>
        editReading(context, id, { ...rest, id, values: { ...rest.values, freeChlorine: 2.2 } }),
    ],
    ['deleted', (context: ServiceContext, { id }: NewReading) => removeReading(context, id)],
    [
      'late',
      (context: ServiceContext, { takenAt }: NewReading) => {
        const late = new Date(Date.parse(takenAt) - 6 * 3_600_000);
        return recordReading(context, { ...aFullTest(late), takenAt: late.toISOString() });
      },
    ],
  ] as const)('learns again from the time of a reading that is %s, and no earlier', async (_what, change) => {
    const [first, second] = await testsOfDays(4, 2.8, 2, 1.9);
    const before = await hashes();
    engine.reset();
    await change(at(owner, hoursLater(80)), second!);
    expect(engine.asked.learn.map(({ from }) => from?.at ?? null)).toEqual([Date.parse(first!.takenAt)]);
    const after = await hashes();
    expect(after.get(first!.id)).toBe(before.get(first!.id));
    for (const [id, hash] of after) if (id !== first!.id) expect(hash).not.toBe(before.get(id));
    expect(after.has(second!.id)).toBe(_what !== 'deleted');
  });

  it('comes to the same as learning everything anew', async () => {
    const readings = await testsOfDays(4, 2.8, 2);
    const step = await stepOf(readings[2]!.id);
    const again = freshDatabase();
    const other = await aPoolHousehold(again);
    for (const reading of [readings[2]!, readings[0]!, readings[1]!])
      await recordReading(at(other, hoursLater(60)), reading);
    expect((await findPosterior(again, other.access.householdId, readings[2]!.id))!.step).toEqual(step);
  });

  it('asks whether a wild reading is right, and lets it count little', async () => {
    const readings = await testsOfDays(4, 3.3, 14);
    const { log, posterior } = await stepOf(readings[2]!.id);
    expect(log).toContainEqual(expect.objectContaining({ kind: 'questioned', quantity: 'freeChlorine', measured: 14 }));
    expect(posterior.questioned).toContain('freeChlorine');
  });

  it('costs no reading and no plan when it fails', async () => {
    engine.faults.learn = new Error('Learning fails.');
    const [reading] = await testsOfDays(3);
    expect(await hashes()).toEqual(new Map());
    const snapshot = await loadWeekSnapshot(db, owner.access.householdId, owner.access.timeZone);
    expect(snapshot).toMatchObject({ readingId: reading!.id });
    expect(snapshot!.scenario.posterior).toBeUndefined();
  });
});
