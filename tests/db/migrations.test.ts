import { readdirSync, readFileSync } from 'node:fs';
import { generateSQLiteDrizzleJson, generateSQLiteMigration } from 'drizzle-kit/api';
import { describe, expect, it } from 'vitest';
import * as schema from '@/db/schema';

type Snapshot = Awaited<ReturnType<typeof generateSQLiteDrizzleJson>>;

describe('the migrations', () => {
  it('make the tables that db/schema describes: otherwise run `npm run db:generate`', async () => {
    const newest = readdirSync('drizzle/meta')
      .filter((file) => file.endsWith('_snapshot.json'))
      .sort()
      .at(-1);
    const migrated = JSON.parse(readFileSync(`drizzle/meta/${newest}`, 'utf8')) as Snapshot;
    const described = await generateSQLiteDrizzleJson(schema, migrated.id);
    expect(await generateSQLiteMigration(migrated, described)).toEqual([]);
  });
});
