import 'server-only';
import { and, asc, eq, gte, lt } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { weekDays } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type WeekDayRow = Omit<typeof weekDays.$inferSelect, 'householdId'>;
export type WeekDayValues = Partial<Omit<WeekDayRow, 'day'>>;

/** What was said about the days from `from` up to but not including `until`, in order; unmentioned days are missing. */
export async function listWeekDays(
  db: DatabaseOrTransaction,
  { householdId, from, until }: { householdId: ProvenHouseholdId; from: string; until: string },
): Promise<WeekDayRow[]> {
  return db
    .select({
      day: weekDays.day,
      sky: weekDays.sky,
      rainMillimetres: weekDays.rainMillimetres,
      swimmerHours: weekDays.swimmerHours,
      waterTemperature: weekDays.waterTemperature,
      evaporationMillimetres: weekDays.evaporationMillimetres,
      backwashCubicMetres: weekDays.backwashCubicMetres,
    })
    .from(weekDays)
    .where(and(eq(weekDays.householdId, householdId), gte(weekDays.day, from), lt(weekDays.day, until)))
    .orderBy(asc(weekDays.day));
}

/** Sets what was said about a day; what is left out stays as it was. */
export async function saveWeekDay(
  db: DatabaseOrTransaction,
  { householdId, day, values }: { householdId: ProvenHouseholdId; day: string; values: WeekDayValues },
): Promise<void> {
  const insert = db.insert(weekDays).values({ ...values, householdId, day });
  const target = [weekDays.householdId, weekDays.day];
  await (Object.keys(values).length === 0
    ? insert.onConflictDoNothing({ target })
    : insert.onConflictDoUpdate({ target, set: values }));
}
