import type { SampleWater } from '@/lib/schemas/sample-water';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import { daylightOf } from '@/lib/sun/daylight';
import { solarElevations } from '@/lib/sun/elevation';
import { skyOfSunshine } from '@/lib/sun/sunshine';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';

const latitude = 40;
const longitude = -74;
/** The test of Sunday evening, the midnight after it, and noon of the Wednesday, whose sun stands for the week's. */
const takenAt = '2026-07-05T19:00:00-04:00';
export const sampleMonday = '2026-07-06T00:00:00-04:00';
const midWeek = Date.parse('2026-07-08T12:00:00-04:00');
const HOUR = 3_600_000;

/** What is the same in every sample: free chlorine at the test and the swim limit [mg/L], and when people swim [h]. */
export const samplePool = { freeChlorine: 3.8, swimLimit: 4, swims: { from: 10, to: 19 } } as const;

/** Sunrise and sunset [h of the day], and the day's length [h]. */
export const sampleDaylight = daylight();

/**
 * The week of an invented pool, to try the planner on: at 40 degrees north in early July, measured on Sunday evening with a drop
 * kit and planned from Monday on, with the three forms of chlorine on the shelf, each in plenty. Only its size, its sunshine
 * and its stabilizer are asked.
 */
export function sampleScenario({ volume, sunshine, stabilizer }: SampleWater): Scenario {
  const { freeChlorine, swimLimit, swims } = samplePool;
  return scenarioSchema.parse({
    pool: {
      volume,
      meanDepth: 1.5,
      surface: 'vinyl',
      latitude,
      longitude,
      timeZone: 'America/New_York',
      fillWater: { calciumHardness: 60, totalAlkalinity: 80, pH: 7.6 },
      pump: [{ from: '08:00', to: '16:00' }],
      feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 },
      swimHours: { from: `${swims.from}:00`, to: `${swims.to}:00` },
      stabilizerBand: [30, 60],
      swimLimit,
    },
    reading: {
      takenAt,
      method: 'drop-kit',
      freeChlorine,
      combinedChlorine: 0.2,
      pH: 7.5,
      totalAlkalinity: 80,
      calciumHardness: 220,
      cyanuricAcid: stabilizer,
      temperature: 27,
    },
    shelf: [
      {
        ...{ id: 'tablets', form: 'tablet', substance: 'trichlor', strength: 90 },
        ...{ tabletMass: 227, pricePerKg: 9, stock: 20_000 },
      },
      {
        ...{ id: 'granules', form: 'granular', substance: 'calcium-hypochlorite', strength: 65, labelWay: 'dissolve' },
        ...{ measure: 10, pricePerKg: 7.5, stock: 20_000 },
      },
      {
        ...{ id: 'liquid', form: 'liquid', substance: 'sodium-hypochlorite', strength: 12.5, boughtOn: '2026-06-28' },
        ...{ storedAt: 24, measure: 100, pricePerLitre: 1.6, stock: 100_000 },
      },
    ],
    week: {
      sky: Array<number>(8).fill(skyOfSunshine(sunshine, sampleDaylight.length)),
      swimmerHours: [0, 0, 0, 0, 0, 0, 8, 4],
    },
    preferences: { visits: 4 },
    now: sampleMonday,
  });
}

/** Share of the reference sun in the middle of each hour of the sample's day, under its sky. */
export function sampleSun(sunshine: number): number[] {
  const hours = Array.from({ length: 24 }, (_, hour) => midWeek + (hour - 11.5) * HOUR);
  const sky = skyOfSunshine(sunshine, sampleDaylight.length);
  return solarElevations(hours, latitude, longitude).map((elevation) => sky * ultravioletWeight(elevation));
}

function daylight() {
  const { sunrise, sunset } = daylightOf(midWeek, latitude, longitude);
  if (sunrise === null || sunset === null) throw new Error('no sunrise at 40 degrees north');
  const hourOf = (instant: number) => 12 + (instant - midWeek) / HOUR;
  return { rises: hourOf(sunrise), sets: hourOf(sunset), length: (sunset - sunrise) / HOUR };
}
