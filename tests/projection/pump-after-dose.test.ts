import { expect, it } from 'vitest';
import { pumpUntil, riseOf, weekDose } from '@/lib/projection/events';

const hour = 3_600_000;

// care.md 4: the pump runs at least 4 h after a fast dose, 8 h above +5 mg/L.
it.each([
  [0.5, 4],
  [5, 4],
  [5.01, 8],
  [9, 8],
])('keeps the pump running after +%d mg/L for %d h', (rise, hours) => {
  expect(pumpUntil(1_000, rise)).toBe(1_000 + hours * hour);
});

it('reckons the rise from amount, strength and volume', () => {
  // 1 L of 12.5 trade % is 125 g of chlorine: 2.5 mg/L in 50 m3, 6.25 in 20.
  const dose = { substance: 'sodium-hypochlorite', amount: 1000, strength: 12.5 } as const;
  const inFifty = weekDose(0, dose, 50);
  expect(inFifty.kind === 'dose' && riseOf(inFifty.contents, inFifty.amount, 50)).toBeCloseTo(2.5, 9);
  expect(inFifty).toMatchObject({ pumpUntil: 4 * hour });
  expect(weekDose(0, dose, 20)).toMatchObject({ pumpUntil: 8 * hour });
});
