import { addDays, dayOf, type CalendarDay } from '@/lib/calendar/household-day';
import { intervalsOfDay, toOffsetIso, wallToInstant } from '@/lib/calendar/wall-time';
import { MILLISECONDS_PER_HOUR, HOURS_IN_PLAN } from '@/lib/projection/forcing';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { PlanProjection, WeekPlan } from '@/lib/schemas/plan';
import { codeMinimum, limits } from '@/lib/standards/limits';
import type { CheckReason } from './codes';
import type { Companion } from './companions/companion';
import type { PlanContext } from './context';
import { isMidWeek } from './mid-week-test';
import { QUICK_RAISE } from './planned-doses';

type Check = WeekPlan['checks'][number];

/** Nobody tests again so soon after a test [ms]: the water is still as it was read. */
const SOON_AFTER = 6 * MILLISECONDS_PER_HOUR;
const DAY = 24 * MILLISECONDS_PER_HOUR;

/** Whether a quick check, which reads chlorine and pH, shows what a companion did. */
function quickShows({ planned }: Companion): boolean {
  return planned.effect?.quantity === 'pH';
}

/**
 * Tests that the week asks for: one when a companion dose shows, a quick check before the first swim hour of a swim day on
 * which the last test would come to be over 48 h old, one on the first morning on which the likely range reaches the code
 * minimum, one on the morning after a halved first dose or a large one, a full one in the middle of the week where that pays, and the full test that makes the next plan.
 *
 * @param midWeekPays whether a further full test in the middle of the week is worth what it costs
 */
export function checksOf(
  projection: PlanProjection,
  doses: readonly PlannedDose[],
  companion: Companion | null,
  midWeekPays: boolean,
  context: PlanContext,
  stabilized: boolean,
): Check[] {
  const { scenario, start, now } = context;
  const { pool, week } = scenario;
  const checks: { at: number; kind: Check['kind']; reason: CheckReason }[] = [];
  const morning = (day: CalendarDay) => wallToInstant(day, pool.swimHours.from, pool.timeZone).instant;
  const endsAt = start.takenAt + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR;
  const first = dayOf(start.takenAt, pool.timeZone);
  const lowFrom = firstHourAtMinimum(projection, context, stabilized);
  const due = Math.max(fullTestDue(context, morning, endsAt), now);
  const halved = doses.find(({ reason }) => reason === 'first-dose-halved');

  const large = doses.filter(isLarge).map((dose) => Date.parse(dose.at));

  let lastTest = start.takenAt;
  let retested = false;
  for (let index = 0; index < 8; index++) {
    const day = addDays(first, index);
    const at = morning(day);
    if (at <= lastTest + SOON_AFTER || at < now || at >= endsAt || at === due) continue;
    const swimmingEnds = intervalsOfDay([pool.swimHours], day, pool.timeZone).at(-1)?.to ?? at;
    const age = (swimmingEnds - lastTest) / MILLISECONDS_PER_HOUR;
    const swims = (week.swimmerHours[index] ?? 0) > 0;
    const nextMorning = morning(addDays(day, 1));
    const afterHalved = halved && Date.parse(halved.at) < at && Date.parse(halved.at) >= lastTest;
    const retest = companion && !retested && at >= companion.retestAt;
    const afterLarge = large.some((dose) => dose < at && dose >= lastTest && at - dose < DAY);
    const midWeek =
      midWeekPays && isMidWeek(at, context) && at + DAY < due && !checks.some(({ kind }) => kind === 'full');
    const low = lowFrom !== null && lowFrom < nextMorning && lastTest === start.takenAt;
    const reason: CheckReason | null = retest
      ? 'after-companion'
      : afterHalved
        ? 'after-halved-dose'
        : afterLarge
          ? 'after-large-dose'
          : midWeek
            ? 'mid-week-pays'
            : swims && age > limits.verdictReadingAge.value
              ? 'swim-day-after-two-days'
              : low
                ? 'band-reaches-code-minimum'
                : null;
    if (!reason) continue;
    if (retest) retested = true;
    const full = reason === 'mid-week-pays' || (retest && !quickShows(companion));
    checks.push({ at, kind: full ? 'full' : 'quick', reason });
    lastTest = at;
  }
  checks.push({ at: due, kind: 'full', reason: 'next-week' });
  // Where that comes before the companion shows and no morning is left after it, the plan ends with another.
  if (companion && !retested && due < Math.min(companion.retestAt, endsAt)) {
    const shows = companion.retestAt <= endsAt;
    checks.push({
      at: endsAt,
      kind: shows && quickShows(companion) ? 'quick' : 'full',
      reason: shows ? 'after-companion' : 'next-week',
    });
  }
  return checks.sort((a, b) => a.at - b.at).map((check) => ({ ...check, at: toOffsetIso(check.at, pool.timeZone) }));
}

/** Chlorine that mixes at once, in an amount near what one evening may add. */
function isLarge({ form, rise }: PlannedDose): boolean {
  return form !== 'tablet' && rise >= QUICK_RAISE;
}

/** A week after the last full test; the next morning where there has been none. */
function fullTestDue({ start, scenario }: PlanContext, morning: (day: CalendarDay) => number, endsAt: number): number {
  const lastFull = start.measuredAt.totalAlkalinity;
  if (lastFull === undefined) return morning(addDays(dayOf(start.takenAt, scenario.pool.timeZone), 1));
  return Math.max(start.takenAt, Math.min(endsAt, lastFull + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR));
}

function firstHourAtMinimum(
  { freeChlorine, cyanuricAcid }: PlanProjection,
  { hours }: PlanContext,
  stabilized: boolean,
) {
  const index = freeChlorine.p10.findIndex((value, hour) => value < codeMinimum(cyanuricAcid.p50[hour]!, stabilized));
  return index < 0 ? null : hours[index]!;
}
