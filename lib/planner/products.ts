import { parseInstant } from '@/lib/calendar/wall-time';
import { contentsPerUnit, type Dose } from '@/lib/chemistry';
import { CHLORINE_MILLIGRAMS_PER_MOLE, CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { riseOf } from '@/lib/projection/events';
import type { Fact } from '@/lib/schemas/plan';
import type { Pool } from '@/lib/schemas/pool';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ProductForm, ShelfProduct } from '@/lib/schemas/shelf-product';
import { fastChlorineCap, LIQUID_STRENGTH_SHARE, TABLETS_NEED_PH, tabletCap } from '@/lib/standards/caps';
import { dissolveFirstSurfaces } from '@/lib/standards/surface-ranges';
import type { CautionCode, ReasonCode } from './codes';
import type { PlanContext } from './context';
import { generic } from './generic-products';
import { liquidStrength, priceOf, tabletFacts } from './product-facts';
import type { StartingWater } from './starting-water';
import { wishedOf } from './wished-week-doses';

const HOUR = 3_600_000;
/** Chlorine that comes with 1 g of stabilizer from trichlor [g]. */
const CHLORINE_PER_STABILIZER = (3 * CHLORINE_MILLIGRAMS_PER_MOLE) / CYANURIC_ACID_MILLIGRAMS_PER_MOLE;

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
  /** Whether tablets may be used in this pool, though none may be added now where the week or the feeder is full. */
  tabletsMayBe: boolean;
  /** The cheapest chlorine first. */
  fast: FastOption[];
  cautions: Fact[];
};

/** What the shelf, the feeder, the labels and the water let a plan use (safety constraints only; the rest is cost). */
export function optionsOf(context: Pick<PlanContext, 'scenario' | 'start' | 'now' | 'median' | 'wishes'>): Options {
  const { scenario, start, median, wishes } = context;
  const cautions: Fact[] = [];
  const caution = (code: CautionCode, figures: Omit<Fact, 'code'> = {}) => cautions.push({ code, ...figures });
  const owned = scenario.shelf.flatMap((product) => fastOption(product, scenario, start, caution) ?? []);
  // A cap holds for the smaller of the measured and the learnt volume.
  const spread = Math.min(1, median.setting.parameters.volume / scenario.pool.volume);
  const fast = (owned.length > 0 ? owned : somethingToBuy(scenario, start))
    .map((option) => ({
      ...option,
      capRise: option.capRise * spread,
      // What was wished comes off the shelf first.
      stock: Math.max(0, option.stock - wishedOf(option.product, wishes)),
    }))
    .sort((a, b) => pricePerRise(a, start.takenAt) - pricePerRise(b, start.takenAt));
  const tablets = tabletOption(context, caution);
  if (typeof tablets !== 'string' && wishes.noFurtherTablets)
    return { tablets: null, noTablets: null, tabletsMayBe: true, fast, cautions };
  return typeof tablets === 'string'
    ? { tablets: null, noTablets: tablets, tabletsMayBe: full.has(tablets), fast, cautions }
    : { tablets, noTablets: null, tabletsMayBe: true, fast, cautions };
}

/** Why no tablet more may go in although tablets suit the pool: those that are in carry on. */
const full: ReadonlySet<Options['noTablets']> = new Set(['no-tablets-week-full', 'no-tablets-feeder-full']);

/** Where the shelf holds no fast chlorine that may be planned, one to buy takes its place, unless the household avoids it. */
function somethingToBuy(scenario: Scenario, start: StartingWater): FastOption[] {
  const offered = [generic['sodium-hypochlorite'], generic['calcium-hypochlorite']].flatMap(
    (product) => fastOption(product, scenario, start, () => {}) ?? [],
  );
  return offered.slice(0, 1);
}

function pricePerRise(option: FastOption, at: number): number {
  return option.measurePrice / contentsPerUnit(option.dose(option.measure, at)).freeChlorine / option.measure;
}

type Caution = (code: CautionCode, figures?: Omit<Fact, 'code'>) => void;

function tabletOption(
  { scenario, start, now, wishes }: Pick<PlanContext, 'scenario' | 'start' | 'now' | 'wishes'>,
  caution: Caution,
): TabletOption | Exclude<Options['noTablets'], null> {
  const { pool } = scenario;
  const { onShelf, held } = tabletsOnShelf(scenario);
  for (const { id } of onShelf.filter((each) => !held.includes(each))) caution('label-way-unknown', { product: id });
  if (onShelf.length > 0 && held.length === 0) return 'no-tablets-label-unknown';
  const product = tabletsFrom(scenario);
  if (!product) return held.length > 0 ? 'no-tablets-avoided' : 'no-tablets-on-shelf';
  if (pool.feeder.kind === 'none') return 'no-tablets-feeder';
  if (pool.feeder.ingredient !== 'trichlor') {
    caution('feeder-ingredient-other', { product: product.id });
    return 'no-tablets-feeder';
  }
  if (start.measuredAt.cyanuricAcid === undefined) return 'no-tablets-stabilizer-unknown';
  if (readOnStripsAlone(scenario)) return 'no-tablets-strip-alone';
  if (start.water.cyanuricAcid > pool.stabilizerBand[1]) return 'no-tablets-stabilizer-high';
  if (start.water.pH < TABLETS_NEED_PH) return 'no-tablets-pH-low';
  const { tabletMass, strength } = tabletFacts(product);
  const price = (priceOf(product) * tabletMass) / 1000;
  const withWished = { shelf: scenario.shelf, given: [...scenario.given, ...wishes.doses] };
  const inFeeder = start.loads.reduce((sum, load) => sum + (load.erodedShare < 1 ? load.count : 0), 0);
  const ofWeek = mostTablets(
    pool.volume,
    { tabletMass, strength },
    tabletsGiven(withWished, now - tabletCap.countedFor * HOUR),
  );
  if (mostTablets(pool.volume, { tabletMass, strength }) < 1) return 'no-tablets-pool-small';
  if (ofWeek < 1) return 'no-tablets-week-full';
  const room = pool.feeder.capacity - inFeeder - tabletsGiven(withWished, start.takenAt).count;
  if (room < 1) return 'no-tablets-feeder-full';
  const left = product.stock - wishedOf(product, wishes);
  const most = Math.min(ofWeek, room, Math.max(0, Math.floor(left / tabletMass + 1e-9)));
  return { product, tabletMass, strength, most, price };
}

/** Tablets for a feeder, at least one of them, and those of which the label tells the way. */
function tabletsOnShelf({ shelf }: Pick<Scenario, 'shelf'>) {
  const onShelf = shelf.filter(
    (each) => each.form === 'tablet' && each.substance === 'trichlor' && each.stock >= tabletFacts(each).tabletMass,
  );
  return { onShelf, held: onShelf.filter(({ labelWay }) => labelWay !== 'unknown') };
}

/** The product that a plan takes its tablets from. */
export function tabletsFrom(scenario: Pick<Scenario, 'shelf' | 'preferences'>): ShelfProduct | undefined {
  return tabletsOnShelf(scenario).held.find((each) => !avoided(each, scenario.preferences.avoid));
}

/** A strip tells stabilizer so roughly that its value alone never switches tablets on (care rules, part 2). */
function readOnStripsAlone({ reading }: Pick<Scenario, 'reading'>): boolean {
  return [reading].flat().every(({ cyanuricAcid, method }) => cyanuricAcid === undefined || method === 'strip');
}

type Tablets = { count: number; mass: number; chlorine: number };

/**
 * Most whole tablets beside those already given this week: in all one of 230 g for 18 m3 of water, and 6 mg/L of
 * stabilizer.
 *
 * @param volume m3
 * @param tablet mass [g], available chlorine [%]
 * @param given  tablets of this week: mass and chlorine [g]
 */
export function mostTablets(
  volume: number,
  { tabletMass, strength }: { tabletMass: number; strength: number },
  given: Pick<Tablets, 'mass' | 'chlorine'> = { mass: 0, chlorine: 0 },
): number {
  const mass = (volume / tabletCap.waterPerTablet) * tabletCap.tabletMass - given.mass;
  const chlorine = tabletCap.stabilizerRise * volume * CHLORINE_PER_STABILIZER - given.chlorine;
  return Math.max(0, Math.floor(Math.min(mass / tabletMass, chlorine / ((tabletMass * strength) / 100)) + 1e-9));
}

/** Tablets given since an instant [ms]. */
function tabletsGiven({ given, shelf }: Pick<Scenario, 'given' | 'shelf'>, since: number): Tablets {
  const sum: Tablets = { count: 0, mass: 0, chlorine: 0 };
  for (const { at, product: id, amount } of given) {
    const product = shelf.find((each) => each.id === id);
    if (product?.form !== 'tablet' || parseInstant(at)! < since) continue;
    const { tabletMass, strength } = tabletFacts(product);
    sum.count += amount;
    sum.mass += amount * tabletMass;
    sum.chlorine += (amount * tabletMass * strength) / 100;
  }
  return sum;
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
  if ((product.labelWay ?? 'unknown') === 'unknown') {
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

/** Free chlorine that an amount of a fast product adds at an instant [mg/L]. */
export function riseOfFast(option: FastOption, amount: number, at: number, volume: number): number {
  return riseOf(contentsPerUnit(option.dose(amount, at)), amount, volume);
}

/** Whether the household avoids a product, its form or its substance. */
export function avoided(product: ShelfProduct, avoid: readonly string[]): boolean {
  return avoid.includes(product.id) || avoid.includes(product.form) || avoid.includes(product.substance);
}
