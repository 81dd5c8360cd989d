import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listGivenDoses } from '@/db/queries/plan-doses';
import { listPlans, type StoredPlan } from '@/db/queries/plans';
import type { StoredReading } from '@/db/queries/readings';
import { listReadings } from '@/db/queries/readings';
import { findOpenSituation, listSituationTicks, type StoredSituation } from '@/db/queries/situations';
import { middleOf } from '@/lib/projection/reading-error';
import { measuredQuantities } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { situationSchema } from '@/lib/schemas/situation';
import { morningsOf, type PromiseAt, type SituationRecord, type Taken } from '@/lib/situations';
import { engineReading } from './engine-history';

const DAY = 86_400_000;
/** Values from so long before the opening may still be the newest of their kind. */
const readingsCountFor = 60 * DAY;
/** Stabilizer of a tablet or of dichlor from so long ago may still be in the water. */
const stabilizedFor = 180 * DAY;
/** No procedure is older than this; a list of readings has to end somewhere. */
const longest = 400 * DAY;

export type LoadedSituation = {
  stored: StoredSituation;
  record: SituationRecord;
  promise: PromiseAt;
  tickedBy: ReadonlyMap<string, string | null>;
};

/** The open procedure with everything that it goes by; null when none is open. */
export async function loadOpenSituation(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  pool: Pool,
): Promise<LoadedSituation | null> {
  const stored = await findOpenSituation(db, householdId);
  if (!stored) return null;
  const { timeZone } = pool;
  const { openedAt } = stored;
  const until = new Date(openedAt.getTime() + longest);
  const newestFirst = await listReadings(db, {
    householdId,
    from: new Date(openedAt.getTime() - readingsCountFor),
    until,
  });
  const readings = newestFirst.toReversed().map((reading) => takenOf(reading, timeZone));
  const before = await listGivenDoses(db, {
    householdId,
    from: new Date(openedAt.getTime() - stabilizedFor),
    until,
  });
  const given = before.flatMap(({ givenAt, substance, rise, amount, givenAmount }) =>
    givenAt !== null && givenAt >= openedAt
      ? [{ at: givenAt.getTime(), substance, rise: (rise * (givenAmount ?? amount)) / amount }]
      : [],
  );
  const tickRows = await listSituationTicks(db, { householdId, situationId: stored.id });
  const ticks = new Map(tickRows.map(({ step, doneAt }) => [step, doneAt.getTime()]));
  const plans = await listPlans(db, { householdId, from: openedAt, until });
  const promise = promiseOf(plans);
  return {
    stored,
    promise,
    tickedBy: new Map(tickRows.map(({ step, doneBy }) => [step, doneBy])),
    record: {
      situation: situationSchema.parse({ kind: stored.kind, answers: stored.answers }),
      openedAt: openedAt.getTime(),
      pool,
      readings,
      given,
      ticks,
      mornings: morningsOf(readings, ticks, promise, { openedAt: openedAt.getTime(), timeZone }),
      stabilizedProductUsed:
        pool.feeder.ingredient === 'trichlor' ||
        before.some(({ substance }) => substance === 'trichlor' || substance === 'dichlor'),
    },
  };
}

/** A reading in middles, without what bleached colours said. */
function takenOf(reading: StoredReading, timeZone: string): Taken {
  const sound = engineReading(reading, timeZone);
  const values: Taken['values'] = {};
  for (const quantity of measuredQuantities) {
    const value = sound[quantity];
    if (value !== undefined) values[quantity] = middleOf(value);
  }
  return { takenAt: reading.takenAt.getTime(), kind: reading.kind, look: reading.look, values };
}

/** What was promised of free chlorine before an instant: by the newest plan that started from an earlier reading. */
function promiseOf(plans: readonly StoredPlan[]): PromiseAt {
  return (instant) => {
    const plan = plans.findLast(
      ({ takenAt, result }) => result.projection !== null && takenAt.getTime() < instant - 1000,
    );
    const projection = plan?.result.projection;
    if (!plan || !projection) return null;
    const hours = plan.result.hours.map((hour) => Date.parse(hour));
    const before = hours.findLastIndex((hour) => hour <= instant);
    const after = hours[before + 1];
    const from = hours[before];
    if (from === undefined || after === undefined) return null;
    const share = (instant - from) / (after - from);
    const at = (values: readonly number[]) =>
      (values[before] ?? 0) + share * ((values[before + 1] ?? 0) - (values[before] ?? 0));
    return { low: at(projection.freeChlorine.p10), high: at(projection.freeChlorine.p90) };
  };
}
