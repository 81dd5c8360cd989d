import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Database } from '@/db/client';
import { listDoses, recordDoseEvent, type StoredDose } from '@/db/queries/plan-doses';
import { findPool, updatePool } from '@/db/queries/pools';
import { insertReading } from '@/db/queries/readings';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { inWriteTransaction } from '@/db/write';
import { epochDayOf } from '@/lib/calendar/epoch-day';
import { addDays, type CalendarDay, dayOf, startOfDay } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import { weekDoseOf } from '@/lib/planner/given-doses';
import type { WeekDose } from '@/lib/projection/events';
import type { Pool } from '@/lib/schemas/pool';
import type { NewReading } from '@/lib/schemas/reading';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { chanceOf } from './demo-chance';
import { demoHousehold } from './demo-household';
import { type DemoTest, demoTests } from './demo-tests';
import { type DemoWater, firstWater, fullTestOf, habitDose, quickTestOf, waterAfter } from './demo-water';
import { enginePool } from './engine-pool';
import { engineProduct, productIdOf } from './engine-shelf';
import { planWeek } from './plan-week';

const MINUTE = 60_000;
const { timeZone } = demoHousehold;

export type DemoMembers = { owner: string; caretaker: string };

/** What the life of the demo pool is written with. */
type Pen = {
  db: Database;
  householdId: ProvenHouseholdId;
  members: DemoMembers;
  pool: Pool;
  shelf: readonly ShelfProduct[];
  /** Nothing is written of today: it belongs to the visitor. */
  until: number;
};

/**
 * Ten weeks in the life of the demo pool, up to the beginning of a day: its water as the engine moves it, tests with their
 * errors, in the last weeks plans made of them by the engine and doses given as the plans said. The same day gives the same
 * rows, but for their ids.
 */
export async function writeDemoHistory(
  db: Database,
  { householdId, members, today }: { householdId: ProvenHouseholdId; members: DemoMembers; today: CalendarDay },
): Promise<void> {
  const found = await findPool(db, householdId);
  const pool = found && enginePool(found.pool, timeZone);
  if (!pool) throw new Error('The demo household has no pool.');
  const shelf = (await listShelfProducts(db, householdId)).map(engineProduct);
  const pen: Pen = { db, householdId, members, pool, shelf, until: startOfDay(today, timeZone) };
  const tests = demoTests(today);

  // Before the first plan nobody wrote down what went in: such weeks teach nothing.
  const firstPlanned = tests.find(({ plans }) => plans);
  if (firstPlanned) await updatePool(db, householdId, { learningFrom: new Date(firstPlanned.at) });
  let water = firstWater(tests[0]?.day ?? today);
  let given: WeekDose[] = [];
  let lastWrite = 0;
  for (const [index, test] of tests.entries()) {
    await writeTest(pen, test, water, index);
    lastWrite = test.at + 3 * MINUTE;
    const next = Math.min(tests[index + 1]?.at ?? Infinity, pen.until);
    // The first plan of all ends the time in which the household went by habit.
    if (tests.slice(0, index + 1).some(({ plans }) => plans)) {
      if (test.plans) await plan(pen, new Date(lastWrite));
      const { doses, lastTick } = await givePlanned(pen, new Date(lastWrite), new Date(next));
      given = [...given, ...doses];
      lastWrite = Math.max(lastWrite, lastTick);
      water = waterAfter(water, pool, test.at, next, given);
    } else water = byHabit(water, pool, test, next);
  }
  // The doses given since the newest test are known to the plan that the visitor finds; those it still asks for of the time
  // before are given too.
  for (let due = true; due;) {
    await plan(pen, new Date(lastWrite + 5 * MINUTE));
    const { doses, lastTick } = await givePlanned(pen, new Date(lastWrite), new Date(pen.until));
    due = doses.length > 0;
    lastWrite = Math.max(lastWrite, lastTick);
  }
}

async function writeTest(
  { db, householdId, members }: Pen,
  test: DemoTest,
  water: DemoWater,
  index: number,
): Promise<void> {
  const tester = index % 3 === 1 ? members.caretaker : members.owner;
  const reading: NewReading = {
    id: randomUUID(),
    takenAt: new Date(test.at).toISOString(),
    kind: test.kind,
    method: 'drop-kit',
    values: test.kind === 'full' ? fullTestOf(water, test.day) : quickTestOf(water, test.day),
    look: 'clear',
  };
  const now = new Date(test.at + 3 * MINUTE);
  await inWriteTransaction(db, (tx) =>
    insertReading(tx, { householdId, reading, doneBy: tester, recordedBy: tester, now }),
  );
}

/** Tries again when the engine was kept busy: the demo is made while others plan too. */
async function plan({ db, householdId }: Pen, now: Date): Promise<void> {
  for (let attempt = 1; ; attempt++) {
    const laterEachTime = new Date(now.getTime() + (attempt - 1) * 2 * MINUTE);
    const { problem } = await planWeek({ db, access: { householdId, timeZone }, now: laterEachTime });
    if (!problem) return;
    if (problem.code !== 'engine-busy' || attempt === 3)
      throw new Error(`The demo household has no plan: ${problem.code} ${problem.errorId}`);
  }
}

/** Gives the doses of the current plan whose hour has come, some minutes late, by whoever was at home. */
async function givePlanned(pen: Pen, from: Date, until: Date): Promise<{ doses: WeekDose[]; lastTick: number }> {
  const due = await listDoses(pen.db, { householdId: pen.householdId, from, until });
  const doses: WeekDose[] = [];
  let lastTick = 0;
  for (const dose of due.filter(({ status }) => status === 'planned')) {
    const givenAt = new Date(
      dose.at.getTime() + Math.round(2 + 9 * chanceOf('minutes', epochDayOf(dose.day))) * MINUTE,
    );
    const tickedAt = new Date(givenAt.getTime() + MINUTE);
    await tick(pen, dose, givenAt, tickedAt);
    const { amount, unit } = dose;
    const entry = { at: givenAt.toISOString(), product: productIdOf(dose), amount, unit };
    doses.push(weekDoseOf(entry, 'demo', pen.shelf, pen.pool));
    lastTick = tickedAt.getTime();
  }
  return { doses, lastTick };
}

async function tick({ db, householdId, members }: Pen, dose: StoredDose, givenAt: Date, tickedAt: Date): Promise<void> {
  const by = chanceOf('who', epochDayOf(dose.day)) < 0.4 ? members.caretaker : members.owner;
  const planVersionSeen = dose.planVersion;
  await inWriteTransaction(db, (tx) =>
    recordDoseEvent(tx, {
      householdId,
      event: {
        ...{ id: randomUUID(), doseId: dose.id, action: 'given', statusFrom: 'planned', statusTo: 'given' },
        ...{ amountFrom: null, amountTo: dose.amount, givenAtFrom: null, givenAtTo: givenAt },
        ...{ planVersionSeen, recordedBy: by, createdAt: tickedAt },
      },
      changes: {
        ...{ status: 'given', givenAt, givenAmount: dose.amount, doneBy: by, recordedBy: by, tickedAt },
        planVersionSeen,
      },
    }),
  );
}

/** Liquid every second evening, and acid the morning after a full test; nobody wrote it down. */
function byHabit(from: DemoWater, pool: Pool, test: DemoTest, until: number): DemoWater {
  let water = from;
  let at = test.at;
  const goOn = (to: number, what?: 'liquid' | 'acid') => {
    if (to <= at || to > until) return;
    const before = waterAfter(water, pool, at, to - MINUTE, []);
    const doses = what ? habitDose(before, pool, to, what) : [];
    water = waterAfter(before, pool, to - MINUTE, to, doses);
    at = to;
  };
  for (let day = dayOf(at, timeZone); startOfDay(day, timeZone) < until; day = addDays(day, 1)) {
    if (test.kind === 'full' && day === addDays(test.day, 1))
      goOn(wallToInstant(day, '07:30', timeZone).instant, 'acid');
    if (epochDayOf(day) % 2 === 0) goOn(wallToInstant(day, '17:30', timeZone).instant, 'liquid');
  }
  goOn(until);
  return water;
}
