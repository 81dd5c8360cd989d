import { strengthOnDay } from '@/lib/storage/liquid-strength';
import {
  alike,
  companionDoses,
  fastDoses,
  type Holds,
  isDark,
  isMeasured,
  isPHNow,
  isSwimHour,
  hourAt,
  number,
  pHAsRead,
  productOf,
  readingsOf,
  sumOf,
  takenAt,
  type Told,
  waterAtFirst,
} from './told';
import { breaksLimits } from './wishes';

const HOUR = 3_600_000;
const hardnessKept = {
  plaster: [200, 400],
  tile: [200, 400],
  vinyl: [100, 250],
  fibreglass: [120, 250],
  painted: [150, 300],
} as const;

/** The handbook's index knows no activities: in cold and in salty water it lies up to so much beside ours. */
const NEAR_HANDBOOK = 0.4;

/** Nothing of a product stands in the plan. */
const notPlanned: Holds = (fact, { plan }) => plan.doses.every(({ product }) => product !== fact.product);

/** Of each caution: whether what it says is so. */
export const cautionHolds: Record<string, Holds> = {
  'pH-out-of-range': (fact, told) => {
    return isPHNow(fact.pH, told) && (number(fact.pH) < 7.2 || number(fact.pH) > 7.8);
  },
  'combined-chlorine-high': (fact, told) => {
    const newest = readingsOf(told)
      .filter(({ combinedChlorine }) => combinedChlorine !== undefined)
      .toSorted((a, b) => Date.parse(b.takenAt) - Date.parse(a.takenAt))[0]?.combinedChlorine;
    return (
      typeof newest === 'number' &&
      number(fact.combinedChlorine) > 0.4 &&
      (fact.combinedChlorine === newest || !readInNewest(told))
    );
  },
  'label-way-unknown': (fact, told) =>
    (productOf(told, fact.product)?.labelWay ?? 'unknown') === 'unknown' && notPlanned(fact, told),
  'liquid-past-half-strength': (fact, told) => {
    const product = productOf(told, fact.product);
    if (product?.boughtOn === undefined) return false;
    const { boughtOn, storedAt, strength = 12.5 } = product;
    const day = new Intl.DateTimeFormat('en-CA', { timeZone: told.scenario.pool.timeZone }).format(takenAt(told));
    return strengthOnDay({ strength, boughtOn, storedAt }, day) < strength / 2 && notPlanned(fact, told);
  },
  'liquid-age-unknown': (fact, told) => {
    const product = productOf(told, fact.product);
    return product?.form === 'liquid' && product.boughtOn === undefined;
  },
  'feeder-ingredient-other': (fact, told) =>
    productOf(told, fact.product)?.substance !== told.scenario.pool.feeder.ingredient && notPlanned(fact, told),
  'granules-not-for-surface': (fact, told) =>
    productOf(told, fact.product)?.labelWay === 'broadcast' &&
    ['vinyl', 'fibreglass', 'painted'].includes(told.scenario.pool.surface) &&
    notPlanned(fact, told),
  'stock-short': (fact, told) => {
    const product = productOf(told, fact.product);
    const doses = told.plan.doses.filter(({ product: id }) => id === fact.product);
    return product !== undefined && sumOf(doses, ({ amount }) => amount) > product.stock;
  },
  'dose-after-dark': (fact, told) => {
    // Acid waits for first light, and no swimmer makes it late.
    const dark = told.plan.doses.filter((dose) => isDark(dose, told));
    const swumBefore = dark.every(({ at }) => isSwimHour(Date.parse(at) - 0.5 * HOUR, told));
    return dark.length > 0 && fact.doses === dark.length && swumBefore;
  },
  'wishes-set-aside': (_, told) =>
    told.plan.doses.every(({ reason }) => reason !== 'wished') &&
    told.plan.reasons.every(({ code }) => code !== 'wished') &&
    breaksLimits(told),
  'volume-estimated': (fact, told) => {
    const halved = told.plan.doses.some(({ reason }) => reason === 'first-dose-halved');
    const { volume, volumeEstimated } = told.scenario.pool;
    return volumeEstimated && fact.volume === volume && (fact.halved === 'yes') === halved;
  },
  'free-chlorine-over-swim-limit': (fact, told) => {
    const { swimLimit } = told.scenario.pool;
    const now = waterAtFirst(told, 'freeChlorine');
    const course = told.plan.projection?.freeChlorine.p50 ?? [];
    const firstDose = Math.min(...fastDoses(told).map(({ at }) => hourAt(at, told)), course.length - 1);
    const comesDown = Math.min(...course.slice(0, firstDose + 1)) < now || firstDose === 0;
    return alike(fact.freeChlorine, now, 1) && fact.swimLimit === swimLimit && now > swimLimit && comesDown;
  },
  'companion-waits': (fact, told) => {
    const { plan } = told;
    const { pool } = told.scenario;
    const pH = plan.projection?.pH.p50 ?? [];
    const needed: Record<string, boolean> = {
      'raises-alkalinity': isMeasured(told, 'totalAlkalinity') && waterAtFirst(told, 'totalAlkalinity') < 95,
      'lowers-pH': pH.some((value) => value > 7.75),
      'raises-pH': pH.some((value) => value < 7.25),
      'raises-hardness':
        isMeasured(told, 'calciumHardness') && waterAtFirst(told, 'calciumHardness') < hardnessKept[pool.surface][0],
      'raises-stabilizer':
        isMeasured(told, 'cyanuricAcid') && waterAtFirst(told, 'cyanuricAcid') < pool.stabilizerBand[0],
    };
    return companionDoses(told).length === 0 && needed[String(fact.reason)] === true;
  },
  'hardness-outside-surface-range': (fact, told) => {
    const hardness = waterAtFirst(told, 'calciumHardness');
    const [low, high] = hardnessKept[told.scenario.pool.surface];
    return (
      alike(fact.calciumHardness, hardness, 0) &&
      fact.low === low &&
      fact.high === high &&
      (hardness < low || hardness > high) &&
      Math.abs(number(fact.index) - handbookIndex(told)) < NEAR_HANDBOOK
    );
  },
};

function readInNewest(told: Told): boolean {
  return readingsOf(told).some(
    ({ takenAt: at, combinedChlorine }) => Date.parse(at) === takenAt(told) && combinedChlorine !== undefined,
  );
}

/**
 * The saturation index by the handbook's logarithms: pH + temperature factor + lg hardness - 0.4 + lg carbonate alkalinity
 * - 12.1, the factor from 0.3 at 8 deg C to 0.9 at 36 deg C.
 */
function handbookIndex(told: Told): number {
  const pH = pHAsRead(told);
  const read = readingsOf(told).flatMap(({ temperature }) => (typeof temperature === 'number' ? [temperature] : []));
  const temperature = read.at(-1) ?? 26;
  const carbonate =
    waterAtFirst(told, 'totalAlkalinity') - (0.3 + 0.1 * (pH - 7.5)) * waterAtFirst(told, 'cyanuricAcid');
  const hardness = waterAtFirst(told, 'calciumHardness');
  const index =
    pH + (0.08 + 0.021 * temperature) + Math.log10(hardness) - 0.4 + Math.log10(Math.max(1, carbonate)) - 12.1;
  return index;
}
