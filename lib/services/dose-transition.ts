import 'server-only';
import type { DoseEvent, StoredDose } from '@/db/queries/plan-doses';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { AppError } from '@/lib/errors';
import { formerMember } from '@/lib/schemas/former-member';
import type { DoseTick } from '@/lib/schemas/plan-dose';
import { claimLasts, wentIn } from './dose-state';
import { undoWindow } from './sheet-doses';
import { assertMayBeTicked, pouredOf } from './tick-rules';

export type Asker = Pick<HouseholdAccess, 'personId' | 'role' | 'timeZone' | 'locale'>;

/** What a tick changes in the row of a dose. */
export type DoseTransition = Partial<
  Pick<
    StoredDose,
    | 'status'
    | 'givenAt'
    | 'givenAmount'
    | 'doneBy'
    | 'recordedBy'
    | 'tickedAt'
    | 'claimedBy'
    | 'claimedAt'
    | 'doubtfulAt'
  >
>;

/** A tick that was sent late names the hour of the one that was sent at once, give or take this [ms]. */
const SAME_TICK = 30 * 60_000;

const untouched: DoseTransition = {
  status: 'planned',
  givenAt: null,
  givenAmount: null,
  doneBy: null,
  recordedBy: null,
  tickedAt: null,
  claimedBy: null,
  claimedAt: null,
};

/**
 * What a tick changes of a dose; nothing when it only says again what is known. Errors: `conflict` when it cannot follow
 * on what happened before, `not-allowed` for what somebody else has to undo, `invalid-input` for an impossible amount.
 */
export function transitionOf(
  dose: StoredDose,
  tick: DoseTick,
  asker: Asker,
  now: Date,
  events: readonly DoseEvent[],
): DoseTransition {
  switch (tick.action) {
    case 'claim':
      return claim(dose, asker, now);
    case 'given':
    case 'changed':
      return pour(dose, tick, asker, now);
    case 'skipped':
      return skip(dose, asker, now);
    case 'undo':
      return undo(dose, asker, now, events);
  }
}

function claim(dose: StoredDose, asker: Asker, now: Date): DoseTransition {
  assertMayBeTicked(dose, asker, now);
  if (wentIn(dose)) throw new AppError('conflict', `${somebody(dose.doneByName)} has added it already.`);
  if (dose.status === 'skipped') throw new AppError('conflict', 'This dose was skipped. Undo that first.');
  if (claimLasts(dose, now) && dose.claimedBy !== asker.personId)
    throw new AppError('conflict', `${somebody(dose.claimedByName)} has it. Ask before you add anything.`);
  return { claimedBy: asker.personId, claimedAt: now };
}

/** At the beginning of a sentence. */
function somebody(name: string | null): string {
  return name === null || name === formerMember ? 'Somebody' : name;
}

function pour(
  dose: StoredDose,
  tick: Extract<DoseTick, { action: 'given' | 'changed' }>,
  asker: Asker,
  now: Date,
): DoseTransition {
  assertMayBeTicked(dose, asker, now);
  const poured = pouredOf(tick, dose, now);
  const ticked = { status: tick.action, recordedBy: asker.personId, tickedAt: now };
  if (!wentIn(dose)) return { ...ticked, ...poured, doneBy: asker.personId, claimedBy: null, claimedAt: null };
  // Two people say that they added it: perhaps it is in the water twice. Only a reading tells.
  if (dose.recordedBy !== asker.personId || isAnotherHour(dose, tick)) return { doubtfulAt: dose.doubtfulAt ?? now };
  if (tick.action === 'given') return {};
  return { ...ticked, givenAmount: poured.givenAmount, ...(tick.at === undefined ? {} : { givenAt: poured.givenAt }) };
}

/** Said again with another hour it may have been another time; what is corrected says so. */
function isAnotherHour({ givenAt }: StoredDose, tick: Extract<DoseTick, { action: 'given' | 'changed' }>): boolean {
  if (tick.action !== 'given' || tick.at === undefined || givenAt === null) return false;
  return Math.abs(Date.parse(tick.at) - givenAt.getTime()) > SAME_TICK;
}

function skip(dose: StoredDose, asker: Asker, now: Date): DoseTransition {
  if (wentIn(dose)) throw new AppError('conflict', 'This dose was ticked as added. Undo that first.');
  if (dose.status === 'skipped') return {};
  return { ...untouched, status: 'skipped', recordedBy: asker.personId, tickedAt: now };
}

function undo(dose: StoredDose, asker: Asker, now: Date, events: readonly DoseEvent[]): DoseTransition {
  if (dose.status === 'planned') {
    if (dose.claimedBy === asker.personId) return { claimedBy: null, claimedAt: null };
    throw new AppError('conflict', 'There is nothing to undo: nobody ticked this dose.');
  }
  if (dose.doubtfulAt !== null) return undoOneOfTwo(dose, asker, now, events);
  assertMayUndo(dose.recordedBy, dose.tickedAt, asker, now, dose.recordedByName);
  return untouched;
}

/** Each of two who ticked one dose can take their own tick back; then it counts as the other's. */
function undoOneOfTwo(dose: StoredDose, asker: Asker, now: Date, events: readonly DoseEvent[]): DoseTransition {
  const second = events.findLast(
    ({ action, recordedBy }) => (action === 'given' || action === 'changed') && recordedBy !== dose.recordedBy,
  );
  const own = asker.personId === dose.recordedBy ? dose.tickedAt : second?.createdAt;
  if (asker.personId !== dose.recordedBy && asker.personId !== second?.recordedBy)
    throw new AppError(
      'not-allowed',
      'Two people ticked this dose. Each can undo their own tick; if not, test the water.',
    );
  assertMayUndo(asker.personId, own ?? null, asker, now, null);
  if (asker.personId !== dose.recordedBy || !second) return { doubtfulAt: null };
  return { doubtfulAt: null, doneBy: second.recordedBy, recordedBy: second.recordedBy, tickedAt: second.createdAt };
}

function assertMayUndo(
  ticker: string | null,
  tickedAt: Date | null,
  asker: Asker,
  now: Date,
  name: string | null,
): void {
  if (asker.role === 'owner') return;
  if (ticker !== asker.personId)
    throw new AppError('not-allowed', `Only ${name ?? 'whoever ticked it'} or an owner can undo this.`);
  if (tickedAt !== null && now.getTime() - tickedAt.getTime() > undoWindow)
    throw new AppError('not-allowed', 'A tick can be taken back for 10 minutes; after that an owner can.');
}
