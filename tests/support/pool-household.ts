import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { type Database, openDatabase } from '@/db/client';
import { type PoolChanges, updatePool } from '@/db/queries/pools';
import { saveShelfProduct, type ShelfProductValues } from '@/db/queries/shelf-products';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { NewReading } from '@/lib/schemas/reading';
import type { ServiceContext } from '@/lib/services/context';
import { aHousehold, freshFile } from './test-database';

/** Sunday evening, midsummer: when the household of these tests tests its water. */
const sundayEvening = new Date('2026-07-05T23:00:00Z');
export const hoursLater = (hours: number, from = sundayEvening) => new Date(from.getTime() + hours * 3_600_000);

/** The pool that the design of the engine shows, as the profile stores it. */
export const designPool: PoolChanges = {
  nextStep: null,
  completedAt: new Date('2026-07-05T12:00:00Z'),
  recordOnly: false,
  system: 'chlorine',
  kind: 'pool',
  volumeSource: 'entered',
  volume: 75.7,
  volumeEstimated: false,
  enteredVolume: 75.7,
  enteredUnit: 'm3',
  meanDepth: 1.5,
  surface: 'plaster',
  latitude: 28,
  longitude: -81.5,
  sunExposure: 1,
  cover: 'none',
  waterFeatures: false,
  pump: [{ from: '08:00', to: '16:00' }],
  feederKind: 'inline',
  feederIngredient: 'trichlor',
  feederCapacity: 8,
  feederLoaded: 0,
  swimLimit: 4,
  swimLimitFromLabel: true,
  swimFrom: '10:00',
  swimTo: '20:00',
};

export const designShelf: ShelfProductValues[] = [
  product({
    id: 'tabs',
    name: 'Slow tablets',
    form: 'tablet',
    substance: 'trichlor',
    strength: 90,
    tabletMass: 227,
    labelWay: 'feeder-only',
    pricePerKg: 9,
    stock: 5000,
  }),
  product({
    ...{ id: 'gran', name: 'Granules', form: 'granular', substance: 'calcium-hypochlorite', strength: 65 },
    ...{ labelWay: 'dissolve', measure: 50, pricePerKg: 7.5, stock: 4000 },
  }),
];

function product(
  values: Pick<ShelfProductValues, 'id' | 'form' | 'substance' | 'stock'> & Partial<ShelfProductValues>,
): ShelfProductValues {
  return { alkali: 0, labelWay: 'unknown', storedAt: 25, ...values };
}

/** A household whose pool and shelf are described, and its owner's context at an hour. */
export async function aPoolHousehold(
  db: Database,
  {
    pool = {},
    shelf = designShelf,
    now = sundayEvening,
  }: { pool?: PoolChanges; shelf?: ShelfProductValues[]; now?: Date } = {},
): Promise<ServiceContext> {
  const access = await aHousehold(db);
  await updatePool(db, access.householdId, { ...designPool, ...pool });
  for (const product of shelf) await saveShelfProduct(db, { householdId: access.householdId, product, now });
  return { db, access, now };
}

export const at = (context: ServiceContext, now: Date, access: HouseholdAccess = context.access): ServiceContext => ({
  ...context,
  access,
  now,
});

/** A full test of good water. */
export function aFullTest(takenAt: Date = sundayEvening, overrides: Partial<NewReading> = {}): NewReading {
  return {
    id: randomUUID(),
    takenAt: takenAt.toISOString(),
    kind: 'full',
    method: 'drop-kit',
    values: {
      ...{ freeChlorine: 3, combinedChlorine: 0.2, pH: 7.5, totalAlkalinity: 80 },
      ...{ calciumHardness: 220, cyanuricAcid: 50, temperature: 29 },
    },
    look: 'clear',
    ...overrides,
  };
}

/** A private copy of a database as it stands, for a test that goes on from there. */
export async function copyOf(db: Database): Promise<Database> {
  const file = freshFile();
  await db.run(sql`VACUUM INTO ${file}`);
  return openDatabase(`file:${file}`);
}
