import { randomUUID } from 'node:crypto';
import type { Database } from '@/db/client';
import { insertPlan, type NewPlan, type NewPlanDose } from '@/db/queries/plans';
import { insertReading } from '@/db/queries/readings';
import { inWriteTransaction } from '@/db/write';
import type { NewReading } from '@/lib/schemas/reading';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export const sunday = new Date('2026-07-05T23:00:00Z');
const later = (hours: number) => new Date(sunday.getTime() + hours * 3_600_000);

export const aReading = (takenAt = sunday): NewReading => ({
  id: randomUUID(),
  takenAt: takenAt.toISOString(),
  kind: 'full',
  method: 'drop-kit',
  values: { freeChlorine: 3, pH: 7.5 },
  look: 'clear',
});

export const aDose = (overrides: Partial<NewPlanDose> = {}): NewPlanDose => ({
  id: randomUUID(),
  day: '2026-07-06',
  wallTime: '19:15',
  at: later(24.25),
  productId: 'gran',
  productName: null,
  toBuy: false,
  substance: 'calcium-hypochlorite',
  form: 'granular',
  amount: 250,
  unit: 'g',
  rise: 2,
  reason: 'lowest-level',
  effect: null,
  ...overrides,
});

const snapshot: Scenario = scenarioSchema.parse({
  pool: { volume: 75.7, latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
  reading: { takenAt: sunday.toISOString(), freeChlorine: 3, pH: 7.5 },
});

/** A plan as the planner might have left it; its result is not what these tests are about. */
export const aPlan = (readingId: string, overrides: Partial<NewPlan> = {}): NewPlan => ({
  id: randomUUID(),
  engineVersion: 'test',
  inputHash: randomUUID(),
  readingId,
  takenAt: sunday,
  endsAt: later(168),
  createdAt: sunday,
  snapshot,
  result: {
    engineVersion: 'test',
    takenAt: sunday.toISOString(),
    hours: [],
    projection: null,
    doses: [],
    checks: [],
    endOfWeek: null,
    cost: null,
    mix: null,
    alternatives: [],
    openSwimShare: null,
    broken: [],
    reasons: [],
    cautions: [],
    needs: [],
  },
  ...overrides,
});

/** A stored reading and the plan made of it. */
export async function storePlan(
  db: Database,
  householdId: ProvenHouseholdId,
  doses: readonly NewPlanDose[] = [aDose()],
): Promise<{ plan: NewPlan; version: number; doses: readonly NewPlanDose[]; reading: NewReading }> {
  const reading = aReading();
  const plan = aPlan(reading.id);
  const version = await inWriteTransaction(db, async (tx) => {
    await insertReading(tx, { householdId, reading, doneBy: null, recordedBy: null, now: sunday });
    return insertPlan(tx, { householdId, plan, doses });
  });
  return { plan, version, doses, reading };
}
