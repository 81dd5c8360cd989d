import type { Learnt, LearntRange, LearntRow, LearntThing } from '@/lib/schemas/learnt';

const range = (p10: number, p50: number, p90: number): LearntRange => ({ p10, p50, p90 });

const rows: readonly LearntRow[] = [
  row('dailyLoss', 'mg/L', range(0.8, 1.5, 2.2), range(1.2, 1.35, 1.5), 9, true),
  row('sunStrength', 'percent', range(73, 100, 138), range(75, 92, 113), 4, false),
  row('chlorinePerSwimmerHour', 'g', range(1.5, 2.5, 4.2), range(1.5, 2.5, 4.2), 0, false),
  row('tabletLife', 'days', range(4.5, 7, 9.5), range(6.4, 7, 7.6), 8, true),
  row('volume', 'm3', range(61, 68, 75), range(69, 71, 74), 5, true),
];

function row(
  thing: LearntThing,
  unit: LearntRow['unit'],
  before: LearntRange,
  learnt: LearntRange,
  readings: number,
  clear: boolean,
): LearntRow {
  return { thing, unit, before, learnt, readings, clear };
}

/** A pool of 68 m3 that eleven tests speak of as one of 71. */
export function aLearntPool(change: Partial<Learnt> = {}): Learnt {
  return {
    since: '2026-04-20T09:00:00-04:00',
    readings: 11,
    rows: [...rows],
    tabletHoursADay: 8,
    enteredVolume: 68,
    measureVolumeAgain: false,
    stoodOut: [],
    ...change,
  };
}

/** The same with one thing as it is in another pool. */
export function withRow(learnt: Learnt, thing: LearntThing, change: Partial<LearntRow>): Learnt {
  return { ...learnt, rows: learnt.rows.map((row) => (row.thing === thing ? { ...row, ...change } : row)) };
}

/** Before anything was learnt. */
export const untaught = aLearntPool({ since: null, readings: 0, rows: [], tabletHoursADay: null });
