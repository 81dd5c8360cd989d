import 'server-only';
import { addDays, type CalendarDay } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { NewReading } from '@/lib/schemas/reading';
import { demoHousehold } from './demo-household';

/** A test of the demo household: when, which, and whether a plan was made of it. */
export type DemoTest = { day: CalendarDay; kind: NewReading['kind']; at: number; plans: boolean };

const weeks = 10;
/** Days before today. The newest test is 1 to 3 days old at every hour of today. */
const newestFullTest = 2;
const quickChecks = [4, 6];
/** The household began to plan six full tests ago; since the last but one every test has made a plan. */
const firstPlan = newestFullTest + 5 * 7;
const plannedClosely = newestFullTest + 7;

/** A full test every week and quick checks between, oldest first; the first and the last are full ones. */
export function demoTests(today: CalendarDay): DemoTest[] {
  const before = Array.from({ length: weeks }, (_, week) => newestFullTest + 7 * week);
  const full = before.map((days) => ({ days, kind: 'full' as const }));
  const quick = before
    .slice(1)
    .flatMap((_, week) => quickChecks.map((days) => ({ days: days + 7 * week, kind: 'quick' as const })));
  return [...full, ...quick]
    .sort((a, b) => b.days - a.days)
    .map(({ days, kind }) => {
      const day = addDays(today, -days);
      const { instant } = wallToInstant(day, kind === 'full' ? '16:10' : '08:50', demoHousehold.timeZone);
      return { day, kind, at: instant, plans: kind === 'full' ? days <= firstPlan : days <= plannedClosely };
    });
}
