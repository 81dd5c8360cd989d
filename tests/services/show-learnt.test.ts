import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { listAudit } from '@/db/queries/audit-trail';
import { updatePool } from '@/db/queries/pools';
import { listPosteriorHashes } from '@/db/queries/posteriors';
import { priorSigma } from '@/lib/projection/parameters';
import { type Learnt, learntSchema, type LearntThing } from '@/lib/schemas/learnt';
import type { ServiceContext } from '@/lib/services/context';
import { forgetLearnt } from '@/lib/services/forget-learnt';
import { recordReading } from '@/lib/services/record-reading';
import { showLearnt } from '@/lib/services/show-learnt';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { aMember, freshDatabase } from '@/tests/support/test-database';

planWith();

/** Of the standard normal distribution. */
const Z90 = 1.2815515655446;

/** Full tests of one water, so many hours apart, each with the chlorine given; nothing goes in between them. */
async function tests(context: ServiceContext, levels: readonly number[], hoursApart = 24): Promise<ServiceContext> {
  let last = context;
  for (const [index, freeChlorine] of levels.entries()) {
    const when = hoursLater(hoursApart * index, context.now);
    const reading = aFullTest(when);
    last = at(context, when);
    await recordReading(last, { ...reading, values: { ...reading.values, freeChlorine } });
  }
  return last;
}

const rowOf = (learnt: Learnt, thing: LearntThing) => learnt.rows.find((row) => row.thing === thing);

describe('showLearnt', { timeout: 60_000 }, () => {
  let prepared: ServiceContext;
  let taught: ServiceContext;
  beforeAll(async () => {
    const db = freshDatabase();
    prepared = await aPoolHousehold(db);
    taught = await tests(prepared, [6, 3, 1.5, 0.8]);
  }, 60_000);

  it('shows nothing, and no bar, before anything was tested', async () => {
    const untested = await aPoolHousehold(freshDatabase());
    expect(await showLearnt(untested)).toEqual({
      since: null,
      readings: 0,
      rows: [],
      tabletHoursADay: null,
      enteredVolume: 75.7,
      measureVolumeAgain: false,
      stoodOut: [],
    });
  });

  it('puts what was learnt beside what was assumed, for each thing', async () => {
    const learnt = await showLearnt(taught);
    expect(learntSchema.parse(learnt)).toEqual(learnt);
    expect(learnt.readings).toBe(4);
    expect(learnt.rows.map(({ thing }) => thing)).toEqual([
      'dailyLoss',
      'boundPhotolysis',
      'sunStrength',
      'darkDemand',
      'chlorinePerSwimmerHour',
      'tabletLife',
      'waterPerSwimmerHour',
      'carbonDioxideTransfer',
      'volume',
    ]);
    const loss = rowOf(learnt, 'dailyLoss')!;
    // Half of it is gone each day, 1.5 of 3 mg/L: more than pools usually lose. The bar moves up towards that, and narrows.
    expect(loss.learnt.p50).toBeGreaterThan(loss.before.p50 * 1.2);
    expect(loss.learnt.p50).toBeLessThan(1.6);
    expect(loss.learnt.p90 - loss.learnt.p10).toBeLessThan(loss.before.p90 - loss.before.p10);
    expect(loss.readings).toBeGreaterThanOrEqual(2);
    expect(loss.readings).toBeLessThanOrEqual(3);
    for (const { before, learnt: now } of learnt.rows)
      for (const { p10, p50, p90 } of [before, now]) {
        expect(p10).toBeLessThan(p50);
        expect(p50).toBeLessThan(p90);
      }
  });

  it('gives the life of a tablet in days of the pump, for the tablets on the shelf', async () => {
    const learnt = await showLearnt(taught);
    // 8 hours a day: the usual 48 running hours are 6 days.
    expect(learnt.tabletHoursADay).toBe(8);
    const { before } = rowOf(learnt, 'tabletLife')!;
    expect(before.p50).toBeCloseTo(6, 9);
    expect(before.p90).toBeCloseTo(6 * Math.exp(Z90 * priorSigma.tabletLife), 6);
    const db = await copyOf(taught.db);
    await updatePool(db, taught.access.householdId, { feederKind: 'floating' });
    const floating = await showLearnt({ ...taught, db });
    expect(floating.tabletHoursADay).toBe(24);
    expect(rowOf(floating, 'tabletLife')!.before.p50).toBeCloseTo(2, 9);
  });

  it('leaves tablets out where none are used', async () => {
    const db = await copyOf(taught.db);
    await updatePool(db, taught.access.householdId, { feederKind: 'none', feederIngredient: null });
    const learnt = await showLearnt({ ...taught, db });
    expect(learnt.tabletHoursADay).toBeNull();
    expect(rowOf(learnt, 'tabletLife')).toBeUndefined();
  });

  it('says the volume in cubic metres about the entered one', async () => {
    const { before } = rowOf(await showLearnt(taught), 'volume')!;
    expect(before.p50).toBeCloseTo(75.7, 9);
    expect(before.p10).toBeCloseTo(75.7 * Math.exp(-Z90 * priorSigma.volume), 6);
  });

  it('tells which tests stood out, newest first, with what was expected of them', async () => {
    const db = await copyOf(taught.db);
    const later = await tests(at({ ...taught, db }, hoursLater(96)), [14, 12]);
    const { stoodOut } = await showLearnt(later);
    const chlorine = stoodOut.filter(({ quantity }) => quantity === 'freeChlorine');
    expect(chlorine.map(({ kind, measured }) => [kind, measured])).toEqual([
      ['unrecorded-dose', 12],
      ['questioned', 14],
    ]);
    expect(Date.parse(chlorine[1]!.takenAt)).toBe(hoursLater(96).getTime());
    expect(chlorine[1]!.high).toBeLessThan(3);
  });
});

describe('forgetLearnt', { timeout: 60_000 }, () => {
  let db: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    db = freshDatabase();
    owner = await tests(await aPoolHousehold(db), [6, 3.6, 2.1]);
  }, 60_000);

  it('is for an owner alone', async () => {
    for (const role of ['caretaker', 'viewer'] as const) {
      const member = await aMember(db, { householdId: owner.access.householdId, role, now: hoursLater(-1) });
      await expect(forgetLearnt(at(owner, owner.now, member))).rejects.toMatchObject({
        code: 'not-allowed',
        message: 'Only an owner can let the pool be learnt anew.',
      });
    }
    expect((await showLearnt(owner)).readings).toBe(3);
  });

  it('goes back to what was assumed, keeps the tests, and plans without what was taught', async () => {
    const copy = { ...owner, db: await copyOf(db) };
    const before = await showWeek(copy);
    const later = at(copy, hoursLater(1, owner.now));
    const learnt = await forgetLearnt(later);
    expect(learnt).toMatchObject({ readings: 0, rows: [], stoodOut: [] });
    expect(Date.parse(learnt.since!)).toBe(later.now.getTime());
    expect(await listPosteriorHashes(copy.db, owner.access.householdId)).toEqual(new Map());
    const after = await showWeek(later);
    expect(after.plan!.version).toBe(before.plan!.version + 1);
    expect(after.readings).toEqual(before.readings);
    const [entry] = await listAudit(copy.db, owner.access.householdId);
    expect(entry).toMatchObject({ action: 'forget-learnt', personName: 'Ines', detail: { before: null } });
  });

  it('learns from the tests that come after it, and from no other', async () => {
    const copy = { ...owner, db: await copyOf(db) };
    await forgetLearnt(at(copy, hoursLater(1, owner.now)));
    const later = await tests(at(copy, hoursLater(24, owner.now)), [5, 3]);
    expect((await showLearnt(later)).readings).toBe(2);
  });
});
