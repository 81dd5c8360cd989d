import type { Source } from './limits';

/** A number that a care text says to people, without any sum being worked out from it. */
type Said = { value: number; unit: 'minutes' | 'hours' | 'days' | 'litres' | 'g'; source: Source };

const practice = (text: string): Source => ({ kind: 'practice', text });

/** What the cards, cautions and steps say in numbers about people, covers, buckets and thunder. */
export const handling = {
  /** Eyes and skin under running tap water, at least. */
  rinse: {
    value: 15,
    unit: 'minutes',
    source: {
      kind: 'code',
      text: 'first-aid texts of the poison centres of New Zealand, New South Wales, Queensland and Arizona; the label may ask for more',
    },
  },
  /** Nobody in or near the water for so long after the last thunder. */
  thunder: {
    value: 30,
    unit: 'minutes',
    source: { kind: 'code', text: 'US National Lightning Safety Institute, section 4.7, pools' },
  },
  /** Nobody swims for so long after diarrhoea. */
  diarrhoea: {
    value: 14,
    unit: 'days',
    source: { kind: 'code', text: 'NSW Health, Healthy swimming pools, 2022: not within two weeks of it' },
  },
  /** A pool lies open for so long after a long cover before anybody goes in. */
  airing: {
    value: 30,
    unit: 'minutes',
    source: practice('what gathered under the cover leaves; no public source found'),
  },
  /** The cover stays off for so long after a small dose. */
  openAfterDose: { value: 2, unit: 'hours', source: practice('the dose spreads and airs; no public source found') },
  /** Nobody looks after a pool for so long at most. */
  longestAlone: { value: 7, unit: 'days', source: practice('as long as one plan reaches') },
  /** While green or cloudy water is cleared the pump runs so many hours of a day. */
  pumpWhileClearing: {
    value: 24,
    unit: 'hours',
    source: practice('day and night, so that all of the water passes the filter'),
  },
  /** A tick may be taken back for so long. */
  undo: { value: 10, unit: 'minutes', source: practice('long enough for a slip of the finger') },
  /** No sample is taken so soon after a dose. */
  sampleAfterDose: { value: 4, unit: 'hours', source: practice('as long as the pump is kept running to spread it') },
  /** Water in the bucket for granules, and how much of them for each such bucket. */
  bucketWater: {
    value: 15,
    unit: 'litres',
    source: {
      kind: 'code',
      text: 'US Army TB MED 575, 6-28: by hand a solution of 1 to 5 %; 300 g of granules in 15 L are 2 %',
    },
  },
  granulesInBucket: {
    value: 300,
    unit: 'g',
    source: {
      kind: 'code',
      text: 'US Army TB MED 575, 6-28: by hand a solution of 1 to 5 %; 300 g of granules in 15 L are 2 %',
    },
  },
  /** Calcium chloride heats the bucket: so much of it in the same water. */
  calciumInBucket: {
    value: 1000,
    unit: 'g',
    source: practice('it heats the water: so much and no more in one bucket'),
  },
} as const satisfies Record<string, Said>;
