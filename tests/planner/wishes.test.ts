import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dayOf } from '@/lib/calendar/household-day';
import { AppError } from '@/lib/errors';
import { assertSafePlan, planWeek } from '@/lib/planner';
import { tryOutOpenings } from '@/lib/planner/try-out-openings';
import { mergedWishes, noWishes } from '@/lib/planner/wishes';
import { movesOf, type PlanAhead, tried, wishesOf } from '@/lib/planner/wishes-of';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { type TryOutChanges, tryOutChangesSchema } from '@/lib/schemas/try-out';
import { type Wishes, wishesSchema } from '@/lib/schemas/wishes';
import { anyScenario } from './any-scenario';
import { wrongWith } from './independent-check';
import { type Changes, codesIn, scenarioOf, tabletsIn } from './scenarios';

const wishing = (wishes: Partial<Wishes>, changes: Changes = {}): Scenario => ({
  ...scenarioOf(changes),
  wishes: wishesSchema.parse(wishes),
});
const dayOfDose = ({ at }: PlannedDose) => at.slice(0, 10);
const evening = (day: string) => `${day}T20:15:00-04:00`;
const granules = (day: string, amount = 350) => ({ at: evening(day), product: 'gran', amount, unit: 'g' as const });
const tablets = (day: string, amount: number) => ({
  ...{ at: evening(day), product: 'tabs' },
  ...{ amount, unit: 'tablet' as const },
});
const refusal = (scenario: Scenario) => {
  try {
    planWeek(scenario);
  } catch (error) {
    if (error instanceof AppError) return `${error.code}: ${error.message}`;
    throw error;
  }
  return null;
};
const ahead = (scenario: Scenario, plan: WeekPlan): PlanAhead => ({
  doses: plan.doses.map((dose, index) => ({ ...dose, id: idOf(index) })),
  evenings: tryOutOpenings(scenario).evenings,
});
const idOf = (index: number) => `00000000-0000-4000-8000-00000000000${index}`;
const changesOf = (changes: Partial<TryOutChanges>) => tryOutChangesSchema.parse(changes);

const usual = scenarioOf();
const usualPlan = planWeek(usual);

describe('a wished dose', () => {
  const plan = planWeek(wishing({ doses: [granules('2026-07-09')] }));
  const wished = plan.doses.find(({ reason }) => reason === 'wished');

  it('stands to the gram and the hour, as the shelf’s product', () => {
    expect(wished).toMatchObject({
      ...{ at: evening('2026-07-09'), product: 'gran', amount: 350, unit: 'g', toBuy: false },
      ...{ substance: 'calcium-hypochlorite', form: 'granular' },
    });
    // 350 g of 65 % in 75.7 m3: 350 * 0.65 / 75.7 = 3.005 mg/L.
    expect(wished?.rise).toBeCloseTo(3.005, 2);
    expect(codesIn(plan.reasons)).toContain('wished');
  });

  it('has the rest planned around it: nothing else on its day, no visit more than before, the level follows it', () => {
    expect(plan.doses.filter((dose) => dayOfDose(dose) === '2026-07-09')).toHaveLength(1);
    expect(plan.doses.length).toBeGreaterThan(1);
    expect(new Set(plan.doses.map(dayOfDose)).size).toBeLessThanOrEqual(usual.preferences.visits);
    const { median } = plan.projection!;
    const before = plan.hours.findLastIndex((hour) => Date.parse(hour) <= Date.parse(evening('2026-07-09')));
    expect(median.freeChlorine[before + 1]! - median.freeChlorine[before]!).toBeGreaterThan(2.5);
  });

  it('counts to money, visits and weight of the plan, and comes out in the cost', () => {
    expect(plan.mix?.visits).toBe(new Set(plan.doses.map(dayOfDose)).size);
    // 227 g a tablet; 1.2 kg a litre of liquid.
    const kilograms = { tablet: 0.227, g: 0.001, mL: 0.0012 };
    const weight = plan.doses.reduce((sum, { amount, unit }) => sum + amount * kilograms[unit], 0);
    expect(plan.mix?.kilograms).toBeCloseTo(weight, 6);
    const priced = plan.doses.reduce((sum, { amount, unit }) => sum + priceOf(amount, unit), 0);
    expect(plan.cost?.money).toBeCloseTo(priced, 6);
    const { total, ...parts } = plan.cost!;
    expect(Object.values(parts).reduce((sum, each) => sum + each, 0)).toBeCloseTo(total, 6);
  });

  it('leaves the ways with one form alone as they are without it', () => {
    expect(plan.alternatives).toEqual(usualPlan.alternatives);
  });

  it('takes from the shelf first: what the search needs beyond it is to buy', () => {
    const little = [
      { ...usual.shelf[1]!, stock: 400 },
      { ...usual.shelf[0]!, stock: 0 },
    ];
    const short = planWeek(wishing({ doses: [granules('2026-07-09')] }, { shelf: little }));
    const held = short.doses.filter(({ toBuy }) => !toBuy).reduce((sum, { amount }) => sum + amount, 0);
    expect(held).toBeLessThanOrEqual(400);
    expect(short.doses.some(({ toBuy }) => toBuy)).toBe(true);
  });

  const priceOf = (amount: number, unit: PlannedDose['unit']) =>
    unit === 'tablet' ? (amount * 227 * 9) / 1000 : unit === 'g' ? (amount * 7.5) / 1000 : (amount * 1.6) / 1000;
});

describe('the limits hold for what is wished', () => {
  it.each([
    ['over the cap of an evening', { doses: [granules('2026-07-09', 700)] }, /more chlorine on 2026-07-09/],
    [
      'in swim hours',
      { doses: [{ ...granules('2026-07-09'), at: '2026-07-09T15:00:00-04:00' }] },
      /calcium-hypochlorite in swim hours/,
    ],
    ['more tablets than the rules allow', { doses: [tablets('2026-07-06', 4)] }, /4 tablets where 3 may go in/],
    ['two in one visit', { doses: [granules('2026-07-09', 100), granules('2026-07-09', 100)] }, /two products/],
  ])('%s: refused', (_, wishes, fault) => {
    expect(refusal(wishing(wishes))).toMatch(fault);
    expect(refusal(wishing(wishes))).toMatch(/^plan-refused/);
  });

  it('tablets where stabilizer is above its band, or was read on a strip alone: refused', () => {
    const wishes = { doses: [tablets('2026-07-06', 1)] };
    expect(refusal(wishing(wishes))).toBeNull();
    expect(refusal(wishing(wishes, { reading: { cyanuricAcid: 64 } }))).toMatch(/1 tablets where 0/);
    expect(refusal(wishing(wishes, { reading: { method: 'strip' } }))).toMatch(/1 tablets where 0/);
  });

  it('that keep the likely range over 10 mg/L all week: refused, also where the water needs acid', () => {
    const doses = ['06', '08', '11'].map((day) => granules(`2026-07-${day}`, 440));
    const dark = { pool: { sunExposure: 0, feeder: { kind: 'none' } }, reading: { freeChlorine: 9.8, pH: 7.9 } };
    const often = { ...dark, preferences: { visits: 5 } };
    expect(refusal(wishing({ doses }, often))).toMatch(/plan-refused: .*may pass 10 mg/);
  });

  it('within 4 h of acid that went in: refused', () => {
    const acid = { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 4000 };
    const given = [{ at: '2026-07-05T19:30:00-04:00', product: 'acid', amount: 500, unit: 'mL' }];
    const near = wishing({ doses: [granules('2026-07-05')] }, { shelf: [...usual.shelf, acid], given });
    expect(refusal(near)).toMatch(/chlorine within 4 h of acid/);
  });

  it('in a pool whose volume is an estimate the first dose is half of what an evening may add, with a test after it', () => {
    const estimated = { pool: { volumeEstimated: true } };
    expect(refusal(wishing({ doses: [granules('2026-07-05', 350)] }, estimated))).toMatch(/more than half/);
    const plan = planWeek(wishing({ doses: [granules('2026-07-05', 200)] }, estimated));
    expect(plan.doses[0]).toMatchObject({ amount: 200, reason: 'first-dose-halved' });
    expect(plan.checks.map(({ reason }) => reason)).toContain('after-halved-dose');
  });

  it('acid of any kind is no wish', () => {
    const acid = { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 4000 };
    const dose = { at: evening('2026-07-06'), product: 'acid', amount: 500, unit: 'mL' as const };
    expect(refusal(wishing({ doses: [dose] }, { shelf: [...usual.shelf, acid] }))).toMatch(/^invalid-input/);
  });
});

describe('an evening that is kept free', () => {
  it('has no chlorine, whatever else the week does', () => {
    const day = dayOfDose(usualPlan.doses.find(({ form }) => form !== 'tablet')!);
    const plan = planWeek(wishing({ notOn: [day] }));
    expect(plan.doses.map(dayOfDose)).not.toContain(day);
    expect(codesIn(plan.reasons)).toContain('wished');
  });
});

describe('no further tablets', () => {
  it('leaves out those of the plan, and says nothing of why they would be worse', () => {
    expect(tabletsIn(usualPlan)).toBeGreaterThan(0);
    const plan = planWeek(wishing({ noFurtherTablets: true }));
    expect(tabletsIn(plan)).toBe(0);
    expect(codesIn(plan.reasons).filter((code) => code.startsWith('no-tablets'))).toEqual([]);
    expect(plan.doses.every(({ form }) => form !== 'tablet')).toBe(true);
  });

  it('beside a wished loading plans exactly that', () => {
    const plan = planWeek(wishing({ doses: [tablets('2026-07-06', 2)], noFurtherTablets: true }));
    expect(tabletsIn(plan)).toBe(2);
    expect(plan.reasons.find(({ code }) => code === 'tablets-carry')).toMatchObject({ tablets: 2 });
  });
});

describe('a wish that is over', () => {
  const withWish = wishing({ doses: [granules('2026-07-07')] });

  it.each([
    ['went in meanwhile', { given: [{ ...granules('2026-07-07'), at: '2026-07-07T20:40:00-04:00', amount: 300 }] }],
    [
      'went in from a tub that was bought for it',
      {
        shelf: [...usual.shelf, { ...usual.shelf[1]!, id: 'bought', stock: 0 }],
        given: [{ ...granules('2026-07-07'), at: '2026-07-07T18:30:00-04:00', product: 'bought' }],
      },
    ],
    ['was of a product that has left the shelf', { shelf: [usual.shelf[2]!] }],
    ['lies before now', { now: '2026-07-08T09:00:00-04:00' }],
    ['lies before the reading', { reading: { takenAt: '2026-07-08T19:00:00-04:00' } }],
  ])('because it %s: the plan is that without it', (_, over: Partial<Scenario> | Changes) => {
    const { reading, ...rest } = over as Changes;
    const scenario = { ...withWish, ...scenarioOf({ reading: reading as never, ...rest }) };
    expect(planWeek({ ...scenario, wishes: withWish.wishes })).toEqual(planWeek({ ...scenario, wishes: noWishes }));
  });
});

describe('wishesOf', () => {
  const from = ahead(usual, usualPlan);
  const loading = usualPlan.doses.find(({ form }) => form === 'tablet')!;
  const fast = usualPlan.doses.findIndex(({ form }) => form !== 'tablet');
  const free = from.evenings.find(({ day }) => !usualPlan.doses.some((dose) => dayOfDose(dose) === day))!;

  it('of nothing is nothing, and the scenario plans as before', () => {
    expect(wishesOf(changesOf({}), from, usual)).toEqual(noWishes);
    expect(tried(usual, changesOf({}), from)).not.toHaveProperty('wishes');
    expect(planWeek(tried(usual, changesOf({}), from))).toEqual(usualPlan);
  });

  it('of a number of tablets is one loading at the plan’s own hour, and none further', () => {
    expect(wishesOf(changesOf({ tablets: 2 }), from, usual)).toEqual({
      doses: [{ at: loading.at, product: 'tabs', amount: 2, unit: 'tablet' }],
      ...{ notOn: [], noFurtherTablets: true },
    });
    expect(wishesOf(changesOf({ tablets: 0 }), from, usual)).toEqual({ ...noWishes, noFurtherTablets: true });
  });

  it('of tablets where the plan has none is a loading on the first evening', () => {
    const without = { ...from, doses: from.doses.filter(({ form }) => form !== 'tablet') };
    expect(wishesOf(changesOf({ tablets: 1 }), without, usual).doses).toEqual([
      { at: from.evenings[0]!.at, product: 'tabs', amount: 1, unit: 'tablet' },
    ]);
  });

  it('of a move is the dose with its amount on the other evening, and its old day kept free', () => {
    const changes = changesOf({ moves: [{ doseId: idOf(fast), toDay: free.day }] });
    const dose = usualPlan.doses[fast]!;
    expect(wishesOf(changes, from, usual)).toEqual({
      doses: [{ at: free.at, product: dose.product, amount: dose.amount, unit: dose.unit }],
      ...{ notOn: [dayOfDose(dose)], noFurtherTablets: false },
    });
    const plan = planWeek(tried(usual, changes, from));
    expect(plan.doses).toContainEqual(expect.objectContaining({ at: free.at, amount: dose.amount, reason: 'wished' }));
    expect(plan.doses.map(dayOfDose)).not.toContain(dayOfDose(dose));
  });

  it('leaves out moves to where no evening is, of what is not planned, of one dose twice', () => {
    const moves = [
      { doseId: idOf(fast), toDay: '2026-08-01' },
      { doseId: idOf(9), toDay: free.day },
      { doseId: idOf(fast), toDay: free.day },
      { doseId: idOf(fast), toDay: from.evenings[0]!.day },
    ];
    expect(movesOf(changesOf({ moves }), from, usual)).toHaveLength(1);
  });

  it('lets a later wish take the place of an earlier one', () => {
    const earlier = wishesSchema.parse({ doses: [tablets('2026-07-06', 2), granules('2026-07-08')] });
    const again = { ...noWishes, doses: [granules('2026-07-10')], notOn: ['2026-07-08'] };
    expect(mergedWishes(earlier, again, usual).doses).toEqual([tablets('2026-07-06', 2), granules('2026-07-10')]);
    const fewer = { ...noWishes, doses: [tablets('2026-07-06', 1)], noFurtherTablets: true };
    expect(mergedWishes(earlier, fewer, usual).doses).toEqual([granules('2026-07-08'), tablets('2026-07-06', 1)]);
  });
});

describe('tried', () => {
  const from = ahead(usual, usualPlan);

  it('puts swimmers and sky on their days, counted from the day of the reading', () => {
    const changes = changesOf({
      swimmers: [{ day: '2026-07-11', swimmerHours: 24 }],
      sky: [{ day: '2026-07-12', sky: 0.2 }],
    });
    const { week } = tried(usual, changes, from);
    expect(week.swimmerHours).toEqual([0, 0, 0, 0, 0, 0, 24, 0]);
    expect(week.sky).toEqual([0.85, 0.85, 0.85, 0.85, 0.85, 0.85, 0.85, 0.2]);
  });

  it('has the plan’s doses as the changes leave them', () => {
    const { doses } = tried(usual, changesOf({ tablets: 1 }), from);
    expect(doses?.filter(({ unit }) => unit === 'tablet').map(({ amount }) => amount)).toEqual([1]);
    expect(doses?.filter(({ unit }) => unit !== 'tablet')).toHaveLength(
      usualPlan.doses.filter(({ unit }) => unit !== 'tablet').length,
    );
  });
});

describe('openings', () => {
  it('are the evenings of the plan and the tablets that the rules allow', () => {
    const { evenings, mostTablets } = tryOutOpenings(usual);
    expect(evenings.map(({ day }) => day)).toEqual(
      Array.from({ length: 7 }, (_, index) => `2026-07-${String(5 + index).padStart(2, '0')}`),
    );
    // 75.7 m3 / 18 m3 of 230 g: 4.26 tablets of 227 g; 6 mg/L of stabilizer: 3.66.
    expect(mostTablets).toBe(3);
    expect(tryOutOpenings(scenarioOf({ reading: { cyanuricAcid: 88 } })).mostTablets).toBe(0);
    expect(tryOutOpenings(scenarioOf({ reading: { freeChlorine: undefined } })).evenings).toEqual([]);
  });

  it('do not hang on what was wished before', () => {
    const wishes = { doses: [tablets('2026-07-06', 2)], notOn: ['2026-07-08'], noFurtherTablets: true };
    expect(tryOutOpenings(wishing(wishes))).toEqual(tryOutOpenings(usual));
  });
});

describe('any scenario with any wishes', () => {
  const someWishes = fc.record({
    dose: fc.nat(20),
    evening: fc.nat(20),
    share: fc.integer({ min: 1, max: 30 }),
    tablets: fc.option(fc.integer({ min: 0, max: 4 })),
    freeDay: fc.option(fc.nat(7)),
  });

  /** Moves a dose of the plan and makes it larger or smaller, with another number of tablets and a day kept free. */
  function withWishes(
    scenario: Scenario,
    plan: WeekPlan,
    some: typeof someWishes extends fc.Arbitrary<infer T> ? T : never,
  ) {
    const from = ahead(scenario, plan);
    if (from.evenings.length === 0) return null;
    const moves = plan.doses.length
      ? [
          {
            doseId: idOf(some.dose % plan.doses.length),
            toDay: from.evenings[some.evening % from.evenings.length]!.day,
          },
        ]
      : [];
    const wishes = wishesOf(changesOf({ tablets: some.tablets, moves }), from, scenario);
    const free = some.freeDay === null ? [] : [from.evenings[some.freeDay % from.evenings.length]!.day];
    return {
      ...scenario,
      wishes: {
        ...wishes,
        notOn: [...new Set([...wishes.notOn, ...free])],
        doses: wishes.doses.map((dose) =>
          dose.unit === 'tablet' ? dose : { ...dose, amount: (dose.amount * some.share) / 10 },
        ),
      },
    };
  }

  it('keeps to every limit with them, or is refused', { timeout: 3_600_000 }, () => {
    const seen = { planned: 0, refused: 0, wished: 0 };
    fc.assert(
      fc.property(anyScenario, someWishes, (scenario, some) => {
        let plain: WeekPlan;
        try {
          plain = planWeek(scenario);
        } catch {
          return;
        }
        const wanted = withWishes(scenario, plain, some);
        if (!wanted) return;
        let plan: WeekPlan;
        try {
          plan = planWeek(wanted);
        } catch (error) {
          if (!(error instanceof AppError) || error.code !== 'plan-refused') throw error;
          seen.refused++;
          return;
        }
        seen.planned++;
        assertSafePlan(wanted, plan);
        // A wished amount need not be whole measures; everything else has to hold as ever.
        expect(wrongWith(wanted, plan).filter((wrong) => wrong !== 'part of a measure')).toEqual([]);
        for (const wish of wanted.wishes.doses) {
          const stands = plan.doses.find(
            ({ at, product, amount }) =>
              Date.parse(at) === Date.parse(wish.at) &&
              (product === wish.product || (product === null && wish.product.startsWith('generic-'))) &&
              amount === wish.amount,
          );
          expect(stands).toBeDefined();
          seen.wished++;
        }
        const wished = wanted.wishes.doses.map(({ at }) => Date.parse(at));
        const others = plan.doses.filter(({ at, rise }) => rise > 0 && !wished.includes(Date.parse(at)));
        for (const { at } of others)
          expect(wanted.wishes.notOn).not.toContain(dayOf(Date.parse(at), wanted.pool.timeZone));
        if (wanted.wishes.noFurtherTablets)
          expect(tabletsIn(plan)).toBe(
            wanted.wishes.doses.filter(({ unit }) => unit === 'tablet').reduce((sum, { amount }) => sum + amount, 0),
          );
      }),
      { numRuns: process.env.LONG === '1' ? 300 : 40 },
    );
    expect(seen.planned).toBeGreaterThan(10);
    expect(seen.refused).toBeGreaterThan(3);
    expect(seen.wished).toBeGreaterThan(10);
  });
});
