import 'server-only';
import { lastMeasured } from '@/db/queries/readings';
import { pumpUntil } from '@/lib/projection/events';
import { type SituationDose, wayOf } from '@/lib/situations';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import type { ServiceContext } from './context';
import { countingDoses } from './sheet-doses';
import { shownName } from './shown-name';
import type { LoadedSituation } from './situation-record';

const DAY = 86_400_000;

/** Doses that a situation has led to: given since it was opened, or planned while it leads. */
export async function situationDoses(
  { db, access, now }: Pick<ServiceContext, 'db' | 'access' | 'now'>,
  { record }: Pick<LoadedSituation, 'record'>,
): Promise<SituationDose[]> {
  const { householdId, language } = access;
  const treats = wayOf(record).lead.kind === 'treat';
  const openedAt = new Date(record.openedAt);
  const tested = await lastMeasured(db, { householdId, quantities: ['freeChlorine'] });
  const doses = await countingDoses(db, {
    householdId,
    from: new Date(openedAt.getTime() - DAY),
    until: new Date(now.getTime() + DAYS_OF_A_PLAN * DAY),
    lastReading: tested[0] ?? null,
  });
  return doses.flatMap(({ status, givenAt, givenAmount, ...dose }) => {
    const counts = givenAt ? givenAt >= openedAt : status === 'planned' && treats && dose.at >= openedAt;
    if (!counts) return [];
    const { id, substance, form, unit, toBuy, rise, doneByName } = dose;
    const at = dose.at.getTime();
    return [
      {
        ...{ id, at, substance, form, unit, toBuy },
        amount: givenAmount ?? dose.amount,
        pumpUntil:
          form === 'tablet'
            ? null
            : pumpUntil(givenAt?.getTime() ?? at, (rise * (givenAmount ?? dose.amount)) / dose.amount),
        givenAt: givenAt?.getTime() ?? null,
        doneBy: shownName(doneByName, language),
      },
    ];
  });
}
