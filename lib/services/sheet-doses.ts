import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listOvertakenDoseIds } from '@/db/queries/overtaken-doses';
import { findDose, listDoses, type StoredDose } from '@/db/queries/plan-doses';
import type { PoolRow } from '@/db/queries/pools';
import type { ShelfProductRow } from '@/db/queries/shelf-products';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { pumpUntil } from '@/lib/projection/events';
import type { Language } from '@/lib/schemas/languages';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { LabelWay } from '@/lib/schemas/shelf-product';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { limits } from '@/lib/standards/limits';
import { claimLasts, isDoubtful } from './dose-state';
import { shownName } from './shown-name';
import { stopProductOf } from './stop-product';
import { swimWaitUntil } from './swim-wait';

const HOUR = 3_600_000;
/** How long whoever ticked may take it back with one tap. */
export const undoWindow = 10 * 60_000;

/**
 * The doses that count between two instants: those of the current plan, what was ticked of earlier ones, and what was due
 * and open when a newer plan took over. Until a reading has seen the water, such a dose may be in it.
 */
export async function countingDoses(
  db: DatabaseOrTransaction,
  {
    householdId,
    from,
    until,
    lastReading,
  }: { householdId: ProvenHouseholdId; from: Date; until: Date; lastReading: Date | null },
): Promise<StoredDose[]> {
  const doses = await listDoses(db, { householdId, from, until });
  const overtaken = await listOvertakenDoseIds(db, { householdId, since: lastReading ?? from });
  for (const id of overtaken) {
    const dose = await findDose(db, householdId, id);
    if (dose && dose.at >= from && dose.at < until) doses.push(dose);
  }
  return doses.sort((a, b) => a.at.getTime() - b.at.getTime());
}

type Around = {
  plan: WeekPlan | null;
  shelf: readonly ShelfProductRow[];
  feederKind: PoolRow['feederKind'];
  timeZone: string;
  language: Language;
  now: Date;
  /** Tablets found before doses, by their ids. */
  found: ReadonlyMap<string, number>;
  /** When free chlorine was measured last. */
  chlorineTakenAt: Date | null;
  /** Products whose Stop whoever asks has confirmed lately; null for somebody who ticks no doses. */
  confirmedStops: ReadonlySet<string> | null;
};

/** A dose as the sheet shows it: which steps, and the hours that follow from when it goes in or went in. */
export function sheetDose(dose: StoredDose, around: Around): PlanDose {
  const { plan, shelf, feederKind, timeZone, language, now, found, chlorineTakenAt, confirmedStops } = around;
  const iso = (instant: number) => toOffsetIso(instant, timeZone);
  const at = dose.at.getTime();
  const poured = dose.givenAt?.getTime() ?? at;
  const onShelf = shelf.find(({ id }) => id === dose.productId);
  const labelWay = onShelf?.labelWay ?? wayOfAlike(dose, shelf);
  const isTablet = dose.form === 'tablet';
  return {
    id: dose.id,
    planId: dose.planId,
    planVersion: dose.planVersion,
    at: iso(at),
    product: dose.productId,
    productName: dose.productName,
    toBuy: dose.toBuy,
    substance: dose.substance,
    form: dose.form,
    amount: dose.amount,
    unit: dose.unit,
    rise: dose.rise,
    ...(dose.effect === null ? {} : { effect: dose.effect }),
    reason: dose.reason,
    labelWay,
    measure: onShelf?.measure ?? null,
    steps: stepsOf(dose, labelWay, feederKind),
    status: dose.status,
    tickFrom: iso(tickFrom(dose)),
    pumpUntil: isTablet ? null : iso(pumpUntil(poured, (dose.rise * (dose.givenAmount ?? dose.amount)) / dose.amount)),
    waitUntil: iso(swimWaitUntil(dose, poured, plan)),
    givenAt: dose.givenAt === null ? null : iso(poured),
    givenAmount: dose.givenAmount,
    doneBy: shownName(dose.doneByName, language),
    recordedBy: shownName(dose.recordedByName, language),
    tabletsLeft: found.get(dose.id) ?? null,
    claimedBy: claimLasts(dose, now) ? shownName(dose.claimedByName, language) : null,
    undoUntil: dose.tickedAt === null ? null : iso(dose.tickedAt.getTime() + undoWindow),
    doubtful: isDoubtful(dose, chlorineTakenAt),
    stopDue: confirmedStops?.has(stopProductOf(dose, onShelf)) === false,
  };
}

/** From when a dose may be ticked [ms]: earlier the card only shows its steps. */
export function tickFrom({ at }: Pick<StoredDose, 'at'>): number {
  return at.getTime() - limits.tickBeforeDose.value * HOUR;
}

const wayTexts = {
  dissolve: 'granules-dissolve',
  broadcast: 'granules-broadcast',
  'feeder-only': 'granules-label-first',
  unknown: 'granules-label-first',
} as const satisfies Record<LabelWay, PlanDose['steps']>;

/**
 * How a dose that has to be bought goes in: as the label of the same product on the shelf says, where that speaks with one
 * voice. Care rules, part 4: of a label that nobody could find no way is taken for granted.
 */
function wayOfAlike(
  { toBuy, substance, form }: Pick<StoredDose, 'toBuy' | 'substance' | 'form'>,
  shelf: Around['shelf'],
): PlanDose['labelWay'] {
  if (!toBuy) return null;
  const ways = new Set(
    shelf.filter((each) => each.substance === substance && each.form === form).map(({ labelWay }) => labelWay),
  );
  const [way] = ways;
  return way !== undefined && ways.size === 1 ? way : null;
}

function stepsOf(
  { form, substance }: Pick<StoredDose, 'form' | 'substance'>,
  labelWay: PlanDose['labelWay'],
  feederKind: PoolRow['feederKind'],
): PlanDose['steps'] {
  if (form === 'tablet') return feederKind === 'floating' ? 'tablets-floating' : 'tablets-inline';
  if (substance === 'hydrochloric-acid' || substance === 'sodium-bisulfate') return 'acid';
  if (form === 'liquid') return 'liquid';
  if (substance === 'calcium-hypochlorite' || substance === 'dichlor') return wayTexts[labelWay ?? 'unknown'];
  return 'companion-dissolve';
}
