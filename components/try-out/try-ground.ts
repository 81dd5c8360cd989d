import type { SheetPicture } from '@/components/week-sheet/sheet-picture';
import { instantOf, type SheetDay } from '@/components/week-sheet/sheet-times';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { chlorines } from '@/lib/standards/chlorines';

/** What of a sheet there is to try on. */
export type TryGround = {
  planId: string;
  /** Days of the sheet that are not over and that the plan reaches. */
  days: SheetDay[];
  /** Doses of fast chlorine that are still ahead. */
  doses: PlanDose[];
  /** Slow tablets that the plan still loads; undefined where there are none in question. */
  tablets: number | undefined;
};

/** Undefined where nothing can be tried: no plan that planned anything, or none of its days on the sheet. */
export function groundOf(sheet: WeekSheet, picture: SheetPicture): TryGround | undefined {
  const { plan, doses } = sheet;
  if (plan === null || plan.cost === null || picture.planEndsAt === undefined) return undefined;
  const { now, planEndsAt } = picture;
  const days = picture.days.filter(({ from, to }) => to > now && from < planEndsAt);
  if (days.length === 0) return undefined;
  const ahead = doses.filter(({ status, at }) => status === 'planned' && instantOf(at) > now);
  const tablets = ahead.filter(({ form }) => form === 'tablet');
  const alone = plan.alternatives.find(({ kind }) => kind === 'tablets');
  const inQuestion = tablets.length > 0 || alone?.doses.some(({ form }) => form === 'tablet') === true;
  return {
    planId: plan.id,
    days,
    doses: ahead.filter(({ substance, form }) => chlorines.includes(substance) && form !== 'tablet'),
    tablets: inQuestion ? tablets.reduce((sum, { amount }) => sum + amount, 0) : undefined,
  };
}

/** The day with the most swimmers, the first of them: what a person most likely asks about. */
export function likeliestDay(days: readonly SheetDay[]): SheetDay | undefined {
  return days.reduce<SheetDay | undefined>(
    (most, day) => (most === undefined || day.swimmerHours > most.swimmerHours ? day : most),
    undefined,
  );
}
