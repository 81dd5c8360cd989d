import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { findDose } from '@/db/queries/plan-doses';
import { findShelfProduct } from '@/db/queries/shelf-products';
import { hasStopConfirmation, insertStopConfirmation } from '@/db/queries/stop-confirmations';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { NewStopConfirmation } from '@/lib/schemas/stop-confirmation';
import type { ServiceContext } from './context';
import { stopProductOf } from './stop-product';

/**
 * Keeps that this person has read the Stop of the product of a dose, and will do so. The same one twice is kept once.
 *
 * Errors: `not-allowed`; `not-found` for a dose of another household; `conflict` for an id that somebody else has used.
 */
export async function confirmStop({ db, access, now }: ServiceContext, sent: NewStopConfirmation): Promise<Done> {
  assertMay(access, 'tick-doses');
  const { householdId, personId } = access;
  const { id, doseId } = sent;
  await inWriteTransaction(db, async (tx) => {
    const dose = await findDose(tx, householdId, doseId);
    if (!dose) throw new AppError('not-found', 'There is no such dose in this household.');
    const onShelf = dose.productId === null ? null : await findShelfProduct(tx, householdId, dose.productId);
    const product = stopProductOf(dose, onShelf);
    if (!(await insertStopConfirmation(tx, { id, householdId, personId, product, confirmedAt: now }))) {
      if (await hasStopConfirmation(tx, { householdId, personId, id })) return;
      throw new AppError('conflict', 'This was confirmed by somebody else. Read the Stop and confirm it yourself.');
    }
    const detail = { product };
    await writeAudit(tx, { householdId, personId, at: now, action: 'confirm-stop', subjectId: doseId, detail });
  });
  return { done: true };
}
