import type { ProductForm } from '@/lib/schemas/shelf-product';
import type { CurveQuantity } from './water-curve';

export type Glyph = 'tablet' | 'granules' | 'liquid';

/** A dose as the charts draw it: a plumb line up to the curve of what it moves. */
export type ChartDose = {
  id: string;
  at: number;
  glyph: Glyph;
  /** Whose curve the plumb line ends at; undefined when no chart shows what it moves. */
  moves: CurveQuantity | undefined;
  /** In the water, or still planned. */
  given: boolean;
  /** "+0.9" and "95 g granules"; a slow tablet has no jump and so no gain. */
  gain: string | undefined;
  words: string;
};

export function glyphOf(form: ProductForm): Glyph {
  if (form === 'tablet') return 'tablet';
  return form === 'liquid' ? 'liquid' : 'granules';
}
