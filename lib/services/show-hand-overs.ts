import 'server-only';
import { listHandOversAhead } from '@/lib/auth/hand-over-in-force';
import { safetyCardCounts } from '@/lib/auth/household-access';
import { assertMay } from '@/lib/auth/permissions';
import { dayOf } from '@/lib/calendar/household-day';
import type { HandOvers } from '@/lib/schemas/hand-over';
import type { ServiceContext } from './context';
import { onDuty, usuallyOnDuty } from './on-duty';

/** Who looks after the pool now, and the hand-overs in force and to come. */
export async function showHandOvers({ db, access, now }: ServiceContext): Promise<HandOvers> {
  assertMay(access, 'look');
  const { householdId, timeZone, membershipId: yours } = access;
  const ahead = await listHandOversAhead(db, { householdId, timeZone, now });
  return {
    today: dayOf(now.getTime(), timeZone),
    onDuty: await onDuty(db, access, now),
    usually: await usuallyOnDuty(db, access, now),
    handOvers: ahead.map(({ id, membershipId, name, role, safetyCardReadAt, agreedAt, ...handOver }) => ({
      ...{ id, memberId: membershipId, name, role },
      ...{ fromDay: handOver.fromDay, untilDay: handOver.untilDay, chemicalsAllowed: handOver.chemicalsAllowed },
      you: membershipId === yours,
      cardRead: safetyCardCounts(safetyCardReadAt, now),
      agreedAt: agreedAt?.toISOString() ?? null,
      inForce: handOver.inForce,
    })),
  };
}
