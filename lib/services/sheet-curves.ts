import 'server-only';
import type { StoredPlan } from '@/db/queries/plans';
import type { SheetCurve } from '@/lib/schemas/week-sheet';

/** The whole of a plan's outlook; null when it has none. */
export function curveAhead(plan: StoredPlan | null): SheetCurve | null {
  return plan && curveOf([{ plan, indices: plan.result.hours.map((_, index) => index) }]);
}

/**
 * What the plans of their time promised between two instants: each hour from the plan that was the newest then. An hour
 * that no plan had spoken of has no entry.
 *
 * @param plans in the order in which they were made
 */
export function curveBehind(plans: readonly StoredPlan[], from: number, until: number): SheetCurve | null {
  const stretches = plans.map((plan, order) => {
    // Before it was made a plan promised nothing; its first hour is the reading that it was made of.
    const first = order === 0 ? plan.takenAt.getTime() : plan.createdAt.getTime();
    const next = plans[order + 1]?.createdAt.getTime() ?? Infinity;
    const indices = plan.result.hours.flatMap((hour, index) => {
      const instant = Date.parse(hour);
      return instant >= Math.max(from, first) && instant < next && instant <= until ? [index] : [];
    });
    return { plan, indices };
  });
  return curveOf(stretches);
}

type Stretch = { plan: StoredPlan; indices: readonly number[] };

function curveOf(stretches: readonly Stretch[]): SheetCurve | null {
  const known = stretches.filter(({ plan, indices }) => plan.result.projection !== null && indices.length > 0);
  if (known.length === 0) return null;
  const series = (valuesOf: (projection: NonNullable<StoredPlan['result']['projection']>) => readonly number[]) =>
    known.flatMap(({ plan: { result }, indices }) => {
      const values = result.projection ? valuesOf(result.projection) : [];
      return indices.map((index) => asDrawn(values[index] ?? 0));
    });
  return {
    hours: known.flatMap(({ plan, indices }) => indices.map((index) => plan.result.hours[index] ?? '')),
    freeChlorine: {
      p10: series(({ freeChlorine }) => freeChlorine.p10),
      p50: series(({ freeChlorine }) => freeChlorine.p50),
      p90: series(({ freeChlorine }) => freeChlorine.p90),
      lowestLevel: series(({ freeChlorine }) => freeChlorine.lowestLevel),
      swimLimit: series(({ freeChlorine }) => freeChlorine.swimLimit),
    },
    pH: {
      p10: series(({ pH }) => pH.p10),
      p50: series(({ pH }) => pH.p50),
      p90: series(({ pH }) => pH.p90),
    },
    cyanuricAcid: {
      p10: series(({ cyanuricAcid }) => cyanuricAcid.p10),
      p50: series(({ cyanuricAcid }) => cyanuricAcid.p50),
      p90: series(({ cyanuricAcid }) => cyanuricAcid.p90),
    },
  };
}

/** As fine as anything that is drawn or said of a curve, mg/L or pH. Further digits would only travel: half the weight of the page. */
function asDrawn(value: number): number {
  return Math.round(value * 10_000) / 10_000;
}
