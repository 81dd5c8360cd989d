import { FlaskConical, Package } from 'lucide-react';
import { type Mark, ProductGlyph } from '@/components/charts/product-glyph';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { chlorines } from '@/lib/standards/chlorines';

const marks: Partial<Record<HouseholdProduct['form'], Mark>> = {
  tablet: 'tablet',
  granular: 'granules',
  liquid: 'liquid',
};

/** The chlorines carry the glyphs of the week sheet, everything else a flask or a box. */
export function IngredientMark({ substance, form }: Pick<HouseholdProduct, 'substance' | 'form'>) {
  const mark = marks[form];
  if (chlorines.includes(substance) && mark !== undefined) return <ProductGlyph mark={mark} size={22} />;
  const Icon = substance === 'other' ? Package : FlaskConical;
  return <Icon aria-hidden="true" className="size-5.5" />;
}
