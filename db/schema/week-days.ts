import { check, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { between, isDay } from './checks';
import { households } from './households';

/** What is known or expected of a household day; a null leaves it to forecast and habit. */
export const weekDays = sqliteTable(
  'week_days',
  {
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    day: text('day').notNull(),
    /** Share of clear-sky UV. */
    sky: real('sky'),
    rainMillimetres: real('rain_millimetres'),
    swimmerHours: real('swimmer_hours'),
    waterTemperature: real('water_temperature_celsius'),
    evaporationMillimetres: real('evaporation_millimetres'),
    backwashCubicMetres: real('backwash_cubic_metres'),
  },
  (table) => [
    primaryKey({ columns: [table.householdId, table.day] }),
    check('week_days_day_is_a_day', isDay(table.day)),
    check('week_days_sky_is_a_share', between(table.sky, 0, 1)),
    check('week_days_rain_in_range', between(table.rainMillimetres, 0, 1000)),
    check('week_days_swimmer_hours_in_range', between(table.swimmerHours, 0, 1000)),
    check('week_days_water_temperature_in_range', between(table.waterTemperature, -2, 60)),
    check('week_days_evaporation_in_range', between(table.evaporationMillimetres, 0, 50)),
    check('week_days_backwash_in_range', between(table.backwashCubicMetres, 0, 100)),
  ],
);
