import type { SampleWater, SampleWeek } from '@/lib/schemas/sample-water';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { ReasonCode } from './codes';
import { sampleDaylight, sampleMonday, samplePool, sampleScenario, sampleSun } from './sample-scenario';
import { planWeek } from './index';

const HOUR = 3_600_000;
/** What is drawn is no finer than a hundredth [mg/L]. */
const rounded = (level: number) => Math.round(level * 100) / 100;

/** The week planned for a sample water: the same planner as a household's, with its safety net. */
export function sampleWeek(water: SampleWater): SampleWeek {
  return sampleWeekOf(water, planWeek(sampleScenario(water)));
}

/** What is drawn of a plan made for `sampleScenario(water)`. */
export function sampleWeekOf(water: SampleWater, plan: WeekPlan): SampleWeek {
  const { projection } = plan;
  if (projection === null) throw new Error('no plan for the sample');
  const { p10, p50, p90, lowestLevel } = projection.freeChlorine;
  const first = plan.hours.findIndex((at) => hourOf(at) >= 0);
  const fromMonday = (levels: readonly number[]) => levels.slice(first).map(rounded);
  return {
    water,
    tested: samplePool.freeChlorine,
    course: {
      low: fromMonday(p10),
      middle: fromMonday(p50),
      high: fromMonday(p90),
      lowest: fromMonday(lowestLevel),
    },
    swimLimit: samplePool.swimLimit,
    swims: samplePool.swims,
    sun: { rises: sampleDaylight.rises, sets: sampleDaylight.sets },
    sunByHour: sampleSun(water.sunshine).map(rounded),
    doses: plan.doses.map(({ at, form, unit, amount, rise }) => ({ hour: hourOf(at), form, unit, amount, rise })),
    quickChecks: plan.checks.filter(({ kind }) => kind === 'quick').map(({ at }) => hourOf(at)),
    standing: standingOf(plan),
  };
}

function standingOf({ reasons, openSwimShare }: WeekPlan): SampleWeek['standing'] {
  const figure = (code: ReasonCode, name: string): number | undefined => {
    const found = reasons.find((reason) => reason.code === code)?.[name];
    return typeof found === 'number' ? found : undefined;
  };
  const volume = figure('replace-water-first', 'volume');
  const days = figure('replace-water-first', 'days');
  const target = figure('replace-water-first', 'target');
  if (volume !== undefined && days !== undefined && target !== undefined)
    return { code: 'replace-water', volume, days, target };
  const visits = figure('few-open-hours', 'visits');
  if (visits !== undefined) return { code: 'few-open-hours', share: openSwimShare ?? 0, visits };
  return { code: 'planned' };
}

function hourOf(at: string): number {
  return (Date.parse(at) - Date.parse(sampleMonday)) / HOUR;
}
