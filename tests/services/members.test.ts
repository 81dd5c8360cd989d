import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { auditTrail, invitations, memberships, people } from '@/db/schema';
import { type HouseholdAccess, proveHousehold } from '@/lib/auth/household-access';
import { linkDigest } from '@/lib/auth/link-token';
import { changeMember, endMember } from '@/lib/services/change-member';
import { invite, inviteAgain, uninvite } from '@/lib/services/invite';
import { joinHousehold, openInvitation } from '@/lib/services/join-household';
import { readSafetyCard } from '@/lib/services/read-safety-card';
import { showPeople } from '@/lib/services/show-people';
import type { Visit } from '@/lib/auth/visit';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const days = (count: number) => new Date(now.getTime() + count * 24 * 3_600_000);

let db: Database;
let owner: HouseholdAccess;
let guest: HouseholdAccess;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aHousehold(db);
  guest = await aHousehold(db);
});

const as = (access: HouseholdAccess, at = now) => ({ db, access, now: at });
const invitation = (overrides = {}) => ({
  ...{ id: crypto.randomUUID(), name: 'Otto', role: 'viewer' as const, chemicalsAllowed: false },
  ...overrides,
});
const tokenOf = (link: string | null) => link?.split('/').at(-1) ?? '';
const signedIn = ({ personId }: HouseholdAccess) => ({ sessionId: 'none', personId, householdId: null });
const join = (token: string, who = guest, at = now) =>
  joinHousehold({ db, now: at, signedIn: signedIn(who) }, { token });
const open = (token: string, at = now) => openInvitation({ db, now: at } as Visit, token);
const joined = (who = guest, at = now) =>
  proveHousehold(db, { personId: who.personId, householdId: owner.householdId, now: at });

describe('an invitation', () => {
  it('lets one person in, with the role it names, and is used up', async () => {
    const { link, invitations: open_ } = await invite(as(owner), invitation());
    expect(open_).toMatchObject([{ name: 'Otto', role: 'viewer', expired: false }]);
    const token = tokenOf(link);
    expect(await open(token)).toMatchObject({ state: 'open', householdName: owner.householdName, invitedBy: 'Ines' });
    expect(await join(token)).toEqual({ next: '/week' });
    expect(await joined()).toMatchObject({ role: 'viewer', handlesChemicals: false });
    const third = await aHousehold(db);
    await expect(join(token, third)).rejects.toMatchObject({ code: 'conflict' });
    expect(await open(token)).toEqual({ state: 'used' });
    expect((await showPeople(as(owner))).invitations).toEqual([]);
  });

  it('is used by one of two who come at once', async () => {
    const token = tokenOf((await invite(as(owner), invitation())).link);
    const third = await aHousehold(db);
    const answers = await Promise.allSettled([join(token), join(token, third)]);
    expect(answers.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await db.$count(memberships)).toBe(4);
  });

  it('is kept as a digest only', async () => {
    const token = tokenOf((await invite(as(owner), invitation())).link);
    const [row] = await db.select().from(invitations);
    expect(row?.tokenDigest).toBe(linkDigest('invitation', token));
    expect(JSON.stringify(await db.select().from(auditTrail))).not.toContain(token);
  });

  it('is over after seven days', async () => {
    const token = tokenOf((await invite(as(owner), invitation())).link);
    expect(await open(token, days(6.9))).toMatchObject({ state: 'open' });
    expect(await open(token, days(7))).toEqual({ state: 'expired' });
    await expect(join(token, guest, days(7))).rejects.toMatchObject({ code: 'conflict' });
    expect((await showPeople(as(owner, days(8)))).invitations).toMatchObject([{ expired: true }]);
  });

  it('can be taken back, and not twice', async () => {
    const sent = invitation();
    const token = tokenOf((await invite(as(owner), sent)).link);
    expect((await uninvite(as(owner), sent)).invitations).toEqual([]);
    expect(await open(token)).toEqual({ state: 'withdrawn' });
    await expect(join(token)).rejects.toMatchObject({ code: 'conflict' });
    await expect(uninvite(as(owner), sent)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('sent again has another link, for seven days from then; the first opens nothing', async () => {
    const sent = invitation();
    const first = tokenOf((await invite(as(owner), sent)).link);
    const second = tokenOf((await inviteAgain(as(owner, days(5)), sent)).link);
    expect(await open(first, days(5))).toEqual({ state: 'unknown' });
    expect(await open(second, days(11))).toMatchObject({ state: 'open' });
  });

  it('is sent, renewed and withdrawn by owners of the household alone', async () => {
    const sent = invitation();
    await invite(as(owner), sent);
    const caretaker = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    await expect(invite(as(caretaker), invitation())).rejects.toMatchObject({ code: 'not-allowed' });
    await expect(inviteAgain(as(guest), sent)).rejects.toMatchObject({ code: 'not-found' });
    await expect(uninvite(as(guest), sent)).rejects.toMatchObject({ code: 'not-found' });
    expect((await showPeople(as(caretaker))).invitations).toEqual([]);
  });

  it('is nothing for who belongs there, and is not used up by them', async () => {
    const token = tokenOf((await invite(as(owner), invitation())).link);
    await expect(join(token, owner)).rejects.toMatchObject({ code: 'conflict' });
    expect(await open(token)).toMatchObject({ state: 'open' });
  });

  it('is not for a visitor of the demo, who has no account', async () => {
    const token = tokenOf((await invite(as(owner), invitation())).link);
    await db.update(people).set({ email: null, passwordHash: null }).where(eq(people.id, guest.personId));
    await expect(join(token)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await open(token)).toMatchObject({ state: 'open' });
  });

  it('is not for a demo household, and no more than twenty are open', async () => {
    await expect(invite(as({ ...owner, demo: true }), invitation())).rejects.toMatchObject({ code: 'not-allowed' });
    for (let sent = 0; sent < 20; sent += 1) await invite(as(owner), invitation());
    await expect(invite(as(owner), invitation())).rejects.toMatchObject({ code: 'conflict' });
  });
});

describe('a member', () => {
  const member = (role: 'owner' | 'caretaker' | 'viewer', handlesChemicals = false) =>
    aMember(db, { householdId: owner.householdId, role, handlesChemicals, now });

  it('made a caretaker who may handle chemicals ticks once the safety card is read', async () => {
    const viewer = await member('viewer');
    const id = { id: viewer.membershipId };
    await changeMember(as(owner), { role: 'caretaker', chemicalsAllowed: true }, id);
    const caretaker = await joined(viewer);
    expect(caretaker).toMatchObject({ role: 'caretaker', handlesChemicals: false });
    await readSafetyCard(as(caretaker));
    expect(await joined(viewer)).toMatchObject({ handlesChemicals: true });
  });

  it('who may not handle chemicals does not begin to by reading the card', async () => {
    const caretaker = await member('caretaker');
    await changeMember(as(owner), { role: 'caretaker', chemicalsAllowed: false }, { id: caretaker.membershipId });
    await expect(readSafetyCard(as(await joined(caretaker)))).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it('who is made to look only no longer handles chemicals', async () => {
    const caretaker = await member('caretaker', true);
    await changeMember(as(owner), { role: 'viewer', chemicalsAllowed: false }, { id: caretaker.membershipId });
    expect(await joined(caretaker)).toMatchObject({ role: 'viewer', handlesChemicals: false });
  });

  it('who is removed sees nothing any more; what they did stays, and they can come again', async () => {
    const caretaker = await member('caretaker');
    await endMember(as(owner, days(1)), { id: caretaker.membershipId });
    await expect(joined(caretaker, days(1))).rejects.toMatchObject({ code: 'not-allowed' });
    const { members } = await showPeople(as(owner, days(1)));
    expect(members.map(({ id }) => id)).not.toContain(caretaker.membershipId);
    const token = tokenOf((await invite(as(owner, days(2)), invitation())).link);
    await join(token, caretaker, days(2));
    expect(await joined(caretaker, days(2))).toMatchObject({ role: 'viewer' });
  });

  it('leaves by themselves, and nobody else is removed by them', async () => {
    const viewer = await member('viewer');
    const caretaker = await member('caretaker');
    await expect(endMember(as(caretaker), { id: viewer.membershipId })).rejects.toMatchObject({ code: 'not-allowed' });
    await endMember(as(viewer, days(1)), { id: viewer.membershipId });
    await expect(joined(viewer, days(1))).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it('is of this household', async () => {
    const change = { role: 'viewer', chemicalsAllowed: false } as const;
    await expect(changeMember(as(owner), change, { id: guest.membershipId })).rejects.toMatchObject({
      code: 'not-found',
    });
    await expect(endMember(as(owner), { id: guest.membershipId })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('the last owner', () => {
  it('neither leaves nor is made anything else', async () => {
    const id = { id: owner.membershipId };
    await expect(endMember(as(owner, days(1)), id)).rejects.toMatchObject({ code: 'conflict' });
    await expect(changeMember(as(owner), { role: 'caretaker', chemicalsAllowed: true }, id)).rejects.toMatchObject({
      code: 'conflict',
    });
    expect(await joined(owner, days(1))).toMatchObject({ role: 'owner' });
  });

  it('is one of two who demote each other at once', async () => {
    const other = await aMember(db, { householdId: owner.householdId, role: 'owner', now });
    const demote = { role: 'viewer', chemicalsAllowed: false } as const;
    const answers = await Promise.allSettled([
      changeMember(as(owner), demote, { id: other.membershipId }),
      changeMember(as(other), demote, { id: owner.membershipId }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect((await showPeople(as(owner))).members.filter(({ role }) => role === 'owner')).toHaveLength(1);
  });

  it('hands over and goes', async () => {
    const other = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    await changeMember(as(owner), { role: 'owner', chemicalsAllowed: true }, { id: other.membershipId });
    await endMember(as(owner, days(1)), { id: owner.membershipId });
    expect(await joined(other, days(1))).toMatchObject({ role: 'owner' });
  });
});
