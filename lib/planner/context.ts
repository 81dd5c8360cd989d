import { dayOf } from '@/lib/calendar/household-day';
import { intervalsOfDay, parseInstant } from '@/lib/calendar/wall-time';
import { hoursFrom, settingOf } from '@/lib/projection';
import { ensembleOf, type Member } from '@/lib/projection/ensemble';
import type { WeekDose } from '@/lib/projection/events';
import { type Forcing, prepareForcing } from '@/lib/projection/forcing';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import { learntStart } from '@/lib/projection/learnt-start';
import { bandOf } from '@/lib/projection/quantiles';
import type { Posterior } from '@/lib/schemas/posterior';
import type { Scenario } from '@/lib/schemas/scenario';
import { limits } from '@/lib/standards/limits';
import { ledgerOf } from '@/lib/chemistry';
import { weekDoseOf } from './given-doses';
import { type StartingWater, startingWater } from './starting-water';

const SEARCH_MEMBERS = 12;

/** A member with its week in which nothing more goes in. */
export type Undosed = { member: Member; undosed: Course };

/** What every candidate plan of one scenario shares. */
export type PlanContext = {
  scenario: Scenario;
  now: number;
  start: StartingWater;
  /** What went in, and what is to go in beside chlorine. */
  given: readonly WeekDose[];
  forcing: Forcing;
  /** The pool with every parameter at its median, and the ensemble around it. */
  median: Member;
  members: readonly Member[];
  /** Those that a search projects: they stand for all in how fast they lose chlorine. */
  searchMembers: readonly Undosed[];
  /** The median's week in which nothing more goes in: what a plan's own drift is measured from. */
  undosed: Course;
  hours: readonly number[];
  /** Whether somebody may swim at each of the hours. */
  swimHour: readonly boolean[];
  /** The swim limit at each hour [mg/L]; infinite while nobody may swim. */
  swimCeiling: Float64Array;
  /** From when on [ms] the likely range stays at or under 10 mg/L by itself: nothing goes in before. */
  belowMaximumFrom: number;
  /** Whether stabilized products have been used, so that the higher code minimum holds. */
  stabilizedProductUsed: boolean;
};

/**
 * Readies a scenario: the water at its newest reading, what acts on it, the ensemble.
 *
 * @param companion what is to go in beside chlorine
 * Errors: invalid-input for a given dose that cannot be reckoned with; WaterRangeError for water that cannot be.
 */
export function contextOf(scenario: Scenario, companion?: WeekDose): PlanContext {
  const { pool, shelf } = scenario;
  const history = scenario.given.map((dose, index) => weekDoseOf(dose, `given[${index}]`, shelf, pool));
  const { start, taught } = startOf(scenario, history);
  const given = companion ? [...history, companion] : history;
  const forcing = prepareForcing(pool, start.takenAt, scenario.week, start.water.temperature);
  const setting = {
    ...settingOf(pool, start.water.temperature, { ...taught?.medians, ...scenario.parameters }),
    ...(taught ? { volumeRatio: pool.volume / taught.medians.volume } : {}),
  };
  const hours = hoursFrom(start.takenAt);
  const swimHour = swimHours(scenario, hours);
  const median: Member = { start: { ledger: ledgerOf(start.water), loads: start.loads }, setting };
  const members = ensembleOf(
    start.water,
    start.errors,
    start.loads,
    setting,
    taught ? { covariance: taught.covariance } : {},
  );
  const undosed = (member: Member) => integrateWeek(forcing, member.start, given, member.setting);
  const all = members.map((member) => ({ member, undosed: undosed(member) }));
  return {
    scenario,
    now: scenario.now === undefined ? start.takenAt : Math.max(start.takenAt, parseInstant(scenario.now)!),
    start,
    given,
    forcing,
    median,
    members,
    searchMembers: spread(all),
    belowMaximumFrom: belowMaximumFrom(all, hours),
    undosed: undosed(median),
    hours,
    swimHour,
    swimCeiling: Float64Array.from(swimHour, (swims) => (swims ? pool.swimLimit : Infinity)),
    stabilizedProductUsed: start.loads.length > 0 || given.some(bringsStabilizer),
  };
}

/**
 * Where the week starts: at the newest reading, as what the pool has taught sees it when that reading is part of what it
 * was taught by; else as the reading alone does.
 */
function startOf(scenario: Scenario, history: readonly WeekDose[]): { start: StartingWater; taught?: Posterior } {
  const start = startingWater(scenario, history);
  const { posterior } = scenario;
  if (!posterior || parseInstant(posterior.readingAt) !== start.takenAt) return { start };
  const learnt = learntStart(posterior);
  return { start: { ...start, ...learnt, water: { ...start.water, ...learnt.water } }, taught: posterior };
}

/** Trichlor and dichlor bring chlorine and stabilizer together. */
function bringsStabilizer(dose: WeekDose): boolean {
  return dose.kind === 'tablets' || (dose.contents.freeChlorine > 0 && dose.contents.cyanurate > 0);
}

/** The instant after which the 90th percentile of free chlorine is never over the maximum; infinite when it never is. */
function belowMaximumFrom(all: readonly Undosed[], hours: readonly number[]): number {
  const { value: maximum } = limits.freeChlorineMaximum;
  const rows = all.map(({ undosed }) => undosed.hourly.freeChlorine);
  if (rows.every((row) => row.every((level) => level <= maximum))) return -Infinity;
  const last = bandOf(rows).p90.findLastIndex((level) => level > maximum);
  return last < 0 ? -Infinity : (hours[last + 1] ?? Infinity);
}

/** A few members that stand for all: evenly spread over their order by the chlorine that is left to them. */
function spread(all: readonly Undosed[]): Undosed[] {
  const ordered = all.map((each) => ({ each, mean: meanChlorine(each.undosed) })).sort((a, b) => a.mean - b.mean);
  const place = (index: number) => Math.floor(((index + 0.5) * ordered.length) / SEARCH_MEMBERS);
  return Array.from({ length: SEARCH_MEMBERS }, (_, index) => ordered[place(index)]!.each);
}

function meanChlorine({ hourly }: Course): number {
  return hourly.freeChlorine.reduce((sum, level) => sum + level, 0) / hourly.freeChlorine.length;
}

/** Whether each instant [ms] lies in the household's swim hours; their end is no longer one of them. */
export function swimHours({ pool }: Pick<Scenario, 'pool'>, hours: readonly number[]): boolean[] {
  const cache = new Map<string, ReturnType<typeof intervalsOfDay>>();
  return hours.map((hour) => {
    const day = dayOf(hour, pool.timeZone);
    const intervals = cache.get(day) ?? intervalsOfDay([pool.swimHours], day, pool.timeZone);
    cache.set(day, intervals);
    return intervals.some(({ from, to }) => hour >= from && hour < to);
  });
}
