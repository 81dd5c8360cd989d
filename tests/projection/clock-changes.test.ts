import { describe, expect, it } from 'vitest';
import { addDays, dayOf, hoursInDay, startOfDay } from '@/lib/calendar/household-day';
import { toOffsetIso, wallClock } from '@/lib/calendar/wall-time';
import { projectWeek } from '@/lib/projection';
import { type Forcing, prepareForcing } from '@/lib/projection/forcing';
import { aPool, aWeek, everyDay, someWater } from './pools';

const places = {
  'America/New_York': { timeZone: 'America/New_York', latitude: 28, longitude: -81.5 },
  'Europe/Madrid': { timeZone: 'Europe/Madrid', latitude: 40.4, longitude: -3.7 },
};
const changes = [
  { timeZone: 'America/New_York', day: '2026-03-08', hours: 23 },
  { timeZone: 'America/New_York', day: '2026-11-01', hours: 25 },
  { timeZone: 'Europe/Madrid', day: '2026-03-29', hours: 23 },
  { timeZone: 'Europe/Madrid', day: '2026-10-25', hours: 25 },
] as const;

/** Weeks that begin one to six days before a change, in the evening or at an odd minute. */
const weeks = changes.flatMap((change) =>
  [1, 3, 6].map((before) => ({
    ...change,
    before,
    takenAt: startOfDay(addDays(change.day, -before), change.timeZone) + (19 * 60 + (before === 3 ? 17 : 0)) * 60_000,
  })),
);

const sum = (values: ArrayLike<number>, from = 0, to = values.length) =>
  Array.from(values)
    .slice(from, to)
    .reduce((total, value) => total + value, 0);

/** First step of a day of the week and of the next, counted from the start. */
function stepsOf({ startsAt }: Forcing, day: string, timeZone: string): [number, number] {
  const hours = (instant: number) => (instant - startsAt) / 3_600_000;
  return [hours(startOfDay(day, timeZone)), hours(startOfDay(addDays(day, 1), timeZone))];
}

describe.each(weeks)('a week that holds $day in $timeZone, from $before days before', (week) => {
  const { timeZone, day, hours, takenAt } = week;
  const pool = aPool({ ...places[timeZone], pump: [{ from: '22:00', to: '04:00' }], cover: 'opaque' });
  const inputs = aWeek({ rain: everyDay(24), swimmerHours: everyDay(10), evaporation: everyDay(6) });
  const forcing = prepareForcing(pool, takenAt, inputs, 20);
  const onTheHour = takenAt % 3_600_000 === 0;

  it(`has a day of ${hours} hours and 169 instants an hour apart`, () => {
    expect(hoursInDay(day, timeZone)).toBe(hours);
    const { hours: instants } = projectWeek(
      pool,
      { takenAt: toOffsetIso(takenAt, timeZone), water: someWater() },
      inputs,
    );
    expect(instants).toEqual(Array.from({ length: 169 }, (_, hour) => takenAt + hour * 3_600_000));
  });

  it('rains, floats and evaporates its whole amount on every day', () => {
    const [from, to] = stepsOf(forcing, day, timeZone);
    const inDay = (series: Float64Array) => {
      // Whole steps inside the day and the shares of those at its ends.
      let total = 0;
      for (let step = Math.floor(from); step < to; step++)
        total += series[step]! * (Math.min(step + 1, to) - Math.max(step, from));
      return total;
    };
    if (onTheHour) {
      expect(to - from).toBe(hours);
      expect(inDay(forcing.rain)).toBeCloseTo(0.024, 12);
      expect(inDay(forcing.swimmers)).toBeCloseTo(10, 9);
    } else {
      expect(inDay(forcing.rain)).toBeCloseTo(0.024, 4);
      expect(inDay(forcing.swimmers)).toBeCloseTo(10, 6);
    }
  });

  it('runs the pump from wall time to wall time, an hour less or more on the night of the change', () => {
    // Six hours on each of the seven nights, of which one loses or gains an hour; the week holds them all.
    const sevenNights = 7 * 6 + (hours - 24);
    expect(sum(forcing.pump)).toBeCloseTo(sevenNights, 9);
  });

  it('lets people swim and the sun shine at the right hours of the wall', () => {
    const at = (step: number) => wallClock(takenAt + (step + 0.5) * 3_600_000, timeZone).hourOfDay;
    forcing.swimmers.forEach((swimmers, step) => {
      const hour = at(step);
      if (hour > 10.5 && hour < 19.5 && dayOf(takenAt + step * 3_600_000, timeZone) > dayOf(takenAt, timeZone))
        expect(swimmers > 0).toBe(step < stepsOf(forcing, addDays(dayOf(takenAt, timeZone), 7), timeZone)[0]);
      if (hour < 9.5 || hour > 20.5) expect(swimmers).toBe(0);
      // An opaque cover lies outside the swim hours: the sun reaches the water only in them.
      if (hour < 9 || hour > 21) expect(forcing.sun[step]).toBe(0);
    });
    const brightest = forcing.sun.indexOf(Math.max(...forcing.sun));
    const solarNoon = 12 - pool.longitude / 15 + offsetOf(takenAt + brightest * 3_600_000, timeZone);
    expect(Math.abs(at(brightest) - solarNoon)).toBeLessThan(1);
  });
});

function offsetOf(instant: number, timeZone: string): number {
  const iso = toOffsetIso(instant, timeZone);
  return Number(iso.slice(-6, -3));
}

describe('a week of seven days that begins at the last minute before clocks go forward', () => {
  it('reaches into a ninth calendar day and keeps to its inputs', () => {
    const takenAt = Date.parse('2026-03-02T23:30:00-05:00');
    const waterTemperature = [20, 21, 22, 23, 24, 25, 26, 27];
    const pool = aPool();
    const forcing = prepareForcing(pool, takenAt, aWeek({ waterTemperature, rain: [0, 0, 0, 0, 0, 0, 0, 9] }), 20);
    expect(dayOf(takenAt + 168 * 3_600_000, pool.timeZone)).toBe('2026-03-10');
    expect(forcing.temperature.at(-1)).toBeCloseTo(27, 9);
    expect(sum(forcing.rain)).toBeCloseTo(0.009, 9);
  });
});
