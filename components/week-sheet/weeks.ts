import { addDays, type CalendarDay } from '@/lib/calendar/household-day';
import type { SheetPicture } from './sheet-picture';

/** Whether a sheet shows the week of now. */
export function isThisWeek({ axis, now }: Pick<SheetPicture, 'axis' | 'now'>): boolean {
  return now >= axis.from && now < axis.to;
}

/** Addresses of the week before and the week after; the week of now has one of its own, which moves on with the days. */
export function weeksBeside(first: CalendarDay, today: CalendarDay): { previous: string; next: string } {
  const address = (start: CalendarDay) =>
    today >= start && today < addDays(start, 7) ? '/week' : `/week?start=${start}`;
  return { previous: address(addDays(first, -7)), next: address(addDays(first, 7)) };
}
