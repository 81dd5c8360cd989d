import { dayOf } from '@/lib/calendar/household-day';
import { intervalsOfDay, parseInstant } from '@/lib/calendar/wall-time';
import { hoursFrom, settingOf } from '@/lib/projection';
import { ensembleOf, type Member } from '@/lib/projection/ensemble';
import { riseOf, type WeekDose } from '@/lib/projection/events';
import { type Forcing, prepareForcing } from '@/lib/projection/forcing';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import { learntStart } from '@/lib/projection/learnt-start';
import { bandOf } from '@/lib/projection/quantiles';
import type { TabletLoad } from '@/lib/projection/tablets';
import type { Posterior } from '@/lib/schemas/posterior';
import type { Scenario } from '@/lib/schemas/scenario';
import type { Wishes } from '@/lib/schemas/wishes';
import { limits } from '@/lib/standards/limits';
import { ledgerOf } from '@/lib/chemistry';
import { weekDoseOf } from './given-doses';
import { type StartingWater, startingWater } from './starting-water';
import { wishedWeekDoses } from './wished-week-doses';
import { noWishes } from './wishes';

/** The first 32 of 64 Sobol points are as evenly spread as all of them. */
const QUICK_MEMBERS = 32;
const ROUGH_MEMBERS = 6;

/** A member with its week in which nothing more goes in. */
export type Undosed = { member: Member; undosed: Course };

/** What every candidate plan of one scenario shares. */
export type PlanContext = {
  scenario: Scenario;
  now: number;
  start: StartingWater;
  /** What went in, what is to go in beside chlorine, and what stands as it was wished. */
  given: readonly WeekDose[];
  /** What the household changed of the plan, and its doses as they stand among those. */
  wishes: Wishes;
  wished: readonly WeekDose[];
  forcing: Forcing;
  /** The pool with every parameter at its median, and the ensemble around it. */
  median: Member;
  members: readonly Member[];
  /** The half of them that the quick model compares drafts over. */
  quickMembers: readonly Undosed[];
  /** A few that stand for those in how fast they lose chlorine: for a first look at many drafts. */
  roughMembers: readonly Undosed[];
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
 * @param wishes    what the household changed of the plan; only a plan made for the week itself minds them
 * Errors: invalid-input for a given dose that cannot be reckoned with; WaterRangeError for water that cannot be.
 */
export function contextOf(
  scenario: Scenario,
  { companion, wishes = noWishes }: { companion?: WeekDose; wishes?: Wishes } = {},
): PlanContext {
  const { pool, shelf } = scenario;
  const history = scenario.given.map((dose, index) => weekDoseOf(dose, `given[${index}]`, shelf, pool));
  const { start, taught } = startOf(scenario, history);
  const wished = wishedWeekDoses(wishes, scenario);
  const given = [...history, ...(companion ? [companion] : []), ...wished];
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
  const quickMembers = members.slice(0, QUICK_MEMBERS).map((member) => ({ member, undosed: undosed(member) }));
  return {
    scenario,
    now: scenario.now === undefined ? start.takenAt : Math.max(start.takenAt, parseInstant(scenario.now)!),
    start,
    given,
    wishes,
    wished,
    forcing,
    median,
    members,
    quickMembers,
    roughMembers: spread(quickMembers),
    belowMaximumFrom: members.every((member) => surelyBelowMaximum(member, given))
      ? -Infinity
      : belowMaximumFrom(members.map(undosed), hours),
    undosed: undosed(median),
    hours,
    swimHour,
    swimCeiling: Float64Array.from(swimHour, (swims) => (swims ? pool.swimLimit : Infinity)),
    stabilizedProductUsed: start.loads.some(isStabilized) || given.some(bringsStabilizer),
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
  return dose.kind === 'tablets'
    ? isStabilized(dose.load)
    : dose.contents.freeChlorine > 0 && dose.contents.cyanurate > 0;
}

function isStabilized({ contents }: TabletLoad): boolean {
  return contents === undefined || contents.cyanurate > 0;
}

/** Whether a member cannot pass the maximum by itself, not even if nothing of what it has and gets were lost. */
function surelyBelowMaximum({ start, setting }: Member, given: readonly WeekDose[]): boolean {
  const { volume } = setting.parameters;
  const ofTablets = ({ count, tabletMass, strength }: TabletLoad) => (count * tabletMass * strength) / 100 / volume;
  const most = [
    start.ledger.freeChlorine,
    ...start.loads.map(ofTablets),
    ...given.map((dose) =>
      dose.kind === 'tablets' ? ofTablets(dose.load) : riseOf(dose.contents, dose.amount, volume),
    ),
  ].reduce((sum, each) => sum + each);
  return most <= limits.freeChlorineMaximum.value;
}

/** The instant after which the 90th percentile of free chlorine is never over the maximum; infinite when it never is. */
function belowMaximumFrom(undosed: readonly Course[], hours: readonly number[]): number {
  const { value: maximum } = limits.freeChlorineMaximum;
  const last = bandOf(undosed.map(({ hourly }) => hourly.freeChlorine)).p90.findLastIndex((level) => level > maximum);
  return last < 0 ? -Infinity : (hours[last + 1] ?? Infinity);
}

/** A few members that stand for all: evenly spread over their order by the chlorine that is left to them. */
function spread(all: readonly Undosed[]): Undosed[] {
  const ordered = all.map((each) => ({ each, mean: meanChlorine(each.undosed) })).sort((a, b) => a.mean - b.mean);
  const place = (index: number) => Math.floor(((index + 0.5) * ordered.length) / ROUGH_MEMBERS);
  return Array.from({ length: ROUGH_MEMBERS }, (_, index) => ordered[place(index)]!.each);
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
