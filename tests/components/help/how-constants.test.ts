import { describe, expect, it } from 'vitest';
import { type Constant } from '@/lib/client/worked-out/constant';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { parametersOf } from '@/lib/projection/parameters';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import { numbersInCode } from './numbers-in-code';

const listed: readonly Constant[] = constantGroups.flatMap((group): readonly Constant[] => group.constants);

const modules = import.meta.glob<Record<string, unknown>>([
  '/lib/chemistry/*.ts',
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
};

describe('every number in the code', () => {
  it.each(['chemistry', 'projection', 'standards', 'storage', 'sun'])(
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
