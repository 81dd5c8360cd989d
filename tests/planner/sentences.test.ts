import { describe, expect, it } from 'vitest';
import { holdWeek, planWeek, treatmentWeek } from '@/lib/planner';
import { cautionCodes, limitCodes, reasonCodes } from '@/lib/planner/codes';
import type { Alternative, WeekPlan } from '@/lib/schemas/plan';
import { type Wishes, wishesSchema } from '@/lib/schemas/wishes';
import { type Changes, products, scenarioOf } from './scenarios';
import { cautionHolds } from './sentences/cautions';
import { brokenHolds } from './sentences/limits';
import { reasonHolds } from './sentences/reasons';
import type { Told } from './sentences/told';
import { unsaidOf, untrueOf } from './sentences/untrue';
import { wrongWithWay } from './sentences/ways';

const { tabs, gran, liq } = products;
const oslo = { latitude: 69.6, longitude: 18.9, timeZone: 'Europe/Oslo' };
const acid = { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 5000 };
/** A week that nothing but granules is for. */
const granulesOnly = { shelf: [gran] };

const told = (changes: Changes = {}): Told => {
  const scenario = scenarioOf(changes);
  return { scenario, plan: planWeek(scenario) };
};
const wishesOf = (wishes: Partial<Wishes>) => wishesSchema.parse(wishes);
const wishing = (wishes: Partial<Wishes>): Told => {
  const scenario = { ...scenarioOf(), wishes: wishesOf(wishes) };
  return { scenario, plan: planWeek(scenario) };
};
/** What the household wished, and a plan that was made without it. */
const setAside = (wishes: Partial<Wishes>): Told =>
  withScenario(withPlan(told(), { cautions: [{ code: 'wishes-set-aside' }] }), { wishes: wishesOf(wishes) });
const granules = (amount: number) => ({
  ...{ at: '2026-07-09T20:15:00-04:00', product: 'gran' },
  ...{ amount, unit: 'g' as const },
});
/** The same with other doses, reasons or figures: what makes a sentence false. */
const withPlan = ({ scenario, plan }: Told, change: Partial<WeekPlan>): Told => ({
  scenario,
  plan: { ...plan, ...change },
});
const withScenario = ({ scenario, plan }: Told, change: Partial<Told['scenario']>): Told => ({
  scenario: { ...scenario, ...change },
  plan,
});
const without = (form: string) => (each: Told) =>
  withPlan(each, { doses: each.plan.doses.filter((dose) => dose.form !== form) });
const twice = (each: Told) => withPlan(each, { doses: [...each.plan.doses, ...each.plan.doses] });
const withTablets = (each: Told) => {
  const [tablet] = told().plan.doses.filter(({ unit }) => unit === 'tablet');
  return withPlan(each, { doses: [...each.plan.doses, tablet!] });
};
const inPool = (change: Partial<Told['scenario']['pool']>) => (each: Told) =>
  withScenario(each, { pool: { ...each.scenario.pool, ...change } });
const onShelf = (shelf: Changes['shelf']) => (each: Told) =>
  withScenario(each, { shelf: scenarioOf({ shelf: shelf! }).shelf });
const read = (reading: Changes['reading']) => (each: Told) =>
  withScenario(each, { reading: scenarioOf({ reading: reading! }).reading });

type Falsify = (each: Told) => Told;
type Planted = {
  of: () => Told;
  /** Figures of the fact that are false of this plan, each for itself. */
  figures?: Record<string, unknown>;
  /** Plans or pools of which the fact is false as it stands. */
  elsewhere?: Falsify[];
};

const level =
  (quantity: 'freeChlorine' | 'pH' | 'cyanuricAcid' | 'calciumHardness' | 'totalAlkalinity', value: number) =>
  (each: Told) => {
    const projection = each.plan.projection!;
    const course = projection.median[quantity].map(() => value);
    return withPlan(each, { projection: { ...projection, median: { ...projection.median, [quantity]: course } } });
  };

const noTablets = (changes: Changes, ...elsewhere: Falsify[]): Planted => ({
  of: () => told(changes),
  elsewhere: [withTablets, ...elsewhere],
});

const reasons: Record<string, Planted> = {
  'replace-water-first': {
    of: () => told({ reading: { cyanuricAcid: 120 } }),
    figures: { stabilizer: 80, swimLimit: 5, volume: 10, days: 2, target: 30 },
    elsewhere: [level('cyanuricAcid', 60)],
  },
  'few-open-hours': {
    of: () => told({ reading: { cyanuricAcid: 65 }, shelf: [gran], preferences: { visits: 1 } }),
    figures: { share: 0.2, visits: 5 },
    elsewhere: [inPool({ swimLimit: 10 })],
  },
  wished: {
    of: () => wishing({ doses: [granules(350)], notOn: ['2026-07-07'] }),
    elsewhere: [
      (each) => withScenario(each, { wishes: undefined }),
      (each) => withScenario(each, { wishes: wishesOf({ doses: [granules(250)] }) }),
      (each) => withScenario(each, { wishes: wishesOf({ notOn: each.plan.doses.map(({ at }) => at.slice(0, 10)) }) }),
      (each) => withScenario(each, { wishes: wishesOf({ doses: [granules(350)], noFurtherTablets: true }) }),
      // Its only dose lies behind.
      (each) => withScenario(each, { wishes: wishesOf({ doses: [granules(350)] }), now: '2026-07-10T08:00:00-04:00' }),
      (each) => withPlan(each, { doses: each.plan.doses.filter(({ reason }) => reason !== 'wished') }),
    ],
  },
  'situation-treats': {
    of: () => {
      const scenario = scenarioOf({ reading: { freeChlorine: 2 } });
      return { scenario, plan: treatmentWeek(scenario, { kind: 'quick-raise', aim: { to: 4 }, evening: 'ordinary' }) };
    },
    elsewhere: [
      twice,
      (each) => withPlan(each, { checks: [] }),
      (each) => withPlan(each, { doses: told().plan.doses }),
    ],
  },
  'situation-holds': {
    of: () => {
      const scenario = scenarioOf();
      return { scenario, plan: holdWeek(scenario, 'storm') };
    },
    elsewhere: [(each) => withPlan(each, { doses: told().plan.doses })],
  },
  'lowest-level-follows-stabilizer': {
    of: () => told(),
    figures: { stabilizer: 30, lowestLevel: 3, sets: 'rules' },
    elsewhere: [level('cyanuricAcid', 20)],
  },
  'tablets-carry': {
    of: () => told(),
    figures: { tablets: 1, stabilizer: 12, most: 'no' },
    elsewhere: [without('tablet'), twice],
  },
  'no-tablets-stabilizer-high': {
    ...noTablets({ reading: { cyanuricAcid: 65 } }, level('cyanuricAcid', 55)),
    figures: { stabilizer: 90, upper: 40 },
  },
  'no-tablets-stabilizer-unknown': noTablets({ reading: { cyanuricAcid: undefined } }, read({ cyanuricAcid: 40 })),
  'no-tablets-strip-alone': noTablets({ reading: { method: 'strip' } }, read({ method: 'drop-kit' })),
  'no-tablets-label-unknown': noTablets({ shelf: [{ ...tabs, labelWay: 'unknown' }, gran] }, onShelf([tabs, gran])),
  'no-tablets-pH-low': { ...noTablets({ reading: { pH: 7.1 } }, read({ pH: 7.4 })), figures: { pH: 7.5 } },
  'no-tablets-feeder': noTablets(
    { pool: { feeder: { kind: 'none' } } },
    inPool({ feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 } }),
  ),
  'no-tablets-on-shelf': noTablets(granulesOnly, onShelf([tabs, gran])),
  'no-tablets-avoided': noTablets(
    { preferences: { avoid: ['tablet'] } },
    (each) => withScenario(each, { preferences: { ...each.scenario.preferences, avoid: [] } }),
    onShelf([gran]),
  ),
  'no-tablets-pool-small': noTablets({ pool: { volume: 12 } }, inPool({ volume: 75 })),
  'no-tablets-week-full': noTablets(
    { given: [{ at: '2026-07-04T20:00:00-04:00', product: 'tabs', amount: 3, unit: 'tablet' }] },
    (each) => withScenario(each, { given: [] }),
    inPool({ volume: 300 }),
  ),
  'no-tablets-feeder-full': noTablets(
    { pool: { feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3, loaded: 681 } } },
    inPool({ feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 681 } }),
  ),
  'no-tablets-better-without': noTablets(
    { reading: { cyanuricAcid: 58, freeChlorine: 3.5 }, driftPrices: { stabilizer: 40 } },
    (each) =>
      withPlan(each, {
        alternatives: each.plan.alternatives.map((way) => ({ ...way, doses: told().plan.doses, total: 0 })),
      }),
  ),
  'fast-closes-gap': {
    of: () => told(granulesOnly),
    figures: { evenings: 7, rise: 0.3, form: 'liquid', closes: 'yes', lastLight: 'no' },
    elsewhere: [without('granular'), twice, inPool({ swimHours: { from: '00:00', to: '23:45' } })],
  },
  'nothing-fast-needed': {
    of: () => told({ reading: { freeChlorine: 4 }, week: { sky: Array(7).fill(0.05) }, pool: { swimLimit: 5 } }),
    elsewhere: [
      (each) => withPlan(each, { doses: [...each.plan.doses, ...told(granulesOnly).plan.doses] }),
      (each) =>
        withPlan(each, {
          broken: [{ limit: 'lowest-level', at: each.plan.hours[9]!, value: 1, bound: 2, unit: 'mg/L' }],
        }),
    ],
  },
  'no-fast-on-shelf': {
    of: () => told({ preferences: { avoid: ['granular', 'liquid'] } }),
    elsewhere: [
      (each) => withScenario(each, { preferences: { ...each.scenario.preferences, avoid: [] } }),
      (each) => withPlan(each, { doses: told(granulesOnly).plan.doses }),
    ],
  },
  'cheaper-than': {
    // So rare a week that it is set up: every form alone holds it, and costs more.
    of: () =>
      withPlan(told(), {
        reasons: [{ code: 'cheaper-than' }],
        alternatives: told().plan.alternatives.map((way) => ({ ...way, feasible: true, money: 99 })),
      }),
    elsewhere: [
      (each) =>
        withPlan(each, { alternatives: each.plan.alternatives.map((way) => ({ ...way, money: 0, doses: [] })) }),
      (each) => withPlan(each, { alternatives: [] }),
    ],
  },
  'raises-alkalinity': {
    of: () => told({ reading: { totalAlkalinity: 40 } }),
    figures: { change: 60, quantity: 'pH' },
    elsewhere: [without('other'), level('totalAlkalinity', 110), twice],
  },
  'lowers-pH': {
    of: () => told({ reading: { pH: 8.1 }, shelf: [tabs, gran, acid] }),
    figures: { change: -0.9, quantity: 'totalAlkalinity' },
    elsewhere: [
      without('liquid'),
      (each) =>
        withPlan(each, {
          doses: each.plan.doses.map((dose) =>
            dose.substance === 'hydrochloric-acid' ? { ...dose, at: dose.at.replace(/T\d\d/, 'T13') } : dose,
          ),
        }),
      read({ pH: 7.4 }),
    ],
  },
  'raises-pH': {
    of: () => told({ reading: { pH: 7, totalAlkalinity: 90 }, shelf: [gran] }),
    figures: { change: 1.4, quantity: 'cyanuricAcid' },
    elsewhere: [(each) => withPlan(each, { doses: [] }), read({ pH: 7.6 })],
  },
  'raises-hardness': {
    of: () => told({ reading: { calciumHardness: 120 } }),
    figures: { change: 90, quantity: 'pH' },
    elsewhere: [
      (each) => withPlan(each, { doses: [] }),
      level('calciumHardness', 300),
      inPool({ surface: 'vinyl', volume: 75 }),
    ],
  },
  'raises-stabilizer': {
    of: () => told({ reading: { cyanuricAcid: 12 }, shelf: [gran], pool: { feeder: { kind: 'none' } } }),
    figures: { change: 90, quantity: 'pH' },
    elsewhere: [(each) => withPlan(each, { doses: [] }), level('cyanuricAcid', 45), withTablets],
  },
  'water-values-assumed': {
    of: () => told({ reading: { calciumHardness: undefined } }),
    figures: { value: 120, quantity: 'cyanuricAcid' },
    elsewhere: [read({ calciumHardness: 250 })],
  },
};

const cautions: Record<string, Planted> = {
  'pH-out-of-range': { of: () => told({ reading: { pH: 8.1 } }), figures: { pH: 7.9 }, elsewhere: [read({ pH: 7.5 })] },
  'combined-chlorine-high': {
    of: () => told({ reading: { combinedChlorine: 0.8 } }),
    figures: { combinedChlorine: 0.3 },
    elsewhere: [read({ combinedChlorine: undefined })],
  },
  'label-way-unknown': {
    of: () => told({ shelf: [{ ...gran, labelWay: 'unknown' }, liq] }),
    figures: { product: 'liq' },
    elsewhere: [onShelf([gran, liq]), (each) => withPlan(each, { doses: told(granulesOnly).plan.doses })],
  },
  'liquid-past-half-strength': {
    of: () => told({ shelf: [gran, { ...liq, boughtOn: '2025-07-01' }] }),
    figures: { product: 'gran' },
    elsewhere: [onShelf([gran, liq]), (each) => withPlan(each, { doses: told({ shelf: [liq] }).plan.doses })],
  },
  'liquid-age-unknown': {
    of: () => told({ shelf: [gran, { ...liq, boughtOn: undefined }] }),
    figures: { product: 'gran' },
    elsewhere: [onShelf([gran, liq])],
  },
  'feeder-ingredient-other': {
    of: () => told({ pool: { feeder: { kind: 'inline', ingredient: 'calcium-hypochlorite', capacity: 8 } } }),
    elsewhere: [inPool({ feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 } }), withTablets],
  },
  'granules-not-for-surface': {
    of: () => told({ pool: { surface: 'vinyl' }, shelf: [{ ...gran, labelWay: 'broadcast' }, liq] }),
    figures: { product: 'liq' },
    elsewhere: [inPool({ surface: 'plaster' }), (each) => withPlan(each, { doses: told(granulesOnly).plan.doses })],
  },
  'stock-short': {
    of: () => told({ shelf: [{ ...gran, stock: 60 }] }),
    figures: { product: 'tabs' },
    elsewhere: [onShelf([gran]), (each) => withPlan(each, { doses: [] })],
  },
  'wishes-set-aside': {
    // Over the cap of an evening.
    of: () => setAside({ doses: [granules(700)] }),
    elsewhere: [
      (each) => withScenario(each, { wishes: undefined }),
      (each) => withScenario(each, { wishes: wishesOf({ doses: [granules(350)] }) }),
      (each) => withPlan(each, { doses: wishing({ doses: [granules(350)] }).plan.doses }),
      (each) => withPlan(each, { reasons: [{ code: 'wished' }] }),
    ],
  },
  'dose-after-dark': {
    of: () => told({ ...granulesOnly, pool: { swimHours: { from: '10:00', to: '22:15' } } }),
    figures: { doses: 9 },
    elsewhere: [
      (each) => withPlan(each, { doses: told(granulesOnly).plan.doses }),
      inPool({ swimHours: { from: '10:00', to: '20:00' } }),
    ],
  },
  'volume-estimated': {
    of: () => told({ ...granulesOnly, pool: { volumeEstimated: true } }),
    figures: { volume: 40, halved: 'no' },
    elsewhere: [inPool({ volumeEstimated: false }), (each) => withPlan(each, { doses: [] })],
  },
  'free-chlorine-over-swim-limit': {
    of: () => told({ reading: { freeChlorine: 5.5 } }),
    figures: { freeChlorine: 7, swimLimit: 5 },
    elsewhere: [level('freeChlorine', 3)],
  },
  'companion-waits': {
    of: () => told({ reading: { totalAlkalinity: 40 }, preferences: { visits: 1 } }),
    figures: { reason: 'raises-stabilizer' },
    elsewhere: [
      level('totalAlkalinity', 110),
      (each) => withPlan(each, { doses: told({ reading: { totalAlkalinity: 40 } }).plan.doses }),
    ],
  },
  'hardness-outside-surface-range': {
    of: () => told({ reading: { calciumHardness: 520 } }),
    figures: { calciumHardness: 450, low: 100, high: 600, index: -1.2 },
    elsewhere: [level('calciumHardness', 300), inPool({ surface: 'vinyl' })],
  },
};

const limits: Record<string, () => Told> = {
  'code-minimum': () => told({ reading: { freeChlorine: 1 }, ...granulesOnly }),
  'lowest-level': () => told({ reading: { freeChlorine: 1 }, ...granulesOnly }),
  'swim-limit': () => told({ reading: { freeChlorine: 8, takenAt: '2026-07-05T11:00:00-04:00' } }),
  'free-chlorine-maximum': () => told({ reading: { freeChlorine: 12 } }),
  'pH-low': () => told({ reading: { pH: 7 } }),
  'pH-high': () => told({ reading: { pH: 8.2 } }),
  'stabilizer-too-high-for-swim-limit': () => told({ reading: { cyanuricAcid: 120 } }),
};

describe('every sentence of a plan', () => {
  it('can be held against the plan', () => {
    expect(reasonCodes.filter((code) => !(code in reasonHolds))).toEqual([]);
    expect(cautionCodes.filter((code) => !(code in cautionHolds))).toEqual([]);
    expect(reasonCodes.filter((code) => !(code in reasons))).toEqual([]);
    expect(cautionCodes.filter((code) => !(code in cautions))).toEqual([]);
    expect(limitCodes.filter((code) => !(code in limits))).toEqual([]);
  });

  const facts = [
    ...Object.entries(reasons).map(([code, planted]) => ({
      code,
      planted,
      holds: reasonHolds[code]!,
      of: 'reasons' as const,
    })),
    ...Object.entries(cautions).map(([code, planted]) => ({
      code,
      planted,
      holds: cautionHolds[code]!,
      of: 'cautions' as const,
    })),
  ];
  it.each(facts)('$code is true where it stands, and is found out where it is not', ({ code, planted, holds, of }) => {
    const each = planted.of();
    const fact = each.plan[of].find((said) => said.code === code);
    if (!fact) throw new Error(`not said: ${each.plan[of].map((said) => said.code).join()}`);
    expect(holds(fact, each)).toBe(true);
    for (const [name, figure] of Object.entries(planted.figures ?? {})) {
      expect(name in fact, `${name} is a figure of it`).toBe(true);
      expect(holds({ ...fact, [name]: figure }, each), `${name} is wrong`).toBe(false);
    }
    planted.elsewhere?.forEach((falsify, index) =>
      expect(holds(fact, falsify(each)), `elsewhere ${index}`).toBe(false),
    );
  });

  it.each(Object.entries(limits))(
    'the limit %s is true where it stands, and is found out where it is not',
    (code, make) => {
      const each = make();
      const limit = each.plan.broken.find((said) => said.limit === code);
      if (!limit) throw new Error(`not said: ${each.plan.broken.map((said) => said.limit).join()}`);
      expect(brokenHolds(limit, each)).toBe(true);
      expect(brokenHolds({ ...limit, value: limit.value + 1 }, each)).toBe(false);
      expect(brokenHolds({ ...limit, bound: limit.bound - 1 }, each)).toBe(false);
      // At another hour it is broken by less, or not at all.
      const hour = each.plan.hours.indexOf(limit.at);
      if (code !== 'stabilizer-too-high-for-swim-limit')
        expect(brokenHolds({ ...limit, at: each.plan.hours[(hour + 60) % 169]! }, each)).toBe(false);
      const silent = withPlan(each, { broken: each.plan.broken.filter((said) => said !== limit) });
      if (code !== 'stabilizer-too-high-for-swim-limit') expect(unsaidOf(silent)).toContain(`nothing of ${code}`);
    },
  );

  it('is missed where it has to be said', () => {
    const each = told({ ...granulesOnly, pool: { volumeEstimated: true } });
    const mute = withPlan(each, { reasons: [], cautions: [] });
    expect(unsaidOf(each)).toEqual([]);
    expect(unsaidOf(mute)).toEqual(
      expect.arrayContaining(
        ['fast-closes-gap', 'lowest-level-follows-stabilizer', 'volume-estimated'].map((code) => `not said: ${code}`),
      ),
    );
    expect(unsaidOf(withPlan(told(), { reasons: [] }))).toContain('not said: tablets-carry');
  });

  it('is true far in the north, where the sun does not set', () => {
    const each = told({ pool: oslo, reading: { takenAt: '2026-06-21T19:00:00+02:00' }, ...granulesOnly });
    expect(untrueOf(each)).toEqual([]);
    expect(each.plan.reasons.find(({ code }) => code === 'fast-closes-gap')?.lastLight).toBe('no');
  });
});

describe('this week, four ways', () => {
  // With room between the limits some forms hold the week alone.
  const each = told({ pool: { swimLimit: 10 }, reading: { cyanuricAcid: 35 }, preferences: { visits: 7 } });
  const way = (kind: Alternative['kind']) => each.plan.alternatives.find((other) => other.kind === kind)!;

  it('says the truth of each form alone', () => {
    expect(each.plan.alternatives.flatMap((other) => wrongWithWay(other, each))).toEqual([]);
  });

  it.each<[string, (granules: Alternative) => Alternative]>([
    ['hours out of range', (granules) => ({ ...granules, hoursOutside: granules.hoursOutside + 5 })],
    ['something else goes in', (granules) => ({ ...granules, doses: way('tablets').doses })],
    ['as many visits as doses', (granules) => ({ ...granules, visits: granules.visits + 1 })],
    ['holds the week, and does not', (granules) => ({ ...granules, feasible: true, doses: [] })],
    ['does not hold the week, and does', () => ({ ...way('tablets'), feasible: false })],
  ])('finds out: %s', (what, falsify) => {
    expect(wrongWithWay(falsify(way('granular')), each).join()).toContain(what);
  });
});
