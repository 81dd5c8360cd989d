import { createClient } from '@libsql/client';
import { rmSync } from 'node:fs';
import { Person } from './person';
import { databaseFileOf, Server } from './server';

const known = new Map<string, Promise<string>>();

/**
 * A database as a server leaves it that was started at a time and has made its demo household, which costs the engine some
 * seconds. It is made once for each such time; what starts from a copy of it can do its own work at once.
 */
export function seededDatabase(clock: string): Promise<string> {
  const making = known.get(clock) ?? make(clock, known.size);
  known.set(clock, making);
  return making;
}

async function make(clock: string, number: number): Promise<string> {
  const server = await Server.start({ name: `seed-${number}`, clock, fresh: true });
  try {
    await new Person(server).must('POST', '/api/look-round');
  } finally {
    await server.stop();
  }
  const file = databaseFileOf(`seeded-${number}`);
  rmSync(file, { force: true });
  const client = createClient({ url: `file:${server.databaseFile}` });
  try {
    // Whole, with what the write-ahead log still holds.
    await client.execute({ sql: 'vacuum into ?', args: [file] });
  } finally {
    client.close();
  }
  return file;
}
