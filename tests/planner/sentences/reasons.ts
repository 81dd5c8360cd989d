import { usesStabilized } from './limits';
import { keepsWishes, wishIsAhead } from './wishes';
import { projectScenario } from '@/lib/planner';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import {
  alike,
  companionDoses,
  fastDoses,
  type Holds,
  hoursFromSunrise,
  hoursToSunset,
  isAvoided,
  isMeasured,
  isPHNow,
  isSwimHour,
  mostTabletGrams,
  number,
  productOf,
  type Quantity,
  readingsOf,
  stabilizerShare,
  sumOf,
  tabletDoses,
  tabletsOnShelf,
  takenAt,
  type Told,
  waterAtFirst,
} from './told';

const HOUR = 3_600_000;
/** A dose of last light stands so long before sunset at most [h]. */
const LAST_LIGHT = 2;
/** Lowest hardness that is kept on a surface, and alkalinity under which the aim of either form is missed by a reading. */
const lowestHardness = { plaster: 200, tile: 200, vinyl: 100, fibreglass: 120, painted: 150 } as const;

const none: Holds = (_, told) => tabletDoses(told).length === 0;
const noneBecause =
  (why: Holds): Holds =>
  (fact, told) =>
    none(fact, told) && why(fact, told);

/** Of each reason: whether what it says is so. Written from the words on the screen and the care rules, not from the code. */
export const reasonHolds: Record<string, Holds> = {
  'replace-water-first': (fact, told) => {
    const { pool } = told.scenario;
    const stabilizer = waterAtFirst(told, 'cyanuricAcid');
    const lowest = stabilizer / 20;
    const why = fact.closed === 'yes' ? lowest >= pool.swimLimit - 0.5 : stabilizer > pool.stabilizerBand[1];
    // Day by day: 15 cm of level goes out and as much fresh water comes in.
    const share = Math.min(1, 0.15 / pool.meanDepth);
    const days = number(fact.days);
    let [left, out] = [stabilizer, 0];
    for (let day = 1; day <= days; day++) {
      const today = Math.min(share, Math.max(0, 1 - number(fact.target) / left));
      left *= 1 - today;
      out += today * pool.volume;
    }
    return (
      why &&
      alike(fact.stabilizer, stabilizer, 0) &&
      fact.swimLimit === pool.swimLimit &&
      Number.isInteger(days) &&
      alike(left, number(fact.target), 0) &&
      Math.abs(out - number(fact.volume)) <= 0.01 * out &&
      stabilizer * (1 - share) ** (days - 1) > number(fact.target) - 0.5
    );
  },

  'few-open-hours': (fact, told) => {
    const share = openShareOf(told);
    return (
      alike(number(fact.share) * 100, share * 100, 0) && share < 0.9 && fact.visits === told.scenario.preferences.visits
    );
  },

  wished: (_, told) => wishIsAhead(told) && keepsWishes(told),

  'situation-treats': (_, { plan }) => {
    const ofSituation = ['treatment-evening', 'raise-to-limit', 'pH-before-treatment', 'first-dose-halved'];
    const chlorine = fastDoses({ plan } as Told);
    const lastDose = Math.max(...plan.doses.map(({ at }) => Date.parse(at)));
    return (
      plan.doses.every(({ reason }) => ofSituation.includes(reason)) &&
      chlorine.length <= 1 &&
      (plan.doses.length === 0 ||
        plan.checks.some(({ at }) => Date.parse(at) > lastDose && Date.parse(at) < lastDose + 24 * HOUR))
    );
  },

  'situation-holds': (_, { plan }) => plan.doses.length === 0,

  'lowest-level-follows-stabilizer': (fact, told) => {
    const stabilizer = waterAtFirst(told, 'cyanuricAcid');
    // Of the two that ask, the larger one holds.
    const byRules = stabilizer >= 10 || usesStabilized(told) ? 2 : 1;
    const lowest = Math.max(stabilizer / 20, byRules);
    const byStabilizer = stabilizer / 20 > byRules;
    return (
      alike(fact.stabilizer, stabilizer, 0) &&
      alike(fact.lowestLevel, lowest, 1) &&
      (fact.sets === 'stabilizer') === byStabilizer
    );
  },

  'tablets-carry': (fact, told) => {
    const doses = tabletDoses(told);
    const { volume } = told.scenario.pool;
    const gramsOf = (dose: (typeof doses)[number]) => dose.amount * (tabletOf(dose.product, told).tabletMass ?? 227);
    const chlorine = sumOf(doses, (dose) => gramsOf(dose) * ((tabletOf(dose.product, told).strength ?? 90) / 100));
    const stabilizer = sumOf(
      doses,
      (dose) => gramsOf(dose) * stabilizerShare(tabletOf(dose.product, told).strength ?? 90),
    );
    const others = sumOf(fastDoses(told), ({ rise }) => rise);
    return (
      doses.length > 0 &&
      fact.tablets === sumOf(doses, ({ amount }) => amount) &&
      alike(fact.stabilizer, stabilizer / volume, 1) &&
      (fact.most === 'yes') === chlorine / volume > others
    );
  },

  'no-tablets-stabilizer-high': noneBecause((fact, told) => {
    const [, upper] = told.scenario.pool.stabilizerBand;
    const stabilizer = waterAtFirst(told, 'cyanuricAcid');
    return alike(fact.stabilizer, stabilizer, 0) && fact.upper === upper && stabilizer > upper;
  }),
  'no-tablets-stabilizer-unknown': noneBecause((_, told) => !isMeasured(told, 'cyanuricAcid')),
  'no-tablets-strip-alone': noneBecause((_, told) => {
    const read = readingsOf(told).filter(({ cyanuricAcid }) => cyanuricAcid !== undefined);
    return read.length > 0 && read.every(({ method }) => method === 'strip');
  }),
  'no-tablets-label-unknown': noneBecause(
    (_, told) =>
      tabletsOnShelf(told).length > 0 && tabletsOnShelf(told).every(({ labelWay }) => labelWay === 'unknown'),
  ),
  'no-tablets-pH-low': noneBecause((fact, told) => {
    return isPHNow(fact.pH, told) && number(fact.pH) < 7.2;
  }),
  'no-tablets-feeder': noneBecause(
    (_, { scenario: { pool } }) => pool.feeder.kind === 'none' || pool.feeder.ingredient !== 'trichlor',
  ),
  'no-tablets-on-shelf': noneBecause((_, told) => tabletsOnShelf(told).length === 0),
  'no-tablets-avoided': noneBecause((_, told) => {
    const clear = tabletsOnShelf(told).filter(({ labelWay }) => labelWay !== 'unknown');
    return clear.length > 0 && clear.every((product) => isAvoided(told, product));
  }),
  'no-tablets-pool-small': noneBecause((_, told) =>
    tabletsOnShelf(told).some(({ tabletMass = 227, strength = 90 }) => tabletMass > mostTabletGrams(told, strength)),
  ),
  'no-tablets-week-full': noneBecause((_, told) => {
    const { grams } = tabletsGiven(told, 7 * 24);
    return tabletsOnShelf(told).some(
      ({ tabletMass = 227, strength = 90 }) => grams > 0 && grams + tabletMass > mostTabletGrams(told, strength),
    );
  }),
  'no-tablets-feeder-full': noneBecause((_, told) => {
    const { capacity, loaded } = told.scenario.pool.feeder;
    const inIt = Math.ceil(loaded / (tabletsOnShelf(told)[0]?.tabletMass ?? 227)) + tabletsGiven(told, Infinity).count;
    return inIt + 1 > capacity;
  }),
  'no-tablets-better-without': noneBecause((_, { plan }) => {
    const alone = plan.alternatives.find(({ kind }) => kind === 'tablets');
    return (
      alone !== undefined && plan.cost !== null && (alone.doses.length === 0 || alone.total >= plan.cost.total - 1e-6)
    );
  }),

  'fast-closes-gap': (fact, told) => {
    const doses = fastDoses(told).filter(({ form }) => form === fact.form);
    const before = doses.map((dose) => hoursToSunset(dose, told));
    const lastLight = before.every((hours) => hours !== undefined && hours >= 0 && hours <= LAST_LIGHT);
    const open = told.plan.broken.some(({ limit }) => limit === 'lowest-level');
    return (
      doses.length > 0 &&
      fact.evenings === doses.length &&
      alike(
        fact.rise,
        sumOf(doses, ({ rise }) => rise),
        1,
      ) &&
      doses.every(({ at }) => !isSwimHour(Date.parse(at), told)) &&
      (fact.lastLight === 'yes') === lastLight &&
      (fact.closes === 'yes') === !open
    );
  },
  'nothing-fast-needed': (_, told) =>
    fastDoses(told).length === 0 && told.plan.broken.every(({ limit }) => limit !== 'lowest-level'),
  'no-fast-on-shelf': (_, told) => {
    const usable = told.scenario.shelf.filter((product) => {
      if (product.stock <= 0 || isAvoided(told, product)) return false;
      if (product.substance === 'calcium-hypochlorite')
        return product.form === 'granular' && (product.labelWay === 'dissolve' || product.labelWay === 'broadcast');
      return product.substance === 'sodium-hypochlorite';
    });
    const onlyRefused = usable.every(({ form, labelWay }) => form === 'liquid' || labelWay === 'broadcast');
    return fastDoses(told).length === 0 && onlyRefused;
  },

  'cheaper-than': (_, { plan }) => {
    const doses = JSON.stringify(plan.doses.map(({ product, amount, at }) => [product, amount, at]));
    const others = plan.alternatives.filter(
      (way) =>
        way.feasible && JSON.stringify(way.doses.map(({ product, amount, at }) => [product, amount, at])) !== doses,
    );
    return plan.mix !== null && others.length > 0 && others.every(({ money }) => cents(money) > cents(plan.mix!.money));
  },

  'raises-alkalinity': companion('totalAlkalinity', ['sodium-bicarbonate'], (told, dose) => {
    const first = companionDoses(told)[0];
    const retest = Date.parse(dose.at) + 24 * HOUR;
    const testedNext = told.plan.checks.some(
      ({ at }) => Date.parse(at) >= Math.min(retest, takenAt(told) + 167 * HOUR),
    );
    return (
      waterAtFirst(told, 'totalAlkalinity') < 95 && first === dose && companionDoses(told).length === 1 && testedNext
    );
  }),
  'lowers-pH': companion('pH', ['hydrochloric-acid', 'sodium-bisulfate'], (told, dose) => {
    const sinceLight = hoursFromSunrise(dose, told);
    return pHWithout(told).some((pH) => pH > 7.8) && sinceLight !== undefined && sinceLight >= 0 && sinceLight <= 0.5;
  }),
  'raises-pH': companion('pH', ['sodium-carbonate'], (told) => pHWithout(told).some((pH) => pH < 7.2)),
  'raises-hardness': companion('calciumHardness', ['calcium-chloride'], (told) => {
    const { surface } = told.scenario.pool;
    return waterAtFirst(told, 'calciumHardness') < lowestHardness[surface];
  }),
  'raises-stabilizer': companion(
    'cyanuricAcid',
    ['cyanuric-acid'],
    (told) =>
      waterAtFirst(told, 'cyanuricAcid') < told.scenario.pool.stabilizerBand[0] && tabletDoses(told).length === 0,
  ),

  'water-values-assumed': (fact, told) => {
    const quantity = fact.quantity as Quantity;
    const decimals = 0;
    return !isMeasured(told, quantity) && alike(fact.value, waterAtFirst(told, quantity), decimals);
  },
};

/** A dose beside chlorine that stands in the plan, moves what it says by as much as it says, and is needed. */
function companion(
  quantity: Quantity,
  substances: readonly string[],
  needed: (told: Told, dose: Told['plan']['doses'][number]) => boolean,
): Holds {
  return (fact, told) => {
    const dose = companionDoses(told).find(({ substance }) => substances.includes(substance));
    if (!dose?.effect || dose.effect.quantity !== quantity || fact.quantity !== quantity) return false;
    const sign = fact.code.startsWith('lowers') ? -1 : 1;
    const decimals = quantity === 'pH' ? 1 : 0;
    return sign * dose.effect.change > 0 && alike(fact.change, dose.effect.change, decimals) && needed(told, dose);
  };
}

/** The middle of pH hour by hour, had nothing gone in beside chlorine. */
function pHWithout(told: Told): number[] {
  const others = companionDoses(told);
  const doses = told.plan.doses.filter((dose) => !others.includes(dose));
  return projectScenario({ ...told.scenario, doses }).projection?.pH.p50 ?? [];
}

/** Of the hours in which somebody may swim, those in which the middle keeps chlorine and pH and no dose asks to wait. */
export function openShareOf(told: Told): number {
  const { plan } = told;
  const waits: Record<string, number> = { trichlor: 0.25, 'sodium-bicarbonate': 2 };
  const swim = plan.hours.map((hour) => Date.parse(hour)).filter((hour) => isSwimHour(hour, told));
  const open = swim.filter((hour) => {
    const index = plan.hours.findIndex((each) => Date.parse(each) === hour);
    const { freeChlorine, pH } = plan.projection!;
    const level = freeChlorine.p50[index]!;
    return (
      level >= freeChlorine.lowestLevel[index]! &&
      level <= told.scenario.pool.swimLimit &&
      pH.p50[index]! >= 7.2 &&
      pH.p50[index]! <= 7.8 &&
      plan.doses.every(({ at, substance }) => {
        const since = (hour - Date.parse(at)) / HOUR;
        return since < 0 || since >= (waits[substance] ?? 4);
      })
    );
  });
  return swim.length === 0 ? 1 : open.length / swim.length;
}

function cents(money: number): number {
  return Math.round(money * 100);
}

function tabletOf(id: unknown, told: Told): Pick<ShelfProduct, 'tabletMass' | 'strength'> {
  return productOf(told, id) ?? {};
}

/** Tablets that went in during some hours before now. */
function tabletsGiven(told: Told, hours: number): { count: number; grams: number } {
  const { given, shelf, now } = told.scenario;
  const from = Math.max(takenAt(told), now === undefined ? 0 : Date.parse(now)) - hours * HOUR;
  const tablets = given.flatMap(({ product: id, amount, at }) => {
    const product = shelf.find((each) => each.id === id);
    return product?.form === 'tablet' && Date.parse(at) >= from
      ? [{ count: amount, grams: amount * (product.tabletMass ?? 227) }]
      : [];
  });
  return { count: sumOf(tablets, ({ count }) => count), grams: sumOf(tablets, ({ grams }) => grams) };
}
