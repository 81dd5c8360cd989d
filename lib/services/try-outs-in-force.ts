import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listTakenTryOuts, type StoredTryOut } from '@/db/queries/try-outs';
import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { isEmptyWish, mergedWishes, noWishes } from '@/lib/planner/wishes';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { TakenTryOut } from '@/lib/schemas/try-out';
import type { Wishes } from '@/lib/schemas/wishes';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import { shownName } from './shown-name';

const DAY = 86_400_000;

/** The newest reading: wishes are held against it and not against the clock, so that time alone changes no plan. */
type Newest = { id: string; takenAt: Date };

/** Try-outs that may still bear on the week of the newest reading: older ones are about days that are over. */
function taken(db: DatabaseOrTransaction, householdId: ProvenHouseholdId, { takenAt }: Newest) {
  return listTakenTryOuts(db, { householdId, since: new Date(takenAt.getTime() - DAYS_OF_A_PLAN * DAY) });
}

/** What the household wishes of its plan by the try-outs that it took; undefined when that is nothing. */
export async function loadWishes(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  { newest, pool }: { newest: Newest; pool: Scenario['pool'] },
): Promise<Wishes | undefined> {
  const rows = await taken(db, householdId, newest);
  const wishes = rows.reduce(
    (sum, row) => mergedWishes(sum, standingWishes(row, newest, pool.timeZone), { pool }),
    noWishes,
  );
  return isEmptyWish(wishes) ? undefined : wishes;
}

/** The try-outs that still change something of the days from today on, for whoever looks at the week. */
export async function loadTryOutsInForce(
  db: DatabaseOrTransaction,
  {
    householdId,
    householdName,
    timeZone,
    language,
  }: Pick<HouseholdAccess, 'householdId' | 'householdName' | 'timeZone' | 'language'>,
  { newest, now }: { newest: Newest | null; now: Date },
): Promise<TakenTryOut[]> {
  if (!newest) return [];
  const today = dayOf(now.getTime(), timeZone);
  return (await taken(db, householdId, newest))
    .filter((row) => isInForce(row, { newest, today, timeZone }))
    .map(({ id, takenBy, takenAt, changes }) => ({
      id,
      // Whoever took it may have left: then it was the household.
      takenBy: shownName(takenBy ?? householdName, language),
      takenAt: toOffsetIso(takenAt.getTime(), timeZone),
      changes,
    }));
}

/** A count of tablets is over with the next reading, a moved dose with its day. */
function standingWishes({ wishes, changes, readingId }: StoredTryOut, newest: Newest, timeZone: string): Wishes {
  const firstDay = dayOf(newest.takenAt.getTime(), timeZone);
  const countIsOver = changes.tablets !== null && readingId !== newest.id;
  return {
    doses: wishes.doses.filter(
      ({ at, unit }) => Date.parse(at) >= newest.takenAt.getTime() && !(countIsOver && unit === 'tablet'),
    ),
    notOn: wishes.notOn.filter((day) => day >= firstDay),
    noFurtherTablets: wishes.noFurtherTablets && !countIsOver,
  };
}

function isInForce(
  row: StoredTryOut,
  { newest, today, timeZone }: { newest: Newest; today: string; timeZone: string },
): boolean {
  const { doses, notOn, noFurtherTablets } = standingWishes(row, newest, timeZone);
  const days = [
    ...[...row.changes.swimmers, ...row.changes.sky].map(({ day }) => day),
    ...doses.map(({ at }) => dayOf(Date.parse(at), timeZone)),
    ...notOn,
  ];
  return noFurtherTablets || days.some((day) => day >= today);
}
