import 'server-only';
import { listMembers } from '@/db/queries/memberships';
import { findHandOverInForce } from '@/lib/auth/hand-over-in-force';
import { type HouseholdAccess, safetyCardCounts } from '@/lib/auth/household-access';
import type { DutyMember } from '@/lib/schemas/hand-over';
import type { ServiceContext } from './context';

type Household = Pick<HouseholdAccess, 'householdId' | 'timeZone'>;

/** Who is reminded at an instant: whoever stands in, alone; else those who look after the pool usually. */
export async function onDuty(db: ServiceContext['db'], household: Household, now: Date): Promise<DutyMember[]> {
  const { householdId, timeZone } = household;
  const handOver = await findHandOverInForce(db, { householdId, timeZone, now });
  if (!handOver) return usuallyOnDuty(db, household, now);
  const { membershipId, name, role } = handOver;
  return [{ memberId: membershipId, name, role }];
}

/**
 * Who looks after the pool while nobody stands in: every owner, and caretakers who handle chemicals. An owner without
 * chemicals is among them, so that there is always somebody to remind.
 */
export async function usuallyOnDuty(
  db: ServiceContext['db'],
  { householdId }: Household,
  now: Date,
): Promise<DutyMember[]> {
  const members = await listMembers(db, householdId, now);
  const owners = members.filter(({ role }) => role === 'owner');
  const caretakers = members.filter(
    ({ role, handlesChemicals, safetyCardReadAt }) =>
      role === 'caretaker' && handlesChemicals && safetyCardCounts(safetyCardReadAt, now),
  );
  return [...owners, ...caretakers].map(({ id, name, role }) => ({ memberId: id, name, role }));
}
