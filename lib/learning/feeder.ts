import { addDays, dayOf, startOfDay } from '@/lib/calendar/household-day';
import { type InstantInterval, intervalsOfDay } from '@/lib/calendar/wall-time';
import type { WeekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { lifeOf, massLeft, type TabletLoad } from '@/lib/projection/tablets';
import type { Pool } from '@/lib/schemas/pool';
import type { FilterState } from '@/lib/schemas/posterior';

export type FeederLoad = FilterState['loads'][number];

/** Even a tablet of four times the usual life is gone after so many running hours [h]. */
const LONGEST_RUN = 4 * 48;

/**
 * The feeder at `to`: what was in it at `from`, what went in since, each with the running hours behind it. Hours are kept
 * and not shares of a life, because the life is what is learnt.
 *
 * @param timer when the pump runs by its timer between the two instants [ms]
 */
export function feederAt(
  loads: readonly FeederLoad[],
  doses: readonly WeekDose[],
  timer: readonly InstantInterval[],
  floater: boolean,
  from: number,
  to: number,
): FeederLoad[] {
  const added = doses.filter((dose) => dose.kind === 'tablets' && dose.at >= from && dose.at < to);
  if (loads.length + added.length === 0) return [];
  const kept = doses.flatMap((dose) => (dose.kind === 'dose' ? [{ from: dose.at, to: dose.pumpUntil }] : []));
  const running = floater ? [{ from, to }] : joined([...timer, ...kept]);
  const since = (instant: number) => hoursWithin(running, instant, to);
  const old = loads.map((load) => ({ ...load, runningHours: load.runningHours + since(from) }));
  const fresh = added.flatMap((dose) => (dose.kind === 'tablets' ? [feederLoad(dose.load, since(dose.at))] : []));
  return [...old, ...fresh].filter(({ runningHours, tabletMass }) => runningHours < lifeOf(tabletMass, LONGEST_RUN));
}

/** A load of the projection in running hours, `more` of them since; what was eroded before counts at the usual life. */
export function feederLoad({ tabletMass, count, strength, erodedShare }: TabletLoad, more: number): FeederLoad {
  return { tabletMass, count, strength, runningHours: erodedShare * lifeOf(tabletMass, LONGEST_RUN / 4) + more };
}

/** The same loads as the projection takes them, for one tablet life [h]. */
export function loadsAtLife(loads: readonly FeederLoad[], tabletLife: number): TabletLoad[] {
  return loads.map(({ tabletMass, count, strength, runningHours }) => ({
    tabletMass,
    count,
    strength,
    erodedShare: Math.min(1, runningHours / lifeOf(tabletMass, tabletLife)),
  }));
}

/** Tablets' worth that is left of the loads at one tablet life [h]. */
export function tabletsWorth(loads: readonly FeederLoad[], tabletLife: number): number {
  return loadsAtLife(loads, tabletLife).reduce((sum, load) => sum + load.count * massLeft(load.erodedShare), 0);
}

/** When the timer runs the pump between two instants [ms]. */
export function timerBetween({ pump, timeZone }: Pool, from: number, to: number): InstantInterval[] {
  const intervals: InstantInterval[] = [];
  for (let day = dayOf(from, timeZone); startOfDay(day, timeZone) < to; day = addDays(day, 1))
    intervals.push(...intervalsOfDay(pump, day, timeZone));
  return intervals;
}

function hoursWithin(intervals: readonly InstantInterval[], from: number, to: number): number {
  let sum = 0;
  for (const interval of intervals) sum += Math.max(0, Math.min(to, interval.to) - Math.max(from, interval.from));
  return sum / MILLISECONDS_PER_HOUR;
}

/** The same stretches of time without overlaps, in order. */
function joined(intervals: readonly InstantInterval[]): InstantInterval[] {
  const stretches: InstantInterval[] = [];
  for (const { from, to } of intervals.toSorted((a, b) => a.from - b.from)) {
    const last = stretches.at(-1);
    if (last && from <= last.to) last.to = Math.max(last.to, to);
    else stretches.push({ from, to });
  }
  return stretches;
}
