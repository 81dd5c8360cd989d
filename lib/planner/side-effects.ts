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

/** Size of the dose that the answer to fast chlorine is measured with [mg/L]. */
const PROBE_RISE = 2;

type WeeksEnd = { pH: number; low: number; high: number; totalAlkalinity: number; cyanuricAcid: number };

/**
 * How pH, alkalinity and stabilizer answer to one tablet and to 1 mg/L of fast chlorine on each evening: measured by
 * projecting the median in full with one dose at a time. They move little, so answers add up.
 *
 * A class, since V8 compiles a method once and a closure anew in every plan.
 */
export class SideEffects {
  private readonly ofTablet: readonly Answer[];
  private readonly ofFast: readonly Answer[];
  private readonly without: WeeksEnd;
  private readonly noRises: readonly number[];
  // The answers to a question are given in the same memory each time: a search asks thousands.
  private readonly end: WeeksEnd;
  private readonly pH: Float64Array;

  constructor(
    context: PlanContext,
    { evenings, tablets }: Choice,
    private readonly measureRises: (fast: FastOption) => readonly number[],
  ) {
    const { undosed, scenario } = context;
    const { volume } = scenario.pool;
    const count = Math.max(1, Math.round((tablets?.most ?? 0) / 2));
    this.ofTablet =
      tablets && tablets.most > 0
        ? evenings.map(({ at }) => answerTo(tabletDose(tablets, count, at), count, context))
        : [];
    const liquid = { substance: 'sodium-hypochlorite', strength: 12.5 } as const;
    const amount = PROBE_RISE / riseOf(contentsPerUnit(liquid), 1, volume);
    this.ofFast = evenings.map(({ at }) => answerTo(weekDose(at, { ...liquid, amount }, volume), PROBE_RISE, context));
    this.without = {
      pH: undosed.pH.at(-1)!,
      low: Math.min(...undosed.pH),
      high: Math.max(...undosed.pH),
      totalAlkalinity: undosed.end.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
      cyanuricAcid: undosed.end.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
    };
    this.end = { ...this.without };
    this.noRises = evenings.map(() => 0);
    this.pH = new Float64Array(undosed.pH.length);
  }

  /** What a draft's week ends with, and between what its pH surely stays. The same memory at every call. */
  endOf({ tablets: counts, fast, measures }: Draft): WeeksEnd {
    const { end, without } = this;
    end.pH = without.pH;
    end.low = without.low;
    end.high = without.high;
    end.totalAlkalinity = without.totalAlkalinity;
    end.cyanuricAcid = without.cyanuricAcid;
    const rises = fast ? this.measureRises(fast) : this.noRises;
    for (let evening = 0; evening < measures.length; evening++) {
      if (counts[evening]! > 0) addToEnd(end, this.ofTablet[evening]!, counts[evening]!);
      if (measures[evening]! > 0) addToEnd(end, this.ofFast[evening]!, measures[evening]! * rises[evening]!);
    }
    return end;
  }

  /** How a draft moves the median's pH, from an hour on. The same memory at every call. */
  pHMovedBy({ tablets: counts, fast, measures }: Draft, from: number): Float64Array {
    const { pH } = this;
    pH.fill(0, from);
    const rises = fast ? this.measureRises(fast) : this.noRises;
    for (let evening = 0; evening < measures.length; evening++) {
      if (counts[evening]! > 0) addFrom(from, pH, this.ofTablet[evening]!.pH, counts[evening]!);
      if (measures[evening]! > 0) addFrom(from, pH, this.ofFast[evening]!.pH, measures[evening]! * rises[evening]!);
    }
    return pH;
  }

  /** How much more stabilizer the tablets of a draft bring, by hour [mg/L]. */
  stabilizerOf({ tablets: counts }: Draft): Float64Array {
    const sum = new Float64Array(this.pH.length);
    for (let evening = 0; evening < counts.length; evening++)
      if (counts[evening]! > 0) addFrom(0, sum, this.ofTablet[evening]!.stabilizer, counts[evening]!);
    return sum;
  }
}

/** How the median answers to one unit of what a dose holds `amount` of. */
function answerTo(dose: WeekDose, amount: number, { forcing, given, median, undosed }: PlanContext): Answer {
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
}

function addToEnd(end: WeeksEnd, answer: Answer, amount: number): void {
  const last = answer.pH.length - 1;
  end.pH += amount * answer.pH[last]!;
  end.low += amount * answer.low;
  end.high += amount * answer.high;
  end.totalAlkalinity += amount * answer.totalAlkalinity;
  end.cyanuricAcid += amount * answer.stabilizer[last]!;
}

function addFrom(from: number, sum: Float64Array, each: Float64Array, amount: number): void {
  for (let hour = from; hour < sum.length; hour++) sum[hour]! += amount * each[hour]!;
}
