import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/client';
import { copyHouseholdRecord, listDemoPeople } from '@/db/queries/demo-households';
import { countDemoCopies, deleteExpiredDemoCopies, insertHousehold } from '@/db/queries/households';
import { insertMembership, listValidMemberships } from '@/db/queries/memberships';
import { insertPerson } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { countTry } from '@/lib/auth/rate-limit';
import { householdOfSystem, systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered } from '@/lib/schemas/account';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';
import { demoHousehold, demoPeople } from './demo-household';
import { seedDemo } from './seed-demo';

const mostCopies = 200;
const copyLastsFor = 24 * 3_600_000;

/**
 * Opens a private copy of the demo household on this device, without an account: writable, gone after 24 hours. Whoever
 * looks round already keeps their copy. Error: `too-many-requests` while 200 of them are in use, and for an address that
 * opened many.
 */
export async function lookRound(visit: Visit): Promise<Entered> {
  const next = '/week';
  if (await looksRoundAlready(visit)) return { next };
  await countTry(visit, 'look-round-address', visit.address);
  const { db, now } = visit;
  const original = await seedDemo(db, now);
  const scope = systemScope('seed-demo');
  const copy = await inWriteTransaction(db, async (tx) => {
    await deleteExpiredDemoCopies(tx, scope, now);
    if ((await countDemoCopies(tx, scope, now)) >= mostCopies)
      throw new AppError(
        'too-many-requests',
        'Many people are looking round just now. Try again in an hour, or sign up.',
      );
    return makeCopy(tx, scope, original, visit);
  });
  await visit.enter(copy.personId, copy.householdId);
  return { next };
}

async function looksRoundAlready({ db, signedIn, now }: Visit): Promise<boolean> {
  if (!signedIn) return false;
  const memberships = await listValidMemberships(db, signedIn.personId, now);
  return memberships.some(({ household }) => household.demo && household.id === signedIn.householdId);
}

type Looking = Pick<Visit, 'now' | 'language'>;

async function makeCopy(tx: Transaction, scope: SystemScope, original: ProvenHouseholdId, { now, language }: Looking) {
  const householdId = householdOfSystem(scope, randomUUID());
  const personId = randomUUID();
  const idOf = (id: string) => derivedId(householdId, id);
  const expiresAt = new Date(now.getTime() + copyLastsFor);
  await insertHousehold(tx, scope, { ...demoHousehold, id: householdId, demo: true, expiresAt, createdAt: now });

  const residents = await listDemoPeople(tx, scope, original);
  const people = [
    ...residents.map(({ id, name, role }) => ({ id: idOf(id), name, role })),
    { id: personId, name: demoPeople.visitor, role: 'owner' as const },
  ];
  for (const { id, name, role } of people) {
    await insertPerson(tx, scope, { id, name, language, createdAt: now });
    await insertMembership(tx, scope, {
      ...{ id: randomUUID(), householdId, personId: id, role, validFrom: now },
      ...{ handlesChemicals: true, safetyCardReadAt: now },
    });
  }
  await copyHouseholdRecord(tx, scope, { from: original, to: householdId, idOf });
  return { householdId, personId };
}

/** A UUID that is always the same for one thing in one copy: version 8 of RFC 9562, from a digest. */
function derivedId(copy: string, id: string): string {
  const hex = createHash('sha256').update(`${copy} ${id}`).digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}
