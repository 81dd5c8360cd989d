import 'server-only';
import { listValidMemberships } from '@/db/queries/memberships';
import type { DatabaseOrTransaction } from '@/db/client';
import { AppError } from '@/lib/errors';
import { type Language, localeIn } from '@/lib/schemas/languages';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { Role } from '@/lib/schemas/week-sheet';
import type { UnitSystem } from '@/lib/units/unit';

/** Who is asking, about which household, and what they may do there; proven at this request. */
export type HouseholdAccess = {
  householdId: ProvenHouseholdId;
  householdName: string;
  personId: string;
  personName: string;
  membershipId: string;
  role: Role;
  /** An owner says that this is an adult who may handle chemicals. */
  chemicalsAllowed: boolean;
  /** Marked as one who handles chemicals, with the safety card read within the season. */
  handlesChemicals: boolean;
  timeZone: string;
  unitSystem: UnitSystem;
  /** The person's, for the screen. */
  language: Language;
  /** How days and numbers are written: in the person's language, as where the household is at home. */
  locale: string;
  demo: boolean;
  /** Whether the person has yet to close the notes on the first sheet. */
  tourOpen: boolean;
  /** Whether the first run is finished. */
  poolCompleted: boolean;
};

/** A season comes once a year: so long a reading of the safety card counts. */
const safetyCardCountsFor = 365 * 24 * 3_600_000;

/** Whether somebody has read the safety card this season. */
export function safetyCardCounts(readAt: Date | null, now: Date): boolean {
  return readAt !== null && now.getTime() - readAt.getTime() < safetyCardCountsFor;
}

/**
 * Proves that a signed-in person belongs to a household now: the one asked for; the one joined first when none was. Checked
 * at every request, because a membership can end between two of them; nothing meant for one household ever lands in
 * another.
 */
export async function proveHousehold(
  db: DatabaseOrTransaction,
  { personId, householdId, now }: { personId: string; householdId: string | null; now: Date },
): Promise<HouseholdAccess> {
  const memberships = await listValidMemberships(db, personId, now);
  const membership = memberships.find(({ household }) => householdId === null || household.id === householdId);
  if (!membership)
    throw new AppError('not-allowed', 'You do not belong to a household, or your time there is over. Ask its owner.');
  const { household, safetyCardReadAt } = membership;
  return {
    householdId: household.id as ProvenHouseholdId,
    householdName: household.name,
    personId,
    personName: membership.personName,
    membershipId: membership.membershipId,
    role: membership.role,
    chemicalsAllowed: membership.chemicalsAllowed,
    handlesChemicals: membership.handlesChemicals && safetyCardCounts(safetyCardReadAt, now),
    timeZone: household.timeZone,
    unitSystem: household.unitSystem,
    language: membership.language,
    locale: localeIn(membership.language, household.locale),
    demo: household.demo,
    tourOpen: membership.tourClosedAt === null && !household.demo,
    poolCompleted: membership.poolCompletedAt !== null,
  };
}
