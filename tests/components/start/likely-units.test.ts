import { expect, it } from 'vitest';
import { likelyUnits } from '@/components/start/likely-units';

it.each([
  ['en-US,en;q=0.9', 'us'],
  [' es-us', 'us'],
  ['en-GB,en-US;q=0.8', 'metric'],
  ['en', 'metric'],
  ['', 'metric'],
  [null, 'metric'],
] as const)('offers for %j %s first', (languages, units) => {
  expect(likelyUnits(languages)).toBe(units);
});
