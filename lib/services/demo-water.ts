import 'server-only';
import { epochDayOf } from '@/lib/calendar/epoch-day';
import { addDays, type CalendarDay, dayOf } from '@/lib/calendar/household-day';
import { amountToReach, ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { analysisAt, settingOf, type TabletLoad } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR, prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import type { Measured } from '@/lib/schemas/reading';
import type { Pool } from '@/lib/schemas/pool';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import { type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';
import { normalOf } from './demo-chance';
import { demoDay } from './demo-weather';

/** This pool is a little unlike the usual one, as every pool is: what it has to teach. */
const truth: ParameterOverrides = {
  sunStrength: 1.08,
  darkDemand: 0.115 / 24,
  tabletLife: 52,
  chlorinePerSwimmerHour: 2.8,
  carbonDioxideTransfer: 0.01,
};

/** The demo pool as it really is, which only its tests ever see. */
export type DemoWater = { water: WaterAnalysis; loads: readonly TabletLoad[] };

export function firstWater(day: CalendarDay): DemoWater {
  return {
    water: {
      ...{ freeChlorine: 3.1, combinedChlorine: 0.1, pH: 7.5, totalAlkalinity: 100, calciumHardness: 230 },
      ...{ cyanuricAcid: 33, temperature: demoDay(day).waterTemperature ?? 25, dissolvedSolids: 900 },
    },
    loads: [],
  };
}

/** The water some time later, with what went in between. Instants in milliseconds; eight days at most. */
export function waterAfter(
  from: DemoWater,
  pool: Pool,
  start: number,
  end: number,
  doses: readonly WeekDose[],
): DemoWater {
  const hours = (end - start) / MILLISECONDS_PER_HOUR;
  const forcing = prepareForcing(pool, start, weatherFrom(dayOf(start, pool.timeZone)), from.water.temperature, {
    hours,
  });
  const setting = settingOf(pool, from.water.temperature, truth);
  const between = doses.filter(({ at }) => at > start && at <= end);
  const course = integrateWeek(forcing, { ledger: ledgerOf(from.water), loads: from.loads }, between, setting);
  return { water: analysisAt(course.end, course.endPH), loads: course.loads };
}

/** What the household did before it planned: liquid in the evening up to a usual level, acid when pH had risen. */
export function habitDose({ water }: DemoWater, { volume }: Pool, at: number, what: 'liquid' | 'acid'): WeekDose[] {
  const [product, target] =
    what === 'liquid'
      ? ([
          { substance: 'sodium-hypochlorite', strength: 12 },
          { quantity: 'freeChlorine', value: 3.9 },
        ] as const)
      : ([
          { substance: 'hydrochloric-acid', strength: 31.45 },
          { quantity: 'pH', value: 7.45 },
        ] as const);
  if (what === 'acid' && water.pH <= target.value) return [];
  const amount = amountToReach(water, volume, product, target);
  return amount > 0 ? [weekDose(at, { ...product, amount }, volume)] : [];
}

function weatherFrom(first: CalendarDay): WeekAhead {
  const days = Array.from({ length: 8 }, (_, index) => demoDay(addDays(first, index)));
  return {
    ...weekAheadSchema.parse({}),
    sky: days.map(({ sky }) => sky ?? 0),
    rain: days.map(({ rainMillimetres }) => rainMillimetres ?? 0),
    swimmerHours: days.map(({ swimmerHours }) => swimmerHours ?? 0),
    waterTemperature: days.map(({ waterTemperature }) => waterTemperature ?? 0),
  };
}

/** What a drop kit makes of the water: its error, and the steps in which it can be read. */
export function fullTestOf({ water }: DemoWater, day: CalendarDay): Measured {
  const read = readerOf(day);
  return {
    ...quickTestOf({ water }, day),
    combinedChlorine: read('combinedChlorine', water.combinedChlorine ?? 0, 0.05, 5),
    totalAlkalinity: read('totalAlkalinity', water.totalAlkalinity, 4, 0.1),
    calciumHardness: read('calciumHardness', water.calciumHardness, 6, 0.1),
    cyanuricAcid: read('cyanuricAcid', water.cyanuricAcid, 3, 0.2),
    temperature: read('temperature', water.temperature, 0.2, 1),
  };
}

export function quickTestOf({ water }: Pick<DemoWater, 'water'>, day: CalendarDay): Measured {
  const read = readerOf(day);
  return {
    freeChlorine: read('freeChlorine', water.freeChlorine, 0.07 * water.freeChlorine, 5),
    pH: read('pH', water.pH, 0.06, 10),
  };
}

/** Reads a value with an error of one sigma, in steps of one over `perUnit`. */
function readerOf(day: CalendarDay) {
  const epochDay = epochDayOf(day);
  return (quantity: string, value: number, sigma: number, perUnit: number) =>
    Math.max(0, Math.round((value + sigma * normalOf(quantity, epochDay)) * perUnit) / perUnit);
}
