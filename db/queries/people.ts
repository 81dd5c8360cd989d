import 'server-only';
import { and, desc, eq, isNotNull, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { people, unprovenAccounts } from '@/db/schema';
import type { Language } from '@/lib/schemas/languages';
import type { SystemScope } from '@/lib/schemas/scope';

/** @returns "taken" when somebody has this e-mail already: the unique index decides, also between two at once. */
export async function insertPerson(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  person: typeof people.$inferInsert,
): Promise<'added' | 'taken'> {
  const added = await db
    .insert(people)
    .values(person)
    .onConflictDoNothing({ target: people.email })
    .returning({ id: people.id });
  return added.length === 1 ? 'added' : 'taken';
}

export async function findPersonByEmail(db: DatabaseOrTransaction, _scope: SystemScope, email: string) {
  const [person] = await db.select().from(people).where(eq(people.email, email));
  return person ?? null;
}

/**
 * Keeps what somebody signs in with who has yet to show that the address is theirs. Others may have given the same one, or
 * have it.
 */
export async function insertUnprovenAccount(
  tx: DatabaseOrTransaction,
  _scope: SystemScope,
  row: typeof unprovenAccounts.$inferInsert,
): Promise<void> {
  await tx.insert(unprovenAccounts).values(row);
}

/** The newest of those who gave an address and have yet to show that it is theirs. */
export async function findUnprovenByEmail(db: DatabaseOrTransaction, _scope: SystemScope, email: string) {
  const [found] = await db
    .select({
      id: people.id,
      name: people.name,
      email: unprovenAccounts.email,
      language: people.language,
      passwordHash: unprovenAccounts.passwordHash,
    })
    .from(unprovenAccounts)
    .innerJoin(people, eq(people.id, unprovenAccounts.personId))
    .where(eq(unprovenAccounts.email, email))
    .orderBy(desc(unprovenAccounts.createdAt), desc(unprovenAccounts.personId))
    .limit(1);
  return found ?? null;
}

/** The account of a person, for that person: the caller has the id from the session, or from a link of theirs. */
export async function findAccount(db: DatabaseOrTransaction, personId: string) {
  const [found] = await db
    .select({
      name: people.name,
      email: people.email,
      emailConfirmedAt: people.emailConfirmedAt,
      language: people.language,
      passwordHash: people.passwordHash,
      unproven: { email: unprovenAccounts.email, passwordHash: unprovenAccounts.passwordHash },
    })
    .from(people)
    .leftJoin(unprovenAccounts, eq(unprovenAccounts.personId, people.id))
    .where(eq(people.id, personId));
  if (!found) return null;
  const { unproven, ...account } = found;
  return { ...account, ...unproven, proven: unproven === null };
}

/**
 * Whoever reads the mail of this address is this person; not for an address that was changed meanwhile.
 *
 * @returns "taken" when somebody else has shown that before; the transaction is still good then
 */
export async function setEmailConfirmed(
  tx: DatabaseOrTransaction,
  { personId, email, at }: { personId: string; email: string; at: Date },
): Promise<'confirmed' | 'taken'> {
  const account = await findAccount(tx, personId);
  if (account?.email !== email) return 'confirmed';
  if (!account.proven)
    return (await setEmail(tx, { personId, email, confirmedAt: at })) === 'taken' ? 'taken' : 'confirmed';
  await tx
    .update(people)
    .set({ emailConfirmedAt: at })
    .where(and(eq(people.id, personId), isNull(people.emailConfirmedAt)));
  return 'confirmed';
}

/** @returns "taken" when somebody has this e-mail already; the transaction is still good then */
export async function setEmail(
  tx: DatabaseOrTransaction,
  { personId, email, confirmedAt }: { personId: string; email: string; confirmedAt: Date | null },
): Promise<'changed' | 'taken'> {
  const [other] = await tx.select({ id: people.id }).from(people).where(eq(people.email, email));
  if (other && other.id !== personId) return 'taken';
  const passwordHash = await findPasswordHash(tx, personId);
  await tx.update(people).set({ email, passwordHash, emailConfirmedAt: confirmedAt }).where(eq(people.id, personId));
  await tx.delete(unprovenAccounts).where(eq(unprovenAccounts.personId, personId));
  return 'changed';
}

/** Once closed they stay closed, with the time of the first closing. */
export async function setTourClosed(db: DatabaseOrTransaction, personId: string, at: Date): Promise<void> {
  await db
    .update(people)
    .set({ tourClosedAt: at })
    .where(and(eq(people.id, personId), isNull(people.tourClosedAt)));
}

/** Nobody but the person chooses it, and no household sees it: the caller has the id from the session. */
export async function setPersonLanguage(
  db: DatabaseOrTransaction,
  personId: string,
  language: Language,
): Promise<void> {
  await db.update(people).set({ language }).where(eq(people.id, personId));
}

/** What the password of a person is checked against; null for whoever has none. */
export async function findPasswordHash(db: DatabaseOrTransaction, personId: string): Promise<string | null> {
  return (await findAccount(db, personId))?.passwordHash ?? null;
}

export async function setPasswordHash(
  tx: DatabaseOrTransaction,
  personId: string,
  passwordHash: string,
): Promise<void> {
  const proven = and(eq(people.id, personId), isNotNull(people.email));
  await tx.update(people).set({ passwordHash }).where(proven);
  await tx.update(unprovenAccounts).set({ passwordHash }).where(eq(unprovenAccounts.personId, personId));
}
