import 'server-only';
import { findCleanPressure, findLastRound } from '@/db/queries/rounds';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { assertMay } from '@/lib/auth/permissions';
import type { Rounds } from '@/lib/schemas/round';
import type { ServiceContext } from './context';
import { shownName } from './shown-name';

/** The newest round, and the clean filter's pressure. */
export async function showRounds({ db, access }: ServiceContext): Promise<Rounds> {
  assertMay(access, 'look');
  const { householdId, timeZone, language } = access;
  const last = await findLastRound(db, householdId);
  return {
    last: last
      ? {
          ...last,
          doneAt: toOffsetIso(last.doneAt.getTime(), timeZone),
          doneBy: shownName(last.doneBy, language),
        }
      : null,
    cleanPressure: await findCleanPressure(db, householdId),
  };
}
