import 'server-only';
import type { ShelfProductRow } from '@/db/queries/shelf-products';
import { describeLearnt, type LearntParameter } from '@/lib/learning';
import { lifeOf } from '@/lib/projection/tablets';
import type { LearntRange, LearntRow } from '@/lib/schemas/learnt';
import type { Pool } from '@/lib/schemas/pool';
import type { Posterior } from '@/lib/schemas/posterior';
import { genericProducts } from '@/lib/standards/generic-products';
import { pumpHoursADay } from './engine-pool';

/** The daily loss is clear when its range is this share of what was assumed before, or less. */
const CLEAR = 0.75;

/** What a day's loss hangs on. */
const lossParameters: readonly string[] = ['sunStrength', 'boundPhotolysis', 'darkDemand'];

/** Hours a day that water passes the tablets: while the pump runs, in a floater always; null where none are used. */
export function tabletHoursADay(pool: Pool, instant: number): number | null {
  if (pool.feeder.kind === 'none') return null;
  if (pool.feeder.kind === 'floating') return 24;
  const hours = pumpHoursADay(pool, instant);
  return hours > 0 ? hours : null;
}

/** What a posterior says, one row for each thing; how long tablets last in days, where the household uses any. */
export function learntRows(
  posterior: Posterior,
  pool: Pool,
  { hoursADay, shelf }: { hoursADay: number | null; shelf: readonly ShelfProductRow[] },
): LearntRow[] {
  const { parameters, dailyLoss } = describeLearnt(posterior, pool);
  const counts = parameters.map(({ parameter, readingsThatCounted }) =>
    lossParameters.includes(parameter) ? readingsThatCounted : 0,
  );
  const loss: LearntRow = {
    thing: 'dailyLoss',
    unit: 'mg/L',
    before: dailyLoss.prior,
    learnt: dailyLoss.learnt,
    readings: Math.max(...counts),
    clear: widthOf(dailyLoss.learnt) <= CLEAR * widthOf(dailyLoss.prior),
  };
  return [loss, ...parameters.flatMap((each) => rowOf(each, hoursADay, shelf))];
}

function rowOf(learnt: LearntParameter, hoursADay: number | null, shelf: readonly ShelfProductRow[]): LearntRow[] {
  const { parameter: thing, unit, prior, readingsThatCounted: readings, clear } = learnt;
  if (unit !== 'running-hours') return [{ thing, unit, before: prior, learnt: learnt.learnt, readings, clear }];
  if (hoursADay === null) return [];
  const days = (hours: number) => lifeOf(massOfTablets(shelf), hours) / hoursADay;
  return [{ thing, unit: 'days', before: each(prior, days), learnt: each(learnt.learnt, days), readings, clear }];
}

/** Of the tablets on the shelf; without any, of the usual ones [g]. */
function massOfTablets(shelf: readonly ShelfProductRow[]): number {
  const tablets = shelf.find(
    ({ form, substance, tabletMass }) => form === 'tablet' && substance === 'trichlor' && tabletMass,
  );
  return tablets?.tabletMass ?? genericProducts.trichlor.tabletMass;
}

function each({ p10, p50, p90 }: LearntRange, change: (value: number) => number): LearntRange {
  return { p10: change(p10), p50: change(p50), p90: change(p90) };
}

function widthOf({ p10, p90 }: LearntRange): number {
  return p90 - p10;
}
