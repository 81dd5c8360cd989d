import { poolSchema } from '@/lib/schemas/pool';

export const places = [
  { latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
  { latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid' },
  { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' },
];
export const feeder = { kind: 'inline', ingredient: 'trichlor', capacity: 8 };
export const errors = { freeChlorine: 0.3, pH: 0.1, totalAlkalinity: 10, calciumHardness: 10, cyanuricAcid: 8 };
const FIRST_EVENING = Date.UTC(2026, 3, 1, 23);
const DAY = 86_400_000;

/** Sixty pools, each in a week of its own: nothing remembered from one helps with the next. */
function weeks(stabilizer: (index: number) => number) {
  return Array.from({ length: 60 }, (_, index) => ({
    pool: poolSchema.parse({ ...places[index % 3], volume: 40 + index, meanDepth: 1.2 + index / 100, feeder }),
    start: {
      takenAt: new Date(FIRST_EVENING + 3 * index * DAY).toISOString(),
      water: {
        freeChlorine: 3,
        pH: 7.5,
        totalAlkalinity: 80,
        calciumHardness: 220,
        cyanuricAcid: stabilizer(index),
        temperature: 24 + (index % 8),
      },
    },
    doses: [
      {
        at: new Date(FIRST_EVENING + (3 * index + 2) * DAY).toISOString(),
        substance: 'calcium-hypochlorite' as const,
        amount: 200,
        strength: 65,
      },
    ],
  }));
}
export const stabilized = weeks((index) => 30 + index);
export const unstabilized = weeks(() => 0);
