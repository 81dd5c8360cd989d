import { addDays, type CalendarDay, dayOf } from '@/lib/calendar/household-day';
import { intervalsOfDay, wallToInstant } from '@/lib/calendar/wall-time';
import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { codeMinimum, limits } from '@/lib/standards/limits';
import { daylightOf } from '@/lib/sun/daylight';
import type { PlanContext } from '../context';
import type { ByMedian } from '../cost';
import type { CompanionNeed, CompanionSubstance } from './need';

const QUARTER_HOUR = MILLISECONDS_PER_HOUR / 4;
const DAY = 24 * MILLISECONDS_PER_HOUR;
const acids: readonly CompanionSubstance[] = ['hydrochloric-acid', 'sodium-bisulfate'];

/**
 * When a companion goes in [ms]: acid at first light, at least 4 h from any chlorine; everything else on the first dose
 * evening that the week's chlorine leaves free, else on the last one, from which chlorine then gives way. Chlorine under
 * the code minimum is raised first, and nothing goes in while the likely range is over 10 mg/L. Null when the week has no
 * such moment.
 */
export function momentOf(need: CompanionNeed, substance: CompanionSubstance, plan: ByMedian, context: PlanContext) {
  const { start, now } = context;
  const chlorine = [...chlorineEvenings(plan), ...context.wished.map(({ at }) => at)].sort((a, b) => a - b);
  const low = start.water.freeChlorine < codeMinimum(start.water.cyanuricAcid, context.stabilizedProductUsed);
  const from = Math.max(now, context.belowMaximumFrom, low && chlorine.length > 0 ? chlorine[0]! : start.takenAt);
  if (acids.includes(substance)) return acidMorning(need, from, chlorine, context);

  const evenings = plan.choice.evenings.map(({ at }) => at).filter((at) => at > from || !low);
  return evenings.find((at) => !chlorine.includes(at)) ?? evenings.at(-1) ?? null;
}

function chlorineEvenings({ draft, choice }: ByMedian): number[] {
  return choice.evenings.flatMap(({ at }, evening) =>
    draft.tablets[evening]! > 0 || draft.measures[evening]! > 0 ? [at] : [],
  );
}

/** First light of the last morning before pH leaves its range; of the first one after when none lies before. */
function acidMorning({ fromHour }: CompanionNeed, from: number, chlorine: readonly number[], context: PlanContext) {
  const { start, scenario, given } = context;
  const { timeZone } = scenario.pool;
  const endsAt = start.takenAt + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR;
  // Where the likely range stays over 10 mg/L all week there is no such morning, nor a day to begin at.
  if (from >= endsAt) return null;
  const taken = [...chlorine, ...given.map(({ at }) => at)];
  const gap = limits.acidToChlorineGap.value * MILLISECONDS_PER_HOUR;
  const mornings: number[] = [];
  for (let day = dayOf(from, timeZone); ; day = addDays(day, 1)) {
    const at = firstLight(day, context);
    if (wallToInstant(day, '00:00', timeZone).instant >= endsAt) break;
    if (at !== null && at >= from && at < endsAt && taken.every((other) => Math.abs(other - at) >= gap))
      mornings.push(at);
  }
  const needed = start.takenAt + fromHour * MILLISECONDS_PER_HOUR;
  return mornings.findLast((at) => at <= needed && at > needed - DAY) ?? mornings.find((at) => at > needed) ?? null;
}

/** Sunrise rounded up to a quarter of an hour, unless somebody may swim then or there is none. */
export function firstLight(day: CalendarDay, { scenario: { pool } }: Pick<PlanContext, 'scenario'>): number | null {
  const { sunrise } = daylightOf(wallToInstant(day, '12:00', pool.timeZone).instant, pool.latitude, pool.longitude);
  if (sunrise === null) return null;
  const at = Math.ceil(sunrise / QUARTER_HOUR) * QUARTER_HOUR;
  const swimming = [addDays(day, -1), day].flatMap((each) => intervalsOfDay([pool.swimHours], each, pool.timeZone));
  return swimming.some(({ from, to }) => at >= from && at < to) ? null : at;
}
