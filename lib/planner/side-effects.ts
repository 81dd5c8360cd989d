import { contentsPerUnit } from '@/lib/chemistry';
import { ALKALINITY_MILLIGRAMS_PER_EQUIVALENT, CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { riseOf, type WeekDose, weekDose } from '@/lib/projection/events';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import type { PlanContext } from './context';
import { type Choice, type Draft, tabletDose } from './draft';
import type { FastOption } from './products';

/** What a week does to the median's pH by hour, and what it ends with [mg/L]; or by how much one unit moves them. */
export type SideEffect = { pH: Float64Array; totalAlkalinity: number; cyanuricAcid: number };

export type SideEffects = {
  /** The median's pH by hour in a draft's week, and what it ends with. The same memory at every call. */
  endOf: (draft: Draft, measureRises: (fast: FastOption) => readonly number[]) => SideEffect;
};

/** Size of the dose that the answer to fast chlorine is measured with [mg/L]. */
const PROBE_RISE = 2;

/**
 * How pH, alkalinity and stabilizer answer to one tablet and to 1 mg/L of fast chlorine on each evening: measured by
 * projecting the median in full with one dose at a time. They move little, so answers add up.
 */
export function sideEffectsOf(context: PlanContext, { evenings, tablets }: Choice): SideEffects {
  const { forcing, given, median, scenario } = context;
  const undosed = sideEffectOf(context.undosed);
  const answerTo = (dose: WeekDose, amount: number): SideEffect => {
    const course = sideEffectOf(integrateWeek(forcing, median.start, [...given, dose], median.setting));
    return {
      pH: course.pH.map((value, hour) => (value - undosed.pH[hour]!) / amount),
      totalAlkalinity: (course.totalAlkalinity - undosed.totalAlkalinity) / amount,
      cyanuricAcid: (course.cyanuricAcid - undosed.cyanuricAcid) / amount,
    };
  };
  const count = Math.max(1, Math.round((tablets?.most ?? 0) / 2));
  const ofTablet =
    tablets && tablets.most > 0 ? evenings.map(({ at }) => answerTo(tabletDose(tablets, count, at), count)) : [];
  const liquid = { substance: 'sodium-hypochlorite', strength: 12.5 } as const;
  const amount = PROBE_RISE / riseOf(contentsPerUnit(liquid), 1, scenario.pool.volume);
  const ofFast = evenings.map(({ at }) =>
    answerTo(weekDose(at, { ...liquid, amount }, scenario.pool.volume), PROBE_RISE),
  );

  const sum: SideEffect = { pH: undosed.pH.slice(), totalAlkalinity: 0, cyanuricAcid: 0 };
  return {
    endOf: ({ tablets: counts, fast, measures }, measureRises) => {
      sum.pH.set(undosed.pH);
      sum.totalAlkalinity = undosed.totalAlkalinity;
      sum.cyanuricAcid = undosed.cyanuricAcid;
      const rises = fast ? measureRises(fast) : [];
      for (let evening = 0; evening < measures.length; evening++) {
        if (counts[evening]! > 0) add(sum, ofTablet[evening]!, counts[evening]!);
        if (measures[evening]! > 0) add(sum, ofFast[evening]!, measures[evening]! * rises[evening]!);
      }
      return sum;
    },
  };
}

function sideEffectOf({ pH, end }: Course): SideEffect {
  return {
    pH,
    totalAlkalinity: end.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
    cyanuricAcid: end.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
  };
}

function add(sum: SideEffect, effect: SideEffect, amount: number): void {
  for (let hour = 0; hour < sum.pH.length; hour++) sum.pH[hour]! += amount * effect.pH[hour]!;
  sum.totalAlkalinity += amount * effect.totalAlkalinity;
  sum.cyanuricAcid += amount * effect.cyanuricAcid;
}
