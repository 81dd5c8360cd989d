import { addDays, dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import type { Wishes } from '@/lib/schemas/wishes';
import { chlorines } from '@/lib/standards/chlorines';
import { genericIdOf } from './generic-products';
import { tabletsFrom } from './products';
import { isEmptyWish, mergedWishes, noWishes } from './wishes';

/** The plan that something is tried on: its doses that are still ahead, and the evenings on which chlorine may go in. */
export type PlanAhead = { doses: TryOutStart['doses']; evenings: TryOutStart['evenings'] };

/** What changes wish of a plan: tablets of the whole plan in one loading, and doses on another evening. */
export function wishesOf(changes: TryOutChanges, ahead: PlanAhead, scenario: Scenario): Wishes {
  const { timeZone } = scenario.pool;
  const { tablets } = changes;
  // How many tablets there are and when they go in is said by their count; a move only says when.
  const moves = movesOf(changes, ahead, scenario).filter(({ dose }) => tablets === null || dose.form !== 'tablet');
  const loading = tablets === null ? null : loadingOf(changes, ahead, scenario);
  const moved = moves.map(({ dose, at }) => ({ at, product: productOf(dose), amount: dose.amount, unit: dose.unit }));
  return {
    doses: loading ? [loading, ...moved] : moved,
    notOn: [...new Set(moves.map(({ dose }) => dayOf(Date.parse(dose.at), timeZone)))].sort(),
    noFurtherTablets: tablets !== null,
  };
}

/**
 * The scenario with what somebody tries: other swimmers, another sky, and their wishes beside those it has already. Its
 * `doses` are those of the plan as the changes leave them, so that it can be projected before it is planned anew.
 */
export function tried(scenario: Scenario, changes: TryOutChanges, ahead: PlanAhead): Scenario {
  const { wishes: before = noWishes, week, ...rest } = scenario;
  const wishes = mergedWishes(before, wishesOf(changes, ahead, scenario), scenario);
  const first = dayOf(newestReading(scenario), scenario.pool.timeZone);
  const days = Array.from({ length: DAYS_OF_A_PLAN }, (_, index) => addDays(first, index));
  const swimmers = new Map(changes.swimmers.map(({ day, swimmerHours }) => [day, swimmerHours]));
  const skies = new Map(changes.sky.map(({ day, sky }) => [day, sky]));
  return {
    ...rest,
    week: {
      ...week,
      swimmerHours: days.map((day, index) => swimmers.get(day) ?? week.swimmerHours[index] ?? 0),
      sky: days.map((day, index) => skies.get(day) ?? week.sky[index] ?? week.sky.at(-1)!),
    },
    doses: dosesAfter(changes, ahead, scenario),
    ...(isEmptyWish(wishes) ? {} : { wishes }),
  };
}

/** The moves that can be made: of chlorine that is still ahead, each dose once, to another evening of the plan. */
export function movesOf(
  { moves }: TryOutChanges,
  { doses, evenings }: PlanAhead,
  { pool }: Pick<Scenario, 'pool'>,
): { dose: PlanAhead['doses'][number]; at: string }[] {
  const seen = new Set<string>();
  return moves.flatMap(({ doseId, toDay }) => {
    const dose = doses.find(({ id, substance }) => id === doseId && chlorines.includes(substance));
    const evening = evenings.find(({ day }) => day === toDay);
    if (!dose || !evening || seen.has(doseId) || dayOf(Date.parse(dose.at), pool.timeZone) === toDay) return [];
    seen.add(doseId);
    return [{ dose, at: evening.at }];
  });
}

/** So many tablets as were tried: at the plan's first loading, where that is moved at its new evening, else on the first. */
function loadingOf(changes: TryOutChanges, ahead: PlanAhead, scenario: Scenario): Wishes['doses'][number] | null {
  const { tablets } = changes;
  const planned = ahead.doses.filter(({ form }) => form === 'tablet').sort(byTime)[0];
  const moves = movesOf(changes, ahead, scenario);
  const movedTo = moves.find(({ dose }) => dose.id === planned?.id)?.at;
  const taken = moves.map(({ at }) => at);
  const at = movedTo ?? planned?.at ?? ahead.evenings.find((evening) => !taken.includes(evening.at))?.at;
  const product = planned?.product ?? tabletsFrom(scenario)?.id;
  return tablets && at !== undefined && product !== undefined ? { at, product, amount: tablets, unit: 'tablet' } : null;
}

/** What the plan gives after the changes, before it is made anew. */
function dosesAfter(changes: TryOutChanges, ahead: PlanAhead, scenario: Scenario): NonNullable<Scenario['doses']> {
  const { tablets } = changes;
  const moves = new Map(movesOf(changes, ahead, scenario).map(({ dose, at }) => [dose.id, at]));
  const loading = tablets === null ? null : loadingOf(changes, ahead, scenario);
  const kept = ahead.doses
    .filter(({ form }) => tablets === null || form !== 'tablet')
    .map(({ id, ...dose }) => ({ ...dose, at: moves.get(id) ?? dose.at }));
  return (loading ? [...kept, loading] : kept).sort(byTime);
}

/** Under which id a wish names the product of a planned dose: its own, or that of what a shop sells. */
function productOf({ product, substance }: PlannedDose): string {
  return product ?? genericIdOf(substance);
}

function newestReading({ reading }: Scenario): number {
  return Math.max(...[reading].flat().map(({ takenAt }) => parseInstant(takenAt)!));
}

function byTime(a: { at: string }, b: { at: string }): number {
  return Date.parse(a.at) - Date.parse(b.at);
}
