import pino from 'pino';
import { describe, expect, it } from 'vitest';
import { people } from '@/db/schema';
import { logTo, withoutParameters } from '@/lib/log';
import { freshDatabase } from '@/tests/support/test-database';

describe('the log of a fault', () => {
  it('says which query failed and why, without what it was called with', async () => {
    const db = freshDatabase();
    const person = {
      id: 'p',
      name: 'Ines',
      email: 'INES@pool.example',
      passwordHash: 'digest\nof it',
      createdAt: new Date(),
    };
    const failed = await db
      .insert(people)
      .values(person)
      .then(
        () => undefined,
        (error: unknown) => error as Error,
      );
    if (!failed) throw new Error('A badly written e-mail was taken.');
    const told = JSON.stringify(withoutParameters(pino.stdSerializers.err(failed)));
    expect(JSON.stringify(pino.stdSerializers.err(failed))).toContain('INES@pool.example');
    expect(told).not.toMatch(/INES@pool|digest|of it/);
    expect(told).toContain('insert into');
    expect(told).toContain('people_email_is_normalised');
  });

  it('names nobody whom a mail server does not know', () => {
    const told = withoutParameters({
      message: '550 No such user <ines@pool.example>',
      stack: 'Error: for ines@pool.example\n    at x (/node_modules/@libsql/client.js:1:1)',
    });
    expect(JSON.stringify(told)).not.toContain('ines@');
    expect(told.stack).toContain('/node_modules/@libsql/client.js:1:1');
  });
});

it('leaves out what could sign somebody in, at whatever depth it is handed over', () => {
  const lines: string[] = [];
  const logger = logTo({ write: (line) => void lines.push(line) });
  const secret = 'larch water evening';
  logger.info({ password: secret, body: { email: secret, input: { current: secret, token: secret } } }, 'planted');
  logger.info({ headers: { cookie: secret, 'set-cookie': [secret], authorization: secret } }, 'planted');
  expect(lines).toHaveLength(2);
  expect(lines.join('')).not.toContain(secret);
  expect(lines.join('')).toContain('[left out]');
});
