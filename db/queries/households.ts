import 'server-only';
import { and, count, eq, gt, inArray, isNotNull, isNull, lte } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { households, memberships, people, pools } from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';
import { forgetFormerMembers, listFormerMembers } from './former-members';

export type NewHousehold = typeof households.$inferInsert;

/** A household is never without its pool: the row waits for the first run. */
export async function insertHousehold(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  household: NewHousehold,
): Promise<void> {
  await db.insert(households).values(household);
  await db.insert(pools).values({ householdId: household.id });
}

export async function findHousehold(db: DatabaseOrTransaction, householdId: ProvenHouseholdId) {
  const [household] = await db.select().from(households).where(eq(households.id, householdId));
  return household ?? null;
}

export async function updateHousehold(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  changes: Partial<Pick<NewHousehold, 'name' | 'timeZone' | 'unitSystem' | 'locale'>>,
): Promise<void> {
  if (Object.keys(changes).length === 0) return;
  await db.update(households).set(changes).where(eq(households.id, householdId));
}

/** Deletes a household with everything in it, and whoever was only kept because it referred to them. */
export async function deleteHousehold(
  tx: Transaction,
  scope: SystemScope,
  householdId: ProvenHouseholdId,
): Promise<void> {
  const former = await listFormerMembers(tx, scope, householdId);
  await tx.delete(households).where(eq(households.id, householdId));
  await forgetFormerMembers(tx, scope, former);
}

/** The demo household that copies are made of; null before it was seeded. */
export async function findDemoOriginal(db: DatabaseOrTransaction, _scope: SystemScope) {
  const [original] = await db
    .select()
    .from(households)
    .where(and(eq(households.demo, true), isNull(households.expiresAt)));
  return original ?? null;
}

export async function countDemoCopies(db: DatabaseOrTransaction, _scope: SystemScope, now: Date): Promise<number> {
  const [row] = await db.select({ copies: count() }).from(households).where(gt(households.expiresAt, now));
  return row?.copies ?? 0;
}

/** Deletes demo copies whose day is over, with everything in them and the visitors who had nothing else. */
export async function deleteExpiredDemoCopies(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  now: Date,
): Promise<number> {
  const expired = await db
    .select({ id: households.id, personId: memberships.personId })
    .from(households)
    .leftJoin(memberships, eq(memberships.householdId, households.id))
    .where(and(isNotNull(households.expiresAt), lte(households.expiresAt, now)));
  const visitors = expired.flatMap(({ personId }) => (personId === null ? [] : [personId]));
  await db.delete(people).where(and(inArray(people.id, visitors), isNull(people.email)));
  const deleted = await db
    .delete(households)
    .where(and(isNotNull(households.expiresAt), lte(households.expiresAt, now)))
    .returning({ id: households.id });
  return deleted.length;
}
