import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '@/db/client';
import { listReadingVersions } from '@/db/queries/readings';
import { auditTrail, plans, readings } from '@/db/schema';
import { Engine } from '@/lib/engine-worker/engine';
import { editReading, removeReading } from '@/lib/services/edit-reading';
import { listReadings } from '@/lib/services/list-readings';
import { recordReading } from '@/lib/services/record-reading';
import type { ServiceContext } from '@/lib/services/context';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';

// The faults are wanted here, and the log is no place for wanted faults.
vi.mock('@/lib/log', () => ({ logFault: () => randomUUID() }));

/** An engine that always fails: what a reading must survive. */
class BrokenEngine extends Engine {
  override run(): Promise<never> {
    return Promise.reject(new Error('The engine crashed.'));
  }
}
planWith(
  new BrokenEngine({
    startThread: () => {
      throw new Error('never started');
    },
  }),
);

let db: Database;
let owner: ServiceContext;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aPoolHousehold(db);
});

async function member(role: 'owner' | 'caretaker' | 'viewer') {
  const { householdId } = owner.access;
  return at(owner, owner.now, await aMember(db, { householdId, role, now: hoursLater(-1) }));
}

describe('recordReading', () => {
  it('is on disk before the plan: a crash of the engine costs the plan alone', async () => {
    const reading = aFullTest();
    const recorded = await recordReading(owner, reading);
    expect(recorded).toMatchObject({ id: reading.id, values: reading.values, doneBy: 'Ines', recordedBy: 'Ines' });
    expect(await db.$count(readings)).toBe(1);
    expect(await db.$count(plans)).toBe(0);
    const sheet = await showWeek(owner);
    expect(sheet.lastReading?.id).toBe(reading.id);
    expect(sheet.plan).toBeNull();
    expect(sheet.planProblem).toEqual({ code: 'unexpected', errorId: expect.stringMatching(/^[0-9a-f-]{36}$/) });
  });

  it('keeps a reading that is sent twice once, as it was sent first', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    const again = await recordReading(owner, { ...reading, values: { freeChlorine: 9, pH: 7 } });
    expect(again.values).toEqual(reading.values);
    expect(await db.$count(readings)).toBe(1);
    expect(await db.$count(auditTrail)).toBe(1);
  });

  it('is for owners and caretakers, never for viewers', async () => {
    await expect(recordReading(await member('viewer'), aFullTest())).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await db.$count(readings)).toBe(0);
    await recordReading(await member('caretaker'), aFullTest());
    expect(await db.$count(readings)).toBe(1);
  });

  it('takes a device clock that runs a little ahead as now, and refuses the future', async () => {
    const ahead = await recordReading(owner, aFullTest(hoursLater(4 / 60)));
    expect(Date.parse(ahead.takenAt)).toBe(owner.now.getTime());
    await expect(recordReading(owner, aFullTest(hoursLater(6 / 60)))).rejects.toMatchObject({
      code: 'invalid-input',
      problems: [{ path: 'takenAt' }],
    });
    expect(await db.$count(readings)).toBe(1);
  });

  it('takes a reading that is written down days late', async () => {
    const late = await recordReading(owner, aFullTest(hoursLater(-72)));
    expect(Date.parse(late.takenAt)).toBe(hoursLater(-72).getTime());
    expect(Date.parse(late.createdAt)).toBe(owner.now.getTime());
  });

  it('shows readings newest first, and only those of the asked time', async () => {
    for (const hours of [-48, -24, 0]) await recordReading(owner, aFullTest(hoursLater(hours)));
    const from = hoursLater(-30).toISOString();
    expect((await listReadings(owner, {})).map(({ takenAt }) => Date.parse(takenAt))).toEqual(
      [0, -24, -48].map((hours) => hoursLater(hours).getTime()),
    );
    expect(await listReadings(owner, { from, until: owner.now.toISOString() })).toHaveLength(1);
  });
});

describe('editReading', () => {
  it('keeps what the reading was before', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    const corrected = { ...reading, values: { ...reading.values, pH: 7.3 } };
    expect((await editReading(owner, reading.id, corrected)).values.pH).toBe(7.3);
    expect(await listReadingVersions(db, owner.access.householdId, reading.id)).toMatchObject([
      { replacedBy: owner.access.personId, former: { values: { pH: 7.5 } } },
    ]);
  });

  it('lets a caretaker correct an own test for 48 hours, and no other', async () => {
    const caretaker = await member('caretaker');
    const own = aFullTest();
    const others = aFullTest();
    await recordReading(caretaker, own);
    await recordReading(owner, others);
    await editReading(at(caretaker, hoursLater(47)), own.id, own);
    for (const attempt of [
      editReading(at(caretaker, hoursLater(49)), own.id, own),
      removeReading(at(caretaker, hoursLater(49)), own.id),
      editReading(caretaker, others.id, others),
      removeReading(caretaker, others.id),
    ])
      await expect(attempt).rejects.toMatchObject({ code: 'not-allowed' });
    await editReading(at(owner, hoursLater(100)), own.id, own);
  });

  it('takes a deleted reading out of what is shown, and says not found afterwards', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    await removeReading(owner, reading.id);
    expect(await listReadings(owner, {})).toEqual([]);
    expect(await db.$count(readings)).toBe(1);
    await expect(editReading(owner, reading.id, reading)).rejects.toMatchObject({ code: 'not-found' });
    await expect(recordReading(owner, reading)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('knows no reading of another household', async () => {
    const reading = aFullTest();
    await recordReading(owner, reading);
    const stranger = await aPoolHousehold(db);
    await expect(editReading(stranger, reading.id, reading)).rejects.toMatchObject({ code: 'not-found' });
    await expect(removeReading(stranger, reading.id)).rejects.toMatchObject({ code: 'not-found' });
    const id = randomUUID();
    await expect(editReading(owner, id, reading)).rejects.toMatchObject({ code: 'invalid-input' });
  });
});
