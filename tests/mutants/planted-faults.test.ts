import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { occurrences } from './occurrences';
import { plantedFaults } from './planted-faults';

const root = join(import.meta.dirname, '../..');

it('plants at least 40 faults, each another one', () => {
  expect(plantedFaults.length).toBeGreaterThanOrEqual(40);
  const places = plantedFaults.map(({ file, find }) => `${file} ${find}`);
  expect(new Set(places).size).toBe(places.length);
});

it.each(plantedFaults.map((planted) => [planted.fault, planted] as const))(
  'finds the sound text of "%s" exactly once, and the tests that notice it',
  (_, { file, find, plant, noticedBy }) => {
    expect(occurrences(readFileSync(join(root, file), 'utf8'), find)).toBe(1);
    expect(plant).not.toBe(find);
    expect(noticedBy.length).toBeGreaterThan(0);
    expect(noticedBy.filter((test) => !existsSync(join(root, test)))).toEqual([]);
  },
);
