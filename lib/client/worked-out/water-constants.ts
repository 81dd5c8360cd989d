import {
  activityCoefficients,
  debyeHuckelCoefficient,
  dielectricConstant,
  ionicStrengthOf,
  KELVIN_AT_ZERO,
  waterActivity,
} from '@/lib/chemistry/activity';
import {
  chlorocyanurateHydrolysisPK,
  cyanuricAcidPK,
  dichlorocyanurateHydrolysisPK,
  OBRIEN_1974,
} from '@/lib/chemistry/cyanurate-constants';
import { LOG_CARBON_DIOXIDE_PRESSURE } from '@/lib/chemistry/equilibrium-constants';
import { MOLAR_MASS } from '@/lib/chemistry/molar-masses';
import {
  boricAcidDissociation,
  calciteSolubility,
  calciumBicarbonatePairing,
  calciumCarbonatePairing,
  carbonDioxideSolubility,
  carbonicAcidFirstDissociation,
  carbonicAcidSecondDissociation,
  hypochlorousAcidDissociation,
  waterDissociation,
} from '@/lib/chemistry/published-constants';
import { alkalinityFactor, calciumFactor, saturationPH } from '@/lib/chemistry/saturation';
import { DEFAULT_DISSOLVED_SOLIDS } from '@/lib/chemistry/water';
import { type Constant, group, type SourceName } from './constant';

/** Constants of equilibrium are listed at 25 degrees C, where most of them were measured. */
const celsius = 25;
const kelvin = celsius + KELVIN_AT_ZERO;

function fit<Name extends string>(
  name: Name,
  file: string,
  formula: (kelvin: number) => number,
  written: string,
  unit: 'logK' | 'pK',
  source?: SourceName,
): Constant<Name> {
  const of = `chemistry/${file}#${formula.name}`;
  return { name, value: formula(kelvin), unit, of, at: [kelvin], formula: written, ...(source ? { source } : {}) };
}

const carbonate = <Name extends string>(name: Name, formula: (kelvin: number) => number, written: string) =>
  fit(name, 'published-constants', formula, written, 'logK');

/** pK of each constant of the set, the way they are published. */
const obrien = (Object.keys(OBRIEN_1974) as (keyof typeof OBRIEN_1974)[]).map((name) => ({
  name,
  value: -Math.log10(OBRIEN_1974[name]),
  unit: 'pK' as const,
  of: `chemistry/cyanurate-constants#OBRIEN_1974.${name}`,
}));

export const waterConstants = [
  group('hypochlorous', ['chlorine-forms', 'free-chlorine', 'ph'], 'morris1966', [
    fit(
      'hypochlorousAcid',
      'published-constants',
      hypochlorousAcidDissociation,
      'log K = −(3000/*T* − 10.0686 + 0.0253 *T*)',
      'logK',
    ),
  ]),
  group('cyanurate', ['chlorine-forms', 'stabilizer'], 'obrien1974', obrien),
  group('cyanurateLater', ['chlorine-forms'], 'wahman2019', [
    fit('cyanuricAcidLater', 'cyanurate-constants', cyanuricAcidPK, 'pK = 1743/*T* + 1.12', 'pK', 'wahman2018'),
    fit('twoHydrolysisLater', 'cyanurate-constants', dichlorocyanurateHydrolysisPK, 'pK = 2028/*T* − 2.15', 'pK'),
    fit('oneHydrolysisLater', 'cyanurate-constants', chlorocyanurateHydrolysisPK, 'pK = 2229/*T* − 1.65', 'pK'),
  ]),
  group('carbonate', ['ph', 'alkalinity', 'calcium'], 'plummer1982', [
    carbonate(
      'carbonDioxideGas',
      carbonDioxideSolubility,
      'log K = 108.3865 + 0.01985076 *T* − 6919.53/*T* − 40.45154 log *T* + 669365/*T*²',
    ),
    carbonate(
      'carbonicAcidFirst',
      carbonicAcidFirstDissociation,
      'log K = −356.3094 − 0.06091964 *T* + 21834.37/*T* + 126.8339 log *T* − 1684915/*T*²',
    ),
    carbonate(
      'carbonicAcidSecond',
      carbonicAcidSecondDissociation,
      'log K = −107.8871 − 0.03252849 *T* + 5151.79/*T* + 38.92561 log *T* − 563713.9/*T*²',
    ),
    carbonate('calcite', calciteSolubility, 'log K = −171.9065 − 0.077993 *T* + 2839.319/*T* + 71.595 log *T*'),
    carbonate(
      'calciumBicarbonate',
      calciumBicarbonatePairing,
      'log K = 1209.12 + 0.31294 *T* − 34765.05/*T* − 478.782 log *T*',
    ),
    carbonate(
      'calciumCarbonatePair',
      calciumCarbonatePairing,
      'log K = −1228.732 − 0.299444 *T* + 35512.75/*T* + 485.818 log *T*',
    ),
  ]),
  group('waterAndBorate', ['ph', 'alkalinity'], 'phreeqc', [
    fit(
      'water',
      'published-constants',
      waterDissociation,
      'log K = 293.29227 + 0.1360833 *T* − 10576.913/*T* − 123.73158 log *T* − 6.996455 · 10{^−5} *T*²',
      'logK',
    ),
    fit(
      'boricAcid',
      'published-constants',
      boricAcidDissociation,
      'log K = −9.24 − 3.224 · 4184 / (8.31446 ln 10) · (1/*T* − 1/298.15)',
      'logK',
    ),
    {
      name: 'airCarbonDioxide',
      value: LOG_CARBON_DIOXIDE_PRESSURE,
      unit: 'none',
      of: 'chemistry/equilibrium-constants#LOG_CARBON_DIOXIDE_PRESSURE',
      source: 'air',
    },
  ]),
  group('activity', ['chlorine-forms', 'ph', 'calcium'], 'davies1962', [
    {
      name: 'ionicStrength',
      value: ionicStrengthOf(DEFAULT_DISSOLVED_SOLIDS),
      unit: 'molesPerLitre',
      of: 'chemistry/activity#ionicStrengthOf',
      at: [DEFAULT_DISSOLVED_SOLIDS],
      formula: '*I* = 1.6 · 10{^−5} · {=dissolvedSolids}',
      source: 'ionic',
    },
    {
      name: 'dissolvedSolids',
      value: DEFAULT_DISSOLVED_SOLIDS,
      unit: 'mg/L',
      of: 'chemistry/water#DEFAULT_DISSOLVED_SOLIDS',
      source: 'practice',
    },
    {
      name: 'debyeHuckel',
      value: debyeHuckelCoefficient(celsius),
      unit: 'none',
      of: 'chemistry/activity#debyeHuckelCoefficient',
      at: [celsius],
      formula: '*A* = 1.82 · 10{^6} (*ε* *T*){^−1.5}',
      source: 'stumm',
    },
    {
      name: 'davies',
      value: activityCoefficients(celsius, ionicStrengthOf(DEFAULT_DISSOLVED_SOLIDS)).single,
      unit: 'none',
      of: 'chemistry/activity#activityCoefficients.single',
      at: [celsius, ionicStrengthOf(DEFAULT_DISSOLVED_SOLIDS)],
      formula: 'log *γ* = −*A* *z*² (√*I* / (1 + √*I*) − 0.3 *I*), {=uncharged} log *γ* = 0.1 *I*',
    },
    {
      name: 'dielectric',
      value: dielectricConstant(celsius),
      unit: 'none',
      of: 'chemistry/activity#dielectricConstant',
      at: [celsius],
      formula: '*ε* = 87.74 − 0.40008 *t* + 9.398 · 10{^−4} *t*² − 1.41 · 10{^−6} *t*³',
      source: 'malmberg1956',
    },
    {
      name: 'waterActivity',
      value: waterActivity(ionicStrengthOf(DEFAULT_DISSOLVED_SOLIDS)),
      unit: 'none',
      of: 'chemistry/activity#waterActivity',
      at: [ionicStrengthOf(DEFAULT_DISSOLVED_SOLIDS)],
      formula: '*a* = 1 − 0.034 *I*',
      source: 'phreeqc',
    },
    {
      name: 'kelvinAtZero',
      value: KELVIN_AT_ZERO,
      unit: 'none',
      of: 'chemistry/activity#KELVIN_AT_ZERO',
      source: 'weights',
    },
  ]),
  group('handbookIndex', ['calcium'], 'handbook', [
    {
      name: 'saturationPH',
      value: saturationPH(1000, celsius, 300, 100),
      unit: 'pH',
      of: 'chemistry/saturation#saturationPH',
      at: [1000, celsius, 300, 100],
      formula: 'pHs = 9.3 + (log TDS − 1)/10 − 13.12 log(*t* + 273) + 34.55 − *C* − *D*',
    },
    {
      name: 'calciumFactor',
      value: calciumFactor(300),
      unit: 'none',
      of: 'chemistry/saturation#calciumFactor',
      at: [300],
      formula: '*C* = log {=hardness} − 0.4',
    },
    {
      name: 'alkalinityFactor',
      value: alkalinityFactor(100),
      unit: 'none',
      of: 'chemistry/saturation#alkalinityFactor',
      at: [100],
      formula: '*D* = log {=alkalinity}',
    },
  ]),
  group(
    'molarMasses',
    ['stabilizer', 'ph', 'alkalinity', 'calcium'],
    'weights',
    (Object.keys(MOLAR_MASS) as (keyof typeof MOLAR_MASS)[]).map((name) => ({
      name,
      value: MOLAR_MASS[name],
      unit: 'gPerMole' as const,
      of: `chemistry/molar-masses#MOLAR_MASS.${name}`,
      ...(name === 'trichlor' || name === 'dichlorDihydrate' ? { source: 'epa2017' as const } : {}),
    })),
  ),
];
