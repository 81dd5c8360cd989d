import 'server-only';
import { eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { people } from '@/db/schema';
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
