'use client';

import { useTranslations } from 'next-intl';
import { addDays, daysBetween } from '@/lib/calendar/household-day';
import { intervalsOfDay, wallToInstant } from '@/lib/calendar/wall-time';
import { nextPart } from '@/lib/calendar/part-of-day';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { doseInstant, effectiveAmount, isLastLight } from './dose-state';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** What is said about a dose, in the household's units and hours. */
export function useDoseWords() {
  const t = useTranslations('doses');
  const { sheet, picture } = useSheet();
  const { household } = sheet;
  const times = useTimes();
  const { amount, signed } = useUnits();

  const product = ({ substance, form }: PlanDose, count: number) => t(`product.${substance}`, { form, count });

  return {
    /** "95 g" or, of tablets, "3". */
    amountOf: (dose: PlanDose) => amount(effectiveAmount(dose), dose.unit),
    productOf: (dose: PlanDose) => product(dose, effectiveAmount(dose)),
    amountAndProduct: (dose: PlanDose, value = effectiveAmount(dose)) =>
      t('amountAndProduct', { unit: dose.unit, amount: amount(value, dose.unit), product: product(dose, value) }),
    /** "Last light, about 19:40", with the pump's hours where they matter. */
    hourOf: (dose: PlanDose, { pump }: { pump: boolean }) => {
      const day = picture.days.find(({ from, to }) => instantOf(dose.at) >= from && instantOf(dose.at) < to);
      const lastLight = isLastLight(dose, day?.sunset ?? null);
      const time = times.clock(instantOf(dose.at));
      if (!pump || dose.pumpUntil === null) return t(lastLight ? 'when.lastLight' : 'when.about', { time });
      const until = times.clock(instantOf(dose.pumpUntil));
      return t(lastLight ? 'when.lastLightPump' : 'when.aboutPump', { time, until });
    },
    /** "Pump on until 23:40." */
    pump: ({ pumpUntil }: PlanDose) =>
      pumpUntil === null ? undefined : t('pump', { time: times.clock(instantOf(pumpUntil)) }),
    /** "Nobody in until the morning." */
    afterwards: (dose: PlanDose) => {
      if (dose.steps === 'tablets-inline') return t('after.tablets');
      // Soda and calcium cloud the water until they have dissolved.
      const clouds = dose.substance === 'sodium-carbonate' || dose.substance === 'calcium-chloride';
      const free = nextPart(instantOf(dose.waitUntil), household.timeZone);
      const doseDay = times.dayOf(instantOf(dose.at));
      const morning = wallToInstant(addDays(doseDay, 1), '06:00', household.timeZone).instant;
      const lastSwim = intervalsOfDay([sheet.pool.swimHours], doseDay, household.timeZone).at(-1)?.to ?? morning;
      // Once the swim hours are over nobody goes in before the next day's, however early the wait ends.
      if (free.startsAt >= Math.min(lastSwim, morning) && free.startsAt <= morning)
        return t(clouds ? 'after.morningClear' : 'after.morning');
      return t(clouds ? 'after.partClear' : 'after.part', { when: times.partAfter(instantOf(dose.waitUntil)) });
    },
    /** "Due tomorrow". */
    dueOf: (dose: PlanDose) => {
      const at = instantOf(dose.at);
      const days = daysBetween(times.today, times.dayOf(at));
      if (days < 0) return t('due.overdue', { day: times.weekday(at) });
      if (instantOf(dose.tickFrom) <= picture.now) return t('due.now');
      if (days === 0) return t('due.today');
      return days === 1 ? t('due.tomorrow') : t('due.day', { day: times.weekday(at) });
    },
    /** "Odile, 19:42", and who wrote it down when that was someone else. */
    doneBy: (dose: PlanDose) => {
      const time = times.clock(doseInstant(dose));
      const { doneBy: name, recordedBy: recorder } = dose;
      if (name === null) return t('done.unknown', { time });
      return recorder === null || recorder === name
        ? t('done.by', { name, time })
        : t('done.recorded', { name, time, recorder });
    },
    skippedBy: ({ doneBy: name }: PlanDose) => (name === null ? t('done.skipped') : t('done.skippedBy', { name })),
    /** "50 g instead of 95 g". */
    changed: (dose: PlanDose) =>
      t('done.changed', { amount: amount(effectiveAmount(dose), dose.unit), planned: amount(dose.amount, dose.unit) }),
    /** "+0.9", how far it lifts free chlorine; of a slow tablet nothing, it has no jump. */
    gainOf: ({ rise, form, givenAmount, amount: planned }: PlanDose) => {
      if (form === 'tablet') return undefined;
      const lift = givenAmount === null ? rise : (rise * givenAmount) / planned;
      return lift >= 0.05 ? signed(lift, 1) : undefined;
    },
  };
}
