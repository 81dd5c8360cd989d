import { intervalsOfDay, parseInstant, wallToInstant } from '@/lib/calendar/wall-time';
import type { Stretch, TimeAxis } from '@/components/charts/time-axis';
import type { WeekSheet } from '@/lib/schemas/week-sheet';

/** One column of the sheet; its width is its length, 23, 24 or 25 hours. */
export type SheetDay = WeekSheet['days'][number] & { from: number; to: number };

/** An instant of a reply that has been checked [ms]. */
export function instantOf(iso: string): number {
  return parseInstant(iso) ?? Number.NaN;
}

export function daysOf({ days }: WeekSheet): SheetDay[] {
  return days.map((day) => ({ ...day, from: instantOf(day.startsAt), to: instantOf(day.endsAt) }));
}

/** The axis from the first instant of the first day to the last of the last. */
export function axisOf(days: readonly SheetDay[]): TimeAxis {
  return { from: days[0]?.from ?? 0, to: days.at(-1)?.to ?? 1 };
}

/** Sunset to sunrise. A day on which the sun never rises is one night, a day on which it never sets has none. */
export function nightsOf(days: readonly SheetDay[]): Stretch[] {
  const dark = days.flatMap(({ from, to, sunrise, sunset, sun }): Stretch[] => {
    if (sunrise === null || sunset === null) return sun.some((share) => share > 0) ? [] : [{ from, to }];
    return [
      { from, to: instantOf(sunrise) },
      { from: instantOf(sunset), to },
    ];
  });
  return joined(dark.filter(({ from, to }) => from < to));
}

/** Swim hours of each day, by the household's clock. */
export function swimHoursOf(days: readonly SheetDay[], { pool, household }: WeekSheet): Stretch[] {
  return days.flatMap(({ day }) => intervalsOfDay([pool.swimHours], day, household.timeZone));
}

/** 6, noon and 18 of a day as instants; a clock change moves them along the column. */
export function hourMarksOf({ day }: SheetDay, timeZone: string): { hour: '06' | '12' | '18'; at: number }[] {
  return (['06', '12', '18'] as const).map((hour) => ({
    hour,
    at: wallToInstant(day, `${hour}:00`, timeZone).instant,
  }));
}

function joined(stretches: Stretch[]): Stretch[] {
  return stretches.reduce<Stretch[]>((done, stretch) => {
    const last = done.at(-1);
    if (last && stretch.from <= last.to) return [...done.slice(0, -1), { from: last.from, to: stretch.to }];
    return [...done, stretch];
  }, []);
}
