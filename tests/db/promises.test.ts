import { randomUUID } from 'node:crypto';
import { eq, type SQL, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { findPreferences, savePreferences } from '@/db/queries/preferences';
import { insertReading, replaceReading } from '@/db/queries/readings';
import { households, memberships, people, plans, pools } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { aDose, aReading, storePlan, sunday } from '@/tests/support/stored-plan';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

type Refusal = { what: string; by: RegExp; write: (access: HouseholdAccess) => SQL };

const reading = (id: string, household: string, takenAt: number, createdAt: number) =>
  sql`INSERT INTO readings (id, household_id, taken_at, created_at, kind, method, look) VALUES (${id}, ${household}, ${takenAt}, ${createdAt}, 'full', 'strip', 'clear')`;
const inPool = (assignment: SQL) => (access: HouseholdAccess) =>
  sql`UPDATE pools SET ${assignment} WHERE household_id = ${access.householdId}`;
const onDay = (column: SQL, value: string | number) => (access: HouseholdAccess) =>
  sql`INSERT INTO week_days (household_id, day, ${column}) VALUES (${access.householdId}, '2026-07-06', ${value})`;

const refused: Refusal[] = [
  {
    what: 'a reading of a household that is not there',
    by: /FOREIGN KEY/,
    write: () => reading(randomUUID(), 'nowhere', 1, 1),
  },
  {
    what: 'a reading from the future',
    by: /readings_not_from_the_future/,
    write: ({ householdId }) => reading(randomUUID(), householdId, 200_000, 1),
  },
  {
    what: 'a finished pool that was never described',
    by: /pools_completed_means_answered/,
    write: inPool(sql`completed_at = 1`),
  },
  { what: 'an exact address', by: /pools_latitude_is_coarse/, write: inPool(sql`latitude = 28.0317`) },
  { what: 'a volume beyond what can be planned', by: /pools_volume_in_range/, write: inPool(sql`volume = 18000`) },
  { what: 'an unknown lining', by: /pools_surface_known/, write: inPool(sql`surface = 'gold'`) },
  {
    what: 'a feeder without its ingredient',
    by: /pools_feeder_has_ingredient/,
    write: inPool(sql`feeder_kind = 'inline'`),
  },
  { what: 'swim hours that are no times', by: /pools_swim_hours_are_times/, write: inPool(sql`swim_from = 'noon'`) },
  {
    what: 'swim hours the wrong way round',
    by: /pools_swim_hours_in_order/,
    write: inPool(sql`swim_from = '20:00', swim_to = '10:00'`),
  },
  { what: 'a swim limit over the code', by: /pools_swim_limit_in_range/, write: inPool(sql`swim_limit = 12`) },
  { what: 'more sun than there is', by: /week_days_sky_is_a_share/, write: onDay(sql`sky`, 1.2) },
  { what: 'negative swimmers', by: /week_days_swimmer_hours_in_range/, write: onDay(sql`swimmer_hours`, -1) },
  {
    what: 'a day that is none',
    by: /week_days_day_is_a_day/,
    write: ({ householdId }) => sql`INSERT INTO week_days (household_id, day) VALUES (${householdId}, '2026-02-30')`,
  },
  {
    what: 'a product of no strength',
    by: /shelf_products_strength_in_range/,
    write: ({ householdId }) =>
      sql`INSERT INTO shelf_products (household_id, id, form, substance, strength, alkali, label_way, stock, stored_at_celsius, created_at) VALUES (${householdId}, 'gran', 'granular', 'calcium-hypochlorite', 0, 0, 'dissolve', 1, 25, 1)`,
  },
  {
    what: 'an e-mail in capitals',
    by: /people_email_is_normalised/,
    write: () =>
      sql`INSERT INTO people (id, name, email, password_hash, created_at) VALUES ('p', 'Ines', 'Ines@pool.example', 'x', 1)`,
  },
  {
    what: 'an account without a password',
    by: /people_email_goes_with_password/,
    write: () => sql`INSERT INTO people (id, name, email, created_at) VALUES ('p', 'Ines', 'ines@pool.example', 1)`,
  },
  {
    what: 'chemicals in the hands of a viewer',
    by: /memberships_viewers_do_not_dose/,
    write: ({ membershipId }) =>
      sql`INSERT INTO memberships (id, household_id, person_id, role, handles_chemicals, safety_card_read_at, valid_from, valid_until) SELECT 'm', household_id, person_id, 'viewer', 1, 1, 1, 2 FROM memberships WHERE id = ${membershipId}`,
  },
  {
    what: 'chemicals in the hands of somebody who has not read the card',
    by: /memberships_card_before_chemicals/,
    write: ({ membershipId }) => sql`UPDATE memberships SET safety_card_read_at = NULL WHERE id = ${membershipId}`,
  },
  {
    what: 'a second open membership of one person',
    by: /UNIQUE/,
    write: ({ membershipId }) =>
      sql`INSERT INTO memberships (id, household_id, person_id, role, handles_chemicals, safety_card_read_at, valid_from, valid_until) SELECT 'm', household_id, person_id, 'owner', 0, NULL, 1, NULL FROM memberships WHERE id = ${membershipId}`,
  },
  {
    what: 'the last owner becoming a viewer',
    by: /last owner/,
    write: ({ membershipId }) =>
      sql`UPDATE memberships SET role = 'viewer', handles_chemicals = 0 WHERE id = ${membershipId}`,
  },
  {
    what: 'the last owner leaving',
    by: /last owner/,
    write: ({ membershipId }) => sql`UPDATE memberships SET valid_until = 9e12 WHERE id = ${membershipId}`,
  },
  {
    what: 'a household that expires and is no demo',
    by: /households_only_demo_copies_expire/,
    write: ({ householdId }) => sql`UPDATE households SET expires_at = 1 WHERE id = ${householdId}`,
  },
];

/** The words of SQLite, which Drizzle keeps as the cause of its own. */
async function reasonOf(write: Promise<unknown>): Promise<string> {
  try {
    await write;
  } catch (error) {
    return error instanceof Error && error.cause instanceof Error ? error.cause.message : String(error);
  }
  return 'it was written';
}

describe('the database refuses', () => {
  it.each(refused)('$what', async ({ by, write }) => {
    const db = freshDatabase();
    const access = await aHousehold(db);
    expect(await reasonOf(db.run(write(access)))).toMatch(by);
  });

  const value = (quantity: string, low: number, high: number, exact: number) => (id: string) =>
    sql`INSERT INTO reading_values (reading_id, quantity, low, high, exact) VALUES (${id}, ${quantity}, ${low}, ${high}, ${exact})`;
  it.each([
    { what: 'an interval the wrong way round', by: /low_not_above_high/, write: value('temperature', 30, 20, 0) },
    { what: 'an exact value of two numbers', by: /exact_is_one_number/, write: value('temperature', 20, 30, 1) },
    { what: 'a quantity nobody measures', by: /quantity_known/, write: value('salt', 1, 1, 1) },
    { what: 'more alkalinity than water can hold', by: /in_model_range/, write: value('totalAlkalinity', 0, 1001, 0) },
    { what: 'one quantity twice', by: /UNIQUE/, write: value('pH', 7, 7, 1) },
  ])('$what', async ({ by, write }) => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const stored = aReading();
    await insertReading(db, { householdId, reading: stored, doneBy: null, recordedBy: null, now: sunday });
    expect(await reasonOf(db.run(write(stored.id)))).toMatch(by);
  });

  it.each([
    { what: 'a given dose that says not when', by: /given_says_when/, assignment: sql`status = 'given'` },
    { what: 'an amount of nothing', by: /amount_in_range/, assignment: sql`amount = 0` },
    { what: 'an unknown state', by: /status_known/, assignment: sql`status = 'perhaps'` },
    { what: 'a product to buy that stands on the shelf', by: /to_buy_has_no_product/, assignment: sql`to_buy = 1` },
    { what: 'a dose that changes its household', by: /FOREIGN KEY/, assignment: sql`household_id = 'nowhere'` },
  ])('$what', async ({ by, assignment }) => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    await storePlan(db, householdId, [aDose()]);
    expect(await reasonOf(db.run(sql`UPDATE plan_doses SET ${assignment}`))).toMatch(by);
  });
});

describe('what was written down', () => {
  async function aRecord(db: Database) {
    const access = await aHousehold(db);
    const { householdId, personId } = access;
    const { reading: stored } = await storePlan(db, householdId);
    await replaceReading(db, { householdId, reading: stored, replacedBy: personId, now: sunday });
    await writeAudit(db, { householdId, personId, at: sunday, action: 'save-pool' });
    return access;
  }

  it.each([
    ['audit_trail', sql`action = 'nothing'`],
    ['reading_versions', sql`former = '{}'`],
    ['plans', sql`result = '{}'`],
    ['plans', sql`input_hash = ''`],
  ])('stays as it was: %s', async (table, assignment) => {
    const db = freshDatabase();
    await aRecord(db);
    expect(await reasonOf(db.run(sql`UPDATE ${sql.identifier(table)} SET ${assignment}`))).toMatch(
      /append-only|keeps what it promised/,
    );
  });

  it('outlives the account of who wrote it', async () => {
    const db = freshDatabase();
    const { householdId } = await aRecord(db);
    const { personId } = await aMember(db, { householdId, role: 'caretaker', now: sunday });
    await writeAudit(db, { householdId, personId, at: sunday, action: 'count-stock' });
    await db.delete(people).where(eq(people.id, personId));
    expect(await db.get(sql`SELECT count(*) AS kept FROM audit_trail WHERE person_id IS NULL`)).toMatchObject({
      kept: 1,
    });
  });

  it('goes with its household, and with nothing else of anybody', async () => {
    const db = freshDatabase();
    const { householdId } = await aRecord(db);
    await aRecord(db);
    await db.delete(households).where(eq(households.id, householdId));
    for (const table of [pools, memberships, plans]) expect(await db.$count(table)).toBe(1);
    expect(await db.all(sql`PRAGMA foreign_key_check`)).toEqual([]);
  });
});

describe('a tick', () => {
  it('stays as it was sent', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const dose = aDose();
    await storePlan(db, householdId, [dose]);
    await db.run(
      sql`INSERT INTO dose_events (id, household_id, dose_id, action, status_from, status_to, plan_version_seen, created_at) VALUES ('t', ${householdId}, ${dose.id}, 'skipped', 'planned', 'skipped', 1, 1)`,
    );
    expect(await reasonOf(db.run(sql`UPDATE dose_events SET status_to = 'given'`))).toMatch(/append-only/);
  });
});

describe('preferences', () => {
  it('are the usual ones until the household chose, and its own from then on', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    expect(await findPreferences(db, householdId)).toEqual({
      visits: 3,
      money: 1,
      evenings: 1,
      steadiness: 1,
      avoid: [],
    });
    const chosen = { visits: 2, money: 0.5, evenings: 2, steadiness: 1, avoid: ['dichlor'] };
    await savePreferences(db, householdId, { ...chosen, visits: 5 });
    await savePreferences(db, householdId, chosen);
    expect(await findPreferences(db, householdId)).toEqual(chosen);
  });
});
