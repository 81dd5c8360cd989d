import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listDoses, listGivenDoses } from '@/db/queries/plan-doses';
import { findPool } from '@/db/queries/pools';
import { findPosterior } from '@/db/queries/posteriors';
import { findPreferences } from '@/db/queries/preferences';
import { findLatestReading, listReadings, type StoredReading } from '@/db/queries/readings';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { listWeekDays } from '@/db/queries/week-days';
import { addDays, dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { Pool } from '@/lib/schemas/pool';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { SituationKind } from '@/lib/schemas/situation';
import type { Treatment } from '@/lib/schemas/treatment';
import { wayOf } from '@/lib/situations';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import { engineDose, engineReading, productsGone, withoutRepeats } from './engine-history';
import { enginePool, feederMassAt } from './engine-pool';
import { engineProduct } from './engine-shelf';
import { type ZeroDoubt, zeroDoubtOf } from './false-zero';
import { loadOpenSituation } from './situation-record';
import { loadWishes } from './try-outs-in-force';
import { weekAheadOf } from './week-ahead';

const DAY = 86_400_000;
const HOUR = 3_600_000;
const readingsCountFor = 60 * DAY;
/** Tablets that went in this long before the first reading may still be in the feeder. */
const tabletsLastAtMost = 30 * DAY;
const mostReadings = 200;

/** Everything a household's plan is made from, as plain data; how time passes is no part of it. */
export type WeekSnapshot = {
  scenario: Scenario;
  /** The newest reading. */
  readingId: string;
  /** Plan, or only look ahead because the household keeps a record and plans no chlorine. */
  task: 'plan' | 'project';
  /** A reading that may say the opposite of what it seems to: nothing is planned on it. */
  zeroDoubt: { doubt: NonNullable<ZeroDoubt>; takenAt: string } | null;
  /** An open situation that leads: what it asks to be treated, or that nothing is dosed. */
  lead?: { treatment: Treatment } | { hold: SituationKind };
  /** Doses that somebody decided against [ISO]: their hour is over, another one is planned after it. */
  skipped: string[];
};

/** Reads the snapshot; null when there is nothing to plan from: profile not finished, no reading, a salt system. */
export async function loadWeekSnapshot(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  timeZone: string,
): Promise<WeekSnapshot | null> {
  const found = await findPool(db, householdId);
  const newest = await findLatestReading(db, { householdId });
  const pool = found && enginePool(found.pool, timeZone);
  // A salt system makes chlorine that no test has seen: its outlook would be wrong.
  if (!found || !pool || !newest || found.pool.system === 'salt-generator') return null;

  const until = new Date(newest.takenAt.getTime() + 1);
  const from = new Date(newest.takenAt.getTime() - readingsCountFor);
  const readings = (await listReadings(db, { householdId, from, until })).slice(0, mostReadings);
  const first = readings.at(-1)?.takenAt ?? newest.takenAt;
  const zeroDoubt = await newestZeroDoubt(db, householdId, readings);
  const given = await listGivenDoses(db, {
    householdId,
    from: new Date(first.getTime() - tabletsLastAtMost),
    until: new Date(newest.takenAt.getTime() + DAYS_OF_A_PLAN * DAY),
  });
  const shelf = (await listShelfProducts(db, householdId)).map(engineProduct);
  const day = dayOf(newest.takenAt.getTime(), timeZone);
  const week = await listWeekDays(db, { householdId, from: day, until: addDays(day, DAYS_OF_A_PLAN) });
  const learnt = await findPosterior(db, householdId, newest.id);
  const wishes = await loadWishes(db, householdId, { newest, pool });
  const loaded = feederMassAt(pool, found.pool.completedAt?.getTime() ?? 0, first.getTime());
  return {
    scenario: scenarioSchema.parse({
      pool: { ...pool, feeder: { ...pool.feeder, loaded } },
      reading: withoutRepeats(readings.map((reading) => engineReading(reading, timeZone))),
      shelf: [...shelf, ...(await productsGone(db, householdId, given, shelf))],
      week: weekAheadOf(week, day),
      preferences: await findPreferences(db, householdId),
      given: given.map((dose) => engineDose(dose, timeZone)),
      ...(wishes ? { wishes } : {}),
      posterior: learnt?.engineVersion === ENGINE_VERSION ? learnt.step.posterior : undefined,
    } satisfies Record<keyof Omit<Scenario, 'now' | 'doses' | 'parameters' | 'driftPrices' | 'wishes'>, unknown>),
    readingId: newest.id,
    task: found.pool.recordOnly ? 'project' : 'plan',
    zeroDoubt,
    ...(await leadOf(db, householdId, pool)),
    skipped: await skippedSince(db, householdId, newest.takenAt, timeZone),
  };
}

/** What an open situation asks of the plan; nothing where the plan goes on as usual. */
async function leadOf(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  pool: Pool,
): Promise<Pick<WeekSnapshot, 'lead'>> {
  const open = await loadOpenSituation(db, householdId, pool);
  if (!open) return {};
  const { lead } = wayOf(open.record);
  if (lead.kind === 'follow') return {};
  return { lead: lead.kind === 'treat' ? { treatment: lead.treatment } : { hold: open.record.situation.kind } };
}

async function newestZeroDoubt(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  readings: readonly StoredReading[],
): Promise<WeekSnapshot['zeroDoubt']> {
  const reading = readings.find(({ values }) => values.freeChlorine !== undefined);
  const doubt = reading ? await zeroDoubtOf(db, householdId, reading) : null;
  return reading && doubt ? { doubt, takenAt: reading.takenAt.toISOString() } : null;
}

async function skippedSince(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  since: Date,
  timeZone: string,
): Promise<string[]> {
  const until = new Date(since.getTime() + DAYS_OF_A_PLAN * 24 * HOUR);
  const doses = await listDoses(db, { householdId, from: since, until });
  return doses.flatMap(({ status, at }) => (status === 'skipped' ? [toOffsetIso(at.getTime(), timeZone)] : []));
}
