import { dayOf } from '@/lib/calendar/household-day';
import { intervalsOfDay, parseInstant } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import { companionCap } from '@/lib/standards/caps';
import { genericProducts } from '@/lib/standards/generic-products';
import { dissolveFirstSurfaces } from '@/lib/standards/surface-ranges';

const ROUNDING = 1e-6;
/** Stabilizer from which on dichlor, which leaves more of it behind, is out of the question [mg/L]. */
const DICHLOR_UNDER = 50;

/** What is wrong with one dose by itself: its moment, its product, its label, its amount. */
export function doseFaults(dose: PlannedDose, scenario: Scenario): string[] {
  const { pool, shelf } = scenario;
  const { substance } = dose;
  const faults: string[] = [];
  const at = parseInstant(dose.at);
  if (at === undefined) return [`no instant: ${dose.at}`];
  if (at < planningFrom(scenario)) faults.push(`${substance} before now`);
  const swimming = intervalsOfDay([pool.swimHours], dayOf(at, pool.timeZone), pool.timeZone);
  if (swimming.some(({ from, to }) => at >= from && at < to)) faults.push(`${substance} in swim hours`);

  const product = shelf.find(({ id }) => id === dose.product);
  if (!product && !dose.toBuy) faults.push(`${substance} is not on the shelf`);
  if (product && product.substance !== substance) faults.push(`${product.id} is not ${substance}`);
  if (!(dose.amount > 0)) faults.push(`no amount of ${substance}`);
  if (product && substance === 'calcium-hypochlorite') {
    const dissolves = product.labelWay === 'dissolve';
    const poured = product.labelWay === 'broadcast' && !dissolveFirstSurfaces.includes(pool.surface);
    if (!dissolves && !poured) faults.push(`${product.id} against its label`);
  }
  if (substance === 'dichlor' && newestStabilizer(scenario) >= DICHLOR_UNDER)
    faults.push('dichlor though stabilizer is at 50 or more');
  if (substance in companionCap) {
    const { perCubicMetre, strength } = companionCap[substance as keyof typeof companionCap];
    const share = (product?.strength ?? genericProducts[substance].strength) / strength;
    if (dose.amount * share > perCubicMetre * pool.volume + ROUNDING)
      faults.push(`more ${substance} than one evening may add`);
  }
  return faults;
}

/** The instant [ms] before which nothing is planned. */
function planningFrom({ now, reading }: Scenario): number {
  const newest = Math.max(...[reading].flat().map(({ takenAt }) => Date.parse(takenAt)));
  return now === undefined ? newest : Math.max(newest, Date.parse(now));
}

/** The newest stabilizer that was read [mg/L]; nothing where it never was. */
function newestStabilizer({ reading }: Scenario): number {
  const newestFirst = [reading].flat().toSorted((a, b) => Date.parse(b.takenAt) - Date.parse(a.takenAt));
  const value = newestFirst.find(({ cyanuricAcid }) => cyanuricAcid !== undefined)?.cyanuricAcid;
  return typeof value === 'object' ? value.high : (value ?? 0);
}
