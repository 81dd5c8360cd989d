import { z } from 'zod';
import { strongestOf } from '@/lib/client/shelf-products';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { labelWays, productForms, substances } from '@/lib/schemas/shelf-product';
import { liquidStrengthBases, tradePercentOf } from '@/lib/storage/label-strength';
import { formatForInput, formatNumber } from '@/lib/units/format';
import { parseDecimal, parseQuantity } from '@/lib/units/parse';
import { fromInside, toInside, type UnitSystem } from '@/lib/units/unit';
import { factsOf } from './ingredients';

export const productDraftSchema = z.object({
  id: z.string(),
  substance: z.enum([...substances, 'other']).nullable(),
  form: z.enum(productForms).nullable(),
  name: z.string(),
  strength: z.string(),
  basis: z.enum(liquidStrengthBases).nullable(),
  tabletMass: z.string(),
  labelWay: z.enum(labelWays).nullable(),
  /** Whole tablets, else kilograms, litres, pounds or gallons. */
  stock: z.string(),
  measure: z.string(),
  price: z.string(),
  boughtOn: z.string(),
  system: z.enum(['metric', 'us']),
  /** What is not asked here and must not be lost: where it stands, free alkali. */
  alkali: z.number(),
  storedAt: z.number(),
});
export type ProductDraft = z.infer<typeof productDraftSchema>;

/** The units in which one product is written down. */
export function productUnits({ form, system }: Pick<ProductDraft, 'form' | 'system'>) {
  const metric = system === 'metric';
  return form === 'liquid'
    ? ({
        stock: metric ? 'L-poured' : 'us-gal-poured',
        measure: metric ? 'mL' : 'us-fl-oz',
        price: metric ? 'per-L' : 'per-us-gal',
        quantity: 'liquidVolume',
        priceQuantity: 'pricePerLiquidVolume',
      } as const)
    : ({
        stock: metric ? 'kg' : 'lb',
        measure: metric ? 'g' : 'oz',
        price: metric ? 'per-kg' : 'per-lb',
        quantity: 'mass',
        priceQuantity: 'pricePerMass',
      } as const);
}

export function emptyProduct(id: string, system: UnitSystem): ProductDraft {
  return {
    id,
    substance: null,
    form: null,
    name: '',
    strength: '',
    basis: null,
    tabletMass: '',
    labelWay: null,
    stock: '',
    measure: '',
    price: '',
    boughtOn: '',
    system,
    alkali: 0,
    storedAt: 25,
  };
}

export function productDraftOf(product: HouseholdProduct, system: UnitSystem, locale: string): ProductDraft {
  const { form, substance, strength, tabletMass, measure, stock } = product;
  const units = productUnits({ form, system });
  const inUnit = (value: number | undefined, unit: Parameters<typeof fromInside>[1]) =>
    value === undefined ? '' : plain(fromInside(value, unit), locale);
  const price = form === 'liquid' ? product.pricePerLitre : product.pricePerKg;
  const counted = form === 'tablet' && tabletMass !== undefined;
  return {
    ...emptyProduct(product.id, system),
    substance,
    form,
    name: product.name ?? '',
    strength: strength === undefined ? '' : plain(strength, locale),
    basis: factsOf(substance).strength === 'liquid-chlorine' ? 'trade' : null,
    tabletMass: inUnit(tabletMass, units.measure),
    labelWay: factsOf(substance).asksLabelWay ? product.labelWay : null,
    stock: counted ? plain(stock / tabletMass, locale) : inUnit(stock, units.stock),
    measure: inUnit(measure, units.measure),
    price: inUnit(price, units.price),
    boughtOn: product.boughtOn ?? '',
    alkali: product.alkali,
    storedAt: product.storedAt,
  };
}

/** To a thousandth, without zeros at the end: as somebody would have typed it. */
function plain(value: number, locale: string): string {
  return formatForInput(Math.round(value * 1000) / 1000, 'totalAlkalinity', 'mg/L', locale);
}

/** The same product in the other measures; what is no number stays as it was typed. */
export function productInSystem(draft: ProductDraft, system: UnitSystem, locale: string): ProductDraft {
  if (draft.system === system) return draft;
  const from = productUnits(draft);
  const to = productUnits({ ...draft, system });
  const carry = (text: string, old: Parameters<typeof fromInside>[1], now: Parameters<typeof fromInside>[1]) => {
    const value = parseDecimal(text);
    return value === undefined ? text : plain(fromInside(toInside(value, old), now), locale);
  };
  return {
    ...draft,
    stock: draft.form === 'tablet' ? draft.stock : carry(draft.stock, from.stock, to.stock),
    measure: carry(draft.measure, from.measure, to.measure),
    tabletMass: carry(draft.tabletMass, from.measure, to.measure),
    price: carry(draft.price, from.price, to.price),
    system,
  };
}

/** What the fields say, as the schema of a product wants it; what is no number becomes NaN, which it refuses in words. */
export function productAnswersOf(draft: ProductDraft): unknown {
  const { id, substance, form, name, labelWay, boughtOn, alkali, storedAt } = draft;
  const units = productUnits(draft);
  const given = <Name extends string>(key: Name, text: string, value: number | undefined) =>
    text.trim() === '' ? {} : { [key]: value ?? Number.NaN };
  const tabletMass = parseQuantity(draft.tabletMass, 'mass', form === 'liquid' ? 'g' : massUnit(units.measure));
  const count = parseDecimal(draft.stock);
  const stock =
    form === 'tablet' ? (count ?? Number.NaN) * (tabletMass ?? Number.NaN) : measured(draft.stock, units.stock);
  const asksLabelWay = substance !== null && factsOf(substance).asksLabelWay;
  return {
    id,
    substance: substance ?? undefined,
    form: form ?? undefined,
    ...given('strength', draft.strength, strengthOf(draft)),
    ...(form === 'tablet' ? given('tabletMass', draft.tabletMass, tabletMass) : {}),
    ...given('measure', draft.measure, measured(draft.measure, units.measure)),
    ...given(form === 'liquid' ? 'pricePerLitre' : 'pricePerKg', draft.price, measured(draft.price, units.price)),
    ...(draft.stock.trim() === '' ? {} : { stock: stock ?? Number.NaN }),
    ...(asksLabelWay ? { labelWay: labelWay ?? undefined } : {}),
    ...(boughtOn === '' ? {} : { boughtOn }),
    ...(name.trim() === '' ? {} : { name: name.trim() }),
    alkali,
    storedAt,
  };
}

function massUnit(unit: string): 'g' | 'oz' {
  return unit === 'oz' ? 'oz' : 'g';
}

function measured(text: string, unit: Parameters<typeof fromInside>[1]): number | undefined {
  const value = parseDecimal(text);
  return value === undefined ? undefined : toInside(value, unit);
}

/** A label rounds to whole per cents: a little over what is chemically possible counts as that. */
const roundingOfLabels = 1;

function strengthOf({ substance, strength, basis }: ProductDraft): number | undefined {
  const printed = parseDecimal(strength);
  if (printed === undefined || substance === null || substance === 'other') return printed;
  if (factsOf(substance).strength === 'liquid-chlorine')
    return basis === null ? printed : Math.round(tradePercentOf(printed, basis) * 100) / 100;
  const strongest = strongestOf(substance);
  return printed > strongest && printed <= strongest + roundingOfLabels ? strongest : printed;
}

/** What the schema cannot know: the label's way has no default, a liquid's strength needs to be told how it is meant. */
export function missingOf(draft: ProductDraft): readonly ('labelWay' | 'basis' | 'stock' | 'tooStrong')[] {
  const { substance, labelWay, basis, stock } = draft;
  if (substance === null) return [];
  const facts = factsOf(substance);
  const strength = strengthOf(draft);
  return [
    ...(facts.asksLabelWay && labelWay === null ? (['labelWay'] as const) : []),
    ...(facts.strength === 'liquid-chlorine' && basis === null ? (['basis'] as const) : []),
    ...(stock.trim() === '' ? (['stock'] as const) : []),
    ...(substance !== 'other' && strength !== undefined && strength > strongestOf(substance)
      ? (['tooStrong'] as const)
      : []),
  ];
}

/** Strength in trade per cent of a liquid that was printed another way, for a line below the field. */
export function tradeStrength(draft: ProductDraft, locale: string): string | undefined {
  const { basis } = draft;
  const strength = strengthOf(draft);
  return basis === null || basis === 'trade' || strength === undefined || !Number.isFinite(strength)
    ? undefined
    : formatNumber(strength, { decimals: 1, locale });
}
