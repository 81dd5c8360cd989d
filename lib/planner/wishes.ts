import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { GivenDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import type { Wishes } from '@/lib/schemas/wishes';
import { genericOf } from './generic-products';

export const noWishes: Wishes = { doses: [], notOn: [], noFurtherTablets: false };

export function isEmptyWish({ doses, notOn, noFurtherTablets }: Wishes): boolean {
  return doses.length === 0 && notOn.length === 0 && !noFurtherTablets;
}

/** The product that a wish names: of the shelf, or of what shops sell. */
export function wishedProduct({ product: id }: Pick<GivenDose, 'product'>, { shelf }: Pick<Scenario, 'shelf'>) {
  return shelf.find((product) => product.id === id) ?? genericOf(id);
}

/**
 * Wishes with later ones beside them: a later count of tablets takes the place of an earlier one, and a dose that is moved
 * again leaves the evening it was moved to before.
 */
export function mergedWishes(earlier: Wishes, later: Wishes, { pool }: Pick<Scenario, 'pool'>): Wishes {
  const dayOfDose = ({ at }: GivenDose) => dayOf(Date.parse(at), pool.timeZone);
  const stands = (dose: GivenDose) =>
    !later.notOn.includes(dayOfDose(dose)) && !(later.noFurtherTablets && dose.unit === 'tablet');
  return {
    doses: [...earlier.doses.filter(stands), ...later.doses],
    notOn: [...new Set([...earlier.notOn, ...later.notOn])].sort(),
    noFurtherTablets: earlier.noFurtherTablets || later.noFurtherTablets,
  };
}

/**
 * What of a scenario's wishes a plan still has to mind: doses that are ahead, within the plan, of a product that is there,
 * and that have not gone in meanwhile (the same kind of product on the same day is the same dose).
 */
export function wishesInForce(scenario: Scenario): Wishes {
  const { wishes = noWishes, reading, now, pool, given } = scenario;
  const takenAt = Math.max(...[reading].flat().map((each) => parseInstant(each.takenAt)!));
  const from = now === undefined ? takenAt : Math.max(takenAt, parseInstant(now)!);
  const until = takenAt + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR;
  const dayOfDose = (dose: GivenDose) => dayOf(parseInstant(dose.at)!, pool.timeZone);
  const firstDay = dayOf(from, pool.timeZone);
  return {
    ...wishes,
    notOn: wishes.notOn.filter((day) => day >= firstDay),
    doses: wishes.doses.filter((dose) => {
      const at = parseInstant(dose.at)!;
      const product = wishedProduct(dose, scenario);
      return (
        at >= from &&
        at < until &&
        product !== undefined &&
        product.stock > 0 &&
        !given.some((other) => dayOfDose(other) === dayOfDose(dose) && isOf(other, product, scenario))
      );
    }),
  };
}

/** Whether a dose was of a product's kind: of that tub or bottle, or of another that took its place. */
function isOf({ product: id }: GivenDose, product: ShelfProduct, { shelf }: Scenario): boolean {
  const poured = shelf.find((each) => each.id === id);
  return poured?.substance === product.substance && poured.form === product.form;
}
