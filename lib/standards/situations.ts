import type { Source } from './limits';

const practice = (text: string): Source => ({ kind: 'practice', text });

/**
 * Formed stool or vomit in water without stabilizer: so much free chlorine for so long, in water not colder and of a pH not
 * higher than this, with the filter running [mg/L, minutes, pH, degrees C].
 */
export const accidentTime = {
  freeChlorine: 2,
  minutes: 30,
  pHAtMost: 7.5,
  temperatureAtLeast: 25,
  source: {
    kind: 'code',
    text: 'US CDC, fecal incident response: 2 mg/L for 30 minutes at pH 7.5 or less and 25 degrees C or more, without stabilizer',
  } satisfies Source,
} as const;

/** What clearing green or cloudy water goes by [mg/L, pH, evenings, hours]. */
export const clearingRules = {
  /** Raised to at most. */
  freeChlorine: 10,
  /** Stabilizer over this: some water is replaced first. */
  stabilizer: 60,
  /** pH over this is brought down first. */
  pH: 7.4,
  evenings: 4,
  /** Mornings in a row inside the ordinary band. */
  mornings: 2,
  /** Tests in range this far apart before anybody swims. */
  hoursBetweenTests: 12,
  /** Cloudy right after granules, soda or calcium: the pump runs so long and nothing is added. */
  waitHours: 24,
  source: practice('raised to what codes allow at most, and read the morning after'),
} as const;

/** Used-up chlorine: raised by so much on at most so many evenings [mg/L, evenings]. */
export const combinedRules = {
  rise: 5,
  evenings: 3,
  source: practice('in steps, with a test after each; sun and an open cover do the rest'),
} as const;

/** A test older than this is no ground for a treatment [h]. */
export const freshTest = { value: 24, source: practice('a day') } as const;

/** Most of the depth that is replaced before the next test [1]. */
export const replacedAtMost = { value: 1 / 3, source: practice('the builder knows the ground water') } as const;
