import { createClient } from '@libsql/client';
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
