import 'server-only';
import { listValidMemberships } from '@/db/queries/memberships';
import type { DatabaseOrTransaction } from '@/db/client';
import { AppError } from '@/lib/errors';
import { type Language, localeIn } from '@/lib/schemas/languages';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { Role } from '@/lib/schemas/week-sheet';
import type { UnitSystem } from '@/lib/units/unit';
import { findHandOverInForce } from './hand-over-in-force';

/** Who is asking, about which household, and what they may do there; proven at this request. */
export type HouseholdAccess = {
  householdId: ProvenHouseholdId;
  householdName: string;
  personId: string;
  personName: string;
  membershipId: string;
  /** Of the membership; for the days of a hand-over, whoever only looks is a caretaker. */
  role: Role;
  /** An owner says that this is an adult who may handle chemicals. */
  chemicalsAllowed: boolean;
  /** Marked as one who handles chemicals, or handed that over for these days, with the safety card read within the season. */
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
  const { household } = membership;
  const proven = household.id as ProvenHouseholdId;
  const { timeZone } = household;
  const handOver = await findHandOverInForce(db, { householdId: proven, timeZone, now });
  return {
    householdId: proven,
    householdName: household.name,
    personId,
    personName: membership.personName,
    membershipId: membership.membershipId,
    ...standingOf(membership, handOver?.membershipId === membership.membershipId ? handOver : undefined, now),
    timeZone,
    unitSystem: household.unitSystem,
    language: membership.language,
    locale: localeIn(membership.language, household.locale),
    demo: household.demo,
    tourOpen: membership.tourClosedAt === null && !household.demo,
    poolCompleted: membership.poolCompletedAt !== null,
  };
}

type Membership = Awaited<ReturnType<typeof listValidMemberships>>[number];

/**
 * What a member is at this instant: what the membership says, and beside it what the hand-over in force to them says. Nothing
 * of a hand-over is written into the membership, so it ends by itself, on the minute.
 */
function standingOf(
  { role, chemicalsAllowed, handlesChemicals, safetyCardReadAt }: Membership,
  handOver: { chemicalsAllowed: boolean } | undefined,
  now: Date,
): Pick<HouseholdAccess, 'role' | 'chemicalsAllowed' | 'handlesChemicals'> {
  const cardCounts = safetyCardCounts(safetyCardReadAt, now);
  if (!handOver) return { role, chemicalsAllowed, handlesChemicals: handlesChemicals && cardCounts };
  return {
    role: role === 'viewer' ? 'caretaker' : role,
    chemicalsAllowed: (chemicalsAllowed && role !== 'viewer') || handOver.chemicalsAllowed,
    handlesChemicals: (handlesChemicals || handOver.chemicalsAllowed) && cardCounts,
  };
}
