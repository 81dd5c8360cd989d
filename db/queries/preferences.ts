import 'server-only';
import { eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { preferences } from '@/db/schema';
import { type Preferences, preferencesSchema } from '@/lib/schemas/preferences';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** The household's weights; the usual ones while it chose none. */
export async function findPreferences(db: DatabaseOrTransaction, householdId: ProvenHouseholdId): Promise<Preferences> {
  const [row] = await db.select().from(preferences).where(eq(preferences.householdId, householdId));
  if (!row) return preferencesSchema.parse({});
  const { visits, money, evenings, steadiness, avoid } = row;
  return { visits, money, evenings, steadiness, avoid };
}

export async function savePreferences(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  values: Preferences,
): Promise<void> {
  await db
    .insert(preferences)
    .values({ ...values, householdId })
    .onConflictDoUpdate({ target: preferences.householdId, set: values });
}
