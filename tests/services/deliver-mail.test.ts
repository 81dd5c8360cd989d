import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '@/db/client';
import { claimDueMails, insertOutgoingMail } from '@/db/queries/outgoing-mails';
import { outgoingMails } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { systemScope } from '@/lib/auth/system-scope';
import { log } from '@/lib/log';
import { deliverDueMails } from '@/lib/services/deliver-mail';
import { MailServer, readMail } from '@/tests/support/mail-server';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const minutes = (count: number) => new Date(now.getTime() + count * 60_000);
const from = 'wadewell@pool.example';

let server: MailServer;
let db: Database;
let owner: HouseholdAccess;
beforeAll(async () => {
  server = await MailServer.start();
});
afterAll(() => server.stop());
beforeEach(async () => {
  server.refuse = () => undefined;
  server.mails.length = 0;
  db = freshDatabase();
  owner = await aHousehold(db, { now });
});

const queue = (email: string, words = 'Hola, ¿qué tal?') =>
  insertOutgoingMail(db, {
    ...{ id: randomUUID(), personId: owner.personId, email, language: 'en', subject: 'Ä subject – with signs' },
    ...{ text: `${words}\n`, html: `<p>${words}</p>`, createdAt: now, nextTryAt: now },
  });
const deliver = (at = now) => deliverDueMails(db, at, { way: 'smtp', url: server.url, from });
const row = async () => (await db.select().from(outgoingMails))[0];

describe('mail', () => {
  it('leaves once, as text and as HTML, and its words are not kept', async () => {
    await queue('otto@pool.example');
    expect(await deliver()).toEqual({ sent: 1, refused: 0 });
    expect(await deliver(minutes(60))).toEqual({ sent: 0, refused: 0 });
    expect(server.mails).toMatchObject([{ to: ['otto@pool.example'], from }]);
    const { headers, text, html } = readMail(server.mails[0]?.source ?? '');
    expect(headers).toMatch(/^From: Wadewell <wadewell@pool\.example>/m);
    expect(text).toContain('Hola, ¿qué tal?');
    expect(html).toContain('<p>Hola, ¿qué tal?</p>');
    expect(await row()).toMatchObject({ text: null, html: null, nextTryAt: null, sentAt: now, refusal: null });
  });

  it('is sent by one of two that look at once', async () => {
    for (let mail = 0; mail < 5; mail += 1) await queue(`guest-${mail}@pool.example`);
    const counts = await Promise.all([deliver(), deliver()]);
    expect(counts.map(({ sent }) => sent).reduce((sum, sent) => sum + sent)).toBe(5);
    expect(server.mails).toHaveLength(5);
  });

  it('that is refused is tried again later and later, and given up in the end', async () => {
    server.refuse = () => ({ code: 450, message: 'Mailbox is busy' });
    await queue('otto@pool.example');
    // Each try comes with its wait before the next: a minute, five, half an hour, two hours, eight.
    let at = 0;
    for (const wait of [1, 5, 30, 120, 480]) {
      expect(await deliver(minutes(at))).toEqual({ sent: 0, refused: 1 });
      expect(await deliver(minutes(at + wait - 0.01))).toEqual({ sent: 0, refused: 0 });
      expect(await row()).toMatchObject({ nextTryAt: minutes(at + wait), refusal: expect.stringMatching(/450/) });
      at += wait;
    }
    expect(await deliver(minutes(at))).toEqual({ sent: 0, refused: 1 });
    expect(await row()).toMatchObject({ nextTryAt: null, sentAt: null, text: null, html: null, tries: 6 });
    expect(await deliver(minutes(at + 10_000))).toEqual({ sent: 0, refused: 0 });
  });

  it('that was refused once arrives when the server takes it', async () => {
    server.refuse = (email) => (email.startsWith('otto') ? { code: 550, message: 'No such user here' } : undefined);
    await queue('otto@pool.example');
    await queue('lena@pool.example');
    expect(await deliver()).toEqual({ sent: 1, refused: 1 });
    server.refuse = () => undefined;
    expect(await deliver(minutes(1))).toEqual({ sent: 1, refused: 0 });
    expect(server.mails.map(({ to }) => to[0])).toEqual(['lena@pool.example', 'otto@pool.example']);
  });

  it('waits when no server answers', async () => {
    await queue('otto@pool.example');
    const gone = { way: 'smtp', url: 'smtp://127.0.0.1:1', from } as const;
    expect(await deliverDueMails(db, now, gone)).toEqual({ sent: 0, refused: 1 });
    expect(await row()).toMatchObject({ nextTryAt: minutes(1), refusal: expect.stringContaining('ECONNREFUSED') });
  });

  it('goes out again when whoever took it ended before it said how it went', async () => {
    await queue('otto@pool.example');
    await claimDueMails(db, systemScope('mail'), { now, until: minutes(10), most: 20 });
    expect(await deliver(minutes(9))).toEqual({ sent: 0, refused: 0 });
    expect(await deliver(minutes(10))).toEqual({ sent: 1, refused: 0 });
  });

  it('is kept with its words on a machine that has a mailbox page, and stays where none leaves', async () => {
    await queue('otto@pool.example');
    expect(await deliverDueMails(db, now, { way: 'none' })).toEqual({ sent: 0, refused: 0 });
    expect(await row()).toMatchObject({ nextTryAt: now });
    expect(await deliverDueMails(db, now, { way: 'local' })).toEqual({ sent: 1, refused: 0 });
    expect(await row()).toMatchObject({ text: 'Hola, ¿qué tal?\n', sentAt: now });
    expect(server.mails).toEqual([]);
  });

  it('never names whom a refusal is about in the log', async () => {
    const warned = vi.spyOn(log(), 'warn').mockImplementation(() => undefined);
    server.refuse = (email) => ({ code: 550, message: `No such user: ${email}` });
    await queue('otto@pool.example');
    await deliver();
    expect(warned).toHaveBeenCalledTimes(1);
    expect(JSON.stringify(warned.mock.calls)).not.toContain('otto');
    warned.mockRestore();
  });
});
