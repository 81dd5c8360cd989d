import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Database } from '@/db/client';
import { replaceDemoOriginal } from '@/db/queries/demo-households';
import { findDemoOriginal, insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { insertPerson } from '@/db/queries/people';
import { updatePool } from '@/db/queries/pools';
import { savePreferences } from '@/db/queries/preferences';
import { saveShelfProduct } from '@/db/queries/shelf-products';
import { saveWeekDay } from '@/db/queries/week-days';
import { inWriteTransaction } from '@/db/write';
import { householdOfSystem, systemScope } from '@/lib/auth/system-scope';
import { addDays, type CalendarDay, dayOf, startOfDay } from '@/lib/calendar/household-day';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { type DemoMembers, writeDemoHistory } from './demo-history';
import { demoHousehold, demoPeople, demoPool, demoPreferences, demoShelf } from './demo-household';
import { demoDay } from './demo-weather';
import { sharedRun } from './shared-run';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const daysOfHistory = 72;
const daysAhead = 9;
/** Where the making of it is broken off, what there is of it is cleared away after this. */
const unfinishedLastsFor = 2 * HOUR;

/**
 * The demo household of today. It is made once a day, by the engine, behind whoever waits for it, and lies in the database
 * until the next day's takes its place.
 */
export function seedDemo(db: Database, now: Date): Promise<ProvenHouseholdId> {
  return sharedRun('demo', async () => {
    const today = dayOf(now.getTime(), demoHousehold.timeZone);
    return (await originalOf(db, today)) ?? (await makeOriginal(db, today, now));
  });
}

async function originalOf(db: Database, today: CalendarDay): Promise<ProvenHouseholdId | null> {
  const scope = systemScope('seed-demo');
  const original = await findDemoOriginal(db, scope);
  if (!original || dayOf(original.createdAt.getTime(), demoHousehold.timeZone) !== today) return null;
  return householdOfSystem(scope, original.id);
}

async function makeOriginal(db: Database, today: CalendarDay, now: Date): Promise<ProvenHouseholdId> {
  const scope = systemScope('seed-demo');
  const householdId = householdOfSystem(scope, randomUUID());
  const members: DemoMembers = { owner: randomUUID(), caretaker: randomUUID() };
  const since = new Date(startOfDay(today, demoHousehold.timeZone) - daysOfHistory * DAY);
  await inWriteTransaction(db, async (tx) => {
    const expiresAt = new Date(now.getTime() + unfinishedLastsFor);
    await insertHousehold(tx, scope, { ...demoHousehold, id: householdId, demo: true, expiresAt, createdAt: now });
    for (const role of ['owner', 'caretaker'] as const) {
      const personId = members[role];
      await insertPerson(tx, scope, { id: personId, name: demoPeople[role], createdAt: since });
      await insertMembership(tx, scope, {
        ...{ id: randomUUID(), householdId, personId, role, validFrom: since },
        ...{ handlesChemicals: true, safetyCardReadAt: since },
      });
    }
    await updatePool(tx, householdId, { ...demoPool, completedAt: since, swimLimitSetBy: members.owner });
    await savePreferences(tx, householdId, demoPreferences);
    for (const product of demoShelf(today)) await saveShelfProduct(tx, { householdId, product, now: since });
    for (let offset = -daysOfHistory; offset <= daysAhead; offset++) {
      const day = addDays(today, offset);
      await saveWeekDay(tx, { householdId, day, values: demoDay(day) });
    }
  });
  await writeDemoHistory(db, { householdId, members, today });
  await inWriteTransaction(db, (tx) => replaceDemoOriginal(tx, scope, householdId));
  return householdId;
}
