import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { people } from '@/db/schema';
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

/** The account of a person, for that person: the caller has the id from the session, or from a link of theirs. */
export async function findAccount(db: DatabaseOrTransaction, personId: string) {
  const [person] = await db
    .select({
      name: people.name,
      email: people.email,
      emailConfirmedAt: people.emailConfirmedAt,
      language: people.language,
      passwordHash: people.passwordHash,
    })
    .from(people)
    .where(eq(people.id, personId));
  return person ?? null;
}

/** Whoever reads the mail of this address is this person; not for an address that was changed meanwhile. */
export async function setEmailConfirmed(
  db: DatabaseOrTransaction,
  { personId, email, at }: { personId: string; email: string; at: Date },
): Promise<void> {
  await db
    .update(people)
    .set({ emailConfirmedAt: at })
    .where(and(eq(people.id, personId), eq(people.email, email), isNull(people.emailConfirmedAt)));
}

/** @returns "taken" when somebody has this e-mail already; the transaction is still good then */
export async function setEmail(
  tx: DatabaseOrTransaction,
  { personId, email, confirmedAt }: { personId: string; email: string; confirmedAt: Date | null },
): Promise<'changed' | 'taken'> {
  const [other] = await tx.select({ id: people.id }).from(people).where(eq(people.email, email));
  if (other && other.id !== personId) return 'taken';
  await tx.update(people).set({ email, emailConfirmedAt: confirmedAt }).where(eq(people.id, personId));
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
  const [person] = await db.select({ hash: people.passwordHash }).from(people).where(eq(people.id, personId));
  return person?.hash ?? null;
}

export async function setPasswordHash(
  db: DatabaseOrTransaction,
  personId: string,
  passwordHash: string,
): Promise<void> {
  await db.update(people).set({ passwordHash }).where(eq(people.id, personId));
}
