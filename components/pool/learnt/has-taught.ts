import type { Learnt, LearntRow, LearntThing } from '@/lib/schemas/learnt';

/** Fewer tests tell no pool from another. */
const ENOUGH = 3;
/** What is worth a person's while, in this order; the rest is folded away. */
const first: readonly LearntThing[] = ['dailyLoss', 'volume', 'tabletLife', 'chlorinePerSwimmerHour'];

/** What there are bars of: everything once there are tests enough, and nothing before. */
export function taughtRows({ rows, readings }: Learnt): { main: LearntRow[]; more: LearntRow[] } {
  const taught = readings < ENOUGH ? [] : rows;
  return {
    main: first.flatMap((thing) => taught.filter((row) => row.thing === thing)),
    more: taught.filter(({ thing }) => !first.includes(thing)),
  };
}

/** What is still as good as assumed; nothing while nothing is taught, because then all of it is. */
export function guessedThings(learnt: Learnt): LearntThing[] {
  const { main } = taughtRows(learnt);
  return main.length === 0 ? [] : learnt.rows.filter(({ clear }) => !clear).map(({ thing }) => thing);
}
