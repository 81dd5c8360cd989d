import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { findPlanOfVersion } from '@/db/queries/plan-history';
import type { StoredPlan } from '@/db/queries/plans';
import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { ChangeCause, PlanChanges } from '@/lib/schemas/plan-changes';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { identityOf } from './plan-identity';

/** What the newest plan has otherwise than the one before it, of the days that both know; null when that is nothing. */
export async function planChanges(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  current: StoredPlan | null,
  timeZone: string,
): Promise<PlanChanges | null> {
  const former = current && (await findPlanOfVersion(db, householdId, current.version - 1));
  return current && former ? changesBetween(former, current, timeZone) : null;
}

type Compared = Pick<StoredPlan, 'createdAt' | 'endsAt' | 'engineVersion' | 'snapshot' | 'readingId' | 'result'>;

export function changesBetween(former: Compared, current: Compared, timeZone: string): PlanChanges | null {
  const from = current.createdAt.getTime();
  const until = Math.min(former.endsAt.getTime(), current.endsAt.getTime());
  const ahead = ({ result }: Compared) =>
    new Map(
      result.doses
        .filter(({ at }) => Date.parse(at) > from && Date.parse(at) < until)
        .map((dose) => [keyOf(dose, timeZone), dose]),
    );
  const [before, after] = [ahead(former), ahead(current)];
  const doses = [...new Set([...before.keys(), ...after.keys()])].sort().flatMap((key) => {
    const [old, now] = [before.get(key), after.get(key)];
    const dose = now ?? old;
    if (!dose || old?.amount === now?.amount) return [];
    const { substance, form, unit } = dose;
    const day = dayOf(Date.parse(dose.at), timeZone);
    return [{ day, substance, form, unit, before: old?.amount ?? null, after: now?.amount ?? null }];
  });
  if (doses.length === 0) return null;
  return { at: toOffsetIso(from, timeZone), causes: causesOf(former, current), doses };
}

/** Tells a dose of one plan from the others, and finds it in another plan: its day and its product. */
function keyOf({ at, product, substance, form }: PlannedDose, timeZone: string): string {
  return [dayOf(Date.parse(at), timeZone), substance, form, product].join(' ');
}

const parts: [ChangeCause, (scenario: Scenario) => unknown][] = [
  ['new-reading', ({ reading }) => reading],
  ['dose', ({ given }) => given],
  ['week-ahead', ({ week }) => week],
  ['pool', ({ pool: { feeder: _feeder, ...pool } }) => pool],
  // What a dose takes off the shelf is part of that dose.
  ['shelf', ({ shelf }) => shelf.map(({ stock: _stock, ...product }) => product)],
  ['preferences', ({ preferences }) => preferences],
  ['try-out', ({ wishes }) => wishes],
];

/** What differs between what two plans were made from. A dose that was skipped is in neither: nothing else differs then. */
function causesOf(former: Compared, current: Compared): ChangeCause[] {
  if (former.engineVersion !== current.engineVersion) return ['engine'];
  const differs = (part: (scenario: Scenario) => unknown) =>
    identityOf({ part: part(former.snapshot) }) !== identityOf({ part: part(current.snapshot) });
  const causes = parts.filter(([, part]) => differs(part)).map(([cause]) => cause);
  if (causes.length > 0) return causes;
  if (differs(({ posterior }) => posterior)) return ['learning'];
  return [differs(({ shelf }) => shelf) ? 'shelf' : 'dose'];
}
