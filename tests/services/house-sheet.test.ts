import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { markHandlesChemicals } from '@/db/queries/memberships';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { saveHouseNotes } from '@/lib/services/save-house-notes';
import { showHouseSheet } from '@/lib/services/show-house-sheet';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';

planWith();

const DAY = 24;

describe('the house sheet', { timeout: 60_000 }, () => {
  let tested: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    tested = freshDatabase();
    owner = await aPoolHousehold(tested);
    await recordReading(owner, aFullTest());
    await saveHouseNotes(owner, { gate: 'Key in the shed' });
  });
  const fresh = async (hours = 2) => at({ ...owner, db: await copyOf(tested) }, hoursLater(hours));
  const readCard = ({ db, access }: ServiceContext, cardReadAt: Date | null) =>
    markHandlesChemicals(db, { householdId: access.householdId, membershipId: access.membershipId, cardReadAt });

  it('holds no dose for somebody who is not named', async () => {
    const sheet = await showHouseSheet(await fresh());
    expect(sheet).toMatchObject({ handler: null, doses: [], notes: { gate: 'Key in the shed' } });
    expect(sheet.week.doses.length).toBeGreaterThan(0);
  });

  it('holds every dose of the plan ahead, of this calendar week and the next, for a named member who handles chemicals', async () => {
    // On Wednesday: the plan runs until Sunday evening, into the week that begins that day.
    const context = await fresh(3 * DAY);
    await readCard(context, hoursLater(-DAY));
    const sheet = await showHouseSheet(context, context.access.membershipId);
    expect(sheet.handler).toEqual({ membershipId: context.access.membershipId, name: context.access.personName });
    const { plan } = await showWeek(context);
    expect(sheet.doses.length).toBeGreaterThan(0);
    for (const dose of sheet.doses) {
      expect(dose).toMatchObject({ planId: plan?.id, status: 'planned' });
      expect(Date.parse(dose.at)).toBeGreaterThan(context.now.getTime());
    }
    expect(sheet.doses.find(({ form }) => form === 'granular')?.measure).toBe(50);
  });

  it('names nobody whose mark has lapsed or was taken away, no viewer, and nobody of another household', async () => {
    const context = await fresh();
    const { householdId, membershipId } = context.access;
    const ids = async (asked?: string) => {
      const { handlers, handler, doses } = await showHouseSheet(context, asked);
      return { named: handlers.map((each) => each.membershipId), handler, doses: doses.length };
    };
    await readCard(context, new Date(context.now.getTime() - 366 * DAY * 3_600_000));
    expect(await ids(membershipId)).toEqual({ named: [], handler: null, doses: 0 });
    await readCard(context, null);
    expect((await ids(membershipId)).handler).toBeNull();
    const caretaker = await aMember(context.db, { householdId, role: 'caretaker', now: hoursLater(-DAY) });
    const viewer = await aMember(context.db, { householdId, role: 'viewer', now: hoursLater(-DAY) });
    const other = await aPoolHousehold(context.db);
    expect((await ids()).named).toEqual([caretaker.membershipId]);
    for (const asked of [viewer.membershipId, other.access.membershipId, 'nobody'])
      expect(await ids(asked)).toMatchObject({ handler: null, doses: 0 });
  });

  it('counts what is neither ticked nor skipped, and has no dose once the plan is over', async () => {
    const context = await fresh(0);
    await readCard(context, hoursLater(-DAY));
    expect((await showHouseSheet(context)).openDoses).toBe(0);
    // Two hours later the hour of this evening's dose is over.
    expect((await showHouseSheet(at(context, hoursLater(2)))).openDoses).toBe(1);
    // On Sunday, the first day of the next calendar week, what was due before it still counts.
    const sunday = at(context, hoursLater(6 * DAY + 12));
    const open = (await showWeek(sunday)).doses.filter(({ status, at: hour }) => {
      return status === 'planned' && Date.parse(hour) < sunday.now.getTime();
    });
    expect((await showHouseSheet(sunday)).openDoses).toBeGreaterThan(open.length);
    const late = at(context, hoursLater(8 * DAY));
    expect((await showHouseSheet(late, context.access.membershipId)).doses).toEqual([]);
  });
});
