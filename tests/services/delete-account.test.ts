import { randomUUID } from 'node:crypto';
import { eq, getTableColumns, is, sql } from 'drizzle-orm';
import { getTableConfig, SQLiteTable } from 'drizzle-orm/sqlite-core';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import * as schema from '@/db/schema';
import { auditTrail, households, invitations, memberships, people, photos, rounds, sessions } from '@/db/schema';
import { type HouseholdAccess, proveHousehold } from '@/lib/auth/household-access';
import { hashPassword } from '@/lib/auth/passwords';
import { openVisit } from '@/lib/auth/visit';
import type { SignedIn } from '@/lib/auth/sessions';
import { changeMember } from '@/lib/services/change-member';
import { closeHousehold } from '@/lib/services/close-household';
import { deleteAccount, showDeletion } from '@/lib/services/delete-account';
import { invite } from '@/lib/services/invite';
import { joinHousehold } from '@/lib/services/join-household';
import { makeHousehold } from '@/lib/services/make-household';
import { recordReading } from '@/lib/services/record-reading';
import { recordRound } from '@/lib/services/record-round';
import { listReadings } from '@/lib/services/list-readings';
import { showRounds } from '@/lib/services/show-rounds';
import { signIn } from '@/lib/services/sign-in';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const later = new Date('2026-07-06T12:00:00Z');
const password = 'larch water evening';
const secret = 'a secret of this test, long enough to be one';

let db: Database;
let hash: string;
let owner: HouseholdAccess;
let other: HouseholdAccess;
beforeEach(async () => {
  db = freshDatabase();
  hash ??= await hashPassword(password);
  owner = await aHousehold(db);
  other = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
  await db.update(people).set({ passwordHash: hash });
});

const as = (access: HouseholdAccess, at = now) => ({ db, access, now: at });

/** A device on which somebody is signed in, in the household they are proven for. */
async function on({ personId, householdId }: { personId: string; householdId: string | null }, at = later) {
  const visit = await openVisit(new Headers(), { db, now: at, secure: false, secret });
  await visit.enter(personId, householdId);
  return visit as typeof visit & { signedIn: SignedIn };
}
const remove = async (access: HouseholdAccess, deletes: string[] = [], at = later) =>
  deleteAccount(await on(access, at), { password, deletes });
const personOf = async ({ personId }: HouseholdAccess) =>
  (await db.select().from(people).where(eq(people.id, personId)))[0];
const lookAgain = (access: HouseholdAccess) => proveHousehold(db, { ...access, now: later });
const aReading = () => ({
  ...({ id: randomUUID(), takenAt: '2026-07-05T11:00:00Z', kind: 'quick', method: 'drop-kit' } as const),
  ...({ values: { freeChlorine: 3, pH: 7.4 }, look: 'clear' } as const),
});

/** Where in the whole database a text still stands, whatever the column. */
async function mentionsOf(text: string): Promise<string[]> {
  const found: string[] = [];
  for (const table of Object.values(schema)) {
    if (!is(table, SQLiteTable)) continue;
    for (const { name } of Object.values(getTableColumns(table))) {
      const column = sql`${table}.${sql.identifier(name)}`;
      const [row] = await db.all<{ rows: number }>(
        sql`select count(*) as rows from ${table} where instr(cast(${column} as text), ${text}) > 0`,
      );
      if (row && row.rows > 0) found.push(`${getTableConfig(table).name}.${name}`);
    }
  }
  return found;
}

describe('deleting an account', () => {
  it('says first what becomes of each household', async () => {
    expect(await showDeletion(await on(owner))).toMatchObject({ households: [{ fate: 'blocked', others: 1 }] });
    expect(await showDeletion(await on(other))).toMatchObject({ households: [{ fate: 'left', others: 1 }] });
    const only = await aHousehold(db);
    expect(await showDeletion(await on(only))).toMatchObject({
      households: [{ id: only.householdId, name: 'The Larches', fate: 'deleted', others: 0 }],
    });
    expect(await db.$count(households)).toBe(2);
  });

  it('leaves what was entered, under nobody’s name, in the language of whoever reads', async () => {
    await recordReading(as(other), aReading());
    await recordRound(as(other), { id: randomUUID(), doneAt: '2026-07-05T11:30:00Z', exceptions: [] });
    await remove(other);
    const [reading] = await listReadings(as(owner), {});
    expect(reading).toMatchObject({ doneBy: 'former member', recordedBy: 'former member' });
    expect((await showRounds(as({ ...owner, language: 'es' }))).last?.doneBy).toBe('quien ya no está');
    expect(await personOf(other)).toMatchObject({
      ...{ name: 'former member', email: null, passwordHash: null, language: 'en', tourClosedAt: null },
      deletedAt: later,
    });
    await expect(lookAgain(other)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await lookAgain(owner)).toMatchObject({ role: 'owner' });
  });

  it('ends every session of the person, and those of nobody else', async () => {
    const phone = await on(other);
    const hers = await on(owner);
    await remove(other);
    expect(await db.select({ id: sessions.id }).from(sessions)).toEqual([{ id: hers.signedIn.sessionId }]);
    expect(phone.signedIn.personId).toBe(other.personId);
  });

  it('frees the e-mail', async () => {
    const email = (await personOf(other))?.email;
    await remove(other);
    const again = { id: randomUUID(), name: 'Otto', email, passwordHash: hash, createdAt: later };
    await db.insert(people).values(again);
    expect(await db.$count(people, eq(people.email, email ?? ''))).toBe(1);
  });

  it('leaves no e-mail, password or name of the person anywhere but in what a household wrote itself', async () => {
    await db.update(people).set({ name: 'Ottokar' }).where(eq(people.id, other.personId));
    await recordReading(as(other), aReading());
    const email = (await personOf(other))?.email ?? '';
    const sent = await invite(as(owner), {
      id: randomUUID(),
      name: 'Ottokar',
      role: 'viewer',
      chemicalsAllowed: false,
    });
    const third = await aHousehold(db);
    await db.update(people).set({ name: 'Ottokar', passwordHash: hash }).where(eq(people.id, third.personId));
    await joinHousehold(
      { db, now, signedIn: (await on(third)).signedIn },
      { token: sent.link?.split('/').at(-1) ?? '' },
    );
    expect(await mentionsOf('Ottokar')).toEqual(['audit_trail.detail', 'invitations.name', 'people.name']);
    await remove(other);
    await remove(third, [third.householdId]);
    expect(await mentionsOf(email)).toEqual([]);
    // Append-only, and the household's own words: whom an owner once invited.
    expect(await mentionsOf('Ottokar')).toEqual(['audit_trail.detail']);
  });

  it('keeps open invitations, without who sent them', async () => {
    await changeMember(as(owner), { role: 'owner', chemicalsAllowed: true }, { id: other.membershipId });
    const second = await lookAgain(other);
    await invite(as(second), { id: randomUUID(), name: 'Nell', role: 'viewer', chemicalsAllowed: false });
    await remove(second);
    expect(await db.select().from(invitations)).toMatchObject([{ name: 'Nell', createdBy: null, withdrawnAt: null }]);
  });

  it('takes a household along of which nobody else is a member, with everything in it', async () => {
    const only = await aHousehold(db);
    await db.update(people).set({ passwordHash: hash }).where(eq(people.id, only.personId));
    await fill(only);
    expect((await mentionsOf(only.householdId)).length).toBeGreaterThan(8);
    await remove(only, [only.householdId]);
    expect(await mentionsOf(only.householdId)).toEqual([]);
    expect(await mentionsOf(only.personId)).toEqual([]);
    expect(await db.$count(people)).toBe(2);
    expect(await db.$count(households)).toBe(1);
  });

  it('takes no household along that was not announced', async () => {
    const only = await aHousehold(db);
    await db.update(people).set({ passwordHash: hash }).where(eq(people.id, only.personId));
    await expect(remove(only)).rejects.toMatchObject({ code: 'conflict' });
    expect(await db.$count(households)).toBe(2);
    expect(await personOf(only)).toMatchObject({ deletedAt: null });
  });

  it('is refused to the last owner while others belong, and nothing of it is done', async () => {
    const own = await aHousehold(db);
    await db.insert(memberships).values({
      ...({ id: randomUUID(), householdId: own.householdId, personId: owner.personId, role: 'viewer' } as const),
      validFrom: now,
    });
    await expect(remove(owner)).rejects.toMatchObject({ code: 'conflict' });
    expect(await personOf(owner)).toMatchObject({ name: 'Ines', deletedAt: null });
    expect(await db.$count(memberships, eq(memberships.personId, owner.personId))).toBe(2);
    expect(await db.$count(auditTrail)).toBe(0);
  });

  it('is refused to whoever does not know the password', async () => {
    const visit = await on(other);
    const wrong = deleteAccount(visit, { password: 'not this one', deletes: [] });
    await expect(wrong).rejects.toMatchObject({ code: 'invalid-input', problems: [{ path: 'password' }] });
    for (let tries = 0; tries < 9; tries += 1)
      await deleteAccount(visit, { password: 'guess', deletes: [] }).catch(() => undefined);
    await expect(deleteAccount(visit, { password, deletes: [] })).rejects.toMatchObject({ code: 'too-many-requests' });
    expect(await personOf(other)).toMatchObject({ deletedAt: null });
  });

  it('is refused to a visitor of the demo', async () => {
    await db.update(people).set({ email: null, passwordHash: null }).where(eq(people.id, other.personId));
    await expect(remove(other)).rejects.toMatchObject({ code: 'not-allowed' });
    await expect(showDeletion(await on(other))).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await personOf(other)).toMatchObject({ name: 'Ines' });
  });

  it('happens once when two tabs ask at once', async () => {
    const [one, two] = [await on(other), await on(other)];
    const answers = await Promise.allSettled([one, two].map((tab) => deleteAccount(tab, { password, deletes: [] })));
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(answers.find(({ status }) => status === 'rejected')).toMatchObject({ reason: { code: 'signed-out' } });
  });

  it('leaves an owner when another is demoted at the same time', async () => {
    await changeMember(as(owner), { role: 'owner', chemicalsAllowed: true }, { id: other.membershipId });
    const second = await lookAgain(other);
    const demoted = { role: 'viewer', chemicalsAllowed: false } as const;
    const answers = await Promise.allSettled([
      remove(second),
      changeMember(as(second, later), demoted, { id: owner.membershipId }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    const owners = await db.select().from(memberships).where(eq(memberships.role, 'owner'));
    expect(owners.filter(({ validUntil }) => validUntil === null)).toHaveLength(1);
  });

  it('happens to one of two owners who delete theirs at once', async () => {
    await changeMember(as(owner), { role: 'owner', chemicalsAllowed: true }, { id: other.membershipId });
    await aMember(db, { householdId: owner.householdId, role: 'viewer', now });
    const answers = await Promise.allSettled([remove(owner), remove(await lookAgain(other))]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('lets nobody in who signed in at the same moment, and nobody join or begin anew', async () => {
    const device = await on(other);
    const invitation = await invite(as(owner), {
      id: randomUUID(),
      name: 'N',
      role: 'viewer',
      chemicalsAllowed: false,
    });
    await remove(other);
    await expect(
      joinHousehold({ db, now: later, signedIn: device.signedIn }, { token: invitation.link?.split('/').at(-1) ?? '' }),
    ).rejects.toMatchObject({ code: 'not-allowed' });
    const household = { name: 'Anew', timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'es' } as const;
    await expect(makeHousehold(device, household)).rejects.toMatchObject({ code: 'not-allowed' });
    const late = await on(other);
    const cookie = late.cookies[0]?.split(';')[0] ?? '';
    const seen = await openVisit(new Headers({ cookie }), { db, now: later, secure: false, secret });
    expect(seen.signedIn).toBeNull();
    expect(await db.$count(sessions)).toBe(0);
  });
});

describe('somebody who is no longer named', () => {
  it('goes with the last household that refers to them', async () => {
    const second = await aHousehold(db);
    await db.insert(memberships).values({
      ...({ id: randomUUID(), householdId: second.householdId, personId: other.personId, role: 'viewer' } as const),
      validFrom: now,
    });
    await db.update(people).set({ passwordHash: hash });
    await recordReading(as(other), aReading());
    await remove(other);
    await close(owner);
    expect(await personOf(other)).toMatchObject({ name: 'former member' });
    await close(second);
    expect(await personOf(other)).toBeUndefined();
    expect(await db.select({ id: people.id }).from(people)).toHaveLength(2);
  });
});

const close = async (access: HouseholdAccess, typed = {}) =>
  closeHousehold({ ...as(access, later), visit: await on(access) }, { password, name: 'The Larches', ...typed });

/** Something of every kind that only needs a household and a person. */
async function fill(access: HouseholdAccess): Promise<void> {
  const { householdId, personId } = access;
  const reading = aReading();
  await recordReading(as(access), reading);
  await recordRound(as(access), { id: randomUUID(), doneAt: '2026-07-05T11:30:00Z', exceptions: ['drain-cover'] });
  await invite(as(access), { id: randomUUID(), name: 'Nell', role: 'viewer', chemicalsAllowed: false });
  await db.insert(photos).values({
    ...({ id: randomUUID(), householdId, kind: 'strip', readingId: reading.id, addedBy: personId } as const),
    ...{ picture: Buffer.from([1]), small: Buffer.from([1]), width: 1, height: 1, addedAt: now },
  });
}

describe('closing a household', () => {
  it('reaches every table there is, but for what is of no household', () => {
    const tables = Object.values(schema).filter((table) => is(table, SQLiteTable));
    const reached = new Set<SQLiteTable>([households]);
    const goesWithReached = (table: SQLiteTable) =>
      getTableConfig(table).foreignKeys.some(
        ({ onDelete, reference }) => onDelete === 'cascade' && reached.has(reference().foreignTable),
      );
    for (let size = 0; size < reached.size;) {
      size = reached.size;
      for (const table of tables) if (goesWithReached(table)) reached.add(table);
    }
    const left = tables.filter((table) => !reached.has(table)).map((table) => getTableConfig(table).name);
    expect(left.sort()).toEqual([
      ...['account_links', 'passkey_challenges', 'passkeys', 'people', 'rate_limits', 'sessions', 'unproven_accounts'],
    ]);
  });

  it('deletes it for everybody, with everything in it', async () => {
    await fill(owner);
    const members = [await on(other), await on(owner)];
    await close(owner);
    expect(await mentionsOf(owner.householdId)).toEqual([]);
    expect(await db.$count(rounds)).toBe(0);
    expect(await db.$count(photos)).toBe(0);
    expect(await db.$count(people)).toBe(2);
    expect(await db.$count(sessions)).toBe(members.length + 1);
  });

  it('leaves other households as they are', async () => {
    const second = await aHousehold(db);
    await fill(second);
    const before = await mentionsOf(second.householdId);
    await close(owner);
    expect(await mentionsOf(second.householdId)).toEqual(before);
  });

  it('wants the name and the password', async () => {
    await expect(close(owner, { name: 'The Larch' })).rejects.toMatchObject({ problems: [{ path: 'name' }] });
    await expect(close(owner, { password: 'not this' })).rejects.toMatchObject({ problems: [{ path: 'password' }] });
    expect(await db.$count(households)).toBe(1);
    await close(owner, { name: ' the  larches' });
    expect(await db.$count(households)).toBe(0);
  });

  it('is for owners, also for one who was an owner a moment ago', async () => {
    await expect(close(other)).rejects.toMatchObject({ code: 'not-allowed' });
    await changeMember(as(owner), { role: 'owner', chemicalsAllowed: true }, { id: other.membershipId });
    await changeMember(as(owner), { role: 'viewer', chemicalsAllowed: false }, { id: owner.membershipId });
    await expect(close(owner)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await db.$count(households)).toBe(1);
  });

  it('is not for the demo', async () => {
    await expect(close({ ...owner, demo: true })).rejects.toMatchObject({ code: 'not-allowed' });
  });
});

describe('whoever belongs nowhere', () => {
  it('makes a household of their own, whose owner they are', async () => {
    await close(owner);
    const visit = await on({ ...owner, householdId: null });
    const household = { name: 'Anew', timeZone: 'Europe/Madrid', unitSystem: 'us', locale: 'es-ES' } as const;
    expect(await makeHousehold(visit, household)).toEqual({ next: '/first-run' });
    const access = await proveHousehold(db, { personId: owner.personId, householdId: null, now: later });
    expect(access).toMatchObject({ householdName: 'Anew', role: 'owner', poolCompleted: false, unitSystem: 'us' });
    const [session] = await db.select().from(sessions).where(eq(sessions.id, visit.signedIn.sessionId));
    expect(session?.householdId).toBe(access.householdId);
  });

  it('signs in, and is told so', async () => {
    await close(owner);
    const visit = await openVisit(new Headers(), { db, now: later, secure: false, secret });
    const email = (await personOf(owner))?.email ?? '';
    expect(await signIn(visit, { email, password })).toEqual({ next: '/week' });
    expect(visit.signedIn?.householdId).toBeNull();
  });
});
