import { randomUUID } from 'node:crypto';
import { copyFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { inject } from 'vitest';
import { type Database, openDatabase } from '@/db/client';
import { insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { insertPerson } from '@/db/queries/people';
import { type HouseholdAccess, proveHousehold } from '@/lib/auth/household-access';
import { systemScope } from '@/lib/auth/system-scope';
import type { Role } from '@/lib/schemas/week-sheet';

/** The name of a file that no other test uses; it goes with the run's folder. */
export function freshFile(): string {
  return join(dirname(inject('baseDatabase')), `${randomUUID()}-test.db`);
}

/** A private copy of the migrated file: the real engine, the real migrations, nobody else's rows. */
export function freshDatabase(): Database & { url: string } {
  const file = freshFile();
  copyFileSync(inject('baseDatabase'), file);
  const url = `file:${file}`;
  return Object.assign(openDatabase(url), { url });
}

/** A household of its own with one member, and that member's proven access to it. */
export async function aHousehold(
  db: Database,
  {
    role = 'owner',
    handlesChemicals = role !== 'viewer',
    timeZone = 'America/New_York',
    now = new Date('2026-07-05T12:00:00Z'),
  }: { role?: Role; handlesChemicals?: boolean; timeZone?: string; now?: Date } = {},
): Promise<HouseholdAccess> {
  const scope = systemScope('sign-up');
  const householdId = randomUUID();
  await insertHousehold(db, scope, {
    id: householdId,
    name: 'The Larches',
    timeZone,
    unitSystem: 'metric',
    locale: 'en',
    createdAt: now,
  });
  return aMember(db, { householdId, role, handlesChemicals, now });
}

/** One more member of a household. */
export async function aMember(
  db: Database,
  {
    householdId,
    role,
    handlesChemicals = role !== 'viewer',
    now,
  }: { householdId: string; role: Role; handlesChemicals?: boolean; now: Date },
): Promise<HouseholdAccess> {
  const scope = systemScope('sign-up');
  const personId = randomUUID();
  const email = `${personId}@pool.example`;
  await insertPerson(db, scope, { id: personId, name: 'Ines', email, passwordHash: 'unusable', createdAt: now });
  await insertMembership(db, scope, {
    id: randomUUID(),
    householdId,
    personId,
    role,
    handlesChemicals,
    safetyCardReadAt: handlesChemicals ? now : null,
    validFrom: now,
  });
  return proveHousehold(db, { personId, householdId, now });
}
