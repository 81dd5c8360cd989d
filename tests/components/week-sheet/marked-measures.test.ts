import { expect, it } from 'vitest';
import { markedMeasures } from '@/components/week-sheet/marked-measures';

const grams = (amount: number, measure: number | null) => markedMeasures({ amount, unit: 'g', measure });

it.each([
  [250, 50, { how: 'whole', count: 5 }],
  [50, 50, { how: 'whole', count: 1 }],
  // Nobody sees a gram on a measure of 100.
  [401, 100, { how: 'whole', count: 4 }],
  [225, 50, { how: 'quarters', whole: 4, quarters: 2 }],
  [25, 100, { how: 'quarters', whole: 0, quarters: 1 }],
  [175, 100, { how: 'quarters', whole: 1, quarters: 3 }],
  [440, 100, { how: 'decimal', count: 4.4 }],
  [447, 100, { how: 'quarters', whole: 4, quarters: 2 }],
])('%d g with a measure of %d g', (amount, measure, filled) => {
  expect(grams(amount, measure)).toEqual(filled);
});

it('counts millilitres as it counts grams', () => {
  expect(markedMeasures({ amount: 300, unit: 'mL', measure: 100 })).toEqual({ how: 'whole', count: 3 });
});

it.each([
  ['the household keeps none', grams(250, null)],
  ['tablets are counted', markedMeasures({ amount: 3, unit: 'tablet', measure: 50 })],
  // A third would become 0.3, a tenth too little.
  ['it cannot be filled so finely', grams(100, 300)],
  ['it is far too big', grams(2, 500)],
])('is silent where %s', (_when, filled) => {
  expect(filled).toBeUndefined();
});
