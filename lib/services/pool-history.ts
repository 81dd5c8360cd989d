import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { findPool } from '@/db/queries/pools';
import { listGivenDoses } from '@/db/queries/plan-doses';
import { listReadings, type StoredReading } from '@/db/queries/readings';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { listTreatedTimes } from '@/db/queries/situations';
import { listTabletsFound } from '@/db/queries/tablets-found';
import { listWeekDays, type WeekDayRow } from '@/db/queries/week-days';
import { addDays, dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { DayConditions, PoolHistory } from '@/lib/learning';
import { weekDoseOf } from '@/lib/planner/given-doses';
import { loadOfMass } from '@/lib/projection/tablets';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { genericProducts } from '@/lib/standards/generic-products';
import { engineDose, engineReading, productsGone } from './engine-history';
import { enginePool, feederMassAt, given } from './engine-pool';
import { engineProduct } from './engine-shelf';

const DAY = 86_400_000;
/** Two years of weekly tests and quick checks before swim days; what is older has been overtaken. */
const MOST_READINGS = 400;
const TABLETS_LAST_AT_MOST = 30 * DAY;

/** What a household's pool is learnt from, and the readings of it, oldest first. Null without a profile or a reading. */
export async function loadPoolHistory(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  timeZone: string,
): Promise<{ history: PoolHistory; readings: StoredReading[] } | null> {
  const found = await findPool(db, householdId);
  const pool = found && enginePool(found.pool, timeZone);
  if (!found || !pool || found.pool.system === 'salt-generator') return null;
  const since = found.pool.learningFrom ?? new Date(0);
  const newestFirst = await listReadings(db, { householdId, from: since, until: new Date(8.64e15) });
  const readings = newestFirst.slice(0, MOST_READINGS).reverse();
  const [first, last] = [readings[0]?.takenAt, readings.at(-1)?.takenAt];
  if (!first || !last) return null;

  const until = new Date(last.getTime() + 1);
  const doses = await listGivenDoses(db, {
    householdId,
    from: new Date(first.getTime() - TABLETS_LAST_AT_MOST),
    until,
  });
  const shelf = (await listShelfProducts(db, householdId)).map(engineProduct);
  const products = [...shelf, ...(await productsGone(db, householdId, doses, shelf))];
  const days = await listWeekDays(db, {
    householdId,
    from: dayOf(first.getTime(), timeZone),
    until: addDays(dayOf(last.getTime(), timeZone), 1),
  });
  const { tabletMass, strength } = genericProducts.trichlor;
  const mass = feederMassAt(pool, found.pool.completedAt?.getTime() ?? 0, first.getTime());
  const load = loadOfMass(mass, { tabletMass, strength });
  return {
    readings,
    history: {
      pool,
      readings: readings.map((reading) => engineReading(reading, timeZone)),
      doses: doses.map((dose, index) => weekDoseOf(engineDose(dose, timeZone), `doses[${index}]`, products, pool)),
      days: Object.fromEntries(days.map((day) => [day.day, conditionsOf(day)])),
      tabletsLeft: (await listTabletsFound(db, { householdId, from: first })).map(({ at, tablets }) => ({
        at: toOffsetIso(at.getTime(), timeZone),
        tablets,
      })),
      loads: load ? [load] : [],
      unusual: [...(await listTreatedTimes(db, householdId)), ...readings.filter(notClear).map(timeOf)],
    },
  };
}

/** Something in green or cloudy water uses chlorine up that is no trait of the pool. */
function notClear({ look }: StoredReading): boolean {
  return look !== 'clear';
}

function timeOf({ takenAt }: StoredReading): { from: number; until: number } {
  return { from: takenAt.getTime(), until: takenAt.getTime() };
}

function conditionsOf(day: WeekDayRow): DayConditions {
  return given({
    sky: day.sky,
    rain: day.rainMillimetres,
    swimmerHours: day.swimmerHours,
    evaporation: day.evaporationMillimetres,
    backwash: day.backwashCubicMetres,
    waterTemperature: day.waterTemperature,
  });
}
