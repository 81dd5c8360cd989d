/** What a ten-minute round looks at, in the order of a walk round the pool. */
export const roundItems = [
  'baskets',
  'water-level',
  'filter-pressure',
  'brushed',
  'pump-seal',
  'feeder-lid',
  'drain-cover',
  'gate-latch',
  'ladder',
  'lockers',
] as const;
export type RoundItem = (typeof roundItems)[number];

/** What a gauge on a filter can show [bar]. */
export const GAUGE = [0, 6] as const;
