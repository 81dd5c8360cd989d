import { describe, expect, it } from 'vitest';
import {
  addDose,
  aerateToEquilibrium,
  amountToReach,
  chlorineSpecies,
  constantsOfLedger,
  type DosedProduct,
  langelierIndex,
  ledgerOf,
  type ModelChoice,
  newLedgerState,
  saturationIndex,
  solveLedger,
  storedHypochloriteStrength,
  type Substance,
  SUBSTANCES,
  type Target,
  useUpChlorine as afterUseOf,
  type WaterAnalysis,
} from '@/lib/chemistry';
import {
  chlorocyanurateHydrolysisPK,
  cyanuricAcidPK,
  dichlorocyanurateHydrolysisPK,
  OBRIEN_1974,
} from '@/lib/chemistry/cyanurate-constants';
import {
  breakpointArithmetic,
  CHLORINE_PER_NITROGEN_AT_BREAKPOINT,
  CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE,
} from '@/lib/chemistry/breakpoint';
import { hypochloriteHalfLife } from '@/lib/chemistry/hypochlorite-decay';
import { alkalinityWithoutCarbonate, ledgerWithoutCarbon } from '@/lib/chemistry/ledger';
import {
  calciteSolubility,
  carbonDioxideSolubility,
  carbonicAcidFirstDissociation,
  carbonicAcidSecondDissociation,
  hypochlorousAcidDissociation,
  waterDissociation,
} from '@/lib/chemistry/published-constants';
import { alkalinityFactor, calciumFactor, saturationPH } from '@/lib/chemistry/saturation';
import { daylightOf } from '@/lib/sun/daylight';
import { solarElevation } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';
import { referenceRows, type ReferenceRow } from './reference-table';

// Source: tests/reference/published-values.csv; the source of each value stands in its own column there.

const POUND = 453.59237;
const OUNCE = 28.349523125;
const FLUID_OUNCE = 29.5735295625; // mL
const GALLON = 3.785411784e-3; // m3
const TEN_THOUSAND_GALLONS = 10_000 * GALLON;
const ideal: ModelChoice = { activity: 'ideal' };

const celsius = (fahrenheit: number) => (fahrenheit - 32) / 1.8;
const kelvin = (value: number) => value + 273.15;
const radians = Math.PI / 180;

type Inputs = (name: string) => number;

/** "pH=7.5;TA=100" as a function of the name. */
function inputsOf(row: ReferenceRow): Inputs {
  const pairs = new Map(
    row
      .text('inputs')
      .split(';')
      .map((pair) => pair.split('=') as [string, string | undefined]),
  );
  return (name) => {
    const value = Number(pairs.get(name));
    if (!Number.isFinite(value)) throw new Error(`${row.text('id')} has no ${name}: ${row.text('inputs')}`);
    return value;
  };
}

const basis: WaterAnalysis = {
  freeChlorine: 0,
  pH: 7.5,
  totalAlkalinity: 100,
  calciumHardness: 200,
  cyanuricAcid: 0,
  temperature: 25,
};

const water = (change: Partial<WaterAnalysis>): WaterAnalysis => ({ ...basis, ...change });

/** Dissolved solids that give an ionic strength. */
const solidsOf = (ionicStrength: number) => ionicStrength / 1.6e-5;

function idealAcid(freeChlorine: number, cyanuricAcid: number, pH: number, temperature: number, choice = ideal) {
  return chlorineSpecies(water({ freeChlorine, cyanuricAcid, pH, temperature }), choice).hypochlorousAcid;
}

/** mg/L as CaCO3 that 1 mg/L of something carries at a pH, by the change of the non-carbonate alkalinity. */
function alkalinityCarried(change: Partial<WaterAnalysis>, pH: number): number {
  const carried = (analysis: WaterAnalysis) => {
    const ledger = ledgerWithoutCarbon(analysis);
    return alkalinityWithoutCarbonate(ledger, 10 ** -pH, constantsOfLedger(ledger, ideal)) * 50_043.5;
  };
  return carried(water(change)) - carried(water({}));
}

/** Amount per 10,000 gal for a change of one quantity. */
function amountFor(product: DosedProduct, quantity: Target['quantity'], change: number): number {
  const from = water({ freeChlorine: 5 });
  const before = { ...from, pH: from.pH }[quantity];
  return amountToReach(from, TEN_THOUSAND_GALLONS, product, { quantity, value: before + change });
}

/** What one mg/L of chlorine from a product changes, at once or after it is used up. */
function perChlorine(
  substance: Substance,
  quantity: 'cyanuricAcid' | 'calciumHardness' | 'totalAlkalinity',
  used: boolean,
) {
  const amount = amountToReach(basis, 1, { substance }, { quantity: 'freeChlorine', value: 1 });
  const dosed = addDose(basis, 1, { substance, amount });
  return (used ? afterUseOf(dosed, 1) : dosed)[quantity] - basis[quantity];
}

/** Water of the acid rows: 26.7 deg C (80 deg F), ionic strength 0.025, soft. */
const acidWater = (of: Inputs) =>
  water({
    pH: of('pH'),
    totalAlkalinity: of('TA'),
    cyanuricAcid: of('CYA'),
    temperature: 26.7,
    calciumHardness: 0,
    dissolvedSolids: solidsOf(0.025),
  });

function acidFluidOunces(of: Inputs): number {
  const target: Target = { quantity: 'pH', value: of('target') };
  const product: DosedProduct = { substance: 'hydrochloric-acid', strength: 31.45 };
  return amountToReach(acidWater(of), TEN_THOUSAND_GALLONS, product, target) / FLUID_OUNCE;
}

function dioxideRatio(of: Inputs): number {
  const ledger = ledgerOf(
    water({
      pH: of('pH'),
      totalAlkalinity: of('carbonate alkalinity'),
      temperature: of('T_C'),
      calciumHardness: 0,
      dissolvedSolids: solidsOf(of('I')),
    }),
  );
  const state = newLedgerState();
  solveLedger(ledger, constantsOfLedger(ledger), state);
  return state.carbonDioxide / (state.carbonDioxide - state.carbonDioxideExcess);
}

function calciteIndex(of: Inputs, ionicStrength: number): number {
  return saturationIndex(
    water({
      pH: of('pH'),
      totalAlkalinity: of('TA'),
      calciumHardness: of('CH'),
      cyanuricAcid: of('CYA'),
      temperature: of('T_C'),
      dissolvedSolids: solidsOf(ionicStrength),
    }),
  );
}

const chlorineOunces = (product: DosedProduct) => amountFor(product, 'freeChlorine', 1) / OUNCE;
const liquidOunces = (strength: number) =>
  amountFor({ substance: 'sodium-hypochlorite', strength }, 'freeChlorine', 1) / FLUID_OUNCE;
const pounds = (product: DosedProduct, quantity: Target['quantity'], change: number) =>
  amountFor(product, quantity, change) / POUND;

/** Trade per cent of a liquid given in weight per cent NaOCl; 12.5 % is 1.19 g/mL (sources.md 4.2), so 1 + 0.0152 w. */
const tradeOfWeight = (weight: number) => (weight * (1 + 0.0152 * weight) * 70.906) / 74.442;

/** UV index at 300 Dobson units: 12.5 with the sun overhead (Madronich 2007), falling as our weight falls. */
const ultravioletIndex = (elevation: number) => (12.5 * ultravioletWeight(elevation)) / ultravioletWeight(90);

/** Elevation of the sun at its highest on day n of 2025, on the Greenwich meridian. */
function noonElevation(latitude: number, day: number): number {
  const noon = Date.UTC(2025, 0, day, 12);
  const { sunrise, sunset } = daylightOf(noon, latitude, 0);
  return solarElevation((sunrise! + sunset!) / 2, latitude, 0);
}

/** Which function of ours answers which rows. The first pattern that fits an id counts. */
const answers: readonly [pattern: RegExp, answer: (of: Inputs, id: string) => number][] = [
  [/^SPEC-PK-\d+$/, (of) => -hypochlorousAcidDissociation(kelvin(of('T_C')))],
  [/^SPEC-FR-/, (of) => idealAcid(1, 0, of('pH'), of('T_C'))],
  [/^SPEC-CYA-/, (of) => idealAcid(of('FC'), of('CYA'), of('pH'), of('T_C'))],
  [/^SPEC-K9$/, () => -Math.log10(OBRIEN_1974.oneHydrolysis)],
  [/^SPEC-W-K7/, (of) => dichlorocyanurateHydrolysisPK(kelvin(of('T_C')))],
  [/^SPEC-W-K9/, (of) => chlorocyanurateHydrolysisPK(kelvin(of('T_C')))],
  [/^SPEC-W-K6/, (of) => cyanuricAcidPK(kelvin(of('T_C')))],
  [
    /^SPEC-WS-/,
    (of) => idealAcid(of('FC'), of('CYA'), of('pH'), of('T_C'), { activity: 'ideal', constants: 'wahman-2019' }),
  ],
  [
    /^SPEC-RATIO$/,
    () => {
      const acids = [1, 2, 3, 4, 5].map((chlorine) => idealAcid(chlorine, 20 * chlorine, 7.5, 25));
      const mean = acids.reduce((sum, acid) => sum + acid, 0) / acids.length;
      return (Math.max(...acids) - Math.min(...acids)) / 2 / mean;
    },
  ],
  [/^LSI-CF-/, (of) => calciumFactor(of('CH'))],
  [/^LSI-AF-/, (of) => alkalinityFactor(of('TA'))],
  [/^LSI-PHS-/, (of) => saturationPH(of('TDS'), of('T_C'), of('Ca'), of('Alk'))],
  [
    /^LSI-F-/,
    (of) =>
      langelierIndex(
        water({
          pH: of('pH'),
          dissolvedSolids: of('TDS'),
          temperature: of('T_C'),
          calciumHardness: of('Ca'),
          totalAlkalinity: of('Alk'),
        }),
      ),
  ],
  [/^CARB-K1-/, (of) => -carbonicAcidFirstDissociation(kelvin(of('T_C')))],
  [/^CARB-K2-/, (of) => -carbonicAcidSecondDissociation(kelvin(of('T_C')))],
  [/^CARB-KC-/, (of) => -calciteSolubility(kelvin(of('T_C')))],
  [/^CARB-KH-/, (of) => -carbonDioxideSolubility(kelvin(of('T_C')))],
  [/^CARB-KW-/, (of) => -waterDissociation(kelvin(of('T_C')))],
  [/^CARB-EX3-SI$/, (of) => calciteIndex(of, of('I'))],
  // These rows take the ionic strength of river water, 2.5e-5 per mg/L of dissolved solids.
  [/^CARB-SI-/, (of) => calciteIndex(of, 2.5e-5 * of('TDS'))],
  [/^ALK-CYAP?-/, (of) => alkalinityCarried({ cyanuricAcid: 1 }, of('pH'))],
  [/^ALK-B-/, (of) => alkalinityCarried({ borate: 1 }, of('pH'))],
  [/^ACID-TA$/, () => -change('hydrochloric-acid', FLUID_OUNCE)],
  [
    /^ACID-TA10$/,
    () => amountFor({ substance: 'hydrochloric-acid', strength: 31.45 }, 'totalAlkalinity', -10) / FLUID_OUNCE,
  ],
  [/^ACID-(W|MF)-/, (of) => acidFluidOunces(of)],
  [
    /^ACID-M-/,
    (of) => {
      const before = acidWater(of);
      const amount = amountToReach(
        before,
        1,
        { substance: 'hydrochloric-acid' },
        { quantity: 'pH', value: of('target') },
      );
      return before.totalAlkalinity - addDose(before, 1, { substance: 'hydrochloric-acid', amount }).totalAlkalinity;
    },
  ],
  [
    /^CO2-EQ-/,
    (of) =>
      aerateToEquilibrium(
        water({
          totalAlkalinity: of('carbonate alkalinity'),
          temperature: of('T_C'),
          calciumHardness: 0,
          dissolvedSolids: solidsOf(of('I')),
        }),
      ).pH,
  ],
  [/^CO2-SUP-/, (of) => dioxideRatio(of)],
  [/^DOSE-calhypo/, (_, id) => chlorineOunces({ substance: 'calcium-hypochlorite', strength: numberIn(id) })],
  [/^DOSE-naocl/, (_, id) => liquidOunces(numberIn(id))],
  [
    /^DOSE-IN-CH$/,
    (of) => {
      const amount = of('oz') * OUNCE;
      const dose = { substance: 'calcium-hypochlorite', amount, strength: of('av') * 100 } as const;
      return addDose(basis, of('V_gal') * GALLON, dose).freeChlorine;
    },
  ],
  [
    /^DOSE-IN-SH$/,
    (of) => {
      const amount = of('pt') * 16 * FLUID_OUNCE;
      const dose = { substance: 'sodium-hypochlorite', amount, strength: of('trade') } as const;
      return addDose(basis, of('V_gal') * GALLON, dose).freeChlorine;
    },
  ],
  [/^DOSE-IN-CH1$/, () => chlorineOunces({ substance: 'calcium-hypochlorite', strength: 65 })],
  [/^DOSE-IN-SH1$/, () => liquidOunces(12)],
  [
    /^DOSE-KFLA$/,
    () => {
      const liquid: DosedProduct = { substance: 'sodium-hypochlorite', strength: 5 };
      return amountToReach(basis, 80, liquid, { quantity: 'freeChlorine', value: 30 }) / 1000;
    },
  ],
  [/^DOSE-BICARB$/, () => pounds({ substance: 'sodium-bicarbonate' }, 'totalAlkalinity', 10)],
  [/^DOSE-SODAASH$/, () => pounds({ substance: 'sodium-carbonate' }, 'totalAlkalinity', 10)],
  [
    /^DOSE-CACL2-/,
    (_, id) => pounds({ substance: 'calcium-chloride', strength: numberIn(id.slice(10)) }, 'calciumHardness', 10),
  ],
  [/^DOSE-CYA$/, () => pounds({ substance: 'cyanuric-acid' }, 'cyanuricAcid', 10)],
  [/^DOSE-NAHSO4$/, () => pounds({ substance: 'sodium-bisulfate', strength: 93.2 }, 'totalAlkalinity', -10)],
  [/^DOSE-THIO-10K$/, () => amountFor({ substance: 'sodium-thiosulfate' }, 'freeChlorine', -1) / OUNCE],
  [/^AVCL-trichlor$/, () => SUBSTANCES.trichlor.pureStrength],
  [/^AVCL-dichlor-dihyd$/, () => SUBSTANCES.dichlor.pureStrength],
  [/^AVCL-calhypo$/, () => SUBSTANCES['calcium-hypochlorite'].pureStrength],
  [/^AVCL-naocl$/, () => SUBSTANCES['sodium-hypochlorite'].pureStrength],
  [/^BYP-CYA-DI$/, () => perChlorine('dichlor', 'cyanuricAcid', false)],
  [/^BYP-EPA-acid$/, () => addDose(basis, 1, { substance: 'trichlor', amount: 1 }).cyanuricAcid],
  [/^BYP-CH-CALHYPO$/, () => perChlorine('calcium-hypochlorite', 'calciumHardness', false)],
  [/^BYP-TA-TRI$/, () => perChlorine('trichlor', 'totalAlkalinity', true)],
  [/^BYP-TA-DI$/, () => perChlorine('dichlor', 'totalAlkalinity', true)],
  [/^BYP-TA-HYPO$/, () => perChlorine('sodium-hypochlorite', 'totalAlkalinity', true)],
  [/^BYP-TA-HYPO-ADD$/, () => perChlorine('calcium-hypochlorite', 'totalAlkalinity', false)],
  [
    /^HYPO-OBS-\d+$/,
    (of) => {
      const strength = tradeOfWeight(of('wt'));
      return storedHypochloriteStrength({ strength, temperature: celsius(of('T_F')), days: of('d') }) / strength;
    },
  ],
  [/^HYPO-OBS-T13$/, (of) => hypochloriteHalfLife(tradeOfWeight(of('wt')), celsius(of('T_F')))],
  [/^HYPO-T12-[\d.]+-/, (of) => hypochloriteHalfLife(of('trade%'), celsius(of('T_F')))],
  [
    /^HYPO-T12-RULE$/,
    () => storedHypochloriteStrength({ strength: 12.5, temperature: 25, days: hypochloriteHalfLife(12.5, 25) }) / 12.5,
  ],
  [/^UVI-[\d.]+-300$/, (of) => ultravioletIndex(90 - Math.acos(of('cos_zenith')) / radians)],
  [/^UVI-[\d.]+-(Jun|Dec)$/, (of) => ultravioletIndex(noonElevation(of('lat'), of('day')))],
  [/^BRK-THEORY$/, () => CHLORINE_PER_NITROGEN_AT_BREAKPOINT],
  [/^BRK-MONO$/, () => CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE],
  [/^BRK-CC$/, () => breakpointArithmetic(1).byStoichiometry],
  [/^BRK-RULE$/, (of) => breakpointArithmetic(of('CC')).byFieldRule],
  [/^SOL-DEC-172$/, (of) => noonElevation(40, of('day')) + 40 - 90],
  [/^SOL-DEC-1$/, (of) => 90 - 40 - noonElevation(-40, of('day'))],
];

function change(substance: Substance, amount: number): number {
  return addDose(basis, TEN_THOUSAND_GALLONS, { substance, amount }).totalAlkalinity - basis.totalAlkalinity;
}

function numberIn(text: string): number {
  return Number(/[\d.]+/.exec(text)![0]);
}

/** Rows that chemistry, sun and storage do not answer, and why. */
const notOurs: readonly [pattern: RegExp, reason: string][] = [
  [/^SPEC-PK-(EPA|DH)/, 'another equation for the HOCl constant: Morris 1966 is the choice (README)'],
  [/^LSI-(TAB|TF)-/, 'rounded state table, about +0.1 above the formula: we show the formula (sources.md 2.2)'],
  [/^CARB-EX3-SW$/, 'sea water: I 0.674 lies above the 30,000 mg/L that is permitted'],
  [/^DOSE-SULFITE$/, 'sodium sulfite is no product of the model'],
  [/^(AVCL-dichlor-anh|BYP-EPA-dichloA)$/, 'anhydrous dichlor is no product of the model'],
  [
    /^BYP-NACL-BLEACH$/,
    'dissolved solids count hypochlorite as poured; the oxygen it later gives off is not taken out',
  ],
  [/^HYPO-(10C|WHITE)/, 'other sources disagree with the law chosen (sources.md, "where sources disagree", 11)'],
  [/^UVI-[\d.]+-(350|270)$/, 'ozone is not modelled: the learnt sun factor takes it up'],
  [/^SOL-DEC-80$/, "Cooper's own error at the equinox is half a degree; the position used is Meeus's"],
  [/^(GHI-|SOL-RA)/, 'radiation of all wavelengths is not modelled, only UV'],
  [/^(UV|DEM|EVAP|DIL)-/, 'lib/projection'],
  [/^VOL-/, 'lib/units'],
  [/^(RNG|FEC|SAFE|FILT)-/, 'lib/standards and lib/situations'],
  [/^BRK-K1-25$/, 'kinetics of drinking water: the model has none'],
  [/^TEST-/, 'errors of reading methods: lib/projection'],
];

const rows = referenceRows('published-values.csv');
const answerTo = (id: string) => answers.find(([pattern]) => pattern.test(id))?.[1];

describe('published single values', () => {
  it.each(rows.filter((row) => answerTo(row.text('id'))).map((row) => [row.text('id'), row] as const))(
    '%s',
    (id, row) => {
      const found = answerTo(id)!(inputsOf(row), id);
      const error = Math.abs(found - row.number('expected'));
      expect(error, `${row.text('topic')}: got ${found}, published ${row.text('expected')}`).toBeLessThanOrEqual(
        row.number('tolerance'),
      );
    },
  );

  it('answers every row or says why not', () => {
    const open = rows.map((row) => row.text('id')).filter((id) => !answerTo(id));
    expect(open.filter((id) => !notOurs.some(([pattern]) => pattern.test(id)))).toEqual([]);
  });

  it('has no pattern without a row, and none that both answers and declines', () => {
    const ids = rows.map((row) => row.text('id'));
    const idle = [...answers, ...notOurs].filter(([pattern]) => !ids.some((id) => pattern.test(id)));
    expect(idle.map(([pattern]) => pattern.source)).toEqual([]);
    expect(ids.filter((id) => answerTo(id) && notOurs.some(([pattern]) => pattern.test(id)))).toEqual([]);
  });
});
