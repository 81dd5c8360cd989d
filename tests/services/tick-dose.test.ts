import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { listGivenDoses } from '@/db/queries/plan-doses';
import { findCurrentPlan } from '@/db/queries/plans';
import { deleteShelfProduct, findShelfProduct, setStock } from '@/db/queries/shelf-products';
import { auditTrail, doseEvents, plans } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { DoseTick, PlanDose } from '@/lib/schemas/plan-dose';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { tickDose } from '@/lib/services/tick-dose';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';

planWith();

const minutes = (count: number, from: Date) => hoursLater(count / 60, from);

let db: Database;
let owner: ServiceContext;
/** A household that tested on Sunday evening, with the first fast dose of its plan and the hour of that dose. */
let dose: PlanDose;
let due: Date;
let prepared: ServiceContext;

beforeAll(async () => {
  db = freshDatabase();
  owner = await aPoolHousehold(db);
  // Little chlorine and no tablets left: the plan has to add something fast.
  await setStock(db, { householdId: owner.access.householdId, id: 'tabs', stock: 0 });
  await recordReading(owner, aFullTest(owner.now, { values: { ...aFullTest().values, freeChlorine: 2.6 } }));
  const plan = await findCurrentPlan(db, owner.access.householdId);
  const planned = plan?.result.doses.find(({ form }) => form !== 'tablet');
  if (!planned) throw new Error('The plan has no fast dose.');
  const sheet = await showWeek(owner, { start: dayOfIso(planned.at) });
  dose = sheet.doses.find(({ at: hour }) => Date.parse(hour) === Date.parse(planned.at))!;
  due = new Date(dose.at);
  prepared = owner;
}, 60_000);

beforeEach(async () => {
  db = await copyOf(prepared.db);
  owner = { ...prepared, db };
});

const dayOfIso = (iso: string) => iso.slice(0, 10);

type Said = Omit<DoseTick, 'id' | 'planVersion'> & { amount?: number; at?: string };
const said = (tick: Said, planVersion = 1) => ({ ...tick, id: randomUUID(), planVersion }) as DoseTick;

async function another(role: HouseholdAccess['role'], handlesChemicals = role !== 'viewer'): Promise<ServiceContext> {
  const { householdId } = owner.access;
  return at(owner, owner.now, await aMember(db, { householdId, role, handlesChemicals, now: hoursLater(-1) }));
}

const shownIn = async (context: ServiceContext, id = dose.id) =>
  (await showWeek(context, { start: dayOfIso(dose.at) })).doses.find((each) => each.id === id);

describe('tickDose', { timeout: 60_000 }, () => {
  it('records a dose as given, as planned and now, and plans the rest of the week anew', async () => {
    const before = await findCurrentPlan(db, owner.access.householdId);
    const sheet = await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    const given = sheet.doses.find(({ id }) => id === dose.id);
    expect(given).toMatchObject({ status: 'given', givenAmount: dose.amount, doneBy: 'Ines', recordedBy: 'Ines' });
    expect(Date.parse(given?.givenAt ?? '')).toBe(due.getTime());
    expect(sheet.plan?.version).toBe(2);
    const after = await findCurrentPlan(db, owner.access.householdId);
    expect(after?.snapshot.given).toMatchObject([{ product: dose.product, amount: dose.amount, unit: dose.unit }]);
    expect(before?.snapshot.given).toEqual([]);
  });

  it('takes another amount, which moves the curve', async () => {
    const amount = dose.amount + 200;
    await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    const curve = async () => (await showWeek(at(owner, due))).ahead?.freeChlorine.p50 ?? [];
    const asPlanned = await curve();
    const sheet = await tickDose(at(owner, minutes(5, due)), dose.id, said({ action: 'changed', amount }));
    expect(sheet.doses.find(({ id }) => id === dose.id)).toMatchObject({ status: 'changed', givenAmount: amount });
    const more = await curve();
    const hour = Math.ceil((due.getTime() - owner.now.getTime()) / 3_600_000) + 1;
    // 200 g of 65 % in 75.7 m3.
    expect((more[hour] ?? 0) - (asPlanned[hour] ?? 0)).toBeGreaterThan(1);
  });

  it('takes what went in off the shelf, and puts it back on undo', async () => {
    const { householdId } = owner.access;
    const stock = async () => (await findShelfProduct(db, householdId, 'gran'))?.stock;
    const amount = dose.amount + 50;
    await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    expect(await stock()).toBe(4000 - dose.amount);
    await tickDose(at(owner, due), dose.id, said({ action: 'changed', amount }));
    expect(await stock()).toBe(4000 - amount);
    await tickDose(at(owner, due), dose.id, said({ action: 'undo' }));
    expect(await stock()).toBe(4000);
  });

  it('changes nothing when the same tick comes twice', async () => {
    const tick = said({ action: 'given' });
    await tickDose(at(owner, due), dose.id, tick);
    await tickDose(at(owner, minutes(1, due)), dose.id, tick);
    expect(await db.$count(doseEvents)).toBe(1);
    expect(await db.$count(plans)).toBe(2);
    expect((await db.select().from(auditTrail)).filter(({ action }) => action === 'tick-dose')).toHaveLength(1);
  });

  it('opens three hours before the hour of the dose', async () => {
    const tooEarly = tickDose(at(owner, minutes(-181, due)), dose.id, said({ action: 'given' }));
    await expect(tooEarly).rejects.toMatchObject({ code: 'conflict' });
    const sheet = await tickDose(at(owner, minutes(-179, due)), dose.id, said({ action: 'given' }));
    expect(sheet.doses.find(({ id }) => id === dose.id)?.status).toBe('given');
  });

  it('is for those who handle chemicals alone', async () => {
    for (const context of [await another('viewer'), await another('caretaker', false), await another('owner', false)])
      await expect(tickDose(at(context, due), dose.id, said({ action: 'given' }))).rejects.toMatchObject({
        code: 'not-allowed',
      });
    await tickDose(at(await another('caretaker'), due), dose.id, said({ action: 'given' }));
  });

  it('knows no dose of another household', async () => {
    const stranger = await aPoolHousehold(db);
    const tick = tickDose(at(stranger, due), dose.id, said({ action: 'given' }));
    await expect(tick).rejects.toMatchObject({ code: 'not-found' });
  });

  it('refuses a moment that cannot be', async () => {
    for (const when of [minutes(10, due), minutes(-25 * 60, due)]) {
      const tick = tickDose(at(owner, due), dose.id, said({ action: 'given', at: when.toISOString() }));
      await expect(tick).rejects.toMatchObject({ code: 'invalid-input', problems: [{ path: 'at' }] });
    }
  });

  it('shows to all who has it, and leaves it to them', async () => {
    const other = await another('caretaker');
    await tickDose(at(owner, due), dose.id, said({ action: 'claim' }));
    expect((await shownIn(at(other, due)))?.claimedBy).toBe('Ines');
    await expect(tickDose(at(other, due), dose.id, said({ action: 'claim' }))).rejects.toMatchObject({
      code: 'conflict',
    });
    expect(await db.$count(plans)).toBe(1);
    // A claim outlives a new version of the plan, and does not last for ever.
    await setStock(db, { householdId: owner.access.householdId, id: 'gran', stock: 3900 });
    const sheet = await showWeek(at(other, minutes(-1, due)), { start: dayOfIso(dose.at) });
    expect(sheet.plan?.version).toBe(2);
    expect(sheet.doses.filter(({ claimedBy }) => claimedBy === 'Ines')).toHaveLength(1);
    const nextDay = await showWeek(at(other, minutes(180, due)), { start: dayOfIso(dose.at) });
    expect(nextDay.doses.every(({ claimedBy }) => claimedBy === null)).toBe(true);
  });

  it('lets whoever ticked take it back for ten minutes, an owner for longer, nobody else', async () => {
    const caretaker = await another('caretaker');
    const colleague = await another('caretaker');
    await tickDose(at(caretaker, due), dose.id, said({ action: 'given' }));
    for (const [context, after] of [
      [colleague, 1],
      [caretaker, 11],
    ] as const)
      await expect(tickDose(at(context, minutes(after, due)), dose.id, said({ action: 'undo' }))).rejects.toMatchObject(
        {
          code: 'not-allowed',
        },
      );
    await tickDose(at(caretaker, minutes(9, due)), dose.id, said({ action: 'undo' }));
    expect(await givenCount()).toBe(0);
    await tickDose(at(caretaker, minutes(10, due)), dose.id, said({ action: 'given' }));
    await tickDose(at(owner, minutes(200, due)), dose.id, said({ action: 'undo' }));
    expect(await givenCount()).toBe(0);
    const undoNothing = tickDose(at(owner, minutes(201, due)), dose.id, said({ action: 'undo' }));
    await expect(undoNothing).rejects.toMatchObject({ code: 'conflict' });
  });

  const givenCount = async () =>
    (await listGivenDoses(db, { householdId: owner.access.householdId, from: hoursLater(-1), until: hoursLater(400) }))
      .length;

  it('still knows what went in when its product has left the shelf', async () => {
    await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    const before = (await showWeek(at(owner, due))).ahead?.freeChlorine.p50;
    await deleteShelfProduct(db, owner.access.householdId, 'gran');
    const after = await showWeek(at(owner, minutes(5, due)));
    expect(after.planProblem).toBeNull();
    const hour = Math.ceil((due.getTime() - owner.now.getTime()) / 3_600_000) + 1;
    expect(after.ahead?.freeChlorine.p50[hour]).toBeCloseTo(before?.[hour] ?? 0, 9);
  });

  it('plans a skipped dose no more for its hour', async () => {
    const sheet = await tickDose(at(owner, minutes(-60, due)), dose.id, said({ action: 'skipped' }));
    expect(sheet.doses.find(({ id }) => id === dose.id)?.status).toBe('skipped');
    const open = sheet.doses.filter(({ status }) => status === 'planned');
    expect(open.every(({ at: hour }) => Date.parse(hour) > due.getTime())).toBe(true);
    expect(await givenCount()).toBe(0);
  });
});

describe('two ticks of one dose', { timeout: 60_000 }, () => {
  it('by two people keep everyone out until a reading', async () => {
    const other = await another('caretaker');
    await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    const sheet = await tickDose(at(other, minutes(20, due)), dose.id, said({ action: 'given' }));
    expect(sheet.verdict.state).toBe('stay-out');
    expect(sheet.verdict.reasons[0]?.code).toBe('suspected-double-dose');
    // It is that dose which is in doubt, and no other.
    expect(sheet.doses.filter(({ doubtful }) => doubtful).map(({ id }) => id)).toEqual([dose.id]);
    const details = (await db.select().from(auditTrail)).map(({ detail }) => detail);
    expect(details).toContainEqual(expect.objectContaining({ suspected: 'double-dose' }));
    const nextDay = hoursLater(20, due);
    expect((await showWeek(at(owner, nextDay))).verdict.state).toBe('stay-out');
    await recordReading(at(owner, nextDay), aFullTest(nextDay));
    const codes = (await showWeek(at(owner, nextDay))).verdict.reasons.map(({ code }) => code);
    expect(codes).not.toContain('suspected-double-dose');
    expect((await shownIn(at(owner, nextDay)))?.doubtful).toBe(false);
  });

  it('in the same moment are both on record', async () => {
    const other = await another('caretaker');
    await Promise.all([owner, other].map((who) => tickDose(at(who, due), dose.id, said({ action: 'given' }))));
    expect((await showWeek(at(owner, due))).verdict.reasons[0]?.code).toBe('suspected-double-dose');
    expect(await db.$count(doseEvents)).toBe(2);
  });

  it('by one person are one tick', async () => {
    await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
    const sheet = await tickDose(at(owner, minutes(1, due)), dose.id, said({ action: 'given' }));
    expect(sheet.verdict.reasons.map(({ code }) => code)).not.toContain('suspected-double-dose');
  });

  it('are one again when one of the two takes theirs back', async () => {
    const other = await another('caretaker');
    const bystander = await another('owner');
    for (const taker of [owner, other]) {
      await tickDose(at(owner, due), dose.id, said({ action: 'given' }));
      await tickDose(at(other, minutes(1, due)), dose.id, said({ action: 'given' }));
      const asBystander = tickDose(at(bystander, minutes(2, due)), dose.id, said({ action: 'undo' }));
      await expect(asBystander).rejects.toMatchObject({ code: 'not-allowed' });
      const sheet = await tickDose(at(taker, minutes(3, due)), dose.id, said({ action: 'undo' }));
      expect(sheet.verdict.reasons.map(({ code }) => code)).not.toContain('suspected-double-dose');
      expect(sheet.doses.find(({ id }) => id === dose.id)?.status).toBe('given');
      await tickDose(at(bystander, minutes(4, due)), dose.id, said({ action: 'undo' }));
    }
  });

  it('of an old plan and the newest one count as one dose', async () => {
    // A change of the shelf makes a new version, with the same product on the same day.
    await setStock(db, { householdId: owner.access.householdId, id: 'gran', stock: 3900 });
    const sheet = await showWeek(at(owner, minutes(-60, due)), { start: dayOfIso(dose.at) });
    const successor = sheet.doses.find(({ at: hour, product }) => hour === dose.at && product === dose.product);
    expect(successor?.id).not.toBe(dose.id);
    // Ticked offline on a phone that still shows the first version.
    const merged = await tickDose(at(owner, due), dose.id, said({ action: 'given' }, 1));
    expect(merged.doses.filter(({ status }) => status === 'given').map(({ id }) => id)).toEqual([successor?.id]);
    const other = await another('caretaker');
    const again = await tickDose(at(other, minutes(5, due)), dose.id, said({ action: 'given' }, 1));
    expect(again.doses.filter(({ status }) => status === 'given')).toHaveLength(1);
    expect(again.verdict.reasons.map(({ code }) => code)).toContain('suspected-double-dose');
  });
});
