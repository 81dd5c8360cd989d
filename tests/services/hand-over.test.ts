import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { listAudit } from '@/db/queries/audit-trail';
import { handOvers, households, memberships, people } from '@/db/schema';
import { type HouseholdAccess, proveHousehold } from '@/lib/auth/household-access';
import { checkInput } from '@/lib/schemas/problems';
import { newHandOverSchema } from '@/lib/schemas/hand-over';
import { changeMember, endMember } from '@/lib/services/change-member';
import { agreeToHandOver, endHandOver, handOver } from '@/lib/services/hand-over';
import { listChemicalHandlers } from '@/lib/services/list-chemical-handlers';
import { onDuty } from '@/lib/services/on-duty';
import { readSafetyCard } from '@/lib/services/read-safety-card';
import { showHandOvers } from '@/lib/services/show-hand-overs';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-10-20T12:00:00Z');
const DAY = 24 * 3_600_000;
// Clocks in Havana are set back on 1 November 2026 at 01:00, so that day has 25 hours, and its midnight comes twice. The
// instants are written out: the start of 31 October in summer time, the first of the midnights after 1 November in winter time.
const starts = new Date('2026-10-31T04:00:00Z');
const ends = new Date('2026-11-02T05:00:00Z');
const before = (instant: Date) => new Date(instant.getTime() - 1);
const during = new Date('2026-11-01T12:00:00Z');

let db: Database;
let owner: HouseholdAccess;
let viewer: HouseholdAccess;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aHousehold(db, { timeZone: 'America/Havana', now });
  viewer = await aMember(db, { householdId: owner.householdId, role: 'viewer', now });
});

const as = (access: HouseholdAccess, at = now) => ({ db, access, now: at });
const wanted = (overrides = {}) => ({
  ...{ id: crypto.randomUUID(), memberId: viewer.membershipId, chemicalsAllowed: false },
  ...{ fromDay: '2026-10-31', untilDay: '2026-11-01' },
  ...overrides,
});
const standingOf = ({ personId }: HouseholdAccess, at: Date) =>
  proveHousehold(db, { personId, householdId: owner.householdId, now: at });
const roleAt = async (at: Date, who = viewer) => (await standingOf(who, at)).role;
const onDutyAt = async (at: Date) => (await onDuty(db, owner, at)).map(({ memberId }) => memberId);
/** Handed over and agreed to. */
async function agreed(overrides = {}, { cardRead = false, who = viewer } = {}) {
  const asked = wanted({ memberId: who.membershipId, ...overrides });
  await handOver(as(owner), asked);
  await agreeToHandOver(as(who), { cardRead }, asked);
  return asked;
}

describe('a hand-over', () => {
  it('makes a caretaker of who only looks, from its first instant up to, and not at, its last', async () => {
    await agreed();
    expect(await roleAt(before(starts))).toBe('viewer');
    expect(await roleAt(starts)).toBe('caretaker');
    expect(await roleAt(before(ends))).toBe('caretaker');
    expect(await roleAt(ends)).toBe('viewer');
    const [kept] = await db.select().from(memberships).where(eq(memberships.id, viewer.membershipId));
    expect(kept).toMatchObject({ role: 'viewer', handlesChemicals: false });
  });

  it('ends by the hour that the clocks of the household say, also where summer time begins', async () => {
    // In Havana 14 March 2027 begins at 01:00: there is no midnight.
    await agreed({ fromDay: '2027-03-14', untilDay: '2027-03-14' });
    expect(await roleAt(before(new Date('2027-03-14T05:00:00Z')))).toBe('viewer');
    expect(await roleAt(new Date('2027-03-14T05:00:00Z'))).toBe('caretaker');
    expect(await roleAt(before(new Date('2027-03-15T04:00:00Z')))).toBe('caretaker');
    expect(await roleAt(new Date('2027-03-15T04:00:00Z'))).toBe('viewer');
  });

  it('moves with the zone of the household', async () => {
    await agreed();
    await db.update(households).set({ timeZone: 'Pacific/Auckland' }).where(eq(households.id, owner.householdId));
    expect(await roleAt(starts)).toBe('caretaker');
    expect(await roleAt(ends)).toBe('viewer');
    expect(await roleAt(before(new Date('2026-10-30T11:00:00Z')))).toBe('viewer');
    expect(await roleAt(new Date('2026-10-30T11:00:00Z'))).toBe('caretaker');
    expect(await roleAt(new Date('2026-11-01T11:00:00Z'))).toBe('viewer');
  });

  it('is nothing until whoever is asked agrees', async () => {
    const asked = wanted();
    await handOver(as(owner), asked);
    expect(await roleAt(during)).toBe('viewer');
    expect(await onDutyAt(during)).toEqual([owner.membershipId]);
    await agreeToHandOver(as(viewer, during), { cardRead: false }, asked);
    expect(await roleAt(during)).toBe('caretaker');
    const caretaker = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    const other = wanted({ memberId: caretaker.membershipId, fromDay: '2026-12-01', untilDay: '2026-12-02' });
    await handOver(as(owner), other);
    for (const who of [viewer, owner])
      await expect(agreeToHandOver(as(who), { cardRead: false }, other)).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it('taken back ends at once, and can be neither agreed to nor taken back again', async () => {
    const asked = await agreed();
    await endHandOver(as(owner, during), asked);
    expect(await roleAt(during)).toBe('viewer');
    expect((await showHandOvers(as(owner, during))).handOvers).toEqual([]);
    await expect(agreeToHandOver(as(viewer, during), { cardRead: false }, asked)).rejects.toMatchObject({
      code: 'not-found',
    });
    await expect(endHandOver(as(owner, during), asked)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('is declined by whoever is asked, also after they agreed, and taken back by nobody else but an owner', async () => {
    const asked = await agreed();
    const caretaker = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    await expect(endHandOver(as(caretaker), asked)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await roleAt(during)).toBe('caretaker');
    await endHandOver(as(await standingOf(viewer, during), during), asked);
    expect(await roleAt(during)).toBe('viewer');
  });

  it('ends with the membership, and does not come back with another one', async () => {
    await agreed();
    await endMember(as(owner, during), { id: viewer.membershipId });
    await expect(standingOf(viewer, during)).rejects.toMatchObject({ code: 'not-allowed' });
    expect(await onDutyAt(during)).toEqual([owner.membershipId]);
    const { personId, householdId } = viewer;
    const again = { id: crypto.randomUUID(), householdId, personId, role: 'viewer' as const, validFrom: during };
    await db.insert(memberships).values(again);
    expect(await roleAt(during)).toBe('viewer');
    // The days are free for somebody else.
    await handOver(as(owner, during), wanted({ memberId: again.id, fromDay: '2026-11-01' }));
  });

  it('leaves caretakers and owners what they are', async () => {
    const caretaker = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    await agreed({}, { who: caretaker });
    expect(await standingOf(caretaker, during)).toMatchObject({ role: 'caretaker', handlesChemicals: true });
    expect(await roleAt(during)).toBe('viewer');
    await agreed({ fromDay: '2026-12-01', untilDay: '2026-12-01' }, { who: owner });
    expect(await roleAt(new Date('2026-12-01T12:00:00Z'), owner)).toBe('owner');
  });

  it('that an owner writes down for themselves, and any in a demo, is agreed to with that', async () => {
    const mine = wanted({ memberId: owner.membershipId });
    expect((await handOver(as(owner), mine)).handOvers).toMatchObject([{ you: true, agreedAt: now.toISOString() }]);
    const later = wanted({ fromDay: '2026-12-01', untilDay: '2026-12-02' });
    await handOver(as({ ...owner, demo: true }), later);
    expect(await roleAt(new Date('2026-12-01T12:00:00Z'))).toBe('caretaker');
  });

  it('is written down by owners, for members of their own household', async () => {
    const theirs = await aHousehold(db, { now });
    await expect(handOver(as(viewer), wanted())).rejects.toMatchObject({ code: 'not-allowed' });
    await agreed();
    await expect(handOver(as(await standingOf(viewer, during), during), wanted())).rejects.toMatchObject({
      code: 'not-allowed',
    });
    const stranger = wanted({ memberId: theirs.membershipId, fromDay: '2026-12-01', untilDay: '2026-12-01' });
    await expect(handOver(as(owner), stranger)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('of another household is neither seen, agreed to, taken back nor written over', async () => {
    const theirs = await aHousehold(db, { now });
    const asked = await agreed();
    expect((await showHandOvers(as(theirs))).handOvers).toEqual([]);
    await expect(agreeToHandOver(as(theirs), { cardRead: false }, asked)).rejects.toMatchObject({ code: 'not-found' });
    await expect(endHandOver(as(theirs), asked)).rejects.toMatchObject({ code: 'not-found' });
    const sameId = { ...asked, memberId: theirs.membershipId };
    await expect(handOver(as(theirs), sameId)).rejects.toMatchObject({ code: 'conflict' });
    expect(await roleAt(during)).toBe('caretaker');
  });
});

describe('the days of a hand-over', () => {
  it('do not overlap, and may follow one another', async () => {
    await handOver(as(owner), wanted());
    for (const days of [
      { fromDay: '2026-11-01', untilDay: '2026-11-05' },
      { fromDay: '2026-10-25', untilDay: '2026-10-31' },
      { fromDay: '2026-10-25', untilDay: '2026-11-05' },
    ])
      await expect(handOver(as(owner), wanted(days))).rejects.toMatchObject({ code: 'conflict' });
    await handOver(as(owner), wanted({ fromDay: '2026-11-02', untilDay: '2026-11-05' }));
    expect(await db.$count(handOvers)).toBe(2);
  });

  it('are given to one of two that are written down at once', async () => {
    const answers = await Promise.allSettled([handOver(as(owner), wanted()), handOver(as(owner), wanted())]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await db.$count(handOvers)).toBe(1);
  });

  it('sent twice are the same', async () => {
    const asked = wanted();
    await handOver(as(owner), asked);
    expect((await handOver(as(owner), asked)).handOvers).toHaveLength(1);
    expect(await listAudit(db, owner.householdId)).toHaveLength(1);
  });

  it('begin today or later and end within 400 days', async () => {
    await expect(handOver(as(owner), wanted({ fromDay: '2026-10-19' }))).rejects.toMatchObject({
      problems: [{ path: 'fromDay' }],
    });
    const far = { fromDay: '2027-11-24', untilDay: '2027-11-25' };
    await expect(handOver(as(owner), wanted(far))).rejects.toMatchObject({ problems: [{ path: 'untilDay' }] });
    await handOver(as(owner), wanted({ ...far, untilDay: far.fromDay }));
    await handOver(as(owner), wanted({ fromDay: '2026-10-20', untilDay: '2026-10-20' }));
  });

  it('are at most sixty, in order', () => {
    const check = (fromDay: string, untilDay: string) =>
      checkInput(newHandOverSchema, wanted({ fromDay, untilDay })).sound;
    expect(check('2026-11-01', '2026-12-30')).toBe(true);
    expect(check('2026-11-01', '2026-12-31')).toBe(false);
    expect(check('2026-11-02', '2026-11-01')).toBe(false);
    expect(check('2026-11-31', '2026-12-01')).toBe(false);
  });
});

describe('chemicals in a hand-over', () => {
  const handles = async (at: Date, who = viewer) => (await standingOf(who, at)).handlesChemicals;

  it('want the word of an owner and the safety card, and end with it', async () => {
    await agreed({ chemicalsAllowed: true }, { cardRead: true });
    expect(await handles(before(starts))).toBe(false);
    expect(await handles(starts)).toBe(true);
    expect(await handles(before(ends))).toBe(true);
    expect(await handles(ends)).toBe(false);
  });

  it('are nothing without the card, which can be read later', async () => {
    const asked = await agreed({ chemicalsAllowed: true });
    expect(await handles(during)).toBe(false);
    await agreeToHandOver(as(viewer), { cardRead: true }, asked);
    expect(await handles(during)).toBe(true);
    const actions = (await listAudit(db, owner.householdId)).map(({ action }) => action);
    expect(actions).toEqual(['read-safety-card', 'agree-hand-over', 'hand-over']);
  });

  it('are nothing without the word of an owner', async () => {
    const asked = wanted();
    await handOver(as(owner), asked);
    await expect(agreeToHandOver(as(viewer), { cardRead: true }, asked)).rejects.toMatchObject({ code: 'not-allowed' });
    // What was refused changed nothing.
    expect(await roleAt(during)).toBe('viewer');
    await agreeToHandOver(as(viewer), { cardRead: false }, asked);
    await db.update(memberships).set({ safetyCardReadAt: now }).where(eq(memberships.id, viewer.membershipId));
    expect(await handles(during)).toBe(false);
  });

  it('are over with the season of the card', async () => {
    await agreed({ chemicalsAllowed: true }, { cardRead: true });
    const readAt = new Date(during.getTime() - 365 * DAY);
    await db.update(memberships).set({ safetyCardReadAt: readAt }).where(eq(memberships.id, viewer.membershipId));
    expect(await handles(before(during))).toBe(true);
    expect(await handles(during)).toBe(false);
    // Read again on the page of the safety card, they count again, and no mark stays when the days are over.
    await readSafetyCard(as(await standingOf(viewer, during), during));
    expect(await handles(during)).toBe(true);
    expect(await handles(ends)).toBe(false);
  });

  it('are not marked for a caretaker who may otherwise not', async () => {
    const caretaker = await aMember(db, {
      ...{ householdId: owner.householdId, role: 'caretaker', handlesChemicals: false, now },
    });
    await changeMember(as(owner), { role: 'caretaker', chemicalsAllowed: false }, { id: caretaker.membershipId });
    await agreed({ chemicalsAllowed: true }, { cardRead: true, who: caretaker });
    expect(await handles(during, caretaker)).toBe(true);
    expect(await handles(ends, caretaker)).toBe(false);
  });

  it('go when an owner says of the member that they may not', async () => {
    const caretaker = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
    await agreed({ chemicalsAllowed: true }, { cardRead: true, who: caretaker });
    await changeMember(
      as(owner, during),
      { role: 'caretaker', chemicalsAllowed: false },
      { id: caretaker.membershipId },
    );
    expect(await standingOf(caretaker, during)).toMatchObject({ role: 'caretaker', handlesChemicals: false });
  });

  it('put who stands in among those who may dose, beside the others', async () => {
    await db.update(people).set({ name: 'Otto' }).where(eq(people.id, viewer.personId));
    await agreed({ chemicalsAllowed: true }, { cardRead: true });
    const namesAt = async (at: Date) => (await listChemicalHandlers(as(owner, at))).map(({ name }) => name);
    expect(await namesAt(before(starts))).toEqual(['Ines']);
    expect(await namesAt(during)).toEqual(['Ines', 'Otto']);
    expect(await namesAt(ends)).toEqual(['Ines']);
  });
});

describe('who is on duty', () => {
  it('is whoever stands in, alone, and else every owner and the caretakers who handle chemicals', async () => {
    const { householdId } = owner;
    const helper = await aMember(db, { householdId, role: 'caretaker', now });
    await aMember(db, { householdId, role: 'caretaker', handlesChemicals: false, now });
    const other = await aMember(db, { householdId, role: 'owner', handlesChemicals: false, now });
    await agreed();
    const usually = [owner.membershipId, other.membershipId, helper.membershipId];
    expect(new Set(await onDutyAt(before(starts)))).toEqual(new Set(usually));
    expect(await onDutyAt(starts)).toEqual([viewer.membershipId]);
    expect(await onDutyAt(before(ends))).toEqual([viewer.membershipId]);
    expect(new Set(await onDutyAt(ends))).toEqual(new Set(usually));
    // A caretaker whose card is of another season is not among them any more.
    expect(await onDutyAt(new Date(now.getTime() + 366 * DAY))).not.toContain(helper.membershipId);
  });

  it('is told to every member, with the days and what was agreed', async () => {
    await agreed({ chemicalsAllowed: true });
    expect(await showHandOvers(as(viewer))).toMatchObject({
      today: '2026-10-20',
      onDuty: [{ memberId: owner.membershipId, role: 'owner' }],
      handOvers: [
        {
          ...{ memberId: viewer.membershipId, you: true, role: 'viewer', chemicalsAllowed: true, cardRead: false },
          ...{ fromDay: '2026-10-31', untilDay: '2026-11-01', agreedAt: now.toISOString(), inForce: false },
        },
      ],
    });
    const shown = await showHandOvers(as(owner, during));
    expect(shown).toMatchObject({ onDuty: [{ role: 'viewer' }], usually: [{ role: 'owner' }] });
    expect(shown.handOvers).toMatchObject([{ you: false, inForce: true }]);
    expect((await showHandOvers(as(owner, ends))).handOvers).toEqual([]);
  });
});
