import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { insertPoolEvent } from '@/db/queries/pool-events';
import { findPool } from '@/db/queries/pools';
import {
  endSituation,
  findOpenSituation,
  findSituation,
  insertSituation,
  type StoredSituation,
} from '@/db/queries/situations';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { PoolEventKind } from '@/lib/schemas/pool-event';
import type { NewSituation, Situation, Situations } from '@/lib/schemas/situation';
import type { ServiceContext } from './context';
import { enginePool } from './engine-pool';
import { showSituations } from './show-situations';

/**
 * Begins a guided procedure; from then on it leads the plan and the verdict. What ends a verdict by itself is written down as
 * such, too. The same one twice is begun once; one that is named may be set aside for it.
 *
 * Error: `conflict` while another one is open, or before the pool is described.
 */
export async function openSituation(
  context: ServiceContext,
  { id, situation, setAside }: NewSituation,
): Promise<Situations> {
  const { db, access, now } = context;
  assertMay(access, 'open-situations');
  const { householdId, personId, timeZone } = access;
  const found = await findPool(db, householdId);
  if (!found || !enginePool(found.pool, timeZone))
    throw new AppError('conflict', 'Describe the pool first; then a procedure can be worked out for it.');
  const shown = await showSituations(context);
  await inWriteTransaction(db, async (tx) => {
    if (await findSituation(tx, { householdId, id })) return;
    const open = await findOpenSituation(tx, householdId);
    if (open && open.id !== setAside)
      throw new AppError('conflict', 'Another situation is open. Only one can be open at a time: end it first.');
    if (open) assertMayBeSetAside(open, situation, shown.open?.procedure.stayOut ?? false);
    if (open) await endSituation(tx, { householdId, personId, id: open.id, at: now, ending: 'set-aside' });
    const { kind, answers } = situation;
    if (!(await insertSituation(tx, { householdId, personId, id, kind, answers, openedAt: now })))
      throw new AppError('conflict', 'This was begun in another household.');
    await reportEvent(tx, context, { id, situation });
    const detail = { kind, answers, ...(open ? { setAside: open.id } : {}) };
    await writeAudit(tx, { householdId, personId, at: now, action: 'open-situation', subjectId: id, detail });
  });
  return showSituations(context);
}

/**
 * What keeps everybody out is not set aside for something smaller: only an accident or a drain cover takes its place, and the
 * place of an accident or of electricity nothing does.
 */
function assertMayBeSetAside(open: StoredSituation, next: Situation, staysOut: boolean): void {
  const gravest = open.kind === 'accident' || (open.kind === 'storm' && staysOut);
  const grave = next.kind === 'accident' || next.kind === 'drain-cover';
  if (staysOut && (gravest || !grave))
    throw new AppError('conflict', 'The situation that is open keeps everyone out of the water. Finish it first.');
}

/** What happened to the pool, of the situations that begin with it. */
function eventOf(situation: Situation): PoolEventKind | null {
  if (situation.kind === 'storm') return 'storm';
  if (situation.kind === 'drain-cover') return 'drain-cover';
  return situation.kind === 'cover' && situation.answers.covered === 'week-or-more' ? 'cover-off' : null;
}

async function reportEvent(tx: Transaction, { access, now }: ServiceContext, { id, situation }: NewSituation) {
  const kind = eventOf(situation);
  const { householdId, personId } = access;
  if (kind) await insertPoolEvent(tx, { householdId, personId, id, kind, happenedAt: now, createdAt: now });
}
