import { instantOf } from '@/components/week-sheet/sheet-times';
import type { Interval, RecordedReading } from '@/lib/schemas/reading';

const quantities = ['freeChlorine', 'pH', 'totalAlkalinity', 'cyanuricAcid', 'calciumHardness', 'temperature'] as const;

/** The newest value of each quantity; a strip's has two ends. */
export type LastRead = Partial<Record<(typeof quantities)[number] | 'totalChlorine', Interval>>;

/** What was read last of each quantity: a quick check leaves out most of them. Total chlorine is what one test says of both. */
export function lastRead(readings: readonly RecordedReading[]): LastRead {
  const newestFirst = readings.toSorted((a, b) => instantOf(b.takenAt) - instantOf(a.takenAt));
  const found: LastRead = {};
  for (const { values } of newestFirst) {
    for (const quantity of quantities) {
      const value = values[quantity];
      if (value !== undefined) found[quantity] ??= endsOf(value);
    }
    const { freeChlorine, combinedChlorine } = values;
    if (freeChlorine === undefined || combinedChlorine === undefined) continue;
    const [free, used] = [endsOf(freeChlorine), endsOf(combinedChlorine)];
    found.totalChlorine ??= { low: free.low + used.low, high: free.high + used.high };
  }
  return found;
}

function endsOf(value: number | Interval): Interval {
  return typeof value === 'number' ? { low: value, high: value } : value;
}
