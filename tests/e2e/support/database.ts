import { createClient } from '@libsql/client';
import { randomUUID } from 'node:crypto';
import type { Role } from '@/lib/schemas/week-sheet';
import type { Server } from './server';

/** How many rows each table has: what was refused leaves all of them as they were. */
export async function rowCounts(server: Server): Promise<Record<string, number>> {
  const client = createClient({ url: `file:${server.databaseFile}` });
  try {
    const tables = await client.execute(
      `select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name not like '\\_\\_%' escape '\\'`,
    );
    const names = tables.rows.map(({ name }) => String(name));
    const counts = await Promise.all(names.map((name) => client.execute(`select count(*) as rows from "${name}"`)));
    return Object.fromEntries(names.map((name, index) => [name, Number(counts[index]?.rows[0]?.rows)]));
  } finally {
    client.close();
  }
}

/** Makes somebody who has signed up a member of one more household, as an accepted invitation would. */
export async function joinHousehold(
  server: Server,
  { email, householdId, role }: { email: string; householdId: string; role: Role },
): Promise<void> {
  const client = createClient({ url: `file:${server.databaseFile}` });
  try {
    await client.execute({
      sql: `insert into memberships (id, household_id, person_id, role, handles_chemicals, valid_from)
            select ?, ?, people.id, ?, 0, memberships.valid_from
            from people join memberships on memberships.person_id = people.id where people.email = ?`,
      args: [randomUUID(), householdId, role, email],
    });
  } finally {
    client.close();
  }
}
