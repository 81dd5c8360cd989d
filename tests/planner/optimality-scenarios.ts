import type { Scenario } from '@/lib/schemas/scenario';
import { products, scenarioOf } from './scenarios';

/** Between two ends, by the binary van der Corput sequence shifted for each quantity: spread evenly, always the same. */
function spread(index: number, shift: number, low: number, high: number): number {
  let part = 0;
  for (let rest = index + 1, digit = 0.5; rest > 0; rest >>= 1, digit /= 2) part += (rest & 1) * digit;
  return low + ((part + shift * 0.6180339887) % 1) * (high - low);
}

const places = [
  { place: { latitude: 28, longitude: -81.5, timeZone: 'America/New_York' }, takenAt: '2026-07-05T19:00:00-04:00' },
  { place: { latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid' }, takenAt: '2026-06-12T18:00:00+02:00' },
  { place: { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' }, takenAt: '2026-01-20T18:30:00+11:00' },
];

type Choices = { visits: number; measuresInACap?: number; now?: number };

/**
 * Pools in summer, each different, whose water needs nothing beside chlorine: as evenly spread as can be over volume,
 * stabilizer, chlorine, temperature, sky, swimmers and preferences.
 *
 * @param measuresInACap whole measures of granules that one evening may take; 50 g each where left out
 * @param now            hours after the reading before which nothing is planned
 */
export function summerPool(index: number, { visits, measuresInACap, now }: Choices): Scenario {
  const { place, takenAt } = places[index % places.length]!;
  const volume = spread(index, 1, 25, 115);
  const sky = spread(index, 2, 0.55, 1);
  const measure = measuresInACap === undefined ? 50 : (0.999 * (4 / measuresInACap) * volume) / 0.65;
  return scenarioOf({
    pool: {
      ...place,
      volume,
      feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 6 },
      swimLimit: index % 4 === 3 ? 5 : 4,
    },
    reading: {
      takenAt,
      freeChlorine: spread(index, 3, 1.5, 4),
      pH: spread(index, 4, 7.4, 7.6),
      totalAlkalinity: 100,
      calciumHardness: 250,
      cyanuricAcid: spread(index, 5, 25, 58),
      temperature: spread(index, 6, 24, 30),
    },
    shelf: [products.tabs, { ...products.gran, measure }],
    week: {
      sky: Array.from({ length: 7 }, (_, day) => Math.max(0.3, sky - 0.1 * ((day + index) % 3))),
      rain: [0, 0, 0, 0, 0, 0, 0],
      swimmerHours: Array.from({ length: 7 }, (_, day) => ((day + index) % 5 === 0 ? spread(index, 7, 0, 12) : 0)),
    },
    preferences: {
      visits,
      money: 0.5 + (index % 3) / 2,
      evenings: 0.5 + (index % 2),
      steadiness: 0.5 + (index % 4) / 2,
    },
    ...(now === undefined ? {} : { now: new Date(Date.parse(takenAt) + now * 3_600_000).toISOString() }),
  });
}
