import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import type { Morning, Situation } from '@/lib/schemas/situation';
import { codeMinimum, limits, lowestLevel } from '@/lib/standards/limits';

/** A reading as a procedure takes it: the middle of what was measured. Instants in ms. */
export type Taken = {
  takenAt: number;
  kind: 'full' | 'quick';
  look: 'clear' | 'cloudy' | 'green';
  values: Partial<Record<MeasuredQuantity, number>>;
};

/** All that a procedure goes by: what it was told, and what has happened since. */
export type SituationRecord = {
  situation: Situation;
  openedAt: number;
  pool: Pool;
  /** Every reading that may still count, oldest first; those before the opening too. */
  readings: readonly Taken[];
  /** Doses since it was opened, oldest first, with the free chlorine that each added [mg/L]. */
  given: readonly { at: number; substance: string; rise: number }[];
  /** When each step was ticked. */
  ticks: ReadonlyMap<string, number>;
  mornings: readonly Morning[];
  /** Whether trichlor or dichlor has been used in this water. */
  stabilizedProductUsed: boolean;
};

export function since({ readings }: SituationRecord, instant: number): Taken[] {
  return readings.filter(({ takenAt }) => takenAt >= instant);
}

/** The newest value of a quantity, and when it was read. */
export function newest(record: SituationRecord, quantity: MeasuredQuantity): { value: number; takenAt: number } | null {
  const taken = record.readings.findLast(({ values }) => values[quantity] !== undefined);
  const value = taken?.values[quantity];
  return taken && value !== undefined ? { value, takenAt: taken.takenAt } : null;
}

/** Water counts as stabilized from 10 mg/L on, where a stabilized product was used, and where nobody has measured it. */
export function isStabilized(record: SituationRecord): boolean {
  const stabilizer = newest(record, 'cyanuricAcid');
  return stabilizer === null || record.stabilizedProductUsed || stabilizer.value >= limits.stabilizedFrom.value;
}

/** The lowest level and the code minimum of this water [mg/L]. */
export function lowestOf(record: SituationRecord): { lowest: number; minimum: number } {
  const stabilizer = newest(record, 'cyanuricAcid')?.value ?? 0;
  const stabilized = isStabilized(record);
  return { lowest: lowestLevel(stabilizer, stabilized), minimum: codeMinimum(stabilizer, stabilized) };
}

/** Whether a reading found chlorine and pH where somebody may swim. Both have to be measured. */
export function inRange({ values }: Taken, record: SituationRecord): boolean {
  const { freeChlorine, pH } = values;
  if (freeChlorine === undefined || pH === undefined) return false;
  return (
    freeChlorine >= lowestOf(record).lowest &&
    freeChlorine <= record.pool.swimLimit &&
    pH >= limits.pHRangeLow.value &&
    pH <= limits.pHRangeHigh.value
  );
}

/** Chlorine that mixes at once, given since the opening. */
export function fastDoses({ given }: SituationRecord): { at: number; rise: number }[] {
  return given.filter(({ substance }) => fast.includes(substance));
}
const fast: readonly string[] = ['calcium-hypochlorite', 'sodium-hypochlorite', 'dichlor'];
