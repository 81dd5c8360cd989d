import 'server-only';
import { and, eq, gt, gte, inArray, is, isNotNull, isNull, or } from 'drizzle-orm';
import { getTableConfig, type SQLiteColumn, SQLiteTable } from 'drizzle-orm/sqlite-core';
import type { Transaction } from '@/db/client';
import * as schema from '@/db/schema';
import { invitations, memberships, people } from '@/db/schema';
import { formerMember } from '@/lib/schemas/former-member';
import { languages } from '@/lib/schemas/languages';
import type { SystemScope } from '@/lib/schemas/scope';

type Reference = { table: SQLiteTable; column: SQLiteColumn; theirs: boolean };

/**
 * Every column that refers to a person, read from the tables themselves: one that is added later is here by itself. A row
 * that is deleted with a person is theirs (a session); every other one is a household's.
 */
const references: readonly Reference[] = Object.values(schema)
  .filter((table) => is(table, SQLiteTable))
  .flatMap((table) =>
    getTableConfig(table).foreignKeys.flatMap(({ reference, onDelete }) => {
      const { columns, foreignTable } = reference();
      if (foreignTable !== people) return [];
      // A membership is the household's as well: that somebody belonged to it stays known.
      const theirs = onDelete === 'cascade' && table !== memberships;
      return columns.map((column) => ({ table, column, theirs }));
    }),
  );

type Of = { personId: string; at: Date };

/** Ends what somebody has with households: memberships, and what stands there in their name as one who invites. */
export async function endBelonging(tx: Transaction, _scope: SystemScope, { personId, at }: Of): Promise<void> {
  const own = eq(memberships.personId, personId);
  // One that has not begun yet has no time in which it held.
  await tx.delete(memberships).where(and(own, gte(memberships.validFrom, at)));
  await tx
    .update(memberships)
    .set({ validUntil: at })
    .where(and(own, or(isNull(memberships.validUntil), gt(memberships.validUntil, at))));
  await tx.update(memberships).set({ handlesChemicals: false, safetyCardReadAt: null }).where(own);
  await tx.update(invitations).set({ createdBy: null }).where(eq(invitations.createdBy, personId));
  // The one by which they came calls them by their name.
  await tx.update(invitations).set({ name: formerMember }).where(eq(invitations.usedBy, personId));
}

/**
 * Lets a person go. What is theirs alone is deleted, and so are they, unless a household still refers to them: then a row
 * stays that holds nothing of them but when they went.
 */
export async function letPersonGo(tx: Transaction, scope: SystemScope, { personId, at }: Of): Promise<void> {
  for (const { table, column, theirs } of references) if (theirs) await tx.delete(table).where(eq(column, personId));
  await tx
    .update(people)
    .set({
      ...{
        name: formerMember,
        email: null,
        passwordHash: null,
        language: languages[0],
        tourClosedAt: null,
        emailConfirmedAt: null,
      },
      deletedAt: at,
    })
    .where(eq(people.id, personId));
  await forgetFormerMembers(tx, scope, [personId]);
}

/** Those of a household whose accounts are gone. */
export async function listFormerMembers(tx: Transaction, _scope: SystemScope, householdId: string): Promise<string[]> {
  const rows = await tx
    .selectDistinct({ id: people.id })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(and(eq(memberships.householdId, householdId), isNotNull(people.deletedAt)));
  return rows.map(({ id }) => id);
}

/** Deletes those whose accounts are gone and whom no household refers to any more. */
export async function forgetFormerMembers(
  tx: Transaction,
  _scope: SystemScope,
  personIds: readonly string[],
): Promise<void> {
  const unneeded: string[] = [];
  for (const personId of personIds) if (!(await isReferredTo(tx, personId))) unneeded.push(personId);
  await tx.delete(people).where(and(inArray(people.id, unneeded), isNotNull(people.deletedAt)));
}

async function isReferredTo(tx: Transaction, personId: string): Promise<boolean> {
  for (const { table, column, theirs } of references) {
    if (theirs) continue;
    const found = await tx.select({ person: column }).from(table).where(eq(column, personId)).limit(1);
    if (found.length > 0) return true;
  }
  return false;
}
