import { expect, it } from 'vitest';
import { companionCap, fastChlorineCap, swimWaitHours, tabletCap } from '@/lib/standards/caps';
import { codeMinimum, limits, lowestLevel } from '@/lib/standards/limits';

// The figures of the care rules (care.md 2 to 4), typed here once more by hand: whoever changes one changes both.
it.each([
  ['codeMinimumUnstabilized', 1],
  ['codeMinimumStabilized', 2],
  ['stabilizerPerLowestLevel', 20],
  ['freeChlorineMaximum', 10],
  ['swimLimitDefault', 4],
  ['swimLimitHighest', 10],
  ['swimLimitMargin', 0.5],
  ['combinedChlorineAct', 0.4],
  ['pHLowest', 7.0],
  ['pHHighest', 8.0],
  ['pHRangeLow', 7.2],
  ['pHRangeHigh', 7.8],
  ['verdictReadingAge', 48],
  ['planReadingAge', 14],
  ['rainEndsVerdict', 10],
  ['acidToChlorineGap', 4],
  ['stopConfirmation', 90],
  ['swimAfterDose', 4],
  ['pumpAfterDose', 4],
  ['pumpAfterLargeDose', 8],
  ['largeDose', 5],
] as const)('keeps %s at %d', (name, value) => {
  expect(limits[name].value).toBe(value);
});

// care.md 4, "Caps per evening".
it.each([
  ['calcium-hypochlorite', 4],
  ['sodium-hypochlorite', 4],
  ['dichlor', 2],
] as const)('caps %s at +%d mg/L in an evening', (substance, rise) => {
  expect(fastChlorineCap[substance].value).toBe(rise);
});

it.each([
  ['hydrochloric-acid', 16],
  ['sodium-bisulfate', 20],
  ['sodium-bicarbonate', 34],
  ['sodium-carbonate', 10],
  ['calcium-chloride', 43],
  ['cyanuric-acid', 20],
] as const)('caps %s at %d g or mL for each m3', (substance, amount) => {
  expect(companionCap[substance].perCubicMetre).toBe(amount);
});

it('caps tablets by water, mass and stabilizer', () => {
  expect(tabletCap).toMatchObject({ waterPerTablet: 18, tabletMass: 230, stabilizerRise: 6 });
});

it('asks to wait 4 h after fast chlorine and acid, a quarter of an hour after feeder work', () => {
  expect(swimWaitHours).toMatchObject({ 'calcium-hypochlorite': 4, 'hydrochloric-acid': 4, trichlor: 0.25 });
});

// care.md 3: the larger of 2 and stabilizer / 20, 1 where unstabilized; stabilized from a reading of 10.
it.each([
  [0, false, 1],
  [9.9, false, 1],
  [9.9, true, 2],
  [10, false, 2],
  [40, false, 2],
  [44, false, 2.2],
  [90, false, 4.5],
])('with stabilizer %d (product used: %s) the lowest level is %d', (stabilizer, used, lowest) => {
  expect(lowestLevel(stabilizer, used)).toBeCloseTo(lowest, 12);
  expect(codeMinimum(stabilizer, used)).toBe(lowest === 1 ? 1 : 2);
});
