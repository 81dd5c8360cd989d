import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { hasHandOver, insertHandOver, setHandOverAgreed, setHandOverEnded } from '@/db/queries/hand-overs';
import { keepCardReading, listMembers } from '@/db/queries/memberships';
import { inWriteTransaction } from '@/db/write';
import { type HandOverAhead, listHandOversAhead } from '@/lib/auth/hand-over-in-force';
import { assertMay } from '@/lib/auth/permissions';
import { addDays, dayOf } from '@/lib/calendar/household-day';
import { AppError } from '@/lib/errors';
import { furthestHandOver, type HandOverAgreement, type HandOvers, type NewHandOver } from '@/lib/schemas/hand-over';
import type { ServiceContext } from './context';
import { showHandOvers } from './show-hand-overs';

/**
 * Asks a member to look after the pool for some days. It has no effect until they agree; whoever asks themselves has, and in
 * a demo household nobody else is there to be asked.
 */
export async function handOver(context: ServiceContext, wanted: NewHandOver): Promise<HandOvers> {
  const { db, access, now } = context;
  assertMay(access, 'hand-over');
  assertAhead(wanted, dayOf(now.getTime(), access.timeZone));
  const { householdId, personId } = access;
  const { id, memberId: membershipId, fromDay, untilDay, chemicalsAllowed } = wanted;
  await inWriteTransaction(db, async (tx) => {
    if (await hasHandOver(tx, { householdId, id })) return;
    if (!(await listMembers(tx, householdId, now)).some((member) => member.id === membershipId))
      throw new AppError('not-found', 'This person does not belong to the household, or no longer.');
    const others = await listHandOversAhead(tx, { ...access, now });
    if (others.some((other) => fromDay <= other.untilDay && other.fromDay <= untilDay))
      throw new AppError('conflict', 'These days overlap with another hand-over. Take that one back first.');
    const agreedAt = access.demo || membershipId === access.membershipId ? now : null;
    const days = { fromDay, untilDay, chemicalsAllowed };
    const row = { id, householdId, membershipId, ...days, createdBy: personId, createdAt: now, agreedAt };
    if (!(await insertHandOver(tx, row))) throw new AppError('conflict', 'This was written down in another household.');
    const detail = { handOver: id, ...days };
    await writeAudit(tx, { householdId, personId, at: now, action: 'hand-over', subjectId: membershipId, detail });
  });
  return showHandOvers(context);
}

/**
 * The yes of whoever is asked; said again it stays. With it, or later, goes that they have just read the safety card: without
 * that they handle no chemicals.
 */
export async function agreeToHandOver(
  context: ServiceContext,
  { cardRead }: HandOverAgreement,
  { id }: { id: string },
): Promise<HandOvers> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const { householdId, personId, membershipId } = access;
  await inWriteTransaction(db, async (tx) => {
    const meant = await findAhead(tx, context, id);
    if (meant.membershipId !== membershipId)
      throw new AppError('not-allowed', 'Only whoever is asked to look after the pool can agree to it.');
    if (meant.agreedAt === null) {
      await setHandOverAgreed(tx, { householdId, id, at: now });
      await writeAudit(tx, { householdId, personId, at: now, action: 'agree-hand-over', ...toldOf(meant) });
    }
    if (!cardRead) return;
    if (!meant.chemicalsAllowed)
      throw new AppError('not-allowed', 'An owner has to mark you as an adult who handles chemicals first.');
    await keepCardReading(tx, { householdId, membershipId, at: now });
    await writeAudit(tx, { householdId, personId, at: now, action: 'read-safety-card', subjectId: membershipId });
  });
  return showHandOvers(context);
}

/** Takes a hand-over back, at any hour; or declines it, also after having agreed. It has no effect from that instant on. */
export async function endHandOver(context: ServiceContext, { id }: { id: string }): Promise<HandOvers> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const { householdId, personId, membershipId } = access;
  await inWriteTransaction(db, async (tx) => {
    const meant = await findAhead(tx, context, id);
    const declines = meant.membershipId === membershipId;
    if (!declines) assertMay(access, 'hand-over');
    await setHandOverEnded(tx, { householdId, id, at: now });
    const action = declines ? 'decline-hand-over' : 'take-back-hand-over';
    await writeAudit(tx, { householdId, personId, at: now, action, ...toldOf(meant) });
  });
  return showHandOvers(context);
}

async function findAhead(tx: Transaction, { access, now }: ServiceContext, id: string): Promise<HandOverAhead> {
  const ahead = await listHandOversAhead(tx, { ...access, now });
  const meant = ahead.find((each) => each.id === id);
  if (!meant) throw new AppError('not-found', 'This hand-over is over, was taken back, or is not of this household.');
  return meant;
}

const toldOf = ({ id, membershipId, fromDay, untilDay }: HandOverAhead) => ({
  subjectId: membershipId,
  detail: { handOver: id, fromDay, untilDay },
});

function assertAhead({ fromDay, untilDay }: NewHandOver, today: string): void {
  if (fromDay < today) throw refused('fromDay', 'The first day away is today or later.');
  if (untilDay > addDays(today, furthestHandOver))
    throw refused('untilDay', `Write down at most ${furthestHandOver} days ahead.`);
}

function refused(path: string, message: string): AppError {
  return new AppError('invalid-input', message, { problems: [{ path, message }] });
}
