import 'server-only';
import { randomUUID } from 'node:crypto';
import { writeAudit } from '@/db/queries/audit-trail';
import { endPoolEvent, insertPoolEvent } from '@/db/queries/pool-events';
import { endSituation as endStored, findSituation } from '@/db/queries/situations';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { SituationEnding, Situations } from '@/lib/schemas/situation';
import type { ServiceContext } from './context';
import { requireOpenSituation } from './require-open-situation';
import { showSituations } from './show-situations';

/**
 * Ends a procedure. "Done" only while its rule is met; ended otherwise, the verdict asks for a test first. A drain cover
 * that was reported with it is over only when it is replaced, or when it was a mistake. Ended twice is ended once.
 */
export async function endSituation(
  context: ServiceContext,
  { situationId: id, ending }: { situationId: string; ending: SituationEnding },
): Promise<Situations> {
  const { db, access, now } = context;
  assertMay(access, 'open-situations');
  const { householdId, personId } = access;
  const shown = await showSituations(context);
  const isMet = shown.open?.id === id && shown.open.procedure.done;
  await inWriteTransaction(db, async (tx) => {
    if ((await findSituation(tx, { householdId, id }))?.endedAt) return;
    const { kind } = await requireOpenSituation(tx, { householdId, id });
    if (ending === 'done' && !isMet)
      throw new AppError('conflict', 'This is not over yet: a step or a test is missing.');
    await endStored(tx, { householdId, id, personId, at: now, ending });
    if (kind === 'drain-cover' ? ending !== 'professional' : ending === 'mistake')
      await endPoolEvent(tx, { householdId, id, at: now, personId });
    // The pump stood still meanwhile: the water needs a test.
    if (kind === 'drain-cover' && ending === 'done')
      await insertPoolEvent(tx, {
        ...{ householdId, personId, id: randomUUID(), kind: 'pump-failure' },
        ...{ happenedAt: now, createdAt: now },
      });
    const detail = { ending };
    await writeAudit(tx, { householdId, personId, at: now, action: 'end-situation', subjectId: id, detail });
  });
  return showSituations(context);
}
