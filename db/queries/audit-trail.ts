import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { auditTrail, people } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type AuditEntry = {
  householdId: ProvenHouseholdId;
  /** Null when the server itself did it. */
  personId: string | null;
  at: Date;
  /** As the service is called: "save-pool". */
  action: string;
  subjectId?: string;
  detail?: Record<string, unknown>;
};

/** Written in the same transaction as what it tells of. */
export async function writeAudit(db: DatabaseOrTransaction, entry: AuditEntry): Promise<void> {
  await db.insert(auditTrail).values(entry);
}

/** Newest first. */
export async function listAudit(db: DatabaseOrTransaction, householdId: ProvenHouseholdId, most = 200) {
  return db
    .select({
      at: auditTrail.at,
      action: auditTrail.action,
      subjectId: auditTrail.subjectId,
      detail: auditTrail.detail,
      personName: people.name,
    })
    .from(auditTrail)
    .leftJoin(people, eq(people.id, auditTrail.personId))
    .where(eq(auditTrail.householdId, householdId))
    .orderBy(desc(auditTrail.id))
    .limit(most);
}
