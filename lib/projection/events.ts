import { contentsPerUnit, type Dose, type DoseContents } from '@/lib/chemistry';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { limits } from '@/lib/standards/limits';
import { MILLISECONDS_PER_HOUR } from './forcing';
import type { TabletLoad } from './tablets';

/** What goes in at an instant [ms]: a dose that mixes at once, or tablets that begin to erode. */
export type WeekDose =
  | { at: number; kind: 'dose'; contents: DoseContents; amount: number; pumpUntil: number }
  | { at: number; kind: 'tablets'; load: TabletLoad };

/**
 * A dose that mixes at once, with the pump kept running after it: 4 h, above +5 mg/L of free chlorine 8 h.
 *
 * @param at     instant [ms]
 * @param volume volume of the pool as entered [m3]; the rise that decides the pump's hours is that of the plan
 */
export function weekDose(at: number, dose: Dose, volume: number): WeekDose {
  const contents = contentsPerUnit(dose);
  return {
    at,
    kind: 'dose',
    contents,
    amount: dose.amount,
    pumpUntil: pumpUntil(at, riseOf(contents, dose.amount, volume)),
  };
}

/** Free chlorine that an amount adds to a volume [mg/L]. */
export function riseOf(contents: DoseContents, amount: number, volume: number): number {
  return (contents.freeChlorine * amount * CHLORINE_MILLIGRAMS_PER_MOLE) / (volume * 1000);
}

/** Until when [ms] the pump is kept running after a fast dose that adds `rise` mg/L of free chlorine. */
export function pumpUntil(at: number, rise: number): number {
  const hours = rise > limits.largeDose.value ? limits.pumpAfterLargeDose.value : limits.pumpAfterDose.value;
  return at + hours * MILLISECONDS_PER_HOUR;
}
