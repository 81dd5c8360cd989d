import 'server-only';
import type { Database } from '@/db/client';
import { findPosterior, listPosteriorHashes, type NewPosterior, replacePosteriors } from '@/db/queries/posteriors';
import type { StoredReading } from '@/db/queries/readings';
import { inWriteTransaction } from '@/db/write';
import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { sharedEngine } from '@/lib/engine-worker/shared-engine';
import type { PoolHistory } from '@/lib/learning';
import { logFault } from '@/lib/log';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { PosteriorStep } from '@/lib/schemas/posterior';
import { identityOf } from './plan-identity';
import { loadPoolHistory } from './pool-history';

type LearningContext = { db: Database; access: Pick<HouseholdAccess, 'householdId' | 'timeZone'>; now: Date };

/**
 * Brings what the pool has taught up to date with the readings: a new, late, edited or deleted one is learnt again from
 * its own time on, from the state that was stored before it. The engine's thread does the work. A fault costs the
 * learning of this round and nothing else: plans then go by the last posterior that still fits, or by the usual pool.
 */
export async function learnPool(context: LearningContext): Promise<void> {
  const { householdId, timeZone } = context.access;
  try {
    await bringUpToDate(context);
  } catch (error) {
    logFault(error, { task: 'learn-pool', householdId, timeZone });
  }
}

async function bringUpToDate({ db, access, now }: LearningContext): Promise<void> {
  const { householdId, timeZone } = access;
  const known = await loadPoolHistory(db, householdId, timeZone);
  const hashes = known ? hashesOf(known.readings, known.history) : [];
  const stored = await listPosteriorHashes(db, householdId);
  const readings = known?.readings ?? [];
  const changed = readings.find(({ id }, index) => stored.get(id) !== hashes[index]);
  if (!changed && stored.size === readings.length) return;

  // Readings of one second, which is one instant to the engine, are learnt together.
  const secondOf = ({ takenAt }: StoredReading) => Math.floor(takenAt.getTime() / 1000);
  const kept = changed ? readings.filter((each) => secondOf(each) < secondOf(changed)).length : readings.length;
  const last = readings[kept - 1];
  const from = last ? ((await findPosterior(db, householdId, last.id))?.step.state ?? null) : null;
  const steps = known && changed ? await sharedEngine().run('learn', { from, history: known.history }) : [];
  const learnt = rowsOf(steps, readings.slice(kept), hashes.slice(kept), { timeZone, now });
  await inWriteTransaction(db, (tx) =>
    replacePosteriors(tx, { householdId, readingIds: readings.map(({ id }) => id), learnt }),
  );
}

/** Each reading with its step; those of one instant share the last. */
function rowsOf(
  steps: readonly PosteriorStep[],
  readings: readonly StoredReading[],
  hashes: readonly string[],
  { timeZone, now }: { timeZone: string; now: Date },
): NewPosterior[] {
  return readings.map(({ id, takenAt }, index) => {
    const name = toOffsetIso(takenAt.getTime(), timeZone);
    const step = steps.findLast(({ readingAt }) => readingAt === name);
    if (!step) throw new Error(`Nothing was learnt by the reading ${id}.`);
    return { readingId: id, takenAt, engineVersion: ENGINE_VERSION, inputHash: hashes[index]!, step, createdAt: now };
  });
}

/** Name of everything that the posterior of each reading hangs on: what came before it, by the name before, and its own. */
function hashesOf(readings: readonly StoredReading[], { pool, loads, ...history }: PoolHistory): string[] {
  let hash = identityOf({ engineVersion: ENGINE_VERSION, pool, loads });
  let since = -Infinity;
  return readings.map(({ takenAt }, index) => {
    const until = takenAt.getTime();
    const firstDay = Number.isFinite(since) ? dayOf(since, pool.timeZone) : '';
    const lastDay = dayOf(until, pool.timeZone);
    hash = identityOf({
      before: hash,
      reading: history.readings[index],
      doses: history.doses.filter(({ at }) => at >= since && at < until),
      days: Object.entries(history.days).filter(([day]) => day >= firstDay && day <= lastDay),
      tabletsLeft: history.tabletsLeft.filter(({ at }) => Date.parse(at) >= since && Date.parse(at) < until),
      ...(history.unusual?.some((span) => until >= span.from && until <= span.until) ? { unusual: true } : {}),
    });
    since = until;
    return hash;
  });
}
