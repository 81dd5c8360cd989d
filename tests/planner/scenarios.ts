import type { WeekPlan } from '@/lib/schemas/plan';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';

const tabs = {
  ...{ id: 'tabs', form: 'tablet', substance: 'trichlor', strength: 90, tabletMass: 227 },
  ...{ pricePerKg: 9, stock: 5000 },
};
const gran = {
  ...{ id: 'gran', form: 'granular', substance: 'calcium-hypochlorite', strength: 65, labelWay: 'dissolve' },
  ...{ measure: 50, pricePerKg: 7.5, stock: 4000 },
};
const liq = {
  ...{ id: 'liq', form: 'liquid', substance: 'sodium-hypochlorite', strength: 12.5, boughtOn: '2026-06-20' },
  ...{ storedAt: 28, measure: 250, pricePerLitre: 1.6, stock: 20000 },
};
export const products = { tabs, gran, liq };

export type Changes = {
  pool?: Record<string, unknown>;
  reading?: Record<string, unknown> | Record<string, unknown>[];
  shelf?: Record<string, unknown>[];
  week?: Record<string, unknown>;
  preferences?: Record<string, unknown>;
  now?: string;
  given?: Record<string, unknown>[];
  doses?: Record<string, unknown>[];
  driftPrices?: Record<string, unknown>;
};

export const fullTest = {
  takenAt: '2026-07-05T19:00:00-04:00',
  freeChlorine: 3,
  combinedChlorine: 0.2,
  pH: 7.5,
  totalAlkalinity: 80,
  calciumHardness: 220,
  cyanuricAcid: 50,
  temperature: 29,
};

/** The scenario of the engine's design, in Florida in July, with changes to some of its fields. */
export function scenarioOf({ pool, reading, shelf, week, preferences, ...rest }: Changes = {}): Scenario {
  return scenarioSchema.parse({
    pool: {
      ...{ volume: 75.7, latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
      feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8 },
      ...pool,
    },
    reading: Array.isArray(reading) ? reading : { ...fullTest, ...reading },
    shelf: shelf ?? [tabs, gran, liq],
    week: { rain: [0, 0, 12, 0, 0, 0, 0], swimmerHours: [0, 0, 0, 0, 0, 0, 8], ...week },
    preferences: preferences ?? {},
    ...rest,
  });
}

export function tabletsIn({ doses }: Pick<WeekPlan, 'doses'>): number {
  return doses.filter(({ form }) => form === 'tablet').reduce((sum, { amount }) => sum + amount, 0);
}

export function codesIn(facts: readonly { code: string }[]): string[] {
  return facts.map(({ code }) => code);
}
