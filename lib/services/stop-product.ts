import 'server-only';
import type { StoredDose } from '@/db/queries/plan-doses';
import type { ShelfProductRow } from '@/db/queries/shelf-products';

/**
 * What the product of a dose is, as far as its Stop goes: when one of these changes, the Stop is asked again. What has
 * to be bought, or has left the shelf, is a product whose label nobody has copied.
 */
export function stopProductOf(
  { substance, form }: Pick<StoredDose, 'substance' | 'form'>,
  onShelf: Pick<ShelfProductRow, 'strength' | 'labelWay'> | null | undefined,
): string {
  return [substance, form, onShelf?.strength ?? 'none', onShelf?.labelWay ?? 'none'].join(' ');
}
