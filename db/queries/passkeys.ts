import 'server-only';
import { and, asc, eq, lt, or, sql } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { passkeys } from '@/db/schema';
import type { SystemScope } from '@/lib/schemas/scope';

/** Those of one person, the oldest first: the caller has the id from the session. */
export async function listPasskeys(db: DatabaseOrTransaction, personId: string) {
  return db
    .select({
      id: passkeys.id,
      name: passkeys.name,
      transports: passkeys.transports,
      createdAt: passkeys.createdAt,
      lastUsedAt: passkeys.lastUsedAt,
    })
    .from(passkeys)
    .where(eq(passkeys.personId, personId))
    .orderBy(asc(passkeys.createdAt), asc(passkeys.id));
}

export async function countPasskeys(db: DatabaseOrTransaction, personId: string): Promise<number> {
  return db.$count(passkeys, eq(passkeys.personId, personId));
}

/** Keeps a passkey; false when its id is taken, whoever has it. */
export async function insertPasskey(tx: Transaction, row: typeof passkeys.$inferInsert): Promise<boolean> {
  const written = await tx.insert(passkeys).values(row).onConflictDoNothing().returning({ id: passkeys.id });
  return written.length > 0;
}

/** The passkey that somebody signs in with: who they are is only known by it. */
export async function findPasskey(db: DatabaseOrTransaction, _scope: SystemScope, id: string) {
  const [found] = await db.select().from(passkeys).where(eq(passkeys.id, id));
  return found ?? null;
}

/**
 * Writes down that a passkey was used. False when it is gone, or when its count has not risen since it was read: of two
 * with one count, one is a copy. A device that does not count stays at 0.
 */
export async function keepPasskeyUse(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  { id, counter, backedUp, at }: { id: string; counter: number; backedUp: boolean; at: Date },
): Promise<boolean> {
  const doesNotCount = counter === 0 ? eq(passkeys.counter, 0) : sql`0`;
  const written = await db
    .update(passkeys)
    .set({ counter, backedUp, lastUsedAt: at })
    .where(and(eq(passkeys.id, id), or(lt(passkeys.counter, counter), doesNotCount)))
    .returning({ id: passkeys.id });
  return written.length > 0;
}

/** Forgets a passkey of this person; false where there is none. */
export async function deletePasskey(
  db: DatabaseOrTransaction,
  { personId, id }: { personId: string; id: string },
): Promise<boolean> {
  const gone = await db
    .delete(passkeys)
    .where(and(eq(passkeys.personId, personId), eq(passkeys.id, id)))
    .returning({ id: passkeys.id });
  return gone.length > 0;
}

/** Every passkey of a person goes. */
export async function deletePasskeysOf(tx: Transaction, personId: string): Promise<void> {
  await tx.delete(passkeys).where(eq(passkeys.personId, personId));
}
