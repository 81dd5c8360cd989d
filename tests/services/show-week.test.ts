import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { findCurrentPlan } from '@/db/queries/plans';
import { updateHousehold } from '@/db/queries/households';
import { updatePool } from '@/db/queries/pools';
import { setStock } from '@/db/queries/shelf-products';
import type { StoredReading } from '@/db/queries/readings';
import { saveWeekDay } from '@/db/queries/week-days';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { weekSheetSchema } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from '@/lib/services/context';
import { recordReading } from '@/lib/services/record-reading';
import { sheetChecks } from '@/lib/services/sheet-checks';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

const codesOf = ({ verdict }: { verdict: { reasons: { code: string }[] } }) => verdict.reasons.map(({ code }) => code);

describe('showWeek', { timeout: 60_000 }, () => {
  let db: Database;
  let owner: ServiceContext;
  beforeEach(async () => {
    db = freshDatabase();
    owner = await aPoolHousehold(db);
  });

  it('shows a week before its first test: no curve, no plan, test first', async () => {
    const sheet = await showWeek(owner);
    expect(weekSheetSchema.parse(sheet)).toMatchObject({ plan: null, planProblem: null, ahead: null, behind: null });
    expect(sheet.verdict.state).toBe('test-first');
    expect(codesOf(sheet)).toContain('chlorine-not-known');
    expect(sheet.readings).toEqual([]);
  });

  it('asks for the pool first', async () => {
    await updatePool(db, owner.access.householdId, { completedAt: null });
    await expect(showWeek(owner)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('lays out the seven days of the week that holds the day, by the first weekday of the locale', async () => {
    const days = async (locale: string, start?: string) => {
      const context = { ...owner, access: { ...owner.access, locale } };
      return (await showWeek(context, start === undefined ? {} : { start })).days.map(({ day }) => day);
    };
    // 5 July 2026 is a Sunday.
    expect((await days('en-US'))[0]).toBe('2026-07-05');
    expect((await days('en-GB'))[0]).toBe('2026-06-29');
    expect(await days('en-US', '2026-07-15')).toEqual([12, 13, 14, 15, 16, 17, 18].map((date) => `2026-07-${date}`));
  });

  it('gives each day its hours, also where clocks change, and its sun', async () => {
    const sheet = await showWeek(owner, { start: '2026-11-01' });
    const [change, next] = sheet.days;
    expect(change).toMatchObject({ startsAt: '2026-11-01T00:00:00-04:00', endsAt: '2026-11-02T00:00:00-05:00' });
    expect([change?.sun.length, next?.sun.length]).toEqual([25, 24]);
    const july = (await showWeek(owner)).days[1];
    expect(july?.sun[2]).toBe(0);
    const noonish = Math.max(...(july?.sun ?? []));
    // Nearly the reference sun at 28 degrees north in July, through the usual sky.
    expect(noonish).toBeGreaterThan(0.85);
    expect(noonish).toBeLessThan(1.1);
    expect(Date.parse(july?.sunset ?? '') - Date.parse(july?.sunrise ?? '')).toBeGreaterThan(13.5 * 3_600_000);
  });

  it('shows what was said of a day', async () => {
    const { householdId } = owner.access;
    await saveWeekDay(db, { householdId, day: '2026-07-08', values: { rainMillimetres: 7, swimmerHours: 9, sky: 0 } });
    const day = (await showWeek(owner)).days[3];
    expect(day).toMatchObject({ day: '2026-07-08', rain: 7, swimmerHours: 9 });
    expect(Math.max(...(day?.sun ?? []))).toBe(0);
  });
});

describe('showWeek with a plan', { timeout: 60_000 }, () => {
  let db: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    db = freshDatabase();
    owner = await aPoolHousehold(db);
    await recordReading(owner, aFullTest());
  });

  it('has the whole outlook ahead and what was promised behind', async () => {
    const now = hoursLater(30.5);
    const sheet = await showWeek(at(owner, now));
    expect(weekSheetSchema.parse(sheet).ahead?.hours).toHaveLength(169);
    expect(sheet.behind?.hours).toHaveLength(31);
    expect(sheet.behind?.freeChlorine.p50).toEqual(sheet.ahead?.freeChlorine.p50.slice(0, 31));
    expect(sheet.plan).toMatchObject({ version: 1, stale: false });
  });

  it('stitches what is behind from the plans of their time', async () => {
    const fresh = freshDatabase();
    const other = await aPoolHousehold(fresh);
    await recordReading(other, aFullTest());
    const first = await findCurrentPlan(fresh, other.access.householdId);
    const later = hoursLater(24.2);
    const second = { ...aFullTest(later), kind: 'quick' as const, values: { freeChlorine: 4.4, pH: 7.6 } };
    await recordReading(at(other, hoursLater(24.5)), second);
    const sheet = await showWeek(at(other, hoursLater(27)));
    // The second plan was made at 24.5 h: its hours count from there, 24.2 h + i.
    const promised = first?.result.projection?.freeChlorine.p50.slice(0, 25) ?? [];
    expect(promised).toHaveLength(25);
    // As fine as it is drawn.
    promised.forEach((value, hour) => expect(sheet.behind?.freeChlorine.p50[hour]).toBeCloseTo(value, 3));
    expect(sheet.behind?.freeChlorine.p50.slice(25)).toEqual(sheet.ahead?.freeChlorine.p50.slice(1, 3));
    expect(sheet.behind?.hours.map(Date.parse)).toEqual(sheet.behind?.hours.map(Date.parse).toSorted((a, b) => a - b));
  });

  it('shows the doses of the week with the hours that follow from them', async () => {
    const week = await showWeek(owner);
    const next = await showWeek(owner, { start: '2026-07-12' });
    const plan = await findCurrentPlan(db, owner.access.householdId);
    expect(week.doses.length + next.doses.length).toBe(plan?.result.doses.length);
    const fast = [...week.doses, ...next.doses].find(({ form }) => form === 'granular')!;
    const hour = Date.parse(fast.at);
    expect(fast).toMatchObject({
      status: 'planned',
      productName: 'Granules',
      steps: 'granules-dissolve',
      labelWay: 'dissolve',
      // As the household keeps it on the shelf.
      measure: 50,
    });
    expect(Date.parse(fast.tickFrom)).toBe(hour - 3 * 3_600_000);
    expect(Date.parse(fast.pumpUntil ?? '')).toBe(hour + (fast.rise > 5 ? 8 : 4) * 3_600_000);
    expect(Date.parse(fast.waitUntil)).toBeGreaterThanOrEqual(hour + 4 * 3_600_000);
    const tablets = week.doses.find(({ form }) => form === 'tablet');
    if (tablets) {
      expect(tablets).toMatchObject({ steps: 'tablets-inline', pumpUntil: null });
      expect(Date.parse(tablets.waitUntil)).toBe(Date.parse(tablets.at) + 15 * 60_000);
    }
  });

  it('keeps everyone waiting until chlorine is under the swim limit again', async () => {
    const sheet = await showWeek(owner, { start: '2026-07-05' });
    const { ahead } = sheet;
    for (const dose of sheet.doses.filter(({ form }) => form !== 'tablet')) {
      const index = ahead?.hours.findIndex((hour) => Date.parse(hour) >= Date.parse(dose.waitUntil)) ?? -1;
      expect(ahead?.freeChlorine.p50[index] ?? 0).toBeLessThanOrEqual(4);
    }
  });

  it('turns from fine to test first to a stale plan, by the age of the reading alone', async () => {
    const soon = await showWeek(at(owner, hoursLater(0.5)));
    expect(soon.verdict).toMatchObject({ state: 'fine', reasons: [] });
    expect(Date.parse(soon.verdict.until ?? '')).toBeGreaterThan(hoursLater(0.5).getTime());
    const old = await showWeek(at(owner, hoursLater(60)));
    expect(codesOf(old)).toContain('chlorine-reading-old');
    const stale = await showWeek(at(owner, hoursLater(169)));
    expect(stale.plan).toMatchObject({ version: 1, stale: true });
    expect(codesOf(stale)).toContain('no-outlook');
  });

  it('wants a test when a due dose is neither ticked nor skipped, also after a newer plan', async () => {
    const fresh = freshDatabase();
    const other = await aPoolHousehold(fresh);
    await setStock(fresh, { householdId: other.access.householdId, id: 'tabs', stock: 0 });
    await recordReading(other, aFullTest(other.now, { values: { ...aFullTest().values, freeChlorine: 2.6 } }));
    const plan = await findCurrentPlan(fresh, other.access.householdId);
    const due = new Date(plan!.result.doses[0]!.at);
    const open = await showWeek(at(other, hoursLater(6, due)));
    expect(codesOf(open)).toContain('due-dose-open');
    await setStock(fresh, { householdId: other.access.householdId, id: 'gran', stock: 3000 });
    const replanned = await showWeek(at(other, hoursLater(6, due)));
    expect(replanned.plan?.version).toBe(2);
    expect(codesOf(replanned)).toContain('due-dose-open');
    expect(replanned.doses.some(({ at: hour }) => Date.parse(hour) === due.getTime())).toBe(true);
  });

  it('wants a test after much rain, and after a day of many swimmers', async () => {
    const fresh = await copyOf(db);
    const other = { ...owner, db: fresh };
    const { householdId } = owner.access;
    await saveWeekDay(fresh, { householdId, day: '2026-07-06', values: { rainMillimetres: 30 } });
    await saveWeekDay(fresh, { householdId, day: '2026-07-07', values: { swimmerHours: 40 } });
    // Sunday 23:00 UTC is 19:00 there: no rain yet; by Monday noon half of it has fallen.
    expect(codesOf(await showWeek(other))).not.toContain('much-rain');
    expect(codesOf(await showWeek(at(other, hoursLater(17))))).toContain('much-rain');
    // Tuesday, 21:00: 40 swimmer-hours in 75.7 m3 are more than one in 4 m3.
    const evening = codesOf(await showWeek(at(other, hoursLater(50))));
    expect(evening).toContain('many-swimmers');
  });

  it('asks for the full test that ends the plan', async () => {
    const full = (await showWeek(owner)).checks.find(({ kind }) => kind === 'full');
    expect(full?.done).toBe(false);
    expect(Date.parse(full?.at ?? '')).toBe(hoursLater(168).getTime());
  });

  it('counts a check as done by a test on its day or after it, a full one only by a full test', async () => {
    const plan = (await findCurrentPlan(db, owner.access.householdId))!;
    const checks = [
      { at: '2026-07-08T10:00:00-04:00', kind: 'quick' as const, reason: 'swim-day-after-two-days' },
      { at: '2026-07-09T19:00:00-04:00', kind: 'full' as const, reason: 'next-week' },
    ];
    const withChecks = { ...plan, result: { ...plan.result, checks } };
    const done = (takenAt: string, kind: 'quick' | 'full') => {
      const reading = { takenAt: new Date(takenAt), kind } as StoredReading;
      return sheetChecks(withChecks, [reading], owner.access.timeZone).map((check) => check.done);
    };
    expect(done('2026-07-07T20:00:00-04:00', 'full')).toEqual([false, false]);
    expect(done('2026-07-08T07:00:00-04:00', 'quick')).toEqual([true, false]);
    expect(done('2026-07-09T08:00:00-04:00', 'quick')).toEqual([true, false]);
    expect(done('2026-07-09T08:00:00-04:00', 'full')).toEqual([true, true]);
    // The test that the plan was made of.
    expect(done(plan.takenAt.toISOString(), 'full')).toEqual([false, false]);
  });
});

describe('a reading of no chlorine', { timeout: 60_000 }, () => {
  let db: Database;
  let owner: ServiceContext;
  beforeEach(async () => {
    db = freshDatabase();
    owner = at(await aPoolHousehold(db), hoursLater(24));
    await recordReading(at(owner, hoursLater(0)), aFullTest());
  });
  const zero = (zeroAnswer?: 'flashed' | 'stayed-pale') => ({
    ...aFullTest(hoursLater(24), { kind: 'quick', values: { freeChlorine: 0.3, pH: 7.5 } }),
    ...(zeroAnswer === undefined ? {} : { zeroAnswer }),
  });

  it('is asked about: no dose, test first', async () => {
    await recordReading(owner, zero());
    const sheet = await showWeek(owner);
    expect(codesOf(sheet)).toContain('false-zero-open');
    expect(
      sheet.doses.filter(({ status, at: hour }) => status === 'planned' && Date.parse(hour) > owner.now.getTime()),
    ).toEqual([]);
    expect(sheet.plan?.needs.map(({ code }) => code)).toEqual(['false-zero-open']);
  });

  it('is far too much when the colour flashed: stay out, add nothing', async () => {
    await recordReading(owner, zero('flashed'));
    const sheet = await showWeek(owner);
    expect(sheet.verdict.state).toBe('stay-out');
    expect(codesOf(sheet)).toContain('chlorine-over-maximum');
    expect(sheet.plan?.needs.map(({ code }) => code)).toEqual(['chlorine-bleached-test']);
  });

  it('is none when it stayed pale: it is planned', async () => {
    await recordReading(owner, zero('stayed-pale'));
    const sheet = await showWeek(owner);
    expect(sheet.plan?.needs).toEqual([]);
    expect(sheet.verdict.state).toBe('stay-out');
    expect(codesOf(sheet)).toContain('chlorine-under-code-minimum');
  });
});

describe('a household elsewhere', { timeout: 60_000 }, () => {
  it('sees its own days and hours', async () => {
    const db = freshDatabase();
    const context = await aPoolHousehold(db, { pool: { latitude: 40.4, longitude: -3.7 } });
    await updateHousehold(db, context.access.householdId, { timeZone: 'Europe/Madrid' });
    const owner = { ...context, access: { ...context.access, timeZone: 'Europe/Madrid', locale: 'es' } };
    await recordReading(owner, aFullTest());
    const sheet = await showWeek(owner);
    // 23:00 UTC is 01:00 of Monday in Madrid.
    expect(sheet.now).toBe('2026-07-06T01:00:00+02:00');
    expect(sheet.days[0]).toMatchObject({ day: '2026-07-06', startsAt: '2026-07-06T00:00:00+02:00' });
    expect(sheet.plan?.takenAt).toBe(toOffsetIso(owner.now.getTime(), 'Europe/Madrid'));
  });
});
