import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { accountLinks, invitations, outgoingMails, people } from '@/db/schema';
import { environment } from '@/lib/env';
import { deliverDueMails } from '@/lib/services/deliver-mail';
import { call, cookieOf, serveFreshDatabase } from '@/tests/support/api';
import { MailServer, readMail } from '@/tests/support/mail-server';

let db: Database;
let server: MailServer;
beforeAll(async () => {
  server = await MailServer.start();
  db = serveFreshDatabase();
  // Read once, at the first call: set before anything asks.
  process.env.SMTP_URL = server.url;
  process.env.MAIL_FROM = 'wadewell@pool.example';
});
afterAll(() => server.stop());

const password = 'larch water evening';
const cookie = (response: Response) => cookieOf(response.headers.get('set-cookie'));
const signUp = async (email: string, locale = 'en-US') => {
  const pool = { householdName: 'The Larches', timeZone: 'Europe/Madrid', unitSystem: 'metric', locale };
  return cookie(await call('POST', '/api/sign-up', { body: { name: 'Ines', email, password, ...pool } }));
};
const signIn = (email: string, secret = password) =>
  call('POST', '/api/sign-in', { body: { email, password: secret } });
const confirm = (token: string) => call('POST', '/api/email-confirmations', { body: { token } });
const account = async (as: string) => (await call('GET', '/api/account', { cookie: as })).json() as Promise<unknown>;

/** The newest mail to an address once everything that waits has been sent: its words, and the token of its link. */
async function mailTo(email: string, about: RegExp) {
  await expect
    .poll(async () => {
      await deliverDueMails(db, new Date(), environment().mail);
      return server.to(email)?.source.replace(/\r\n[ \t]+/g, '') ?? '';
    })
    .toMatch(about);
  const mail = readMail(server.to(email)?.source ?? '');
  return { ...mail, token: /\/(?:confirm|reset|invitation)\/([\w-]{43})/.exec(mail.text)?.[1] ?? '' };
}

const confirmed = async (email: string) => {
  const as = await signUp(email);
  await confirm((await mailTo(email, /\/confirm\//)).token);
  return as;
};
const anotherToken = 'x'.repeat(43);

describe('an address', () => {
  it('is confirmed by whoever reads its mail, and by pressing, not by opening', async () => {
    const as = await signUp('ines@pool.example');
    expect(await account(as)).toMatchObject({ email: 'ines@pool.example', confirmed: false, sendsMail: true });
    const { token, html } = await mailTo('ines@pool.example', /\/confirm\//);
    expect(html).toContain(`/confirm/${token}`);
    expect((await confirm(anotherToken)).status).toBe(409);
    expect(await account(as)).toMatchObject({ confirmed: false });
    expect((await confirm(token)).status).toBe(200);
    expect(await account(as)).toMatchObject({ confirmed: true, mail: { state: 'sent' } });
    expect((await confirm(token)).status).toBe(409);
  });

  it('is asked about in the language of the person', async () => {
    await signUp('ines-es@pool.example', 'es-ES');
    expect((await mailTo('ines-es@pool.example', /\/confirm\//)).text).toContain('Hola, Ines:');
  });

  it('is asked about again on request, five times an hour, with the newest link alone', async () => {
    const as = await signUp('again@pool.example');
    const first = await mailTo('again@pool.example', /\/confirm\//);
    const ask = () => call('POST', '/api/account/confirmation', { cookie: as });
    expect((await ask()).status).toBe(200);
    const second = await expect
      .poll(async () => (await mailTo('again@pool.example', /\/confirm\//)).token)
      .not.toBe(first.token)
      .then(() => mailTo('again@pool.example', /\/confirm\//));
    expect((await confirm(first.token)).status).toBe(409);
    expect((await confirm(second.token)).status).toBe(200);
    for (let times = 0; times < 4; times += 1) expect((await ask()).status).toBe(200);
    expect((await ask()).status).toBe(429);
  });

  it('whose mail server refuses is shown to whoever it is of', async () => {
    server.refuse = (email) => (email === 'wrong@pool.example' ? { code: 550, message: 'No such user' } : undefined);
    const as = await signUp('wrong@pool.example');
    await expect.poll(() => account(as)).toMatchObject({ mail: { state: 'refused', refusal: /550/ } });
    server.refuse = () => undefined;
  });
});

describe('an address that somebody has', () => {
  const other = 'heron over the mill';
  const signUpAgain = async (email: string) => {
    const pool = { householdName: 'Heron', timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'en-US' };
    const body = { name: 'Click http://elsewhere.example', email, password: other, ...pool };
    return call('POST', '/api/sign-up', { body });
  };

  it('is told by mail alone, to whoever has it, without a word of whoever asked', async () => {
    const as = await confirmed('has@pool.example');
    const again = await signUpAgain('has@pool.example');
    expect([again.status, await again.json()]).toEqual([200, { next: '/first-run' }]);
    const { text } = await mailTo('has@pool.example', /You have an account/);
    expect(text).toContain('Hello Ines,');
    expect(text).toContain('/sign-in');
    expect(text).not.toMatch(/elsewhere|\/confirm\//);
    // Both passwords lead to the account that they belong to, and the first is untouched.
    const entered = async (secret: string) => account(cookie(await signIn('has@pool.example', secret)));
    expect(await entered(password)).toMatchObject({ email: 'has@pool.example', confirmed: true });
    expect(await entered(other)).toMatchObject({ email: 'has@pool.example', confirmed: false });
    expect(await account(as)).toMatchObject({ confirmed: true });
  });

  it('is nobody else’s to take: a forgotten password is replaced for whoever showed that it is theirs', async () => {
    await confirmed('owns@pool.example');
    await signUpAgain('owns@pool.example');
    await call('POST', '/api/password-resets', { body: { email: 'owns@pool.example' } });
    const { token } = await mailTo('owns@pool.example', /\/reset\//);
    await call('PUT', '/api/password-resets', { body: { token, password: 'a third one for good measure' } });
    expect((await signIn('owns@pool.example', 'a third one for good measure')).status).toBe(200);
    const first = cookie(await signIn('owns@pool.example', 'a third one for good measure'));
    expect(await account(first)).toMatchObject({ confirmed: true });
  });

  it('goes to the first of two who shows it; the second is told at the link', async () => {
    const first = await signUp('both@pool.example');
    const one = await mailTo('both@pool.example', /\/confirm\//);
    const second = cookie(await signUpAgain('both@pool.example'));
    await expect.poll(async () => (await mailTo('both@pool.example', /\/confirm\//)).token).not.toBe(one.token);
    const two = await mailTo('both@pool.example', /\/confirm\//);
    expect((await confirm(two.token)).status).toBe(200);
    const late = await confirm(one.token);
    expect(late.status).toBe(409);
    expect(await late.json()).toMatchObject({ error: { message: expect.stringContaining('Another account') } });
    expect(await account(second)).toMatchObject({ confirmed: true });
    expect(await account(first)).toMatchObject({ confirmed: false });
  });
});

describe('another address', () => {
  const change = (as: string, email: string, current = password) =>
    call('PUT', '/api/account/email', { cookie: as, body: { current, email } });

  it('holds once it is confirmed; the one before is told', async () => {
    const as = await confirmed('before@pool.example');
    expect((await change(as, 'after@pool.example')).status).toBe(200);
    expect(await account(as)).toMatchObject({ email: 'before@pool.example', awaited: 'after@pool.example' });
    expect((await mailTo('before@pool.example', /after@pool\.example/)).text).toContain('after@pool.example');
    const { token } = await mailTo('after@pool.example', /\/confirm\//);
    expect((await confirm(token)).status).toBe(200);
    expect(await account(as)).toMatchObject({ email: 'after@pool.example', confirmed: true, awaited: null });
    expect((await signIn('before@pool.example')).status).toBe(401);
    expect((await signIn('after@pool.example')).status).toBe(200);
  });

  it('is for whoever knows the password', async () => {
    const as = await signUp('knows@pool.example');
    const refused = await change(as, 'other@pool.example', 'not the password');
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ error: { problems: [{ path: 'current' }] } });
    expect(await account(as)).toMatchObject({ awaited: null });
  });

  it('that somebody has is answered alike, gets no mail, and changes nothing', async () => {
    await confirmed('taken@pool.example');
    const as = await confirmed('wants@pool.example');
    const before = server.mails.length;
    const [free, taken] = [await change(as, 'free@pool.example'), await change(as, 'taken@pool.example')];
    expect([taken.status, await taken.text()]).toEqual([free.status, await free.text()]);
    expect(await account(as)).toMatchObject({ email: 'wants@pool.example', awaited: 'taken@pool.example' });
    await mailTo('free@pool.example', /\/confirm\//);
    expect(server.mails.slice(before).filter(({ to }) => to.includes('taken@pool.example'))).toEqual([]);
  });

  it('that was taken meanwhile is refused at the link, with a sentence', async () => {
    const as = await confirmed('slow@pool.example');
    await change(as, 'race@pool.example');
    const { token } = await mailTo('race@pool.example', /\/confirm\//);
    await signUp('race@pool.example');
    const newest = async () => (await mailTo('race@pool.example', /\/confirm\//)).token;
    await expect.poll(newest).not.toBe(token);
    expect((await confirm(await newest())).status).toBe(200);
    const refused = await confirm(token);
    expect(refused.status).toBe(409);
    expect(await refused.json()).toMatchObject({ error: { message: expect.stringContaining('Another account') } });
    expect(await account(as)).toMatchObject({ email: 'slow@pool.example' });
  });
});

describe('a forgotten password', () => {
  const ask = (email: string) => call('POST', '/api/password-resets', { body: { email } });
  const choose = (token: string, secret: string) =>
    call('PUT', '/api/password-resets', { body: { token, password: secret } });

  it('is replaced by whoever reads the mail of the account, and every device is signed out', async () => {
    const as = await signUp('forgot@pool.example');
    expect((await ask('Forgot@pool.example')).status).toBe(200);
    const { token } = await mailTo('forgot@pool.example', /\/reset\//);
    expect((await choose(token, 'password12')).status).toBe(422);
    expect((await choose(token, 'another evening altogether')).status).toBe(200);
    expect((await call('GET', '/api/account', { cookie: as })).status).toBe(401);
    expect((await signIn('forgot@pool.example')).status).toBe(401);
    expect((await signIn('forgot@pool.example', 'another evening altogether')).status).toBe(200);
    // Whoever could read that mail has the address.
    const [person] = await db.select().from(people).where(eq(people.email, 'forgot@pool.example'));
    expect(person?.emailConfirmedAt).not.toBeNull();
    expect((await choose(token, 'a third one for good measure')).status).toBe(409);
    await mailTo('forgot@pool.example', /was=20changed|was changed/);
  });

  it('is answered alike for an address that nobody has, which gets no mail', async () => {
    await signUp('known@pool.example');
    const [known, unknown] = [await ask('known@pool.example'), await ask('unknown@pool.example')];
    expect([unknown.status, await unknown.text()]).toEqual([known.status, await known.text()]);
    await mailTo('known@pool.example', /\/reset\//);
    expect(server.to('unknown@pool.example')).toBeUndefined();
  });

  it('goes to the address of the account, not to one that only looks like it', async () => {
    await signUp('mika@pool.example');
    // Full-width letters are another spelling of the same; a Cyrillic letter is another address.
    expect((await ask('ｍｉｋａ@pool.example')).status).toBe(200);
    await mailTo('mika@pool.example', /\/reset\//);
    const refused = await ask('mikа@pool.example');
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({
      error: { problems: [{ path: 'email', message: expect.stringContaining('letters beyond a to z') }] },
    });
  });

  it('is over after an hour, opens nothing else, and is kept as a digest only', async () => {
    await signUp('digest@pool.example');
    await ask('digest@pool.example');
    const { token } = await mailTo('digest@pool.example', /\/reset\//);
    expect((await confirm(token)).status).toBe(409);
    expect(JSON.stringify(await db.select().from(accountLinks))).not.toContain(token);
    expect(JSON.stringify(await db.select().from(outgoingMails))).not.toContain(token);
    await db.update(accountLinks).set({ expiresAt: new Date(Date.now() - 1) });
    expect((await choose(token, 'another evening altogether')).status).toBe(409);
    expect((await signIn('digest@pool.example')).status).toBe(200);
  });

  it('can be asked for five times an hour', async () => {
    for (let times = 0; times < 5; times += 1) expect((await ask('often@pool.example')).status).toBe(200);
    expect((await ask('often@pool.example')).status).toBe(429);
  });
});

describe('an invitation by mail', () => {
  const invite = (as: string, email?: string, name = 'Otto') =>
    call('POST', '/api/invitations', {
      cookie: as,
      body: { id: crypto.randomUUID(), name, email, role: 'viewer', chemicalsAllowed: false },
    });

  it('goes out in the name of somebody whose own address is confirmed', async () => {
    const as = await signUp('inviter@pool.example', 'es-ES');
    const refused = await invite(as, 'guest@pool.example');
    expect(refused.status).toBe(409);
    expect(await refused.json()).toMatchObject({ error: { message: expect.stringContaining('Confirma antes') } });
    await confirm((await mailTo('inviter@pool.example', /\/confirm\//)).token);
    const sent = await invite(as, 'guest@pool.example');
    expect(await sent.json()).toMatchObject({ link: null, mailFrom: 'here', invitations: [{ name: 'Otto' }] });
    // In the language of the household.
    const { text, token } = await mailTo('guest@pool.example', /\/invitation\//);
    expect(text).toContain('Hola, Otto:');
    const joins = await call('POST', '/api/invitations/sign-up', {
      body: { token, name: 'Otto', email: 'guest@pool.example', password, locale: 'en' },
    });
    expect(joins.status).toBe(200);
  });

  it('is sent again with another link, shown when it is refused, and not sent once it is withdrawn', async () => {
    const as = await confirmed('owner@pool.example');
    const people = async () =>
      (await (await call('GET', '/api/members', { cookie: as })).json()) as { invitations: { id: string }[] };
    server.refuse = (email) => (email === 'away@pool.example' ? { code: 451, message: 'Try later' } : undefined);
    await invite(as, 'away@pool.example');
    await expect.poll(people).toMatchObject({ invitations: [{ mail: { state: 'refused', refusal: /451/ } }] });
    const { id } = (await people()).invitations[0]!;
    await call('PUT', '/api/invitations/[id]', { cookie: as, path: { id } });
    await expect.poll(people).toMatchObject({ invitations: [{ mail: { state: 'refused' } }] });
    expect(await db.select().from(outgoingMails).where(eq(outgoingMails.subjectId, id))).toHaveLength(1);
    server.refuse = () => undefined;
    await call('PUT', '/api/invitations/[id]', { cookie: as, path: { id } });
    await mailTo('away@pool.example', /\/invitation\//);
    await expect.poll(people).toMatchObject({ invitations: [{ mail: { state: 'sent' } }] });
    server.refuse = () => ({ code: 451, message: 'Try later' });
    await invite(as, 'gone@pool.example', 'Lena');
    const lena = (await people()).invitations[1]!;
    await call('DELETE', '/api/invitations/[id]', { cookie: as, path: { id: lena.id } });
    expect(await db.select().from(outgoingMails).where(eq(outgoingMails.subjectId, lena.id))).toEqual([]);
    server.refuse = () => undefined;
  });

  it.each([
    ['a line break', 'otto@pool.example\nBcc: all@pool.example', 'email'],
    ['a second address', 'otto@pool.example,all@pool.example', 'email'],
    ['a name with it', 'Otto <otto@pool.example>', 'email'],
    ['letters that look alike', 'оtto@pool.example', 'email'],
    ['nothing that can be seen', 'otto\u200b@pool.example', 'email'],
    ['no dot in its domain', 'otto@localhost', 'email'],
  ])('is not sent to an address with %s', async (_, email, path) => {
    const as = await signedInOwner();
    const rows = await db.$count(invitations);
    const refused = await invite(as, email);
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ error: { problems: [{ path }] } });
    expect(await db.$count(invitations)).toBe(rows);
  });

  it.each([
    ['breaks the line', 'Otto\r\nSubject: another'],
    ['turns the writing round', 'Otto \u202eknab'],
  ])('is not sent to a name that %s', async (_, name) => {
    const refused = await invite(await signedInOwner(), 'otto@pool.example', name);
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ error: { problems: [{ path: 'name' }] } });
  });

  it('goes out twenty times a day and no more', async () => {
    const as = await confirmed('many@pool.example');
    const [first] = await db.select().from(people).where(eq(people.email, 'many@pool.example'));
    for (let mail = 0; mail < 20; mail += 1) {
      expect((await invite(as, `guest-${mail}@pool.example`)).status).toBe(200);
      await db.update(invitations).set({ withdrawnAt: new Date() }).where(eq(invitations.createdBy, first!.id));
    }
    const refused = await invite(as, 'one-more@pool.example');
    expect(refused.status).toBe(409);
    expect((await invite(as)).status).toBe(200);
  });

  let ownerCookie: string | undefined;
  async function signedInOwner() {
    ownerCookie ??= await confirmed('tricks@pool.example');
    return ownerCookie;
  }
});

describe('the mailbox page of a machine', () => {
  it('is none where a mail server is set', async () => {
    const { hasMailbox } = await import('@/lib/services/show-mailbox');
    expect(hasMailbox()).toBe(false);
  });
});
