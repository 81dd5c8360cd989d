import type { Source } from './limits';

/** Gauge pressure over that of the clean filter at which it wants cleaning [bar]: from, and at the latest. */
export const filterPressureRise = {
  from: 0.35,
  latest: 0.7,
  source: {
    kind: 'code',
    text: 'US EPA, WaterSense at Work (2012): 5 to 10 psi over the clean filter; the filter’s own paper comes first',
  } satisfies Source,
} as const;
