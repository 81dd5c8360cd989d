import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import {
  findDose,
  listDoseEvents,
  listDoses,
  listGivenDoses,
  type NewDoseEvent,
  recordDoseEvent,
} from '@/db/queries/plan-doses';
import { findCurrentPlan, listPlans } from '@/db/queries/plans';
import { inWriteTransaction } from '@/db/write';
import { aDose, storePlan, sunday } from '@/tests/support/stored-plan';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';

const week = { from: new Date('2026-07-05T00:00:00Z'), until: new Date('2026-07-13T00:00:00Z') };

const givenEvent = (doseId: string): NewDoseEvent => ({
  id: randomUUID(),
  doseId,
  action: 'given',
  statusFrom: 'planned',
  statusTo: 'given',
  amountTo: 250,
  givenAtTo: new Date('2026-07-06T23:15:00Z'),
  planVersionSeen: 1,
  createdAt: sunday,
});
const givenChanges = {
  status: 'given',
  givenAt: new Date('2026-07-06T23:15:00Z'),
  givenAmount: 250,
  tickedAt: sunday,
} as const;

describe('plans', () => {
  it('counts versions up and keeps the superseded ones as they were promised', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const first = await storePlan(db, householdId);
    const second = await storePlan(db, householdId);
    expect([first.version, second.version]).toEqual([1, 2]);
    expect((await findCurrentPlan(db, householdId))?.id).toBe(second.plan.id);
    const [old] = await listPlans(db, { householdId, ...week });
    expect(old).toMatchObject({ id: first.plan.id, supersededAt: sunday, result: first.plan.result });
  });

  it('counts each household from one and shows it only its own', async () => {
    const db = freshDatabase();
    const mine = await aHousehold(db);
    const theirs = await aHousehold(db);
    await storePlan(db, mine.householdId);
    expect((await storePlan(db, theirs.householdId)).version).toBe(1);
    expect(await listPlans(db, { householdId: theirs.householdId, ...week })).toHaveLength(1);
    expect(await listDoses(db, { householdId: theirs.householdId, ...week })).toHaveLength(1);
  });
});

describe('doses', () => {
  it('takes a tick that is sent twice once', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const dose = aDose();
    await storePlan(db, householdId, [dose]);
    const event = givenEvent(dose.id);
    const tick = (changes: typeof givenChanges) =>
      inWriteTransaction(db, (tx) => recordDoseEvent(tx, { householdId, event, changes }));
    expect(await tick(givenChanges)).toBe('recorded');
    expect(await tick({ ...givenChanges, givenAmount: 250 })).toBe('already-recorded');
    expect(await listDoseEvents(db, householdId, dose.id)).toHaveLength(1);
    expect(await findDose(db, householdId, dose.id)).toMatchObject({
      status: 'given',
      givenAmount: 250,
      planVersion: 1,
    });
  });

  it('keeps a given dose of an old plan and drops one that was only promised', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const [given, promised] = [aDose(), aDose({ day: '2026-07-08' })];
    await storePlan(db, householdId, [given, promised]);
    await inWriteTransaction(db, (tx) =>
      recordDoseEvent(tx, { householdId, event: givenEvent(given.id), changes: givenChanges }),
    );
    await storePlan(db, householdId, []);
    expect((await listDoses(db, { householdId, ...week })).map(({ id }) => id)).toEqual([given.id]);
    expect((await listGivenDoses(db, { householdId, ...week })).map(({ id }) => id)).toEqual([given.id]);
  });

  it("never finds or ticks another household's dose", async () => {
    const db = freshDatabase();
    const mine = await aHousehold(db);
    const { householdId } = await aHousehold(db);
    const dose = aDose();
    await storePlan(db, mine.householdId, [dose]);
    expect(await findDose(db, householdId, dose.id)).toBeNull();
    const tick = inWriteTransaction(db, (tx) =>
      recordDoseEvent(tx, { householdId, event: givenEvent(dose.id), changes: givenChanges }),
    );
    await expect(tick).rejects.toThrow();
    expect((await findDose(db, mine.householdId, dose.id))?.status).toBe('planned');
  });
});
