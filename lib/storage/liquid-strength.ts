import { type CalendarDay, daysBetween } from '@/lib/calendar/household-day';
import { PERMITTED, storedHypochloriteStrength } from '@/lib/chemistry';

/** A bottle of liquid chlorine as the household keeps it. */
export type LiquidBottle = {
  /** As printed, taken as true on `boughtOn` [trade %, g Cl2 per 100 mL]. */
  strength: number;
  boughtOn: CalendarDay;
  /** Mean temperature of the place where it stands [degrees C]. */
  storedAt: number;
};

/**
 * Strength of liquid chlorine on a day [trade %], by {@link storedHypochloriteStrength}. A day before it was bought
 * counts as that day: it was never stronger than its label. Colder than the water model knows counts as -2 degrees C,
 * which loses a little more than the truth, under 2 % in half a year.
 * Errors: WaterRangeError for a strength that is no strength or a place above 60 degrees C; `invalid-input` for what is
 * no day. Uncertainty: metals and light make real bottles weaker; how long the shop kept it is not known.
 */
export function strengthOnDay(bottle: LiquidBottle, day: CalendarDay): number {
  return storedHypochloriteStrength({
    strength: bottle.strength,
    temperature: Math.max(PERMITTED.temperature[0], bottle.storedAt),
    days: Math.max(0, daysBetween(bottle.boughtOn, day)),
  });
}

/** What is left of the printed strength on a day, as a share from 0 to 1. */
export function shareLeftOnDay(bottle: LiquidBottle, day: CalendarDay): number {
  return strengthOnDay(bottle, day) / bottle.strength;
}
