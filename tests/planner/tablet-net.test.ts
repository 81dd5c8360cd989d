import { expect, it } from 'vitest';
import { tabletFaults } from '@/lib/planner/safety/tablet-faults';
import type { PlannedDose } from '@/lib/schemas/dose';
import { scenarioOf } from './scenarios';

const tabletsOf = (amount: number): PlannedDose => ({
  ...{ at: '2026-07-06T20:30:00-04:00', product: 'tabs', toBuy: false, substance: 'trichlor', form: 'tablet' },
  ...{ amount, unit: 'tablet', rise: 8, reason: 'base-load' },
});

// Each edge by itself, with the others far away: at the edge nothing is wrong, one step beyond it is refused.
it('lets the feeder be full and no fuller', () => {
  const scenario = scenarioOf({
    pool: { volume: 500, feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3 } },
  });
  expect(tabletFaults([tabletsOf(3)], scenario)).toEqual([]);
  expect(tabletFaults([tabletsOf(4)], scenario)).toEqual(['4 tablets in a feeder for 3']);
});

it('lets one tablet of 230 g into each 18 m3 and no more', () => {
  const shelf = [{ id: 'tabs', form: 'tablet', substance: 'trichlor', strength: 50, tabletMass: 230, stock: 5000 }];
  expect(tabletFaults([tabletsOf(4)], scenarioOf({ pool: { volume: 72 }, shelf }))).toEqual([]);
  expect(tabletFaults([tabletsOf(4)], scenarioOf({ pool: { volume: 71 }, shelf }))).toEqual([
    'too many tablets for the water',
  ]);
});
