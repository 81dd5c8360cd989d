import 'server-only';
import { and, desc, eq, lt, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { DatabaseOrTransaction } from '@/db/client';
import { auditTrail, memberships, people } from '@/db/schema';
import type { AuditAction } from '@/lib/schemas/audit-entry';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type AuditEntry = {
  householdId: ProvenHouseholdId;
  /** Null when the server itself did it. */
  personId: string | null;
  at: Date;
  action: AuditAction;
  subjectId?: string;
  detail?: Record<string, unknown>;
};

/** Written in the same transaction as what it tells of. */
export async function writeAudit(db: DatabaseOrTransaction, entry: AuditEntry): Promise<void> {
  await db.insert(auditTrail).values(entry);
}

/**
 * Newest first, with the names as they are now. Where the subject is a membership, whose it is.
 *
 * @param before only entries older than the one of this id, in digits
 */
export async function listAudit(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  { before, most = 200 }: { before?: string | undefined; most?: number } = {},
) {
  return db
    .select({
      id: auditTrail.id,
      at: auditTrail.at,
      action: auditTrail.action,
      subjectId: auditTrail.subjectId,
      detail: auditTrail.detail,
      personId: auditTrail.personId,
      personName: people.name,
      personDeletedAt: people.deletedAt,
      memberName: members.name,
      memberDeletedAt: members.deletedAt,
    })
    .from(auditTrail)
    .leftJoin(people, eq(people.id, auditTrail.personId))
    .leftJoin(
      memberships,
      and(eq(memberships.id, auditTrail.subjectId), eq(memberships.householdId, auditTrail.householdId)),
    )
    .leftJoin(members, eq(members.id, memberships.personId))
    .where(
      and(
        eq(auditTrail.householdId, householdId),
        before === undefined ? undefined : lt(auditTrail.id, sql`cast(${before} as integer)`),
      ),
    )
    .orderBy(desc(auditTrail.id))
    .limit(most);
}

const members = alias(people, 'members');
