import 'server-only';
import { findPool } from '@/db/queries/pools';
import { findPosterior, listLearningLogs } from '@/db/queries/posteriors';
import { findLatestReading } from '@/db/queries/readings';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { assertMay } from '@/lib/auth/permissions';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { Learnt } from '@/lib/schemas/learnt';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { enginePool } from './engine-pool';
import { learntRows, tabletHoursADay } from './learnt-rows';
import { stoodOutOf } from './stood-out';

/**
 * What the household's pool has taught by its newest test, beside what was assumed of it before. Nothing of an older
 * engine is shown: it is learnt again first, and what cannot be learnt leaves the page without bars.
 */
export async function showLearnt(context: ServiceContext): Promise<Learnt> {
  const { db, access } = context;
  const { householdId, timeZone } = access;
  assertMay(access, 'look');
  const found = await findPool(db, householdId);
  const pool = found && enginePool(found.pool, timeZone);
  const since = found?.pool.learningFrom ? toOffsetIso(found.pool.learningFrom.getTime(), timeZone) : null;
  const nothing: Learnt = {
    ...{ since, readings: 0, rows: [], tabletHoursADay: null },
    ...{ enteredVolume: pool?.volume ?? null, measureVolumeAgain: false, stoodOut: [] },
  };
  if (!pool) return nothing;

  await bringPlanUpToDate(context);
  const newest = await findLatestReading(db, { householdId });
  const known = newest && (await findPosterior(db, householdId, newest.id));
  if (!newest || known?.engineVersion !== ENGINE_VERSION) return nothing;
  const logs = await listLearningLogs(db, { householdId, engineVersion: ENGINE_VERSION });
  const hoursADay = tabletHoursADay(pool, newest.takenAt.getTime());
  const { posterior } = known.step;
  return {
    ...nothing,
    readings: logs.length,
    rows: learntRows(posterior, pool, { hoursADay, shelf: await listShelfProducts(db, householdId) }),
    tabletHoursADay: hoursADay,
    measureVolumeAgain: posterior.volumeBeyondReach,
    stoodOut: logs.flatMap(({ takenAt, log }) => stoodOutOf(log, takenAt, timeZone)).reverse(),
  };
}
