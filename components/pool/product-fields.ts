import type { FieldProblems } from './field-problems';
import type { ProductDraft } from './product-draft';

/** What every part of the form of a product is handed. */
export type ProductFieldsProps = {
  draft: ProductDraft;
  change: (part: Partial<ProductDraft>) => void;
  problems: FieldProblems;
};
