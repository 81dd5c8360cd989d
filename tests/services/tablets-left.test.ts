import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { findCurrentPlan } from '@/db/queries/plans';
import { findPosterior } from '@/db/queries/posteriors';
import { listTabletsFound } from '@/db/queries/tablets-found';
import { auditTrail, doseEvents } from '@/db/schema';
import { dayOf } from '@/lib/calendar/household-day';
import { doseTickSchema, type PlanDose } from '@/lib/schemas/plan-dose';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { showWeek } from '@/lib/services/show-week';
import { tickDose } from '@/lib/services/tick-dose';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

let prepared: ServiceContext;
let owner: ServiceContext;
let db: Database;
/** Slow tablets of the plan, and a dose of something else. */
let tablets: PlanDose;
let other: PlanDose;
let due: Date;

beforeAll(async () => {
  prepared = await aPoolHousehold(freshDatabase(), { pool: { feederLoaded: 454 } });
  await recordReading(prepared, aFullTest(prepared.now, { values: { ...aFullTest().values, freeChlorine: 2.4 } }));
  const plan = await findCurrentPlan(prepared.db, prepared.access.householdId);
  const [first] = plan?.result.doses ?? [];
  const start = dayOf(Date.parse(first?.at ?? ''), prepared.access.timeZone);
  const { doses } = await showWeek(prepared, { start });
  tablets = doses.find(({ form }) => form === 'tablet')!;
  other = doses.find(({ form }) => form !== 'tablet')!;
  due = new Date(tablets.at);
}, 60_000);

beforeEach(async () => {
  db = await copyOf(prepared.db);
  owner = { ...prepared, db };
});

const said = (tick: object) => doseTickSchema.parse({ id: randomUUID(), planVersion: 1, ...tick });
const tick = (what: object, minutes = 0) => tickDose(at(owner, hoursLater(minutes / 60, due)), tablets.id, said(what));
const found = async () =>
  (await listTabletsFound(db, { householdId: owner.access.householdId, from: new Date(0) })).map(
    (each) => each.tablets,
  );
const shown = (sheet: Awaited<ReturnType<typeof tick>>) => sheet.doses.find(({ id }) => id === tablets.id)?.tabletsLeft;

describe('whole tablets left at a refill', { timeout: 60_000 }, () => {
  it('are kept with the tick, and shown with the dose', async () => {
    expect(shown(await tick({ action: 'given', tabletsLeft: 2 }))).toBe(2);
    expect(await found()).toEqual([2]);
    const entries = (await db.select().from(auditTrail)).filter(({ action }) => action === 'tick-dose');
    expect(entries).toMatchObject([{ detail: { tick: 'given', tabletsLeft: 2 } }]);
  });

  it('need not be said, and none left is not the same as not said', async () => {
    expect(shown(await tick({ action: 'given' }))).toBeNull();
    expect(await found()).toEqual([]);
    expect(shown(await tick({ action: 'given', tabletsLeft: 0 }, 2))).toBe(0);
    expect(await found()).toEqual([0]);
  });

  it('can be said after the tick by whoever ticked, without another dose', async () => {
    await tick({ action: 'given' });
    const sheet = await tick({ action: 'given', tabletsLeft: 1 }, 3);
    const dose = sheet.doses.find(({ id }) => id === tablets.id);
    expect(dose).toMatchObject({ status: 'given', givenAmount: tablets.amount, tabletsLeft: 1 });
    expect(Date.parse(dose!.givenAt!)).toBe(due.getTime());
  });

  it('go with another amount too; the newest count holds', async () => {
    await tick({ action: 'changed', amount: 2, tabletsLeft: 1 });
    await tick({ action: 'changed', amount: 3, tabletsLeft: 2 }, 1);
    expect(await found()).toEqual([2]);
    await tick({ action: 'changed', amount: 4 }, 2);
    expect(await found()).toEqual([2]);
  });

  it('are taken back with the tick, and do not come again with the next one', async () => {
    await tick({ action: 'given', tabletsLeft: 2 });
    await tick({ action: 'undo' }, 1);
    await tick({ action: 'given' }, 2);
    expect(await found()).toEqual([]);
  });

  it('are sent again as the same tick without a second one', async () => {
    const once = said({ action: 'given', tabletsLeft: 2 });
    for (const minutes of [0, 5]) await tickDose(at(owner, hoursLater(minutes / 60, due)), tablets.id, once);
    expect(await found()).toEqual([2]);
    expect(await db.$count(doseEvents)).toBe(1);
  });

  it('are no part of a dose of anything else', async () => {
    const when = at(owner, new Date(other.at));
    const wrong = tickDose(when, other.id, said({ action: 'given', tabletsLeft: 1 }));
    await expect(wrong).rejects.toMatchObject({ code: 'invalid-input', problems: [{ path: 'tabletsLeft' }] });
    expect(await found()).toEqual([]);
    expect(await db.$count(doseEvents)).toBe(0);
  });

  it.each([-1, 51, 1.5, '2'])('are counted whole, at most 50: not %s', (tabletsLeft) => {
    const sent = { action: 'given', id: randomUUID(), planVersion: 1, tabletsLeft };
    expect(doseTickSchema.safeParse(sent).success).toBe(false);
  });

  it('teach how long a tablet lasts, by the next test', async () => {
    const lives = await Promise.all(
      [0, 2].map(async (tabletsLeft) => {
        const copy = { ...owner, db: await copyOf(db) };
        await tickDose(at(copy, due), tablets.id, said({ action: 'given', tabletsLeft }));
        const next = aFullTest(hoursLater(20, due));
        await recordReading(at(copy, new Date(next.takenAt)), next);
        const known = await findPosterior(copy.db, copy.access.householdId, next.id);
        expect(known?.step.log).toContainEqual(
          expect.objectContaining({ quantity: 'tabletsLeft', measured: tabletsLeft }),
        );
        return known!.step.posterior.medians.tabletLife;
      }),
    );
    expect(lives[0]).toBeLessThan(lives[1]!);
  });
});
