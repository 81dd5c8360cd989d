import { coverPasses } from '@/lib/projection/forcing';
import { latentHeat, PER_WIND, QUIET_POOL, saturationPressure, STILL_AIR } from '@/lib/projection/evaporation';
import { ENSEMBLE_SIZE } from '@/lib/projection/ensemble';
import { parametersOf, priorSigma } from '@/lib/projection/parameters';
import {
  growthPerDay,
  LEAST_FREE_CHLORINE_ERROR,
  methodError,
  type UncertainQuantity,
  uncertainQuantities,
  WIDTHS_OF_INTERVAL,
} from '@/lib/projection/reading-error';
import {
  CARBON_DIOXIDE_UNDER_COVER,
  COMBINED_LOSS_COVERED,
  COMBINED_LOSS_OPEN,
  HYPOCHLORITE_PHOTOLYSIS,
  HYPOCHLOROUS_ACID_PHOTOLYSIS,
  LIGHT_ATTENUATION,
  SHARE_BECOMING_COMBINED,
} from '@/lib/projection/step';
import { lifeOf } from '@/lib/projection/tablets';
import { readingMethods } from '@/lib/schemas/reading-kinds';
import { solarPosition } from '@/lib/sun/solar-position';
import { skyOfSunshine } from '@/lib/sun/sunshine';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import { REFERENCE_ELEVATION, ULTRAVIOLET_EXPONENT } from '@/lib/sun/ultraviolet';
import { type Constant, type ConstantUnit, group, type SourceName } from './constant';

const MIDSUMMER = Date.UTC(2026, 5, 21, 12);
const still = parametersOf({ volume: 1, waterFeatures: false });
const moving = parametersOf({ volume: 1, waterFeatures: true });

const parameter = <Name extends keyof typeof still>(name: Name, unit: ConstantUnit, source: SourceName) => ({
  name,
  value: still[name],
  unit,
  of: `projection/parameters#parametersOf.${name}`,
  source,
});

const step = <Name extends string>(name: Name, value: number, unit: ConstantUnit, of: string, source: SourceName) => ({
  name,
  value,
  unit,
  of: `projection/step#${of}`,
  source,
});

const sigma = <Name extends keyof typeof priorSigma>(name: Name) => ({
  name: `${name}Spread` as const,
  value: priorSigma[name],
  unit: 'sigmaOfLog' as const,
  of: `projection/parameters#priorSigma.${name}`,
});

/** What a method's error counts in: a share of the value, or the value's own unit. */
const errorUnit = (quantity: UncertainQuantity, relative: boolean): ConstantUnit =>
  relative ? 'none' : quantity === 'pH' ? 'pH' : 'mg/L';

const methodErrors = uncertainQuantities.flatMap((quantity) =>
  readingMethods.map((method): Constant<`method.${typeof quantity}.${typeof method}`> => {
    const error = methodError[quantity][method];
    const kind = 'relative' in error ? 'relative' : 'absolute';
    return {
      name: `method.${quantity}.${method}`,
      value: 'relative' in error ? error.relative : error.absolute,
      unit: errorUnit(quantity, kind === 'relative'),
      of: `projection/reading-error#methodError.${quantity}.${method}.${kind}`,
    };
  }),
);

export const weekConstants = [
  group('sunlight', ['free-chlorine', 'sun'], 'nowell1992', [
    step('hypochlorousAcidSun', HYPOCHLOROUS_ACID_PHOTOLYSIS, 'perHour', 'HYPOCHLOROUS_ACID_PHOTOLYSIS', 'nowell1992'),
    step('hypochloriteSun', HYPOCHLORITE_PHOTOLYSIS, 'perHour', 'HYPOCHLORITE_PHOTOLYSIS', 'nowell1992'),
    parameter('boundPhotolysis', 'perHour', 'fitted'),
    parameter('sunStrength', 'none', 'practice'),
    step('lightAttenuation', LIGHT_ATTENUATION, 'perMetre', 'LIGHT_ATTENUATION', 'practice'),
    {
      name: 'referenceElevation',
      value: REFERENCE_ELEVATION,
      unit: 'degrees',
      of: 'sun/ultraviolet#REFERENCE_ELEVATION',
      source: 'nowell1992',
    },
    {
      name: 'ultravioletExponent',
      value: ULTRAVIOLET_EXPONENT,
      unit: 'none',
      of: 'sun/ultraviolet#ULTRAVIOLET_EXPONENT',
      source: 'madronich2007',
    },
  ]),
  group('solar', ['sun'], 'michalsky1988', [
    {
      name: 'declination',
      value: solarPosition(MIDSUMMER).declination,
      unit: 'none',
      of: 'sun/solar-position#solarPosition.declination',
      at: [MIDSUMMER],
      formula:
        '*L* = 280.46 + 0.9856474 *n*, *g* = 357.528 + 0.9856003 *n*, *λ* = *L* + 1.915 sin *g* + 0.02 sin 2*g*, *ε* = 23.439 − 4 · 10{^−7} *n*, {=siderealTime} 280.46062 + 360.98564737 *n*',
    },
  ]),
  group('sunshine', ['sun'], 'fao56', [
    {
      name: 'skyOfSunshine',
      value: skyOfSunshine(11, 15),
      unit: 'none',
      of: 'sun/sunshine#skyOfSunshine',
      at: [11, 15],
      formula: '(0.25 + 0.5 *n* / *N*) / 0.75',
    },
  ]),
  group('covers', ['sun', 'evaporation'], 'practice', [
    {
      name: 'floatingSun',
      value: coverPasses.floating.sun,
      unit: 'none',
      of: 'projection/forcing#coverPasses.floating.sun',
    },
    { name: 'opaqueSun', value: coverPasses.opaque.sun, unit: 'none', of: 'projection/forcing#coverPasses.opaque.sun' },
    {
      name: 'floatingEvaporation',
      value: coverPasses.floating.evaporation,
      unit: 'none',
      of: 'projection/forcing#coverPasses.floating.evaporation',
    },
    {
      name: 'opaqueEvaporation',
      value: coverPasses.opaque.evaporation,
      unit: 'none',
      of: 'projection/forcing#coverPasses.opaque.evaporation',
    },
  ]),
  group('evaporation', ['evaporation'], 'smith1998', [
    {
      name: 'stillAir',
      value: STILL_AIR,
      unit: 'none',
      of: 'projection/evaporation#STILL_AIR',
    },
    { name: 'perWind', value: PER_WIND, unit: 'none', of: 'projection/evaporation#PER_WIND' },
    { name: 'quietPool', value: QUIET_POOL, unit: 'none', of: 'projection/evaporation#QUIET_POOL' },
    {
      name: 'saturationPressure',
      value: saturationPressure(25),
      unit: 'kilopascals',
      of: 'projection/evaporation#saturationPressure',
      at: [25],
      formula: '*p* = 0.61094 e{^17.625 *t* / (*t* + 243.04)}',
      source: 'alduchov1996',
    },
    {
      name: 'latentHeat',
      value: latentHeat(25),
      unit: 'kilojoulesPerKilogram',
      of: 'projection/evaporation#latentHeat',
      at: [25],
      formula: '*Y* = 2501 − 2.361 *t*',
      source: 'fao56',
    },
    {
      name: 'evaporationDefault',
      value: weekAheadSchema.parse({}).evaporation[0] ?? 0,
      unit: 'mm',
      of: 'schemas/week-ahead#weekAheadSchema',
      source: 'practice',
    },
  ]),
  group('darkAndSwimmers', ['free-chlorine', 'swimmers', 'combined-chlorine'], 'practice', [
    parameter('darkDemand', 'perHour', 'practice'),
    parameter('chlorinePerSwimmerHour', 'gPerHour', 'bathers'),
    parameter('waterPerSwimmerHour', 'litresPerHour', 'practice'),
    step('becomingCombined', SHARE_BECOMING_COMBINED, 'none', 'SHARE_BECOMING_COMBINED', 'practice'),
    step('combinedLossOpen', COMBINED_LOSS_OPEN, 'perHour', 'COMBINED_LOSS_OPEN', 'practice'),
    step('combinedLossCovered', COMBINED_LOSS_COVERED, 'perHour', 'COMBINED_LOSS_COVERED', 'practice'),
  ]),
  group('tabletLife', ['tablets'], 'practice', [
    parameter('tabletLife', 'hours', 'practice'),
    {
      name: 'lightTabletLife',
      value: lifeOf(20, still.tabletLife),
      unit: 'hours',
      of: 'projection/tablets#lifeOf',
      at: [20, still.tabletLife],
      formula: '{=life} · ∛({=mass}/200) {=under} 200 g, {=life} · ∛({=mass}/230) {=over} 230 g',
      source: 'tabletShape',
    },
  ]),
  group('carbonDioxideLoss', ['ph'], 'practice', [
    parameter('carbonDioxideTransfer', 'metresPerHour', 'fitted'),
    {
      name: 'carbonDioxideMoving',
      value: moving.carbonDioxideTransfer,
      unit: 'metresPerHour',
      of: 'projection/parameters#parametersOf(waterFeatures).carbonDioxideTransfer',
      source: 'fitted',
    },
    step('carbonDioxideCovered', CARBON_DIOXIDE_UNDER_COVER, 'none', 'CARBON_DIOXIDE_UNDER_COVER', 'practice'),
    parameter('leak', 'm3', 'ours'),
  ]),
  group('spreads', ['likely-range', 'learning'], 'spread', [
    sigma('boundPhotolysis'),
    sigma('sunStrength'),
    sigma('darkDemand'),
    sigma('chlorinePerSwimmerHour'),
    sigma('tabletLife'),
    sigma('waterPerSwimmerHour'),
    sigma('carbonDioxideTransfer'),
    sigma('volume'),
    {
      name: 'ensembleSize',
      value: ENSEMBLE_SIZE,
      unit: 'pools',
      of: 'projection/ensemble#ENSEMBLE_SIZE',
      source: 'ours',
    },
  ]),
  group('methodErrors', ['likely-range', 'learning'], 'kits', methodErrors),
  group('readingErrors', ['likely-range'], 'ours', [
    {
      name: 'leastFreeChlorineError',
      value: LEAST_FREE_CHLORINE_ERROR,
      unit: 'mg/L',
      of: 'projection/reading-error#LEAST_FREE_CHLORINE_ERROR',
    },
    {
      name: 'widthsOfInterval',
      value: WIDTHS_OF_INTERVAL,
      unit: 'none',
      of: 'projection/reading-error#WIDTHS_OF_INTERVAL',
    },
    ...uncertainQuantities.map((quantity) => ({
      name: `${quantity}Growth` as const,
      value: growthPerDay[quantity],
      unit: errorUnit(quantity, false),
      of: `projection/reading-error#growthPerDay.${quantity}`,
    })),
  ]),
];
