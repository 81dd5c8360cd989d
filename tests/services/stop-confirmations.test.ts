import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { saveShelfProduct, setStock } from '@/db/queries/shelf-products';
import { auditTrail, stopConfirmations } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { DoseTick, PlanDose } from '@/lib/schemas/plan-dose';
import { newStopConfirmationSchema } from '@/lib/schemas/stop-confirmation';
import { confirmStop } from '@/lib/services/confirm-stop';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { tickDose } from '@/lib/services/tick-dose';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, designShelf, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';

planWith();

const DAYS = 24;

/** A household that tested on Sunday evening and has granules to add in the week after. */
let tested: Database;
let prepared: ServiceContext;
let owner: ServiceContext;

beforeAll(async () => {
  tested = freshDatabase();
  prepared = await aPoolHousehold(tested);
  await setStock(tested, { householdId: prepared.access.householdId, id: 'tabs', stock: 0 });
  await recordReading(
    prepared,
    aFullTest(prepared.now, { values: { ...aFullTest().values, freeChlorine: 2.6, pH: 7.5 } }),
  );
}, 60_000);

beforeEach(async () => {
  owner = { ...prepared, db: await copyOf(tested) };
});

async function granules(context: ServiceContext): Promise<PlanDose> {
  const { doses } = await showWeek(context, { start: '2026-07-06' });
  const dose = doses.find(({ product }) => product === 'gran');
  if (!dose) throw new Error('The plan has no granules.');
  return dose;
}

const confirm = async (context: ServiceContext, id = randomUUID()) =>
  confirmStop(context, { id, doseId: (await granules(context)).id });

async function another(role: HouseholdAccess['role'], handlesChemicals = role !== 'viewer'): Promise<ServiceContext> {
  const { db, access, now } = owner;
  return at(owner, now, await aMember(db, { ...access, role, handlesChemicals, now: hoursLater(-1) }));
}

/** The granules as the shelf has them, with something changed. */
async function change(part: Partial<(typeof designShelf)[number]>): Promise<void> {
  const product = { ...designShelf[1]!, ...part };
  await saveShelfProduct(owner.db, { householdId: owner.access.householdId, product, now: owner.now });
}

describe('the Stop of a product', { timeout: 60_000 }, () => {
  it('is due until it is confirmed by name, and then for no dose of that product', async () => {
    expect((await granules(owner)).stopDue).toBe(true);
    expect(await confirm(owner)).toEqual({ done: true });
    const { doses } = await showWeek(owner, { start: '2026-07-06' });
    const ofGranules = doses.filter(({ product }) => product === 'gran');
    expect(ofGranules.length).toBeGreaterThan(1);
    expect(ofGranules.map(({ stopDue }) => stopDue)).toEqual(ofGranules.map(() => false));
    const audited = (await owner.db.select().from(auditTrail)).filter(({ action }) => action === 'confirm-stop');
    expect(audited).toMatchObject([{ personId: owner.access.personId }]);
  });

  it('says nothing of another product', async () => {
    await setStock(owner.db, { householdId: owner.access.householdId, id: 'tabs', stock: 5000 });
    const find = async (product: string) =>
      (await showWeek(owner, { start: '2026-07-06' })).doses.find((dose) => dose.product === product);
    const tablets = await find('tabs');
    await confirmStop(owner, { id: randomUUID(), doseId: tablets!.id });
    expect((await find('tabs'))?.stopDue).toBe(false);
    expect((await find('gran'))?.stopDue).toBe(true);
  });

  it('is due again after 90 days, and not a minute before', async () => {
    await confirm(at(owner, hoursLater(-90 * DAYS + 1 / 60)));
    expect((await granules(owner)).stopDue).toBe(false);
    expect((await granules(at(owner, hoursLater(1 / 60)))).stopDue).toBe(true);
  });

  it.each([
    ['strength', { strength: 70 }],
    ['label way', { labelWay: 'broadcast' }],
  ] as const)('is due again when the %s changes', async (_what, part) => {
    await confirm(owner);
    await change(part);
    expect((await granules(owner)).stopDue).toBe(true);
    await confirm(owner);
    expect((await granules(owner)).stopDue).toBe(false);
  });

  it.each([
    ['name', { name: 'The blue tub' }],
    ['marked measure', { measure: 60 }],
    ['price', { pricePerKg: 11 }],
  ])('is not due again when only the %s changes', async (_what, part) => {
    await confirm(owner);
    await change(part);
    expect((await granules(owner)).stopDue).toBe(false);
  });

  it('is confirmed by each person alone, and in each household', async () => {
    await confirm(owner);
    const caretaker = await another('caretaker');
    expect((await granules(caretaker)).stopDue).toBe(true);
    await confirm(caretaker);
    expect((await granules(caretaker)).stopDue).toBe(false);
    const neighbour = await aPoolHousehold(owner.db);
    await recordReading(neighbour, aFullTest());
    const { doses } = await showWeek(neighbour, { start: '2026-07-06' });
    expect(doses.length).toBeGreaterThan(0);
    expect(doses.every(({ stopDue }) => stopDue)).toBe(true);
  });

  it('is not asked of those who tick no doses, and not taken from them', async () => {
    for (const context of [await another('viewer'), await another('caretaker', false), await another('owner', false)]) {
      expect((await granules(context)).stopDue).toBe(false);
      await expect(confirm(context)).rejects.toMatchObject({ code: 'not-allowed' });
    }
    expect(await owner.db.$count(stopConfirmations)).toBe(0);
  });

  it('sent twice is kept once; an id of somebody else confirms nothing', async () => {
    const id = randomUUID();
    await confirm(owner, id);
    await confirm(at(owner, hoursLater(1)), id);
    expect(await owner.db.$count(stopConfirmations)).toBe(1);
    const caretaker = await another('caretaker');
    await expect(confirm(caretaker, id)).rejects.toMatchObject({ code: 'conflict' });
    expect((await granules(caretaker)).stopDue).toBe(true);
  });

  it('of a dose of another household is not there', async () => {
    const { id: doseId } = await granules(owner);
    const neighbour = await aPoolHousehold(owner.db);
    await expect(confirmStop(neighbour, { id: randomUUID(), doseId })).rejects.toMatchObject({ code: 'not-found' });
    expect(await owner.db.$count(stopConfirmations)).toBe(0);
  });

  it('holds up no tick: what went in is kept', async () => {
    const dose = await granules(owner);
    const tick: DoseTick = { action: 'given', id: randomUUID(), planVersion: dose.planVersion };
    const { doses } = await tickDose(at(owner, new Date(dose.at)), dose.id, tick);
    expect(doses.find(({ id }) => id === dose.id)).toMatchObject({ status: 'given', stopDue: true });
  });
});

describe('what is sent of a confirmation', () => {
  const sent = { id: randomUUID(), doseId: randomUUID() };

  it('is its id and the dose', () => {
    expect(newStopConfirmationSchema.parse(sent)).toEqual(sent);
  });

  it.each([
    ['a product that the device names', { product: 'calcium-hypochlorite granular 65 dissolve' }],
    ['an hour of the device', { confirmedAt: '2026-07-05T19:00:00-04:00' }],
    ['what is no dose', { doseId: 'gran' }],
    ['what is no id', { id: '1' }],
  ])('and not %s', (_what, part) => {
    expect(newStopConfirmationSchema.safeParse({ ...sent, ...part }).success).toBe(false);
  });
});
