import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { findCurrentPlan, listPlans } from '@/db/queries/plans';
import { updatePool } from '@/db/queries/pools';
import { savePreferences } from '@/db/queries/preferences';
import { saveShelfProduct, setStock } from '@/db/queries/shelf-products';
import { saveWeekDay } from '@/db/queries/week-days';
import { planDoses, plans } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { ServiceContext } from '@/lib/services/context';
import { removeReading } from '@/lib/services/edit-reading';
import { planWeek } from '@/lib/services/plan-week';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, designPool, designShelf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';
import { WatchedEngine } from '@/tests/support/watched-engine';

const engine = new WatchedEngine();
planWith(engine);

let db: Database;
let owner: ServiceContext;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aPoolHousehold(db);
  engine.reset();
});

const granules = designShelf.find(({ id }) => id === 'gran')!;
const current = () => findCurrentPlan(db, owner.access.householdId);

describe('planWeek', { timeout: 30_000 }, () => {
  it('makes a plan of a reading, with its doses, snapshot and promised band', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    const plan = await current();
    expect(plan).toMatchObject({ version: 1, readingId: reading.id, takenAt: owner.now, endsAt: hoursLater(168) });
    expect(plan?.snapshot.pool.volume).toBe(75.7);
    expect(plan?.result.hours).toHaveLength(169);
    expect(plan?.result.projection?.freeChlorine.p10).toHaveLength(169);
    expect(plan?.result.doses.length).toBeGreaterThan(0);
    const doses = await db.select().from(planDoses);
    expect(doses.map(({ at, amount, status }) => ({ at: at.getTime(), amount, status }))).toEqual(
      plan?.result.doses.map((dose) => ({ at: Date.parse(dose.at), amount: dose.amount, status: 'planned' })),
    );
    expect(doses.every(({ day, wallTime }) => /^2026-07-\d\d$/.test(day) && /^\d\d:\d\d$/.test(wallTime))).toBe(true);
  });

  it('of more than the shelf holds is kept, with what is missing marked to buy', async () => {
    await setStock(db, { householdId: owner.access.householdId, id: 'tabs', stock: 0 });
    await setStock(db, { householdId: owner.access.householdId, id: 'gran', stock: 150 });
    await recordReading(owner, aFullTest());
    const short = (await current())?.result.doses.filter(({ toBuy }) => toBuy) ?? [];
    expect(short.length).toBeGreaterThan(0);
    expect(short.every(({ product }) => product === 'gran')).toBe(true);
    const stored = (await db.select().from(planDoses)).filter(({ toBuy }) => toBuy);
    expect(stored.map(({ amount, productId }) => ({ amount, productId }))).toEqual(
      short.map(({ amount }) => ({ amount, productId: null })),
    );
  });

  it.each([
    ['broadcast', 'granules-broadcast'],
    ['dissolve', 'granules-dissolve'],
  ] as const)('shows what is to buy going in as the same product’s label says: %s', async (labelWay, steps) => {
    const { householdId } = owner.access;
    await setStock(db, { householdId, id: 'tabs', stock: 0 });
    await saveShelfProduct(db, { householdId, product: { ...granules, labelWay, stock: 150 }, now: owner.now });
    await recordReading(owner, aFullTest());
    const short = (await showWeek(owner)).doses.filter(({ toBuy }) => toBuy);
    expect(short.length).toBeGreaterThan(0);
    expect(short.map((dose) => [dose.labelWay, dose.steps])).toEqual(short.map(() => [labelWay, steps]));
  });

  it.each([
    ['another of its kind says something else', { ...granules, id: 'other', labelWay: 'broadcast' }],
    ['the label of another could not be found', { ...granules, id: 'other', labelWay: 'unknown', stock: 0 }],
  ] as const)('shows no way of adding what is to buy where %s', async (_, other) => {
    const { householdId } = owner.access;
    await setStock(db, { householdId, id: 'tabs', stock: 0 });
    for (const product of [
      { ...granules, stock: 150 },
      { ...other, stock: 0 },
    ])
      await saveShelfProduct(db, { householdId, product, now: owner.now });
    await recordReading(owner, aFullTest());
    const short = (await showWeek(owner)).doses.filter(({ toBuy }) => toBuy);
    expect(short.length).toBeGreaterThan(0);
    expect(short.every((dose) => dose.labelWay === null && dose.steps === 'granules-label-first')).toBe(true);
  });

  it('keeps the plan while its inputs stand, however time passes', async () => {
    await recordReading(owner, aFullTest());
    const first = await current();
    for (const hours of [1, 30, 200, 2000]) await planWeek(at(owner, hoursLater(hours)));
    expect((await current())?.id).toBe(first?.id);
    expect(engine.asked.plan).toHaveLength(1);
  });

  it.each([
    [
      'the pool',
      (context: ServiceContext) => updatePool(db, context.access.householdId, { ...designPool, sunExposure: 0.5 }),
    ],
    [
      'the shelf',
      (context: ServiceContext) => setStock(db, { householdId: context.access.householdId, id: 'gran', stock: 500 }),
    ],
    [
      'the week ahead',
      (context: ServiceContext) =>
        saveWeekDay(db, {
          householdId: context.access.householdId,
          day: '2026-07-08',
          values: { sky: 0.2, swimmerHours: 12 },
        }),
    ],
    [
      'the preferences',
      (context: ServiceContext) =>
        savePreferences(db, context.access.householdId, { visits: 5, money: 1, evenings: 0, steadiness: 1, avoid: [] }),
    ],
    ['a late reading', (context: ServiceContext) => recordReading(context, aFullTest(hoursLater(-100)))],
  ])('makes a new version when %s changes, and leaves the old one as it was promised', async (_what, change) => {
    await recordReading(owner, aFullTest());
    const before = await current();
    await change(at(owner, hoursLater(1)));
    await planWeek(at(owner, hoursLater(1)));
    const after = await current();
    expect(after?.version).toBe(2);
    expect(after?.inputHash).not.toBe(before?.inputHash);
    const [old] = await listPlans(db, { householdId: owner.access.householdId, from: owner.now, until: hoursLater(1) });
    expect(old).toEqual({ ...before, supersededAt: hoursLater(1) });
  });

  it('plans nothing before now', async () => {
    await recordReading(at(owner, hoursLater(50)), aFullTest());
    const plan = await current();
    expect(plan?.result.doses.length).toBeGreaterThan(0);
    for (const dose of plan?.result.doses ?? [])
      expect(Date.parse(dose.at)).toBeGreaterThanOrEqual(hoursLater(50).getTime());
  });

  it('makes one plan, whole, of many requests at once', async () => {
    const readings = [-30, -20, -10, 0].map((hours) => aFullTest(hoursLater(hours)));
    await Promise.all(readings.map((reading) => recordReading(owner, reading)));
    const versions = (await db.select().from(plans)).map(({ version }) => version);
    expect(versions.toSorted((a, b) => a - b)).toEqual(versions.map((_, index) => index + 1));
    expect(engine.asked.plan.length).toBeLessThanOrEqual(3);
    const plan = await current();
    expect([plan?.snapshot.reading].flat()).toHaveLength(4);
    const doses = await db.$count(planDoses);
    const promised = (await db.select().from(plans)).reduce((sum, { result }) => sum + result.doses.length, 0);
    expect(doses).toBe(promised);
    const asked = engine.asked.plan.length;
    await Promise.all([1, 2, 3].map(() => planWeek(owner)));
    expect(engine.asked.plan).toHaveLength(asked);
  });

  it('keeps the old plan when the planner refuses, does not ask it again, and recovers with the next change', async () => {
    await recordReading(owner, aFullTest());
    const before = await current();
    engine.faults.plan = new AppError('plan-refused', 'The net holds.');
    await recordReading(at(owner, hoursLater(2)), aFullTest(hoursLater(2)));
    const asked = engine.asked.plan.length;
    const refused = await planWeek(at(owner, hoursLater(30)));
    expect(refused).toMatchObject({ plan: { id: before?.id }, problem: { code: 'plan-refused' } });
    expect(engine.asked.plan).toHaveLength(asked);
    engine.faults = {};
    await recordReading(at(owner, hoursLater(31)), aFullTest(hoursLater(31)));
    expect(await planWeek(at(owner, hoursLater(31)))).toMatchObject({ plan: { version: 2 }, problem: null });
  });

  it('tries a fault that may pass again after a minute', async () => {
    engine.faults.plan = new AppError('engine-busy', 'Too long.');
    await recordReading(owner, aFullTest());
    expect((await planWeek(at(owner, hoursLater(0.5 / 60)))).problem?.code).toBe('engine-busy');
    expect(engine.asked.plan).toHaveLength(1);
    engine.faults = {};
    expect(await planWeek(at(owner, hoursLater(2 / 60)))).toMatchObject({ plan: { version: 1 }, problem: null });
  });

  it('leaves no plan to follow when its only reading is deleted', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    await removeReading(owner, reading.id);
    expect(await current()).toBeNull();
    expect(await db.$count(plans)).toBe(1);
  });

  it.each([
    ['is not described yet', { completedAt: null }],
    ['has a salt system, whose chlorine no test has seen', { system: 'salt-generator', recordOnly: true } as const],
  ])('plans nothing for a pool that %s', async (_what, pool) => {
    await updatePool(db, owner.access.householdId, pool);
    await recordReading(owner, aFullTest());
    expect(await current()).toBeNull();
  });

  it('only looks ahead for a pool that keeps the record', async () => {
    await updatePool(db, owner.access.householdId, { volume: 6, recordOnly: true });
    await recordReading(owner, aFullTest());
    const plan = await current();
    expect(plan?.result.doses).toEqual([]);
    expect(plan?.result.projection?.freeChlorine.p50).toHaveLength(169);
  });

  it('asks for what was never measured instead of planning', async () => {
    await recordReading(owner, aFullTest(owner.now, { kind: 'quick', values: { freeChlorine: 3 } }));
    const plan = await current();
    expect(plan?.result.doses).toEqual([]);
    expect(plan?.result.needs).toContainEqual({ code: 'never-measured', quantity: 'pH', since: null });
  });

  it('ignores a pH that was read with chlorine over 10', async () => {
    await recordReading(owner, aFullTest(owner.now, { values: { freeChlorine: 12, pH: 7.1 } }));
    expect((await current())?.result.needs).toContainEqual({ code: 'never-measured', quantity: 'pH', since: null });
  });

  it('gives the engine nothing of the shelf but what it knows', async () => {
    const product = { ...designShelf[1]!, id: 'mystery', name: 'Mystery blend', substance: 'other' as const };
    await saveShelfProduct(db, { householdId: owner.access.householdId, product, now: owner.now });
    await recordReading(owner, aFullTest());
    expect(engine.asked.plan[0]?.shelf.map(({ id }) => id).toSorted()).toEqual(['gran', 'mystery', 'tabs']);
    expect(JSON.stringify(engine.asked.plan[0])).not.toContain('Mystery blend');
  });
});
