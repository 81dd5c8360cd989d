import pino from 'pino';
import { describe, expect, it } from 'vitest';
import { people } from '@/db/schema';
import { withoutParameters } from '@/lib/log';
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
});
