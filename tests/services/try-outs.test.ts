import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { listAudit } from '@/db/queries/audit-trail';
import { findCurrentPlan } from '@/db/queries/plans';
import { listWeekDays, saveWeekDay } from '@/db/queries/week-days';
import { people, tryOuts } from '@/db/schema';
import { setStock } from '@/db/queries/shelf-products';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { type TryOut, tryOutSchema } from '@/lib/schemas/try-out';
import type { ServiceContext } from '@/lib/services/context';
import { openSituation } from '@/lib/services/open-situation';
import { planWeek } from '@/lib/services/plan-week';
import { putBackTryOut } from '@/lib/services/put-back-try-out';
import { recordReading } from '@/lib/services/record-reading';
import { showTryOutStart } from '@/lib/services/show-try-out-start';
import { showWeek } from '@/lib/services/show-week';
import { takeTryOut } from '@/lib/services/take-try-out';
import { tickDose } from '@/lib/services/tick-dose';
import { planWith } from '@/tests/support/engine';
import { aFullTest, aPoolHousehold, at, copyOf, hoursLater } from '@/tests/support/pool-household';
import { someAnswers } from '@/tests/support/situations';
import { freshDatabase } from '@/tests/support/test-database';
import { WatchedEngine } from '@/tests/support/watched-engine';

const engine = new WatchedEngine();
planWith(engine);

const saturday = '2026-07-11';
const dayOfDose = ({ at: iso }: Pick<PlanDose, 'at'>) => iso.slice(0, 10);

describe('a try-out', { timeout: 60_000 }, () => {
  let tested: Database;
  let owner: ServiceContext;
  beforeAll(async () => {
    tested = freshDatabase();
    owner = await aPoolHousehold(tested);
    await recordReading(owner, aFullTest());
  });
  /** Sunday, half an hour after the test and before the first evening, in a household of its own. */
  const fresh = async (hours = 0.5) => at({ ...owner, db: await copyOf(tested) }, hoursLater(hours));
  const current = async ({ db, access }: ServiceContext) => (await findCurrentPlan(db, access.householdId))!;
  const tryOutOf = async (context: ServiceContext, changes: Partial<TryOut>): Promise<TryOut> =>
    tryOutSchema.parse({ id: crypto.randomUUID(), planId: (await current(context)).id, ...changes });
  const take = async (context: ServiceContext, changes: Partial<TryOut>) => {
    const tryOut = await tryOutOf(context, changes);
    await takeTryOut(context, tryOut);
    return tryOut.id;
  };
  const party = { swimmers: [{ day: saturday, swimmerHours: 36 }] };
  const saturdayIn = ({ db, access: { householdId } }: ServiceContext) =>
    listWeekDays(db, { householdId, from: saturday, until: '2026-07-12' }).then(([day]) => day);
  const tabletsOf = ({ doses }: { doses: readonly PlanDose[] }) =>
    doses
      .filter(({ form, status }) => form === 'tablet' && status === 'planned')
      .reduce((n, { amount }) => n + amount, 0);

  it('starts from the plan that stands: its doses ahead, its evenings, its scenario as of now', async () => {
    const context = await fresh();
    const start = await showTryOutStart(context);
    const plan = await current(context);
    expect(start.planId).toBe(plan.id);
    expect(start.doses.map(({ at: iso, amount }) => [Date.parse(iso), amount])).toEqual(
      plan.result.doses
        .filter((dose) => Date.parse(dose.at) > context.now.getTime())
        .map((dose) => [Date.parse(dose.at), dose.amount]),
    );
    expect(start.doses.length).toBeGreaterThan(0);
    expect(start.evenings.map(({ day }) => day)).toEqual(
      ['05', '06', '07', '08', '09', '10', '11'].map((day) => `2026-07-${day}`),
    );
    expect(start.mostTablets).toBe(3);
    expect(scenarioSchema.parse(start.scenario).now).toBe(context.now.toISOString());
    expect(start.scenario).not.toHaveProperty('wishes');
  });

  it('of a party says so of the day, makes the plan anew and tells who took it', async () => {
    const context = await fresh();
    const before = await current(context);
    const id = await take(context, party);
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: 36, sky: null });
    const after = await current(context);
    expect(after.version).toBe(before.version + 1);
    expect(after.snapshot.week.swimmerHours[6]).toBe(36);
    expect(after.snapshot).not.toHaveProperty('wishes');
    const sheet = await showWeek(context);
    expect(sheet.days.find(({ day }) => day === saturday)?.swimmerHours).toBe(36);
    expect(sheet.tryOuts).toMatchObject([
      { id, takenBy: owner.access.personName, changes: { swimmers: party.swimmers, tablets: null } },
    ]);
    expect((await listAudit(context.db, context.access.householdId))[0]).toMatchObject({
      action: 'take-try-out',
      subjectId: id,
    });
  });

  it('sent twice is taken once, also after the plan has moved on', async () => {
    const context = await fresh();
    const tryOut = await tryOutOf(context, party);
    await takeTryOut(context, tryOut);
    await takeTryOut(context, tryOut);
    expect(await context.db.$count(tryOuts)).toBe(1);
    expect(
      (await listAudit(context.db, context.access.householdId)).filter(({ action }) => action === 'take-try-out'),
    ).toHaveLength(1);
  });

  it('of fewer tablets plans that many and no more, and says why', async () => {
    const context = await fresh();
    expect(tabletsOf(await showWeek(context))).toBeGreaterThan(1);
    await take(context, { tablets: 1 });
    const sheet = await showWeek(context);
    expect(tabletsOf(sheet)).toBe(1);
    expect(sheet.plan?.reasons.map(({ code }) => code)).toContain('wished');
    expect(sheet.changes?.causes).toEqual(['try-out']);
  });

  /** Moves the first fast dose to an evening that has none. */
  async function moveADose(context: ServiceContext) {
    const { doses, evenings } = await showTryOutStart(context);
    const dose = doses.find(({ form }) => form !== 'tablet')!;
    const to = evenings.findLast(({ day }) => !doses.some((each) => dayOfDose(each) === day))!;
    const id = await take(context, { moves: [{ doseId: dose.id, toDay: to.day }] });
    return { id, dose, to };
  }

  it('that moves a dose keeps its amount, frees its old evening, and plans the rest around it', async () => {
    const context = await fresh();
    const { dose, to } = await moveADose(context);
    const { doses } = await showWeek(context);
    expect(doses.find((each) => each.reason === 'wished')).toMatchObject({
      ...{ at: to.at, product: dose.product, amount: dose.amount, unit: dose.unit },
    });
    expect(doses.map(dayOfDose)).not.toContain(dayOfDose(dose));
    expect((await current(context)).snapshot.wishes?.notOn).toEqual([dayOfDose(dose)]);
  });

  it('keeps standing after a tick; the moved dose that went in is not planned twice', async () => {
    const context = await fresh();
    const { to } = await moveADose(context);
    const before = await showWeek(context);
    const tablets = before.doses.find(({ form, status }) => form === 'tablet' && status === 'planned');
    const tick = (dose: PlanDose, when: ServiceContext) =>
      tickDose(when, dose.id, { id: crypto.randomUUID(), action: 'given', planVersion: dose.planVersion });
    if (tablets) await tick(tablets, at(context, new Date(tablets.at)));
    const evening = at(context, new Date(Date.parse(to.at) - 60_000));
    const wished = (await showWeek(evening)).doses.find(({ reason }) => reason === 'wished')!;
    expect(wished.at).toBe(to.at);
    await tick(wished, evening);
    const after = await showWeek(at(context, new Date(Date.parse(to.at) + 3_600_000)));
    expect(after.doses.filter((each) => dayOfDose(each) === to.day)).toMatchObject([
      { status: 'given', amount: wished.amount },
    ]);
  });

  it('that needs more than the shelf holds is taken, and what is missing can be moved like the rest', async () => {
    const context = await fresh();
    await setStock(context.db, { householdId: context.access.householdId, id: 'gran', stock: 100 });
    await planWeek(context);
    await take(context, party);
    const { doses, evenings } = await showTryOutStart(context);
    const short = doses.find(({ toBuy }) => toBuy)!;
    expect(short.product).toBe('gran');
    const free = evenings.findLast(({ day }) => !doses.some((each) => dayOfDose(each) === day))!;
    await take(context, { moves: [{ doseId: short.id, toDay: free.day }] });
    expect((await current(context)).result.doses).toContainEqual(
      expect.objectContaining({ at: free.at, amount: short.amount, product: 'gran', toBuy: true, reason: 'wished' }),
    );
  });

  it('puts back what the days said, drops its wishes, and is the plan of before', async () => {
    const context = await fresh();
    const before = await current(context);
    const id = await take(context, { ...party, sky: [{ day: saturday, sky: 0.2 }], tablets: 0 });
    expect((await current(context)).inputHash).not.toBe(before.inputHash);
    await putBackTryOut(context, { id });
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: null, sky: null });
    expect((await current(context)).inputHash).toBe(before.inputHash);
    expect((await showWeek(context)).tryOuts).toEqual([]);
    await putBackTryOut(context, { id });
    const actions = (await listAudit(context.db, context.access.householdId)).map(({ action }) => action);
    expect(actions.filter((action) => action === 'put-back-try-out')).toHaveLength(1);
  });

  it('leaves a day alone that somebody has said something else of since', async () => {
    const context = await fresh();
    const id = await take(context, { ...party, sky: [{ day: saturday, sky: 0.2 }] });
    const { householdId } = context.access;
    await saveWeekDay(context.db, { householdId, day: saturday, values: { swimmerHours: 8 } });
    await putBackTryOut(context, { id });
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: 8, sky: null });
  });

  it('beneath another one of the same day puts back in any order what stood there first', async () => {
    const context = await fresh();
    const first = await take(context, party);
    const second = await take(at(context, hoursLater(15)), { swimmers: [{ day: saturday, swimmerHours: 4 }] });
    const later = at(context, hoursLater(16));
    await putBackTryOut(later, { id: first });
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: 4 });
    await putBackTryOut(later, { id: second });
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: null });
  });

  it('does not rewrite a day that is over', async () => {
    const context = await fresh();
    const id = await take(context, party);
    const sunday = at(context, hoursLater(24 * 6 + 16));
    expect((await showWeek(sunday)).tryOuts).toEqual([]);
    await putBackTryOut(sunday, { id });
    expect(await saturdayIn(sunday)).toMatchObject({ swimmerHours: 36 });
  });

  it('of tablets is over with the next test; a moved dose stands until its day', async () => {
    const context = await fresh();
    const count = await take(context, { tablets: 0 });
    const { dose, to, id } = await moveADose(context);
    const later = at(context, hoursLater(18));
    await recordReading(later, aFullTest(later.now));
    const { wishes } = (await current(later)).snapshot;
    expect(wishes).toMatchObject({ noFurtherTablets: false, notOn: [dayOfDose(dose)] });
    expect(wishes?.doses).toHaveLength(1);
    expect((await showWeek(later)).tryOuts.map((each) => each.id)).toEqual([id]);
    expect(count).not.toBe(id);
    const nextWeek = at(context, new Date(Date.parse(to.at) + 20 * 3_600_000));
    await recordReading(nextWeek, aFullTest(nextWeek.now));
    expect((await current(nextWeek)).snapshot.wishes?.doses ?? []).toEqual([]);
  });

  it('that no longer keeps to the limits gives way, and the plan says so', async () => {
    const context = await fresh();
    await take(context, { tablets: 3 });
    const { householdId } = context.access;
    await setStock(context.db, { householdId, id: 'tabs', stock: 500 });
    await planWeek(context);
    const sheet = await showWeek(context);
    expect(sheet.planProblem).toBeNull();
    expect(sheet.plan?.cautions.map(({ code }) => code)).toContain('wishes-set-aside');
    expect(tabletsOf(sheet)).toBeLessThanOrEqual(2);
  });

  it('on a plan that has changed meanwhile is a conflict, and nothing is kept', async () => {
    const context = await fresh();
    const stale = await tryOutOf(context, party);
    await take(context, { sky: [{ day: saturday, sky: 0.1 }] });
    await expect(takeTryOut(context, stale)).rejects.toMatchObject({ code: 'conflict' });
    expect(await saturdayIn(context)).toMatchObject({ swimmerHours: null });
    expect(await context.db.$count(tryOuts)).toBe(1);
  });

  it('while a situation leads the plan is a conflict', async () => {
    const context = await fresh();
    const tryOut = await tryOutOf(context, party);
    await openSituation(context, { id: crypto.randomUUID(), situation: someAnswers.accident });
    await expect(takeTryOut(context, tryOut)).rejects.toMatchObject({ code: 'conflict' });
    await expect(showTryOutStart(context)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('that the safety net refuses is said in words, and nothing is kept', async () => {
    const context = await fresh();
    const { doses, evenings } = await showTryOutStart(context);
    // Two doses on one evening.
    const free = evenings.find(({ day }) => !doses.some((dose) => dayOfDose(dose) === day))!;
    const moves = doses.map(({ id }) => ({ doseId: id, toDay: free.day }));
    expect(moves.length).toBeGreaterThan(1);
    await expect(takeTryOut(context, await tryOutOf(context, { ...party, moves }))).rejects.toMatchObject({
      code: 'plan-refused',
      message: expect.stringContaining('nothing was changed') as string,
    });
    expect(await saturdayIn(context)).toBeUndefined();
    expect(await context.db.$count(tryOuts)).toBe(0);
  });

  it.each([
    ['nothing at all', {}, 'swimmers'],
    ['more tablets than may go in', { tablets: 4 }, 'tablets'],
    ['a day that is over', { swimmers: [{ day: '2026-07-04', swimmerHours: 3 }] }, 'swimmers'],
    ['a day beyond the plan', { sky: [{ day: '2026-07-20', sky: 0.5 }] }, 'swimmers'],
    ['a dose of nowhere', { moves: [{ doseId: crypto.randomUUID(), toDay: saturday }] }, 'moves'],
  ])('refuses %s', async (_, changes, path) => {
    const context = await fresh();
    await expect(takeTryOut(context, await tryOutOf(context, changes))).rejects.toMatchObject({
      code: 'invalid-input',
      problems: [{ path }],
    });
    expect(await context.db.$count(tryOuts)).toBe(0);
  });

  it('is a caretaker’s to take, not a viewer’s; another household cannot put it back', async () => {
    const context = await fresh();
    const as = (role: 'caretaker' | 'viewer') => ({ ...context, access: { ...context.access, role } });
    const tryOut = await tryOutOf(context, party);
    await expect(takeTryOut(as('viewer'), tryOut)).rejects.toMatchObject({ code: 'not-allowed' });
    expect((await showTryOutStart(as('viewer'))).planId).toBe(tryOut.planId);
    await takeTryOut(as('caretaker'), tryOut);
    await expect(putBackTryOut(as('viewer'), tryOut)).rejects.toMatchObject({ code: 'not-allowed' });
    const other = { ...(await aPoolHousehold(context.db)), now: context.now };
    await expect(putBackTryOut(other, tryOut)).rejects.toMatchObject({ code: 'not-found' });
    await recordReading(other, aFullTest());
    const theirs = { ...tryOut, planId: (await current(other)).id };
    await expect(takeTryOut(other, theirs)).rejects.toMatchObject({ code: 'conflict' });
    expect(await saturdayIn(other)).toBeUndefined();
  });

  it('is still there when whoever took it has left, in the household’s name', async () => {
    const context = await fresh();
    await take(context, party);
    await context.db.delete(people);
    expect((await showWeek(context)).tryOuts).toMatchObject([{ takenBy: context.access.householdName }]);
  });
});
