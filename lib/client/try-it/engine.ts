import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import { AppError, WaterRangeError } from '@/lib/errors';
import { planWeek } from '@/lib/planner';
import { contextOf, type PlanContext } from '@/lib/planner/context';
import { weekDoseOf } from '@/lib/planner/given-doses';
import { brokenLimits } from '@/lib/planner/limits-broken';
import { projectionOf } from '@/lib/planner/projection-of';
import { tried } from '@/lib/planner/wishes-of';
import { seriesOf } from '@/lib/projection';
import { prepareForcing } from '@/lib/projection/forcing';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { PlanProjection, WeekPlan } from '@/lib/schemas/plan';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import { codeMinimum, lowestLevel } from '@/lib/standards/limits';
import { factsOf, type SeenPool, type SeenWeek } from './facts';
import type { Advice, ChangedDose, CourseAnswer, TriedCourse } from './messages';

type Doses = NonNullable<Scenario['doses']>;
type Week = { scenario: Scenario; doses: Doses };
type Series = ReturnType<typeof seriesOf>;
type Known = { projection: PlanProjection; median: Series; stabilized: boolean };

/** Members of the ensemble between two looks at whether a newer question has come. */
const MEMBERS_AT_ONCE = 4;

/**
 * The engine behind Try it. It readies once what does not hang on what is tried (the water at the newest test, the ensemble,
 * the plan's own week), so that an answer costs one course of the median, about a millisecond.
 */
export class TryItEngine {
  private readonly start: TryOutStart;
  private readonly planned: Week;
  private readonly context: PlanContext;
  private known: Known | undefined;

  constructor(start: TryOutStart) {
    this.start = start;
    this.planned = { scenario: scenarioSchema.parse(start.scenario), doses: start.doses };
    this.context = contextOf(withoutWishes(this.planned.scenario));
  }

  /** Works out beforehand what every answer needs: the plan's own week with its likely range. */
  ready(): void {
    this.plan();
  }

  /** The tried week by the median's course; the middle is taken to lie as far from it as in the plan's own week. */
  course(number: number, changes: TryOutChanges): CourseAnswer {
    const plan = this.plan();
    const week = this.triedWeek(changes);
    const median = seriesOf(this.medianOf(week));
    const beside = (level: number, middle: number, own: number) => Math.max(0, level + middle - own);
    const { projection } = plan;
    const shifted = (quantity: 'freeChlorine' | 'pH' | 'cyanuricAcid') =>
      Array.from(median[quantity], (level, hour) =>
        beside(level, projection[quantity].p50[hour]!, plan.median[quantity][hour]!),
      );
    const stabilized = this.stabilizedIn(week);
    const seen = {
      middle: shifted('freeChlorine'),
      lowestLevel: shifted('cyanuricAcid').map((stabilizer) => lowestLevel(stabilizer, stabilized)),
      pH: shifted('pH'),
    };
    return this.answer(number, week, seen, false);
  }

  /** The tried week with its likely range; undefined when `isStale` says that a newer question has come. */
  async likely(
    number: number,
    changes: TryOutChanges,
    isStale: () => Promise<boolean>,
  ): Promise<CourseAnswer | undefined> {
    const week = this.triedWeek(changes);
    const doses = this.weekDoses(week);
    const forcing = this.forcingOf(week);
    const courses: Course[] = [];
    for (const { start, setting } of this.context.members) {
      if (courses.length % MEMBERS_AT_ONCE === 0 && (await isStale())) return undefined;
      courses.push(integrateWeek(forcing, start, doses, setting));
    }
    const stabilized = this.stabilizedIn(week);
    const projection = projectionOf(courses, this.medianOf(week), this.context, stabilized);
    return this.answer(number, week, seenIn(projection, stabilized), true);
  }

  /** The plan that would be made for the tried week, held against the standing one. */
  advice(changes: TryOutChanges): Advice {
    const { scenario, doses } = this.triedWeek(changes);
    try {
      const plan = planWeek(scenario);
      if (plan.projection === null) return { code: 'refused' };
      const ahead = plan.doses.filter(({ at }) => instantOf(at) >= this.context.now);
      return { code: 'planned', changed: this.changedDoses(doses, ahead), keeps: this.keepsLimits(plan) };
    } catch (problem) {
      // What the safety net refuses, or water that cannot be, is an answer; anything else is a fault.
      if (problem instanceof AppError || problem instanceof WaterRangeError) return { code: 'refused' };
      throw problem;
    }
  }

  private plan(): Known {
    if (this.known) return this.known;
    const forcing = this.forcingOf(this.planned);
    const doses = this.weekDoses(this.planned);
    const courses = this.context.members.map(({ start, setting }) => integrateWeek(forcing, start, doses, setting));
    const median = this.medianOf(this.planned);
    const stabilized = this.stabilizedIn(this.planned);
    const projection = projectionOf(courses, median, this.context, stabilized);
    this.known = { projection, median: seriesOf(median), stabilized };
    return this.known;
  }

  private triedWeek(changes: TryOutChanges): Week {
    const { doses, evenings } = this.start;
    const scenario = tried(this.planned.scenario, changes, { doses, evenings });
    return { scenario, doses: scenario.doses ?? [] };
  }

  private weekDoses({ doses }: Week) {
    const { pool, shelf } = this.planned.scenario;
    return [...this.context.given, ...doses.map((dose, index) => weekDoseOf(dose, `doses[${index}]`, shelf, pool))];
  }

  private forcingOf({ scenario: { pool, week } }: Week) {
    const { takenAt, water } = this.context.start;
    return prepareForcing(pool, takenAt, week, water.temperature);
  }

  private medianOf(week: Week): Course {
    const { start, setting } = this.context.median;
    return integrateWeek(this.forcingOf(week), start, this.weekDoses(week), setting);
  }

  private stabilizedIn(week: Week): boolean {
    return this.context.stabilizedProductUsed || this.weekDoses(week).some(({ kind }) => kind === 'tablets');
  }

  private answer(number: number, week: Week, seen: Omit<SeenWeek, 'at'>, likely: boolean): CourseAnswer {
    const plan = this.plan();
    const { hours, swimHour, now, scenario } = this.context;
    const ahead = hours.findIndex((hour) => hour >= now);
    const fromNow = <Value>(values: readonly Value[]) => (ahead < 0 ? [] : values.slice(ahead));
    const weekAhead = ({ edge, ...rest }: Omit<SeenWeek, 'at'>): SeenWeek => ({
      at: fromNow(hours),
      middle: fromNow(rest.middle),
      lowestLevel: fromNow(rest.lowestLevel),
      pH: fromNow(rest.pH),
      ...(likely && edge ? { edge: { low: fromNow(edge.low), codeMinimum: fromNow(edge.codeMinimum) } } : {}),
    });
    const pool: SeenPool = { swimLimit: scenario.pool.swimLimit, swims: fromNow(swimHour) };
    return {
      kind: 'course',
      number,
      likely,
      plan: this.lineOf(this.planned, plan.projection.freeChlorine.p50),
      tried: this.lineOf(week, seen.middle),
      facts: factsOf(weekAhead(seenIn(plan.projection, plan.stabilized)), weekAhead(seen), pool),
    };
  }

  private lineOf({ doses }: Week, levels: readonly number[]): TriedCourse {
    const jumps = doses.filter(({ unit }) => unit !== 'tablet').map(({ at }) => instantOf(at));
    return { at: [...this.context.hours], levels: [...levels], jumps };
  }

  private keepsLimits({ broken }: WeekPlan): boolean {
    const { projection, stabilized } = this.plan();
    const own = new Set(brokenLimits(projection, this.context, stabilized).map(({ limit }) => limit));
    return broken.every(({ limit }) => own.has(limit));
  }

  /** What would go in on other days or in other amounts than the tried week has it. */
  private changedDoses(before: Doses, after: readonly PlannedDose[]): ChangedDose[] {
    const { timeZone } = this.planned.scenario.pool;
    const changed = new Map<string, ChangedDose>();
    const add = (dose: Doses[number], side: 'before' | 'after') => {
      // A loading that was only tried names no more than its product: slow tablets are trichlor.
      const { substance = 'trichlor', form = 'tablet', unit, amount } = dose;
      const at = instantOf(dose.at);
      const key = `${dayOf(at, timeZone)} ${substance} ${form} ${unit}`;
      const known = changed.get(key) ?? { at, substance, form, unit, before: null, after: null };
      changed.set(key, { ...known, [side]: (known[side] ?? 0) + amount });
    };
    before.forEach((dose) => add(dose, 'before'));
    after.forEach((dose) => add(dose, 'after'));
    return [...changed.values()]
      .filter((dose) => dose.before === null || dose.after === null || Math.abs(dose.before - dose.after) > 1e-6)
      .sort((a, b) => a.at - b.at);
  }
}

/** Wished doses come as the plan's own: reckoned as wishes, too, they would count twice. */
function withoutWishes(scenario: Scenario): Scenario {
  const bare = { ...scenario };
  delete bare.wishes;
  return bare;
}

/** The week that a projection shows. */
function seenIn({ freeChlorine, pH, cyanuricAcid }: PlanProjection, stabilized: boolean): Omit<SeenWeek, 'at'> {
  return {
    middle: freeChlorine.p50,
    lowestLevel: freeChlorine.lowestLevel,
    pH: pH.p50,
    edge: {
      low: freeChlorine.p10,
      codeMinimum: cyanuricAcid.p50.map((stabilizer) => codeMinimum(stabilizer, stabilized)),
    },
  };
}

function instantOf(iso: string): number {
  return parseInstant(iso) ?? Number.NaN;
}
