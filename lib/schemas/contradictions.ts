import { measuredQuantities } from './measured-range';
import type { Reading } from './reading';

export type Contradiction = { path: (string | number)[]; message: string };

/**
 * Where readings contradict the scenario's present or each other: one that is taken after now, and two of one quantity at
 * one instant. Which of the two were right nobody could say.
 */
export function contradictionsOf(reading: Reading | Reading[], now: string | undefined): Contradiction[] {
  const readings = [reading].flat();
  const pathOf = (index: number, field: string) =>
    Array.isArray(reading) ? ['reading', index, field] : ['reading', field];
  const future = readings.flatMap(({ takenAt }, index) =>
    now !== undefined && Date.parse(takenAt) > Date.parse(now)
      ? [{ path: pathOf(index, 'takenAt'), message: `This reading is taken after now, ${now}.` }]
      : [],
  );
  const seen = new Set<string>();
  const twice = readings.flatMap((each, index) =>
    measuredQuantities.flatMap((quantity) => {
      if (each[quantity] === undefined) return [];
      const name = `${quantity} ${Date.parse(each.takenAt)}`;
      if (seen.has(name))
        return [
          { path: pathOf(index, quantity), message: 'Another reading has a value of this for the same instant.' },
        ];
      seen.add(name);
      return [];
    }),
  );
  return [...future, ...twice];
}
