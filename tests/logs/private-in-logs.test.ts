import { copyFileSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { people } from '@/db/schema';
import { checkLogs, privateIn } from '../e2e/support/private-in-logs';
import { freshDatabase } from '../support/test-database';

const known = { names: ['Ines', 'Marrow Lane'], words: ['four words in a row'] };
const ordinary = [
  '▲ Next.js 16.4.6',
  '- Local:         http://127.0.0.1:41234',
  '{"level":30,"time":1796271195074,"pid":30149,"hostname":"vm","name":"wadewell","copy":"/data/x.db","msg":"the database was copied"}',
  '{"level":50,"errorId":"9f756f65-127f-4b2d-8627-c7a49fa337eb","inputHash":"db4193f94e2a5f7acb357d856e2b2fbd74629c7c8d0939071c15107b15ae2b01","err":{"stack":"at plan (/x/node_modules/@libsql/client.js:115:13)"}}',
  'Mail is kept at http://127.0.0.1:3000/mailbox?key=abcdefghijklmnopqrstuvwx',
  'Inesita is another word',
];

describe('a log', () => {
  it('holds nothing private as it should be', () => {
    expect(privateIn(ordinary.join('\n'), known)).toEqual([]);
  });

  it.each([
    ['an e-mail address', '{"msg":"sent to ines@pool.example"}'],
    ['a secret word', '{"body":"four words in a row"}'],
    ['a password field', '{"input":{"password":"hunter two"}}'],
    ['a password, hashed', 'params: $argon2id$v=19$m=19456'],
    ['a session', `{"token":"${'abcde234fg'.repeat(4)}"}`],
    ['a cookie', '{"headers":{"cookie":"theme=dark"}}'],
    ['a cookie', 'Set-Cookie: x=1'],
    ['a name', '{"msg":"Ines has signed in"}'],
    ['a name', 'household Marrow Lane was closed'],
    ['a link that opens something', `GET /reset/${'x'.repeat(43)}`],
    ['a secret word', 'GET /mailbox?key=abcdefghijklmnopqrstuvwx 200'],
  ])('with %s in it is found: %s', (what, line) => {
    const found = privateIn([...ordinary, line].join('\n'), known);
    expect(found).toEqual([`line ${ordinary.length + 1} holds ${what}`]);
  });

  it('is looked through for everybody whom a database of the run knows', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'logs-'));
    const db = freshDatabase();
    await db.insert(people).values({ id: crypto.randomUUID(), name: 'Wilhelmina', createdAt: new Date() });
    await db.run(sql`PRAGMA wal_checkpoint(TRUNCATE)`);
    copyFileSync(db.url.slice('file:'.length), join(folder, 'test-run.db'));
    writeFileSync(join(folder, 'good.log'), ordinary.join('\n'));
    writeFileSync(join(folder, 'bad.log'), '{"msg":"a fault for Wilhelmina"}');
    const checks = await checkLogs(0, folder);
    expect(checks.toSorted((a, b) => (a.name < b.name ? -1 : 1))).toEqual([
      { name: 'bad.log', found: ['line 1 holds a name'] },
      { name: 'good.log', found: [] },
    ]);
    expect(await checkLogs(Date.now() + 60_000, folder)).toEqual([]);
  });
});
