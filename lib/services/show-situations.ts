import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listPlans, type StoredPlan } from '@/db/queries/plans';
import { findPool } from '@/db/queries/pools';
import { listReadings } from '@/db/queries/readings';
import { listEndedSituations } from '@/db/queries/situations';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { assertMay } from '@/lib/auth/permissions';
import { middleOf } from '@/lib/projection/reading-error';
import type { Language } from '@/lib/schemas/languages';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import type { OpenSituation, Situations } from '@/lib/schemas/situation';
import { lowestOf, procedureOf, type SituationDose, wayOf } from '@/lib/situations';
import { limits } from '@/lib/standards/limits';
import type { ServiceContext } from './context';
import { enginePool } from './engine-pool';
import { planWeek } from './plan-week';
import { curveBehind } from './sheet-curves';
import { shownName } from './shown-name';
import { situationDoses } from './situation-doses';
import { type LoadedSituation, loadOpenSituation } from './situation-record';

const DAY = 86_400_000;
const shownPast = 12;
const readingsCountFor = 60 * DAY;
const asked = ['freeChlorine', 'combinedChlorine', 'pH', 'cyanuricAcid', 'calciumHardness'] as const;

/** The situations of a household: the open one with its procedure, those that are over, and the water they ask about. */
export async function showSituations(context: ServiceContext): Promise<Situations> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const { householdId, timeZone, language } = access;
  const iso = (instant: Date) => toOffsetIso(instant.getTime(), timeZone);
  const found = await findPool(db, householdId);
  const pool = found && enginePool(found.pool, timeZone);
  const { plan } = pool ? await planWeek(context) : { plan: null };
  const loaded = pool ? await loadOpenSituation(db, householdId, pool) : null;
  const doses = loaded ? await situationDoses(context, loaded) : [];
  const past = await listEndedSituations(db, { householdId, most: shownPast });
  return {
    now: iso(now),
    open: loaded && openSituation(loaded, doses, language, now),
    past: past.flatMap(({ id, kind, openedAt, endedAt, ending, endedBy }) =>
      endedAt && ending
        ? [{ id, kind, openedAt: iso(openedAt), endedAt: iso(endedAt), ending, endedBy: shownName(endedBy, language) }]
        : [],
    ),
    water: await waterNow(db, householdId, now, iso),
    chart: loaded && pool && (await chartOf(context, loaded, doses, plan, pool)),
  };
}

/** An open procedure as it stands. */
export function openSituation(
  { stored, record, promise, tickedBy }: LoadedSituation,
  doses: readonly SituationDose[],
  language: Language,
  now: Date,
): OpenSituation {
  const names = new Map([...tickedBy].map(([step, name]) => [step, shownName(name, language)]));
  return {
    id: stored.id,
    situation: record.situation,
    openedAt: toOffsetIso(record.openedAt, record.pool.timeZone),
    openedBy: shownName(stored.openedBy, language),
    procedure: procedureOf(wayOf(record), record, { doses, tickedBy: names, promise, now: now.getTime() }),
  };
}

async function waterNow(
  db: DatabaseOrTransaction,
  householdId: Parameters<typeof listReadings>[1]['householdId'],
  now: Date,
  iso: (instant: Date) => string,
): Promise<Situations['water']> {
  const readings = await listReadings(db, {
    householdId,
    from: new Date(now.getTime() - readingsCountFor),
    until: new Date(now.getTime() + DAY),
  });
  const newest = (quantity: MeasuredQuantity) => {
    const reading = readings.find(({ values }) => values[quantity] !== undefined);
    const value = reading?.values[quantity];
    return reading && value !== undefined ? { value: middleOf(value), takenAt: iso(reading.takenAt) } : null;
  };
  return Object.fromEntries(asked.map((quantity) => [quantity, newest(quantity)])) as Situations['water'];
}

/** Free chlorine from a day before the opening to two days ahead: promised behind now, expected from now on. */
async function chartOf(
  { db, access, now }: ServiceContext,
  { record }: LoadedSituation,
  doses: readonly SituationDose[],
  plan: StoredPlan | null,
  pool: Pool,
): Promise<Situations['chart']> {
  const { householdId, timeZone } = access;
  const from = record.openedAt - DAY / 2;
  const until = now.getTime() + 2 * DAY;
  const plans = await listPlans(db, { householdId, from: new Date(from), until: new Date(until) });
  const curve = curveBehind(plans, from, until);
  if (!plan || !curve) return null;
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  const insideOf = (takenAt: number) =>
    record.mornings.find((morning) => morning.takenAt !== null && Date.parse(morning.takenAt) === takenAt)?.inside;
  const { p10, p50, p90 } = curve.freeChlorine;
  return {
    hours: curve.hours.map((hour) => iso(Date.parse(hour))),
    ...{ p10, p50, p90 },
    readings: record.readings.flatMap(({ takenAt, values: { freeChlorine } }) =>
      freeChlorine !== undefined && takenAt >= from
        ? [{ takenAt: iso(takenAt), freeChlorine, inside: insideOf(takenAt) ?? null }]
        : [],
    ),
    doses: doses.map(({ at, givenAt }) => ({ at: iso(givenAt ?? at), given: givenAt !== null })),
    swimLimit: pool.swimLimit,
    lowestLevel: lowestOf(record).lowest,
    maximum: limits.freeChlorineMaximum.value,
  };
}
