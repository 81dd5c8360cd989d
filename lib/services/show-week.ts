import 'server-only';
import { isATickInDoubt } from '@/db/queries/dose-events';
import { listPlans, type StoredPlan } from '@/db/queries/plans';
import { listOpenPoolEvents } from '@/db/queries/pool-events';
import { findPool } from '@/db/queries/pools';
import { lastMeasured, listReadings } from '@/db/queries/readings';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { listEndedSituations } from '@/db/queries/situations';
import { listConfirmedStops } from '@/db/queries/stop-confirmations';
import { tabletsFoundBefore } from '@/db/queries/tablets-found';
import { listWeekDays } from '@/db/queries/week-days';
import { firstWeekday } from '@/lib/calendar/first-weekday';
import { addDays, type CalendarDay, dayOf, startOfDay, weekOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { assertMay, may } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Pool } from '@/lib/schemas/pool';
import type { WeekQuery } from '@/lib/schemas/week-query';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { limits } from '@/lib/standards/limits';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import type { ServiceContext } from './context';
import { enginePool } from './engine-pool';
import { zeroDoubtOf } from './false-zero';
import { planChanges } from './plan-changes';
import { planWeek, type PlanProblem } from './plan-week';
import { questionsOf } from './questioned';
import { recordedReading } from './recorded-reading';
import { sheetChecks } from './sheet-checks';
import { curveAhead, curveBehind } from './sheet-curves';
import { sheetDays } from './sheet-days';
import { countingDoses, sheetDose } from './sheet-doses';
import { sheetVerdict } from './sheet-verdict';
import { openSituation } from './show-situations';
import { shownName } from './shown-name';
import { situationDoses } from './situation-doses';
import { loadOpenSituation } from './situation-record';
import { loadTryOutsInForce } from './try-outs-in-force';

const DAY = 86_400_000;
const readingsCountFor = 60 * DAY;

/**
 * Everything the week sheet shows of the week that holds a day, by the household's first weekday. The verdict is that of
 * now, whichever week is shown. A plan that no longer fits its inputs, or an older engine's, is made again first.
 *
 * Error: `conflict` while the pool is not described.
 */
export async function showWeek(context: ServiceContext, query: WeekQuery = {}): Promise<WeekSheet> {
  const { db, access, now } = context;
  const { householdId, timeZone } = access;
  assertMay(access, 'look');
  const found = await findPool(db, householdId);
  const pool = found && enginePool(found.pool, timeZone);
  if (!found || !pool) throw new AppError('conflict', 'Describe the pool first; then there is a week to show.');

  const { plan, problem } = await planWeek(context);
  const today = dayOf(now.getTime(), timeZone);
  const days = weekOf(query.start ?? today, firstWeekday(access.locale));
  const shown = spanOf(days, timeZone);
  const readings = await listReadings(db, {
    householdId,
    from: new Date(Math.min(now.getTime() - readingsCountFor, shown.from.getTime())),
    until: new Date(Math.max(now.getTime() + DAY, shown.until.getTime())),
  });
  const last = readings[0] ?? null;
  const plans = await listPlans(db, { householdId, ...shown });
  const shelf = await listShelfProducts(db, householdId);
  // The verdict asks for the doses around now, the sheet for those of the week it shows.
  const reach = new Date(now.getTime() - DAYS_OF_A_PLAN * DAY);
  const doses = await countingDoses(db, {
    householdId,
    from: new Date(Math.min(reach.getTime(), shown.from.getTime())),
    until: new Date(Math.max(now.getTime() + DAYS_OF_A_PLAN * DAY, shown.until.getTime())),
    lastReading: last?.takenAt ?? null,
  });
  const chlorineReading = readings.find(({ values }) => values.freeChlorine !== undefined);
  const around = {
    ...{ plan: plan?.result ?? null, shelf, feederKind: found.pool.feederKind, timeZone, now },
    language: access.language,
    found: await tabletsFoundBefore(db, { householdId, doseIds: doses.map(({ id }) => id) }),
    chlorineTakenAt: chlorineReading?.takenAt ?? null,
    confirmedStops: may(access, 'tick-doses') ? await confirmedStops(context) : null,
  };
  const bothForms = doses.map((stored) => ({ stored, shown: sheetDose(stored, around) }));
  const firstDay = dayOf(Math.min(last?.takenAt.getTime() ?? now.getTime(), shown.from.getTime()), timeZone);
  const lastDay = addDays(today > (days[6] ?? today) ? today : (days[6] ?? today), DAYS_OF_A_PLAN);
  const said = await listWeekDays(db, { householdId, from: firstDay, until: lastDay });
  const tested = await lastMeasured(db, { householdId, quantities: ['freeChlorine', 'pH'] });
  // What happened after the older of the two is not in the test; before any test, all of it counts.
  const testedSince = Math.min(...(tested.length > 0 ? tested : [new Date(0)]).map((taken) => taken.getTime()));
  const events = await listOpenPoolEvents(db, { householdId, since: new Date(testedSince) });
  const loaded = await loadOpenSituation(db, householdId, pool);
  const situation = loaded && openSituation(loaded, await situationDoses(context, loaded), access.language, now);
  const ended = (await listEndedSituations(db, { householdId, most: 20 })).find(({ ending }) => ending !== 'done');
  const zeroDoubt = chlorineReading ? await zeroDoubtOf(db, householdId, chlorineReading) : null;

  return {
    now: toOffsetIso(now.getTime(), timeZone),
    household: {
      name: access.householdName,
      timeZone,
      unitSystem: access.unitSystem,
      locale: access.locale,
      demo: access.demo,
    },
    me: { id: access.personId, name: access.personName, role: access.role, handlesChemicals: access.handlesChemicals },
    pool: sheetPool(pool, found.pool.recordOnly, shownName(found.swimLimitSetBy, access.language)),
    days: sheetDays(days, said, pool),
    verdict: sheetVerdict({
      ...{ now: now.getTime(), pool, readings, zeroDoubt, doses: bothForms, days: said, events },
      staysOut: situation?.procedure.stayOut ? situation.situation : null,
      tickInDoubt: await isATickInDoubt(db, { householdId, since: new Date(testedSince) }),
      endedEarlyAt: ended?.endedAt?.getTime() ?? null,
      plan: problem ? null : plan,
    }),
    behind: curveBehind(plans, shown.from.getTime(), Math.min(now.getTime(), shown.until.getTime())),
    ahead: curveAhead(plan),
    plan: sheetPlan(plan, problem, timeZone, now),
    changes: await planChanges(db, householdId, plan, timeZone),
    planProblem: problem,
    lastReading: last && recordedReading(last, access),
    ...(await questionsOf(db, householdId, { newest: last, zeroDoubt, timeZone })),
    readings: readings
      .filter(({ takenAt }) => takenAt >= shown.from && takenAt < shown.until)
      .map((reading) => recordedReading(reading, access)),
    events: events.map(({ happenedAt, reportedBy, ...event }) => ({
      ...event,
      reportedBy: shownName(reportedBy, access.language),
      happenedAt: toOffsetIso(happenedAt.getTime(), timeZone),
    })),
    situation,
    tryOuts: await loadTryOutsInForce(db, access, { newest: last, now }),
    doses: bothForms.filter(({ stored }) => isShown(stored.givenAt ?? stored.at, shown)).map((dose) => dose.shown),
    checks: sheetChecks(plan, readings, timeZone),
  };
}

/** The products whose Stop this person need not confirm at present. */
function confirmedStops({ db, access: { householdId, personId }, now }: ServiceContext): Promise<ReadonlySet<string>> {
  const since = new Date(now.getTime() - limits.stopConfirmation.value * DAY);
  return listConfirmedStops(db, { householdId, personId, since });
}

type Span = { from: Date; until: Date };

function spanOf(days: readonly CalendarDay[], timeZone: string): Span {
  const first = days[0] ?? '';
  return { from: new Date(startOfDay(first, timeZone)), until: new Date(startOfDay(addDays(first, 7), timeZone)) };
}

function isShown(instant: Date, { from, until }: Span): boolean {
  return instant >= from && instant < until;
}

/** The usual limit is the label's; a higher one stands beside the name of who set it. */
function sheetPool(pool: Pool, recordOnly: boolean, setBy: string | null): WeekSheet['pool'] {
  const { volume, surface, swimLimit, swimHours, stabilizerBand } = pool;
  const swimLimitSetBy = swimLimit > limits.swimLimitDefault.value ? setBy : null;
  return { volume, surface, swimLimit, swimLimitSetBy, swimHours, stabilizerBand, recordOnly };
}

function sheetPlan(
  plan: StoredPlan | null,
  problem: PlanProblem | null,
  timeZone: string,
  now: Date,
): WeekSheet['plan'] {
  if (!plan) return null;
  const iso = (instant: Date) => toOffsetIso(instant.getTime(), timeZone);
  const { reasons, cautions, broken, needs, mix, alternatives, cost, openSwimShare } = plan.result;
  return {
    id: plan.id,
    version: plan.version,
    createdAt: iso(plan.createdAt),
    takenAt: iso(plan.takenAt),
    endsAt: iso(plan.endsAt),
    stale: problem !== null || now >= plan.endsAt,
    ...{ reasons, cautions, broken, needs, mix, alternatives, cost, openSwimShare },
  };
}
