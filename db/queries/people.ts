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

/** What a person's own account shows of them; null for an id that nobody has. */
export async function findAccount(db: DatabaseOrTransaction, personId: string) {
  const [person] = await db
    .select({ name: people.name, email: people.email, passwordHash: people.passwordHash })
    .from(people)
    .where(eq(people.id, personId));
  return person ?? null;
}

export async function setPasswordHash(
  db: DatabaseOrTransaction,
  personId: string,
  passwordHash: string,
): Promise<void> {
  await db.update(people).set({ passwordHash }).where(eq(people.id, personId));
}
