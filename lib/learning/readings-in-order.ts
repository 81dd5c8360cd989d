import { parseInstant } from '@/lib/calendar/wall-time';
import { measuredQuantities, measuredRange } from '@/lib/schemas/measured-range';
import type { LearningNote } from '@/lib/schemas/posterior';
import type { Interval, Reading } from '@/lib/schemas/reading';
import type { Dated } from './history';

/** A reading at its instant [ms], with what had to be left out of it. */
export type ReadingInOrder = Dated<Reading> & { log: LearningNote[] };

/**
 * Readings after an instant in the order in which they were taken, exact duplicates joined, values that cannot be left
 * out. At one and the same instant their text decides, so that the order in which they were stored does not.
 *
 * @param after only readings later than this [ms]
 */
export function readingsInOrder(readings: readonly Reading[], after: number): ReadingInOrder[] {
  const dated = readings
    .flatMap((what) => {
      const at = parseInstant(what.takenAt);
      return at !== undefined && at > after ? [{ at, what, text: textOf(what) }] : [];
    })
    .sort((a, b) => a.at - b.at || (a.text < b.text ? -1 : a.text > b.text ? 1 : 0));
  const steps: (ReadingInOrder & { text: string })[] = [];
  for (const { at, what, text } of dated) {
    const last = steps.at(-1);
    if (last && last.at === at && last.text === text) last.log.push({ kind: 'left-out', reason: 'duplicate' });
    else steps.push({ at, text, ...possible(what) });
  }
  return steps;
}

function textOf({ method, ...reading }: Reading): string {
  return JSON.stringify([method, ...measuredQuantities.map((quantity) => reading[quantity] ?? null)]);
}

function possible(reading: Reading): { what: Reading; log: LearningNote[] } {
  const wrong = measuredQuantities.filter((quantity) => {
    const value: number | Interval | undefined = reading[quantity];
    if (value === undefined) return false;
    const [low, high] = measuredRange[quantity];
    const ends = typeof value === 'number' ? [value] : [value.low, value.high];
    return !ends.every((end) => end >= low && end <= high);
  });
  if (wrong.length === 0) return { what: reading, log: [] };
  const what = { ...reading };
  for (const quantity of wrong) delete what[quantity];
  return { what, log: wrong.map(() => ({ kind: 'left-out', reason: 'out-of-range' }) as const) };
}
