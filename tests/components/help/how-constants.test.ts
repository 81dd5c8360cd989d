import { describe, expect, it } from 'vitest';
import { type Constant } from '@/lib/client/worked-out/constant';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { parametersOf } from '@/lib/projection/parameters';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import { numbersInCode } from './numbers-in-code';

const listed: readonly Constant[] = constantGroups.flatMap((group): readonly Constant[] => group.constants);

const modules = import.meta.glob<Record<string, unknown>>([
  '/lib/chemistry/*.ts',
  '/lib/learning/*.ts',
  '/lib/planner/*.ts',
  '/lib/projection/*.ts',
  '/lib/standards/*.ts',
  '/lib/storage/*.ts',
  '/lib/sun/*.ts',
]);

/** What the code exports under the name that the list gives. */
async function inTheCode({ of, at }: Constant): Promise<unknown> {
  const [file = '', path = ''] = of.split('#');
  const [first = '', ...rest] = path.split('.');
  const pool = { volume: 1, waterFeatures: first.includes('(waterFeatures)') };
  const load = modules[`/lib/${file}.ts`];
  const exported = await load?.();
  if (first === 'weekAheadSchema') return weekAheadSchema.parse({}).evaporation[0];
  const start: unknown = first.startsWith('parametersOf') ? parametersOf(pool) : exported?.[first];
  const called: unknown = typeof start === 'function' ? start(...(at ?? [])) : start;
  return rest.reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], called);
}

describe('the list of constants', () => {
  it.each(listed.map((constant) => [constant.of, constant] as const))(
    '%s is what the code has',
    async (_, constant) => {
      const value = Number(await inTheCode(constant));
      const expected = constant.unit === 'pK' && constant.at === undefined ? -Math.log10(value) : value;
      const asListed = constant.of.endsWith('hypochloriteDecayRate') ? Math.log10(expected) : expected;
      expect(constant.value).toBe(asListed);
    },
  );

  it('lists nothing twice', () => {
    const names = listed.map(({ of }) => of);
    expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
  });

  it('prints an equation with the very numbers of its function', async () => {
    const withFormula = listed.filter(({ formula }) => formula !== undefined);
    expect(withFormula.length).toBeGreaterThan(20);
    for (const constant of withFormula) {
      const [file = '', name = ''] = constant.of.split('#');
      const code = numbersInCode(file.split('/')[0] ?? '').find((entry) => entry.name === constant.of);
      const numbers = code?.numbers.map(Number) ?? [];
      // Where the code says KELVIN_AT_ZERO - 0.15 the handbook says 273.
      const printed = numbersPrinted(constant.formula ?? '').map((value) => (value === 273 ? 0.15 : value));
      for (const number of numbers) expect(printed, `${name}: ${constant.formula}`).toContain(number);
    }
  });
});

/** The figures of an equation as it is typeset: "6.996455 · 10{^−5}" is one of them. */
function numbersPrinted(formula: string): number[] {
  const plain = formula.replace(
    / · 10\{\^(−?)(\d+)\}/g,
    (_, sign: string, power: string) => `e${sign ? '-' : ''}${power}`,
  );
  return [...plain.matchAll(/\d+(?:\.\d+)?(?:e-?\d+)?/g)].map(([text]) => Number(text));
}

/** Numbers that are no facts about water, sun or people, each with what they are. */
const arithmetic: Record<string, string> = {
  'chemistry/aerate#aerateToEquilibrium': 'how close a root is sought',
  'chemistry/amount-to-reach#ALREADY_THERE': 'how close a root is sought',
  'chemistry/amount-to-reach#MOST_PER_LITRE': 'where a root is sought',
  'chemistry/amount-to-reach#LEAST_PER_LITRE': 'where a root is sought',
  'chemistry/amount-to-reach#GROWTH': 'how a root is sought',
  'chemistry/amount-to-reach#perLitreToReachPH': 'how a root is sought',
  'chemistry/amount-to-reach#crossing': 'how close a root is sought',
  'chemistry/chlorine-balance#MOST_STEPS': 'how long a root is sought',
  'chemistry/chlorine-balance#TRACE': 'underflow',
  'chemistry/chlorine-balance#LAST_STEP': 'how close a root is sought',
  'chemistry/chlorine-balance#solveHypochlorousAcid': 'where a root is sought',
  'chemistry/dose#PERMITTED_VOLUME': 'what the model lets in',
  'chemistry/dose#PERMITTED_AMOUNT': 'what the model lets in',
  'chemistry/dose#MOST_ALKALI': 'what the model lets in',
  'chemistry/dose#useUpChlorine': 'rounding',
  'chemistry/hypochlorite-decay#SECONDS_PER_DAY': 'a unit',
  'chemistry/hypochlorite-decay#storedHypochloriteStrength': 'what the model lets in',
  'chemistry/ledger#ROUNDING': 'rounding',
  'chemistry/molar-masses#CHLORINE_MILLIGRAMS_PER_MOLE': 'a unit, from a molar mass',
  'chemistry/molar-masses#ALKALINITY_MILLIGRAMS_PER_EQUIVALENT': 'a unit, from a molar mass',
  'chemistry/molar-masses#HARDNESS_MILLIGRAMS_PER_MOLE': 'a unit, from a molar mass',
  'chemistry/molar-masses#CYANURIC_ACID_MILLIGRAMS_PER_MOLE': 'a unit, from a molar mass',
  'chemistry/molar-masses#BORON_MILLIGRAMS_PER_MOLE': 'a unit, from a molar mass',
  'chemistry/ranges#PERMITTED': 'what the model lets in',
  'chemistry/ranges#WIDE_PH': 'what the model lets in',
  'chemistry/saturation#LOWEST_INDEX': 'stands for no calcium at all',
  'chemistry/solve-ledger#newLedgerState': 'where a root is sought',
  'chemistry/solve-ledger#LOWEST_PH': 'where a root is sought',
  'chemistry/solve-ledger#HIGHEST_PH': 'where a root is sought',
  'chemistry/solve-ledger#MOST_STEPS': 'how long a root is sought',
  'chemistry/solve-ledger#LAST_STEP': 'how close a root is sought',
  'chemistry/solve-ledger#chlorine': 'zeros to be filled',
  'chemistry/solve-ledger#carbonate': 'zeros to be filled',
  'chemistry/solve-ledger#pHOfLedger': 'where a root is sought',
  'chemistry/substances#NOTHING': 'zero',
  'planner/purchases#purchaseOf': 'rounding',
  'planner/sample-scenario#latitude': 'an invented pool',
  'planner/sample-scenario#longitude': 'an invented pool',
  'planner/sample-scenario#samplePool': 'an invented pool',
  'planner/sample-scenario#sampleScenario': 'an invented pool',
  'planner/sample-scenario#HOUR': 'a unit, or the middle of an hour',
  'planner/sample-scenario#sampleSun': 'a unit, or the middle of an hour',
  'planner/sample-scenario#daylight': 'a unit, or the middle of an hour',
  'planner/sample-week#HOUR': 'a unit',
  'planner/sample-week#rounded': 'rounding',
  'planner/three-figures#threeFigures': 'rounding',
  'planner/treatment-acid#MORNINGS': 'a week',
  'planner/treatment-week#chlorineDose': 'half of a first dose, and rounding',
  'planner/treatment-week#mostUnder': 'where a root is sought',
  'projection/cholesky#LEAST_SHARE': 'rounding',
  'projection/cholesky#choleskyFactor': 'rounding',
  'projection/ensemble#shifts': 'digits without a pattern',
  'projection/evaporation#permitted': 'what the model lets in',
  'projection/evaporation#SECONDS_PER_DAY': 'a unit',
  'projection/forcing#HOURS_IN_PLAN': 'a week',
  'projection/forcing#MILLISECONDS_PER_HOUR': 'a unit',
  'projection/forcing#SUN_SAMPLES_PER_HOUR': 'how fine a step is',
  'projection/forcing#dim': 'the middle of a step',
  'projection/integrate#newRows': 'room for a series',
  'projection/integrate#ROWS': 'room for a series',
  'projection/integrate#heading': 'zeros to be filled',
  'projection/integrate#LARGEST_BEND': 'how fine a step is',
  'projection/integrate#SHORTEST_STEP': 'how fine a step is',
  'projection/normal#a': 'a fit of the normal distribution',
  'projection/normal#b': 'a fit of the normal distribution',
  'projection/normal#c': 'a fit of the normal distribution',
  'projection/normal#d': 'a fit of the normal distribution',
  'projection/normal#polynomial': 'zero',
  'projection/normal#normalQuantile': 'a fit of the normal distribution',
  'projection/quantiles#bandOf': 'the tenth, the middle, the ninth tenth',
  'projection/sobol#polynomials': 'a sequence of points',
  'projection/sobol#SOBOL_DIMENSIONS': 'a sequence of points',
  'projection/sobol#sobolPoints': 'a sequence of points',
  'projection/sobol#directionNumbers': 'a sequence of points',
  'projection/step#holdRates': 'the temperature of dark demand, printed in the equation of free chlorine',
  'projection/step#noRelease': 'zero',
  'projection/step#rateState': 'rounding',
  'projection/step#moveOn': 'rounding',
  'projection/tablets#erodedShareAt': 'how close a root is sought',
  'projection/tablets#loadOfMass': 'rounding',
  'standards/surface-ranges#hardSurface': 'listed as plaster and tile',
  'sun/solar-position#radians': 'a unit',
  'sun/solar-position#MILLISECONDS_PER_DAY': 'a unit',
  'sun/solar-position#EPOCH': 'from when days are counted',
  'sun/ultraviolet#radians': 'a unit',
  'learning/assimilate#QUANTILE_90': 'the normal distribution',
  'learning/daily-loss#FROM_LEVEL': 'the level a daily loss is told at',
  'learning/daily-loss#dailyLoss': 'the normal distribution',
  'learning/describe-learnt#CLEAR': 'when words say that something is clear',
  'learning/describe-learnt#inWords': 'units',
  'learning/feeder#LONGEST_RUN': 'how long a feeder is followed',
  'learning/gap#STEPS_PER_HOUR': 'step size',
  'learning/gap#forcingBetween': 'rounding',
  'learning/possible-water#A_TRACE': 'what the model lets in',
  'learning/propagate#propagate': 'what the model lets in',
  'learning/state#FURTHEST': 'what the model lets in',
  'learning/step#MILLISECONDS_PER_DAY': 'a unit',
  'learning/step#SHARE_THAT_COUNTS': 'when a test is counted in words',
  'learning/tablets-left#points': 'Gauss-Hermite points',
  'learning/unscented#DISTANCE_SQUARED': 'sigma points of the unscented transform',
  'planner/alternatives#LIQUID_DENSITY': 'density of liquid, to tell a weight',
  'planner/checks#SOON_AFTER': 'when nobody tests again',
  'planner/checks#checksOf': 'days of a week',
  'planner/checks#DAY': 'a unit',
  'projection/tablets#GRAMS_PER_MOLE': 'a unit, from a molar mass',
  'planner/companion-week#SKETCHES_ASKED': 'how a search goes',
  'planner/companion-week#MOST_MOMENTS': 'how a search goes',
  'planner/context#QUICK_MEMBERS': 'how a search goes',
  'planner/context#ROUGH_MEMBERS': 'how a search goes',
  'planner/context#spread': 'how a search goes',
  'planner/cost#stabilizerPrice': 'what the model lets in',
  'planner/cost#hardnessPrice': 'what the model lets in',
  'planner/cost#pHOutsidePrice': 'a unit',
  'planner/cost#pHDriftPrice': 'units of the weights',
  'planner/draft#measuresToBuy': 'rounding',
  'planner/evenings#QUARTER_HOUR': 'a unit',
  'planner/evenings#LONGEST_WAIT': 'how long an evening waits for the last swimmer',
  'planner/generic-products#generic': 'as much as wanted',
  'planner/moves#IMPROVEMENT': 'how a search goes',
  'planner/moves#STEPS_OF_A_CAP': 'how a search goes',
  'planner/moves#fastMoves': 'how a search goes',
  'planner/moves#MOST_LOADINGS': 'how a search goes',
  'planner/moves#tabletMoves': 'how a search goes',
  'planner/moves#mostMeasures': 'rounding',
  'planner/needs#MILLISECONDS_PER_DAY': 'a unit',
  'planner/planned-doses#plannedDoses': 'rounding',
  'planner/product-facts#tabletFacts': 'what a label says where the household does not',
  'planner/product-facts#liquidStrength': 'what a label says where the household does not',
  'planner/products#HOUR': 'a unit',
  'planner/products#CHLORINE_PER_STABILIZER': 'stoichiometry',
  'planner/products#tabletOption': 'rounding',
  'planner/products#mostTablets': 'rounding',
  'planner/products#fastOption': 'what a label says where the household does not',
  'planner/refuse-wishes#tooMuchAtFirst': 'half of a first dose, and rounding',
  'planner/wished-doses#wishedIn': 'rounding',
  'planner/quick-course#reckonOn': 'a series',
  'planner/quick-week#LEVELS': 'how a search goes',
  'planner/quick-week#USUAL_LEVEL': 'how a search goes',
  'planner/quick-week#PH_PROBE': 'how a search goes',
  'planner/quick-week#STABILIZER_PROBE': 'how a search goes',
  'planner/quick-week#HOURS_OF_ONE_SPECIATION': 'how a search goes',
  'planner/response#middleOverMedian': 'the middle',
  'planner/search#MOST_IN_FULL': 'how a search goes',
  'planner/search#MOST_ON_TRIAL': 'how a search goes',
  'planner/search#TRIAL_MEMBERS': 'how a search goes',
  'planner/search#WORTH_A_TRIAL': 'how a search goes',
  'planner/search#WORTH_IT_IN_FULL': 'how a search goes',
  'planner/search#IMPROVEMENT': 'how a search goes',
  'planner/side-effects#PROBE_RISE': 'how a search goes',
  'planner/side-effects#sideEffectsOf': 'how a search goes',
  'planner/sketch#MOST_TABLET_COUNTS': 'how a search goes',
  'planner/sketch#LOADING_EVENINGS': 'how a search goes',
  'planner/sketch#EVENINGS_TRIED_IN_FULL': 'how a search goes',
  'planner/sketch#FIRST_RISES': 'how a search goes',
  'planner/sketch#KEPT_OF_ONE_LOADING': 'how a search goes',
  'planner/sketch#KEPT_OF_FAST_ALONE': 'how a search goes',
  'planner/sketch#KEPT_LOADED_TWICE': 'how a search goes',
  'planner/sketch#MOST_COUNTS_LOADED_TWICE': 'how a search goes',
  'planner/sketch#IMPROVED': 'how a search goes',
  'planner/sketch#IMPROVED_WITH_OTHERS': 'how a search goes',
  'planner/sketch#IMPROVED_AGAIN': 'how a search goes',
  'planner/sketch#VISITS_TAKEN_FROM': 'how a search goes',
  'planner/starting-water#MILLISECONDS_PER_DAY': 'a unit',
  'planner/starting-water#startingWater': 'blank water before a reading fills it',
  'planner/starting-water#loadsBefore': 'any water will do for erosion',
};

describe('every number in the code', () => {
  it.each(['chemistry', 'learning', 'planner', 'projection', 'standards', 'storage', 'sun'])(
    'of lib/%s is listed or is arithmetic',
    (folder) => {
      const names = listed.map(({ of }) => of);
      const missing = numbersInCode(folder)
        .map(({ name }) => name)
        .filter((name) => !(name in arithmetic))
        .filter((name) => !names.some((of) => of === name || of.startsWith(`${name}.`) || of.startsWith(`${name}(`)));
      expect(missing).toEqual([]);
    },
  );
});
