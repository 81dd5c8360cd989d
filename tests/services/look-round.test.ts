import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { insertHousehold } from '@/db/queries/households';
import { findCurrentPlan } from '@/db/queries/plans';
import { households, people, planDoses, plans, readings } from '@/db/schema';
import { proveHousehold } from '@/lib/auth/household-access';
import { systemScope } from '@/lib/auth/system-scope';
import { openVisit } from '@/lib/auth/visit';
import { addDays, startOfDay } from '@/lib/calendar/household-day';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from '@/lib/services/context';
import { listReadings } from '@/lib/services/list-readings';
import { lookRound } from '@/lib/services/look-round';
import { recordReading } from '@/lib/services/record-reading';
import { seedDemo } from '@/lib/services/seed-demo';
import { showWeek } from '@/lib/services/show-week';
import { planWith } from '@/tests/support/engine';
import { aFullTest, copyOf } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

planWith();

const HOUR = 3_600_000;
const zone = 'Indian/Mauritius';
const today = '2027-01-20';
const noon = new Date(startOfDay(today, zone) + 12 * HOUR);
const secret = 'a secret of thirty-two characters!';
const scope = systemScope('seed-demo');

async function visitor(db: Database, now = noon): Promise<ServiceContext> {
  const visit = await openVisit(new Headers(), { db, now, secure: false, secret });
  await lookRound(visit);
  const { personId, householdId } = visit.signedIn!;
  return { db, now, access: await proveHousehold(db, { personId, householdId, now }) };
}

/** What can be seen, without the ids that every copy has of its own. */
function content({ readings: shown, doses, plan, behind, ahead }: WeekSheet) {
  return {
    readings: shown.map(({ id: _id, ...rest }) => rest),
    doses: doses.map(({ id: _id, planId: _planId, ...rest }) => rest),
    plan: plan && { ...plan, id: '' },
    behind,
    ahead,
  };
}

describe('the demo household', { timeout: 240_000 }, () => {
  let seeded: Database;
  let sheet: WeekSheet;
  let context: ServiceContext;
  beforeAll(async () => {
    seeded = freshDatabase();
    await seedDemo(seeded, noon);
    context = await visitor(await copyOf(seeded));
    sheet = await showWeek(context);
  }, 240_000);

  it('has ten weeks of weekly full tests and quick checks, the newest 1 to 3 days old at every hour', async () => {
    const all = await listReadings(context, { from: new Date(noon.getTime() - 100 * 24 * HOUR).toISOString() });
    const full = all.filter(({ kind }) => kind === 'full').map(({ takenAt }) => Date.parse(takenAt));
    expect(full).toHaveLength(10);
    full.slice(1).forEach((at, index) => expect((full[index]! - at) / HOUR).toBe(7 * 24));
    expect(all.length - full.length).toBeGreaterThanOrEqual(15);
    const newest = Date.parse(all[0]!.takenAt);
    for (const instant of [startOfDay(today, zone), startOfDay(addDays(today, 1), zone)]) {
      expect((instant - newest) / HOUR).toBeGreaterThanOrEqual(24);
      expect((instant - newest) / HOUR).toBeLessThanOrEqual(72);
    }
  });

  it('has water that its people keep well, and tests that differ from it', async () => {
    const all = await listReadings(context, { from: new Date(noon.getTime() - 100 * 24 * HOUR).toISOString() });
    for (const { values } of all) {
      expect(values.freeChlorine).toBeGreaterThan(0.5);
      expect(values.freeChlorine).toBeLessThan(6);
      expect(values.pH).toBeGreaterThanOrEqual(7);
      expect(values.pH).toBeLessThanOrEqual(8);
    }
    expect(new Set(all.map(({ values }) => values.freeChlorine)).size).toBeGreaterThan(5);
  });

  it('shows a current plan, what was promised, and given doses', async () => {
    expect(sheet.household).toMatchObject({ name: 'Filao Road', demo: true });
    expect(sheet.me).toMatchObject({ role: 'owner', handlesChemicals: true });
    expect(sheet.plan?.stale).toBe(false);
    expect(sheet.planProblem).toBeNull();
    expect(sheet.ahead?.hours).toHaveLength(169);
    expect(sheet.behind?.hours.length).toBeGreaterThan(48);
    expect(sheet.verdict.reasons.map(({ code }) => code)).not.toContain('due-dose-open');
    const week = await showWeek(context, { start: addDays(today, -7) });
    expect([...week.doses, ...sheet.doses].some(({ status }) => status === 'given')).toBe(true);
    // Each plan counts its hours from its own test, so that a day with a new plan may have one less.
    expect(week.behind?.hours.length).toBeGreaterThan(160);
  });

  it('needs no new plan when somebody looks', async () => {
    const { version } = (await findCurrentPlan(context.db, context.access.householdId))!;
    const later = { ...context, now: new Date(noon.getTime() + 11 * HOUR) };
    expect((await showWeek(later)).plan?.version).toBe(version);
  });

  it('is the same for two visitors, and theirs alone', async () => {
    const db = await copyOf(seeded);
    const [one, two] = [await visitor(db), await visitor(db)];
    expect(content(await showWeek(one))).toEqual(content(await showWeek(two)));
    const before = await db.$count(readings);
    await recordReading(one, aFullTest(noon));
    expect(await db.$count(readings)).toBe(before + 1);
    expect((await showWeek(one)).lastReading?.takenAt).toBe('2027-01-20T12:00:00+04:00');
    expect(content(await showWeek(two))).toEqual(content(sheet));
    expect(content(await showWeek(await visitor(db)))).toEqual(content(sheet));
  });

  it('opens in two seconds', async () => {
    const db = await copyOf(seeded);
    const started = performance.now();
    await visitor(db);
    expect(performance.now() - started).toBeLessThan(2_000);
  });

  it('keeps the copy of whoever looks round already', async () => {
    const db = await copyOf(seeded);
    const visit = await openVisit(new Headers(), { db, now: noon, secure: false, secret });
    await lookRound(visit);
    const first = visit.signedIn;
    await lookRound(visit);
    expect(visit.signedIn).toEqual(first);
    expect(await db.$count(households)).toBe(2);
  });

  it('lets 200 look round at once, clears away what has run out, and loses nobody else', async () => {
    const db = await copyOf(seeded);
    const before = await db.$count(people);
    const gone = await visitor(db, new Date(noon.getTime() - 25 * HOUR + 24 * HOUR));
    for (let copy = 1; copy < 200; copy++)
      await insertHousehold(db, scope, {
        ...{ id: randomUUID(), name: 'Copy', timeZone: zone, unitSystem: 'metric', locale: 'en', demo: true },
        ...{ createdAt: noon, expiresAt: new Date(noon.getTime() + (24 + copy / 1000) * HOUR) },
      });
    await expect(visitor(db)).rejects.toMatchObject({ code: 'too-many-requests' });
    const nextDay = new Date(noon.getTime() + 23.5 * HOUR);
    // The day has changed: the demo of that day is made first.
    await visitor(db, nextDay);
    expect(await db.select().from(households)).not.toContainEqual(
      expect.objectContaining({ id: gone.access.householdId }),
    );
    // Two residents of the new original, three people of the new copy.
    expect(await db.$count(people)).toBe(before + 3);
  });

  it('is the same whenever on a day it is made', async () => {
    const db = freshDatabase();
    const evening = new Date(noon.getTime() + 9 * HOUR);
    await seedDemo(db, evening);
    expect(content(await showWeek(await visitor(db, noon)))).toEqual(content(sheet));
    expect(await db.$count(plans)).toBe((await seeded.$count(plans)) * 2);
    expect(await db.$count(planDoses)).toBe((await seeded.$count(planDoses)) * 2);
  });
});
