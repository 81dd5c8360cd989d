import { contentsPerUnit } from '@/lib/chemistry';
import { ALKALINITY_MILLIGRAMS_PER_EQUIVALENT, CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { riseOf, type WeekDose, weekDose } from '@/lib/projection/events';
import { integrateWeek } from '@/lib/projection/integrate';
import type { PlanContext } from './context';
import { type Choice, type Draft, tabletDose } from './draft';
import type { FastOption } from './products';

/** How one unit of a dose moves the median's pH and stabilizer [mg/L] by hour, and what a week ends with [mg/L]. */
type Answer = {
  pH: Float64Array;
  stabilizer: Float64Array;
  /** Lowest and highest of how pH moves. */
  low: number;
  high: number;
  totalAlkalinity: number;
};

export type SideEffects = {
  /** What a draft's week ends with, and between what its pH surely stays. The same memory at every call. */
  endOf: (draft: Draft) => { pH: number; low: number; high: number; totalAlkalinity: number; cyanuricAcid: number };
  /** How a draft moves the median's pH, from an hour on. The same memory at every call. */
  pHMovedBy: (draft: Draft, from: number) => Float64Array;
  /** How much more stabilizer the tablets of a draft bring, by hour [mg/L]. */
  stabilizerOf: (draft: Draft) => Float64Array;
};

/** Size of the dose that the answer to fast chlorine is measured with [mg/L]. */
const PROBE_RISE = 2;

/**
 * How pH, alkalinity and stabilizer answer to one tablet and to 1 mg/L of fast chlorine on each evening: measured by
 * projecting the median in full with one dose at a time. They move little, so answers add up.
 */
export function sideEffectsOf(
  context: PlanContext,
  { evenings, tablets }: Choice,
  measureRises: (fast: FastOption) => readonly number[],
): SideEffects {
  const { forcing, given, median, scenario } = context;
  const { undosed } = context;
  const answerTo = (dose: WeekDose, amount: number): Answer => {
    const { pH, hourly, end } = integrateWeek(forcing, median.start, [...given, dose], median.setting);
    const moved = pH.map((value, hour) => (value - undosed.pH[hour]!) / amount);
    const perAmount = CYANURIC_ACID_MILLIGRAMS_PER_MOLE / amount;
    return {
      pH: moved,
      stabilizer: hourly.cyanurate.map((value, hour) => (value - undosed.hourly.cyanurate[hour]!) * perAmount),
      low: Math.min(...moved),
      high: Math.max(...moved),
      totalAlkalinity: ((end.alkalinity - undosed.end.alkalinity) * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT) / amount,
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

  const last = undosed.pH.length - 1;
  const without = {
    pH: undosed.pH[last]!,
    low: Math.min(...undosed.pH),
    high: Math.max(...undosed.pH),
    totalAlkalinity: undosed.end.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
    cyanuricAcid: undosed.end.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
  };
  const end = { ...without };
  const pH = new Float64Array(undosed.pH.length);
  const addToEnd = (answer: Answer, amount: number) => {
    end.pH += amount * answer.pH[last]!;
    end.low += amount * answer.low;
    end.high += amount * answer.high;
    end.totalAlkalinity += amount * answer.totalAlkalinity;
    end.cyanuricAcid += amount * answer.stabilizer[last]!;
  };
  const noRises: readonly number[] = evenings.map(() => 0);
  return {
    endOf: ({ tablets: counts, fast, measures }) => {
      end.pH = without.pH;
      end.low = without.low;
      end.high = without.high;
      end.totalAlkalinity = without.totalAlkalinity;
      end.cyanuricAcid = without.cyanuricAcid;
      const rises = fast ? measureRises(fast) : noRises;
      for (let evening = 0; evening < measures.length; evening++) {
        if (counts[evening]! > 0) addToEnd(ofTablet[evening]!, counts[evening]!);
        if (measures[evening]! > 0) addToEnd(ofFast[evening]!, measures[evening]! * rises[evening]!);
      }
      return end;
    },
    pHMovedBy: ({ tablets: counts, fast, measures }, from) => {
      pH.fill(0, from);
      const rises = fast ? measureRises(fast) : noRises;
      for (let evening = 0; evening < measures.length; evening++) {
        if (counts[evening]! > 0) addFrom(from, pH, ofTablet[evening]!.pH, counts[evening]!);
        if (measures[evening]! > 0) addFrom(from, pH, ofFast[evening]!.pH, measures[evening]! * rises[evening]!);
      }
      return pH;
    },
    stabilizerOf: ({ tablets: counts }) => {
      const sum = new Float64Array(undosed.pH.length);
      for (let evening = 0; evening < counts.length; evening++)
        if (counts[evening]! > 0) addFrom(0, sum, ofTablet[evening]!.stabilizer, counts[evening]!);
      return sum;
    },
  };
}

function addFrom(from: number, sum: Float64Array, each: Float64Array, amount: number): void {
  for (let hour = from; hour < sum.length; hour++) sum[hour]! += amount * each[hour]!;
}
