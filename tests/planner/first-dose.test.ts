import { expect, it } from 'vitest';
import { halveFirstDose } from '@/lib/planner/first-dose';
import { scenarioOf } from './scenarios';

const estimated = scenarioOf({ pool: { volumeEstimated: true } });
const none = [0, 0, 0];

// care.md 4: the first dose in a pool whose volume was only estimated is half, then a re-test.
it.each([
  ['fast doses', { tablets: none, fast: null, measures: [0, 4, 6] }, { measures: [0, 2, 6] }, 1],
  ['an odd count, rounded down', { tablets: none, fast: null, measures: [5, 0, 0] }, { measures: [2, 0, 0] }, 0],
  ['tablets', { tablets: [3, 0, 0], fast: null, measures: [0, 4, 0] }, { tablets: [1, 0, 0], measures: [0, 4, 0] }, 0],
] as const)('halves the first of %s and no other', (_, draft, expected, evening) => {
  const { draft: halved, halvedEvening } = halveFirstDose(draft, estimated);
  expect(halved).toMatchObject(expected);
  expect(halvedEvening).toBe(evening);
});

it('leaves a single measure, and a pool whose volume was measured, as they are', () => {
  const single = { tablets: none, fast: null, measures: [1, 0, 0] };
  expect(halveFirstDose(single, estimated)).toEqual({ draft: single, halvedEvening: null });
  const four = { tablets: none, fast: null, measures: [4, 0, 0] };
  expect(halveFirstDose(four, scenarioOf())).toEqual({ draft: four, halvedEvening: null });
});
