import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { replaceAnswers } from '@/db/queries/situations';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Situation, Situations } from '@/lib/schemas/situation';
import type { ServiceContext } from './context';
import { requireOpenSituation } from './require-open-situation';
import { showSituations } from './show-situations';

/** Gives the open procedure other answers; what was ticked and read stays. Error: `conflict` for another kind. */
export async function answerSituation(
  context: ServiceContext,
  { situationId: id, situation }: { situationId: string; situation: Situation },
): Promise<Situations> {
  const { db, access, now } = context;
  assertMay(access, 'open-situations');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const open = await requireOpenSituation(tx, { householdId, id });
    if (open.kind !== situation.kind)
      throw new AppError('conflict', 'The situation that is open is another one. Load the page again.');
    const { answers } = situation;
    await replaceAnswers(tx, { householdId, id, answers });
    const detail = { from: open.answers, to: answers };
    await writeAudit(tx, { householdId, personId, at: now, action: 'answer-situation', subjectId: id, detail });
  });
  return showSituations(context);
}
