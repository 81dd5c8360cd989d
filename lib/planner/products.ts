import { dayOf } from '@/lib/calendar/household-day';
import type { Dose } from '@/lib/chemistry';
import { contentsPerUnit } from '@/lib/chemistry';
import { riseOf } from '@/lib/projection/events';
import type { Fact } from '@/lib/schemas/plan';
import type { Pool } from '@/lib/schemas/pool';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ProductForm, ShelfProduct } from '@/lib/schemas/shelf-product';
import { fastChlorineCap, LIQUID_STRENGTH_SHARE, TABLETS_NEED_PH, tabletCap } from '@/lib/standards/caps';
import { dissolveFirstSurfaces } from '@/lib/standards/surface-ranges';
import { strengthOnDay } from '@/lib/storage/liquid-strength';
import type { CautionCode, ReasonCode } from './codes';
import { genericGranules, genericLiquid } from './generic-products';
import type { StartingWater } from './starting-water';
import { assumedPrice } from './weights';

/** Tablets that may be planned, and how many at most. */
export type TabletOption = { product: ShelfProduct; tabletMass: number; strength: number; most: number; price: number };

/** A fast chlorine that may be planned: whole measures on any evening. */
export type FastOption = {
  product: ShelfProduct;
  form: ProductForm;
  substance: 'calcium-hypochlorite' | 'sodium-hypochlorite';
  /** One measure [g or mL], and its price. */
  measure: number;
  measurePrice: number;
  /** Free chlorine cap of an evening [mg/L], and what is left on the shelf [g or mL]. */
  capRise: number;
  stock: number;
  /** The dose that an amount is at an instant [ms]: liquid at its strength on that day. */
  dose: (amount: number, at: number) => Dose;
};

export type Options = {
  tablets: TabletOption | null;
  /** Why there are none, when there are none. */
  noTablets: Extract<ReasonCode, `no-tablets-${string}`> | null;
  fast: FastOption[];
  cautions: Fact[];
};

/** What the shelf, the feeder, the labels and the water let a plan use (safety constraints only; the rest is cost). */
export function optionsOf(scenario: Scenario, start: StartingWater): Options {
  const cautions: Fact[] = [];
  const caution = (code: CautionCode, figures: Omit<Fact, 'code'> = {}) => cautions.push({ code, ...figures });
  const owned = scenario.shelf.flatMap((product) => fastOption(product, scenario, start, caution) ?? []);
  const fast = owned.length > 0 ? owned : somethingToBuy(scenario, start);
  const tablets = tabletOption(scenario, start, fast.length > 0, caution);
  return typeof tablets === 'string'
    ? { tablets: null, noTablets: tablets, fast, cautions }
    : { tablets, noTablets: null, fast, cautions };
}

/** Where the shelf holds no fast chlorine that may be planned, one to buy takes its place, unless the household avoids it. */
function somethingToBuy(scenario: Scenario, start: StartingWater): FastOption[] {
  const offered = [genericLiquid, genericGranules].flatMap(
    (product) => fastOption(product, scenario, start, () => {}) ?? [],
  );
  return offered.slice(0, 1);
}

type Caution = (code: CautionCode, figures?: Omit<Fact, 'code'>) => void;

function tabletOption(
  { pool, shelf, preferences, given }: Scenario,
  start: StartingWater,
  anotherForm: boolean,
  caution: Caution,
): TabletOption | Exclude<Options['noTablets'], null> {
  const product = shelf.find(
    (each) => each.form === 'tablet' && each.substance === 'trichlor' && !avoided(each, preferences.avoid),
  );
  if (!product || product.stock <= 0) return 'no-tablets-on-shelf';
  if (pool.feeder.kind === 'none') return 'no-tablets-feeder';
  if (pool.feeder.ingredient !== 'trichlor') {
    caution('feeder-ingredient-other', { product: product.id });
    return 'no-tablets-feeder';
  }
  if (start.measuredAt.cyanuricAcid === undefined) return 'no-tablets-stabilizer-unknown';
  if (start.water.cyanuricAcid > pool.stabilizerBand[1] && anotherForm) return 'no-tablets-stabilizer-high';
  if (start.water.pH < TABLETS_NEED_PH) return 'no-tablets-pH-low';
  const tabletMass = product.tabletMass ?? 227;
  const strength = product.strength ?? 90;
  const inFeeder = start.loads.reduce((sum, load) => sum + load.count, 0);
  const most = Math.min(
    mostTablets(pool.volume, tabletMass, strength) - tabletsGiven(given, shelf, start.takenAt),
    Math.max(0, pool.feeder.capacity - inFeeder),
    Math.floor(product.stock / tabletMass + 1e-9),
  );
  return { product, tabletMass, strength, most: Math.max(0, most), price: (priceOf(product) * tabletMass) / 1000 };
}

/**
 * Most whole tablets in a week: one of 200 to 230 g for 18 m3 of water, and 6 mg/L of stabilizer in all.
 *
 * @param volume     m3
 * @param tabletMass g
 * @param strength   available chlorine [%]
 */
export function mostTablets(volume: number, tabletMass: number, strength: number): number {
  const byVolume = (volume / tabletCap.waterPerTablet) * (tabletCap.tabletMass / tabletMass);
  const contents = contentsPerUnit({ substance: 'trichlor', strength });
  const stabilizerPerTablet = (contents.cyanurate * tabletMass * 129.074) / volume;
  return Math.floor(Math.min(byVolume, tabletCap.stabilizerRise / stabilizerPerTablet) + 1e-9);
}

/** Whole tablets already given since the plan's reading. */
function tabletsGiven(given: Scenario['given'], shelf: readonly ShelfProduct[], takenAt: number): number {
  const isTablet = (id: string) => shelf.find((product) => product.id === id)?.form === 'tablet';
  return given
    .filter(({ at, product }) => Date.parse(at) >= takenAt && isTablet(product))
    .reduce((sum, { amount }) => sum + amount, 0);
}

function fastOption(
  product: ShelfProduct,
  { pool, preferences, week }: Scenario,
  start: StartingWater,
  caution: Caution,
): FastOption | undefined {
  if (avoided(product, preferences.avoid) || product.stock <= 0 || week.sky.length === 0) return undefined;
  if (product.form === 'granular' && product.substance === 'calcium-hypochlorite') {
    if (!granulesAllowed(product, pool, caution)) return undefined;
    const { strength = 65, alkali } = product;
    const measure = product.measure ?? 50;
    return {
      product,
      form: 'granular',
      substance: 'calcium-hypochlorite',
      measure,
      measurePrice: (priceOf(product) * measure) / 1000,
      capRise: fastChlorineCap['calcium-hypochlorite'].value,
      stock: product.stock,
      dose: (amount) => ({ substance: 'calcium-hypochlorite', amount, strength, alkali }),
    };
  }
  if (product.form !== 'liquid' || product.substance !== 'sodium-hypochlorite') return undefined;
  const strengthAt = liquidStrength(product, pool.timeZone);
  const today = strengthAt(start.takenAt);
  if (product.boughtOn === undefined) caution('liquid-age-unknown', { product: product.id });
  if (today.share < LIQUID_STRENGTH_SHARE) {
    caution('liquid-past-half-strength', { product: product.id, share: today.share });
    return undefined;
  }
  const measure = product.measure ?? 100;
  return {
    product,
    form: 'liquid',
    substance: 'sodium-hypochlorite',
    measure,
    measurePrice: (priceOf(product) * measure) / 1000,
    capRise: fastChlorineCap['sodium-hypochlorite'].value,
    stock: product.stock,
    dose: (amount, at) => ({
      substance: 'sodium-hypochlorite',
      amount,
      strength: strengthAt(at).strength,
      alkali: product.alkali,
    }),
  };
}

function granulesAllowed(product: ShelfProduct, pool: Pool, caution: Caution): boolean {
  if (product.labelWay === 'unknown') {
    caution('label-way-unknown', { product: product.id });
    return false;
  }
  if (product.labelWay === 'feeder-only') return false;
  if (product.labelWay !== 'dissolve' && dissolveFirstSurfaces.includes(pool.surface)) {
    caution('granules-not-for-surface', { product: product.id, surface: pool.surface });
    return false;
  }
  return true;
}

/** Strength of a bottle at an instant [ms]: trade %, and what share of the label's that is. */
export function liquidStrength(product: ShelfProduct, timeZone: string) {
  const labelled = product.strength ?? 12.5;
  return (at: number) => {
    const { boughtOn, storedAt } = product;
    if (boughtOn === undefined) return { strength: labelled, share: 1 };
    const strength = strengthOnDay({ strength: labelled, boughtOn, storedAt }, dayOf(at, timeZone));
    return { strength, share: strength / labelled };
  };
}

/** Free chlorine that an amount of a fast product adds at an instant [mg/L]. */
export function riseOfFast(option: FastOption, amount: number, at: number, volume: number): number {
  return riseOf(contentsPerUnit(option.dose(amount, at)), amount, volume);
}

/** Price per kg or litre. */
export function priceOf(product: ShelfProduct): number {
  return product.form === 'liquid'
    ? (product.pricePerLitre ?? assumedPrice.perLitre)
    : (product.pricePerKg ?? assumedPrice.perKilogram);
}

function avoided(product: ShelfProduct, avoid: readonly string[]): boolean {
  return avoid.includes(product.id) || avoid.includes(product.form) || avoid.includes(product.substance);
}
