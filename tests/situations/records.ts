import { poolSchema } from '@/lib/schemas/pool';
import type { Situation } from '@/lib/schemas/situation';
import type { SituationRecord, Taken } from '@/lib/situations';

export const HOUR = 3_600_000;
export const DAY = 24 * HOUR;
/** Sunday, 09:00 in Chicago. */
export const openedAt = Date.parse('2026-07-05T09:00:00-05:00');

export const pool = poolSchema.parse({
  volume: 60,
  meanDepth: 1.5,
  latitude: 45.2,
  longitude: -93.3,
  timeZone: 'America/Chicago',
  fillWater: { calciumHardness: 60 },
});

export const aReading = (hours: number, values: Taken['values'], look: Taken['look'] = 'clear'): Taken => ({
  takenAt: openedAt + hours * HOUR,
  kind: 'full',
  look,
  values,
});

/** Water in range, with stabilizer. */
export const fine: Taken['values'] = { freeChlorine: 3, pH: 7.5 };
export const full: Taken['values'] = {
  ...fine,
  combinedChlorine: 0.1,
  totalAlkalinity: 90,
  calciumHardness: 250,
  cyanuricAcid: 40,
  temperature: 27,
};

export function aRecord(situation: Situation, changes: Partial<SituationRecord> = {}): SituationRecord {
  return {
    situation,
    openedAt,
    pool,
    readings: [aReading(-2, full)],
    given: [],
    ticks: new Map(),
    mornings: [],
    stabilizedProductUsed: false,
    ...changes,
  };
}

export const ticked = (...steps: string[]) => new Map(steps.map((step) => [step, openedAt + HOUR]));
