import { expect } from 'vitest';
import { bucketLitres } from '@/components/week-sheet/dose-state';
import { addDose, contentsPerUnit, type Substance } from '@/lib/chemistry';
import { assertSafePlan, planWeek, treatmentWeek } from '@/lib/planner';
import { mostTablets } from '@/lib/planner/products';
import { riseOf } from '@/lib/projection/events';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { Scenario } from '@/lib/schemas/scenario';
import { swimWaitUntil } from '@/lib/services/swim-wait';
import { companionCap, fastChlorineCap, swimWaitHours, tabletCap } from '@/lib/standards/caps';
import { retestHours, waterExchangeADay } from '@/lib/standards/companions';
import { type Changes, codesIn, fullTest, products, scenarioOf, tabletsIn } from '@/tests/planner/scenarios';
import type { Row } from '../row';
import { everySentence, said, written } from '../words';

const HOUR = 3_600_000;
const VOLUME = 75.7;
const instant = ({ at }: { at: string }) => Date.parse(at);

const shelf = [
  products.tabs,
  products.gran,
  products.liq,
  { id: 'di', form: 'granular', substance: 'dichlor', strength: 56, labelWay: 'dissolve', stock: 9000 },
  { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 90_000 },
  { id: 'dry-acid', form: 'other', substance: 'sodium-bisulfate', strength: 93, stock: 90_000 },
  { id: 'bicarbonate', form: 'other', substance: 'sodium-bicarbonate', strength: 100, stock: 90_000 },
  { id: 'soda', form: 'other', substance: 'sodium-carbonate', strength: 100, stock: 90_000 },
  { id: 'calcium', form: 'other', substance: 'calcium-chloride', strength: 77, stock: 90_000 },
  { id: 'stabilizer', form: 'other', substance: 'cyanuric-acid', strength: 100, stock: 90_000 },
];
const scenario = scenarioOf({ shelf, pool: { feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 20 } } });
/** A week in which nothing goes in, into which one dose is planted. */
const empty: WeekPlan = { ...planWeek(scenario), doses: [], alternatives: [] };
const usual = { at: '2026-07-07T20:30:00-04:00', toBuy: false, unit: 'g', rise: 0, reason: 'closes-gap' } as const;

type Planted = Pick<PlannedDose, 'product' | 'substance' | 'form' | 'amount'> & Partial<PlannedDose>;
const refuses = (dose: Planted, of: Scenario = scenario, plan: WeekPlan = empty) => {
  try {
    assertSafePlan(of, { ...plan, doses: [{ ...usual, ...dose }] });
    return false;
  } catch {
    return true;
  }
};
/** The net lets the cap pass and refuses a twentieth more. */
const isCappedAt = (perCubicMetre: number, dose: Omit<Planted, 'amount'>, of: Scenario = scenario) => {
  expect(refuses({ ...dose, amount: perCubicMetre * VOLUME * 0.98 }, of)).toBe(false);
  expect(refuses({ ...dose, amount: perCubicMetre * VOLUME * 1.05 }, of)).toBe(true);
};
const rise = (substance: Substance, perCubicMetre: number, strength: number) =>
  riseOf(contentsPerUnit({ substance, strength }), perCubicMetre * VOLUME, VOLUME);
const after = (substance: Substance, perCubicMetre: number, strength: number, water: Partial<typeof fullTest> = {}) =>
  addDose({ ...fullTest, ...water }, VOLUME, { substance, strength, amount: perCubicMetre * VOLUME });

/** A plan in which free chlorine and pH stand at the given values from the dose on, for the waiting time after it. */
const outlook = (freeChlorine: number[], pH: number[]): Pick<WeekPlan, 'hours' | 'projection'> => {
  const { hours, projection } = empty;
  const held = (values: number[]) => hours.map((_, hour) => values[Math.min(hour, values.length - 1)]!);
  return {
    hours,
    projection: {
      ...projection!,
      freeChlorine: { ...projection!.freeChlorine, p50: held(freeChlorine), swimLimit: held([4]) },
      pH: { ...projection!.pH, p50: held(pH) },
    },
  };
};
const waitHours = (substance: PlannedDose['substance'], plan = outlook([3], [7.5])) =>
  (swimWaitUntil({ substance }, Date.parse(empty.hours[0]!), plan) - Date.parse(empty.hours[0]!)) / HOUR;
const companionPlan = (changes: Changes, substance: string) => {
  const week = planWeek(scenarioOf(changes));
  const dose = week.doses.find((each) => each.substance === substance);
  if (!dose) throw new Error(`The plan has no ${substance}.`);
  const retest = week.checks.find(({ reason }) => reason === 'after-companion');
  return { week, dose, retest };
};
const nextMorningChecked = ({ doses, checks }: WeekPlan, substance: string) =>
  doses
    .filter((dose) => dose.substance === substance)
    .every((dose) =>
      checks.some((check) => instant(check) > instant(dose) && instant(check) - instant(dose) < 20 * HOUR),
    );

/** Part 4, caps per evening, row by row of its table. */
export const capRows: readonly Row[] = [
  [
    'cap-calcium-hypochlorite',
    'granules 65 %: +4 mg/L, which is 6.2 g/m3; wait 4 h and until under the limit',
    () => {
      expect(fastChlorineCap['calcium-hypochlorite'].value).toBe(4);
      expect(rise('calcium-hypochlorite', 6.2, 65)).toBeCloseTo(4, 1);
      isCappedAt(6.15, { product: 'gran', substance: 'calcium-hypochlorite', form: 'granular' });
      expect(waitHours('calcium-hypochlorite')).toBe(4);
      expect(waitHours('calcium-hypochlorite', outlook([5, 5, 5, 5, 5, 5, 5, 3.9], [7.5]))).toBe(7);
    },
  ],
  [
    'cap-calcium-hypochlorite',
    'granules: read again the next morning',
    () =>
      expect(nextMorningChecked(planWeek(scenarioOf({ shelf: [products.gran] })), 'calcium-hypochlorite')).toBe(true),
  ],
  [
    'cap-sodium-hypochlorite',
    'liquid 12.5 trade %: +4 mg/L, which is 32 mL/m3; wait 4 h and until under the limit',
    () => {
      expect(fastChlorineCap['sodium-hypochlorite'].value).toBe(4);
      expect(rise('sodium-hypochlorite', 32, 12.5)).toBeCloseTo(4, 6);
      const fresh = scenarioOf({ shelf: [{ ...products.liq, boughtOn: undefined, stock: 90_000 }] });
      const dose = { product: 'liq', substance: 'sodium-hypochlorite', form: 'liquid', unit: 'mL' } as const;
      expect(refuses({ ...dose, amount: 32 * VOLUME * 0.98 }, fresh)).toBe(false);
      expect(refuses({ ...dose, amount: 32 * VOLUME * 1.05 }, fresh)).toBe(true);
      expect(waitHours('sodium-hypochlorite')).toBe(4);
    },
  ],
  [
    'cap-sodium-hypochlorite',
    'liquid: read again the next morning',
    () => expect(nextMorningChecked(planWeek(scenarioOf({ shelf: [products.liq] })), 'sodium-hypochlorite')).toBe(true),
  ],
  [
    'cap-treatment',
    'a treatment evening raises to 10 in all at most, with a reading the morning after; tablets never',
    () => {
      const week = treatmentWeek(scenarioOf({ reading: { freeChlorine: 1 } }), {
        kind: 'clearing',
        aim: { to: 10 },
        evening: 'treatment',
      });
      expect(week.doses).toHaveLength(1);
      expect(week.doses[0]!.rise).toBeGreaterThan(4);
      expect(tabletsIn(week)).toBe(0);
      const from = instant(week.doses[0]!);
      const edges = week.projection!.freeChlorine.p90.filter((_, hour) => Date.parse(week.hours[hour]!) >= from);
      expect(Math.max(...edges)).toBeLessThanOrEqual(10);
      expect((instant(week.checks[0]!) - from) / HOUR).toBeLessThan(16);
    },
  ],
  [
    'cap-treatment',
    'outside a treatment evening a quick raise keeps the cap of an evening',
    () => {
      const week = treatmentWeek(scenarioOf({ pool: { swimLimit: 10 }, reading: { freeChlorine: 1 } }), {
        kind: 'quick-raise',
        aim: { to: 10 },
        evening: 'ordinary',
      });
      expect(week.doses[0]!.rise).toBeLessThanOrEqual(4);
    },
  ],
  [
    'cap-dichlor',
    'dichlor 56 %: +2 mg/L, which is 3.6 g/m3; never planned for a week; wait 4 h',
    () => {
      expect(fastChlorineCap.dichlor.value).toBe(2);
      expect(rise('dichlor', 3.6, 56)).toBeCloseTo(2, 1);
      const low = { ...scenario, reading: { ...[scenario.reading].flat()[0]!, cyanuricAcid: 40 } };
      isCappedAt(3.57, { product: 'di', substance: 'dichlor', form: 'granular' }, low);
      const { doses } = planWeek(scenarioOf({ shelf: [shelf[3]!] }));
      expect(doses.map(({ substance }) => substance)).not.toContain('dichlor');
      expect(waitHours('dichlor')).toBe(4);
    },
  ],
  [
    'cap-dichlor',
    'dichlor at a stabilizer of 50 or more is refused by the net',
    () => {
      const high = { ...scenario, reading: { ...[scenario.reading].flat()[0]!, cyanuricAcid: 60 } };
      expect(refuses({ product: 'di', substance: 'dichlor', form: 'granular', amount: 100 }, high)).toBe(true);
    },
  ],
  [
    'cap-trichlor',
    'tablets: one of 200 to 230 g for 18 m3 in a week at most, and 6 of stabilizer',
    () => {
      expect(tabletCap).toMatchObject({ waterPerTablet: 18, tabletMass: 230, stabilizerRise: 6 });
      const most = [40, 75.7, 114].map((volume) => mostTablets(volume, { tabletMass: 200, strength: 90 }));
      for (const [index, volume] of [40, 75.7, 114].entries()) {
        expect(most[index]).toBeGreaterThanOrEqual(Math.floor(volume / 25));
        expect((most[index]! * 200) / 230).toBeLessThanOrEqual(volume / 18);
      }
      const tablets = { product: 'tabs', substance: 'trichlor', form: 'tablet', unit: 'tablet' } as const;
      expect(refuses({ ...tablets, amount: 3 })).toBe(false);
      expect(refuses({ ...tablets, amount: 5 })).toBe(true);
      // Three of 227 g of 90 % leave 4.9 mg/L in 75.7 m3.
      expect(3 * 227 * 0.9 * (129.074 / (3 * 70.906)) * (1 / VOLUME)).toBeLessThan(6);
    },
  ],
  [
    'cap-trichlor',
    'tablets: read within the week, and nobody in for 15 minutes after feeder work and restart',
    () => {
      const week = planWeek(scenarioOf());
      expect(tabletsIn(week)).toBeGreaterThan(0);
      expect((instant(week.checks.at(-1)!) - Date.parse(week.hours[0]!)) / HOUR).toBeLessThanOrEqual(168);
      expect(waitHours('trichlor')).toBe(0.25);
      expect(written('doses: after.tablets')).toBe('Nobody in until the feeder has run 15 minutes.');
    },
  ],
  [
    'cap-hydrochloric-acid',
    'acid 31.45 %: 16 mL/m3, pH falls by about 0.4 then; half of it the first time',
    () => {
      const fall = 8 - after('hydrochloric-acid', 16, 31.45, { pH: 8, totalAlkalinity: 80 }).pH;
      expect(fall).toBeGreaterThan(0.3);
      isCappedAt(16, {
        ...{ product: 'acid', substance: 'hydrochloric-acid', form: 'liquid', unit: 'mL' },
        ...{ at: '2026-07-07T06:45:00-04:00', effect: { quantity: 'pH', change: -0.3 } },
      });
      const first = companionPlan({ reading: { pH: 8.1, totalAlkalinity: 120 } }, 'hydrochloric-acid');
      expect(first.dose.amount).toBeLessThanOrEqual((16 * VOLUME) / 2);
      expect(first.dose.effect!.change).toBeGreaterThanOrEqual(-0.4);
    },
  ],
  [
    'cap-hydrochloric-acid',
    'acid: a fall of more than 0.4 is refused',
    () => {
      const dose = {
        product: 'acid',
        substance: 'hydrochloric-acid',
        form: 'liquid',
        unit: 'mL',
        amount: 300,
      } as const;
      const morning = { at: '2026-07-07T06:45:00-04:00' };
      expect(refuses({ ...dose, ...morning, effect: { quantity: 'pH', change: -0.41 } })).toBe(true);
      expect(refuses({ ...dose, ...morning, effect: { quantity: 'pH', change: -0.39 } })).toBe(false);
    },
  ],
  [
    'cap-hydrochloric-acid',
    'acid: low edge of the likely range not under 7.2 after a planned dose',
    () => {
      // Known acid, so that not half of it is planned, and a strip, which leaves pH in much doubt.
      const known = {
        shelf: [products.gran, { ...shelf[4]!, measure: 50 }],
        given: [{ at: '2026-07-01T07:00:00-04:00', product: 'acid', amount: 300, unit: 'mL' }],
      };
      for (const method of ['strip', 'drop-kit']) {
        const reading = { pH: 7.95, totalAlkalinity: 80, method };
        const { week, dose } = companionPlan({ ...known, reading }, 'hydrochloric-acid');
        const hour = week.hours.findIndex((each) => Date.parse(each) >= instant(dose));
        expect(week.projection!.pH.p10[hour]!).toBeGreaterThanOrEqual(7.2);
      }
    },
  ],
  [
    'cap-hydrochloric-acid',
    'acid: the net refuses a dose after which the low edge lies under 7.2',
    () => {
      const { projection } = empty;
      const low = {
        ...empty,
        projection: { ...projection!, pH: { ...projection!.pH, p10: empty.hours.map(() => 7) } },
      };
      const dose = {
        product: 'acid',
        substance: 'hydrochloric-acid',
        form: 'liquid',
        unit: 'mL',
        amount: 300,
      } as const;
      const effect = { quantity: 'pH', change: -0.2 } as const;
      expect(refuses({ ...dose, at: '2026-07-07T06:45:00-04:00', effect }, scenario, low)).toBe(true);
    },
  ],
  [
    'cap-hydrochloric-acid',
    'acid: read on the next day; nobody in for 4 h and until pH is in range',
    () => {
      const { dose, retest } = companionPlan({ reading: { pH: 8, totalAlkalinity: 100 } }, 'hydrochloric-acid');
      expect((instant(retest!) - instant(dose)) / HOUR).toBeGreaterThan(12);
      expect(waitHours('hydrochloric-acid')).toBe(4);
      expect(waitHours('hydrochloric-acid', outlook([3], [7.9, 7.9, 7.9, 7.9, 7.9, 7.9, 7.8]))).toBe(6);
    },
  ],
  [
    'cap-sodium-bisulfate',
    'dry acid 93 %: 20 g/m3, as much as 16 mL of acid; the same waits',
    () => {
      isCappedAt(20, {
        ...{ product: 'dry-acid', substance: 'sodium-bisulfate', form: 'other' },
        ...{ at: '2026-07-07T06:45:00-04:00', effect: { quantity: 'pH', change: -0.3 } },
      });
      const [liquid, dry] = [after('hydrochloric-acid', 16, 31.45), after('sodium-bisulfate', 20, 93)];
      expect(dry.pH).toBeCloseTo(liquid.pH, 1);
      expect([retestHours['sodium-bisulfate'], waitHours('sodium-bisulfate')]).toEqual([
        retestHours['hydrochloric-acid'],
        4,
      ]);
      expect(waitHours('sodium-bisulfate', outlook([3], [7, 7, 7, 7, 7, 7.2]))).toBe(5);
    },
  ],
  [
    'cap-sodium-bicarbonate',
    'bicarbonate: +20 of alkalinity, 34 g/m3, read after 24 h, wait 2 h',
    () => {
      expect(after('sodium-bicarbonate', 34, 100).totalAlkalinity - 80).toBeCloseTo(20, 0);
      isCappedAt(34, { product: 'bicarbonate', substance: 'sodium-bicarbonate', form: 'other' });
      expect([retestHours['sodium-bicarbonate'], waitHours('sodium-bicarbonate')]).toEqual([24, 2]);
    },
  ],
  [
    'cap-sodium-carbonate',
    'soda: +9 of alkalinity, 10 g/m3, read after 24 h, wait 4 h',
    () => {
      expect(after('sodium-carbonate', 10, 100).totalAlkalinity - 80).toBeCloseTo(9.4, 1);
      isCappedAt(10, { product: 'soda', substance: 'sodium-carbonate', form: 'other' });
      expect([retestHours['sodium-carbonate'], waitHours('sodium-carbonate')]).toEqual([24, 4]);
    },
  ],
  [
    'cap-sodium-carbonate',
    'soda: none over a hardness of 300, and none where pH is over 7.5',
    () => {
      const substances = (reading: Record<string, unknown>) =>
        planWeek(scenarioOf({ reading })).doses.map(({ substance }) => substance);
      expect(substances({ pH: 6.9 })).toContain('sodium-carbonate');
      expect(substances({ pH: 6.9, calciumHardness: 301 })).not.toContain('sodium-carbonate');
      const soda = { product: 'soda', substance: 'sodium-carbonate', form: 'other', amount: 300 } as const;
      const read = (change: object): Scenario => ({
        ...scenario,
        reading: { ...[scenario.reading].flat()[0]!, ...change },
      });
      expect(refuses(soda, read({ pH: 7.7 }))).toBe(true);
      expect(refuses(soda, read({ pH: 7, calciumHardness: 330 }))).toBe(true);
      expect(refuses(soda, read({ pH: 7 }))).toBe(false);
    },
  ],
  [
    'cap-sodium-carbonate',
    'after soda, and after calcium, nobody in before the water is clear',
    () =>
      expect(everySentence.some(({ at, text }) => at.startsWith('doses: ') && /water is clear/.test(text))).toBe(true),
  ],
  [
    'cap-calcium-chloride',
    'calcium chloride 77 %: +30 of hardness, 43 g/m3, 1 kg for 15 L, read after 24 h, wait 4 h',
    () => {
      expect(after('calcium-chloride', 43, 77).calciumHardness - 220).toBeCloseTo(30, 0);
      isCappedAt(43, { product: 'calcium', substance: 'calcium-chloride', form: 'other' });
      expect([retestHours['calcium-chloride'], waitHours('calcium-chloride')]).toEqual([24, 4]);
      const bucket = (amount: number) => bucketLitres({ amount, substance: 'calcium-chloride' } as PlanDose);
      expect([bucket(1000), bucket(1001)]).toEqual([15, 30]);
    },
  ],
  [
    'calcium-a-day',
    'calcium within a day of bicarbonate or soda is refused, and passes a day later',
    () => {
      const calcium = { product: 'calcium', substance: 'calcium-chloride', form: 'other', amount: 500 } as const;
      for (const product of ['bicarbonate', 'soda']) {
        const given = (at: string): Scenario => ({ ...scenario, given: [{ at, product, amount: 300, unit: 'g' }] });
        expect(refuses(calcium, given('2026-07-06T21:00:00-04:00'))).toBe(true);
        expect(refuses(calcium, given('2026-07-06T20:00:00-04:00'))).toBe(false);
      }
    },
  ],
  [
    'acid-morning',
    'acid within 4 h of chlorine is refused by the net, in a plan and beside what went in',
    () => {
      const acid = {
        product: 'acid',
        substance: 'hydrochloric-acid',
        form: 'liquid',
        unit: 'mL',
        amount: 300,
      } as const;
      const effect = { quantity: 'pH', change: -0.2 } as const;
      const given = (at: string): Scenario => ({
        ...scenario,
        given: [{ at, product: 'liq', amount: 500, unit: 'mL' }],
      });
      const morning = { ...acid, effect, at: '2026-07-07T06:45:00-04:00' };
      expect(refuses(morning, given('2026-07-07T03:00:00-04:00'))).toBe(true);
      expect(refuses(morning, given('2026-07-07T02:30:00-04:00'))).toBe(false);
    },
  ],
  [
    'cap-cyanuric-acid',
    'cyanuric acid: +20, 20 g/m3, in a mesh bag before a return, read after 7 days, wait 4 h',
    () => {
      expect(after('cyanuric-acid', 20, 100).cyanuricAcid - 50).toBeCloseTo(20, 1);
      isCappedAt(20, { product: 'stabilizer', substance: 'cyanuric-acid', form: 'other' });
      expect([retestHours['cyanuric-acid'] / 24, waitHours('cyanuric-acid')]).toEqual([7, 4]);
      expect(`${said('doses: steps.stabilizer-bag.3')} ${said('doses: steps.stabilizer-bag.4')}`).toMatch(
        /mesh bag.*before a return/,
      );
    },
  ],
  [
    'cap-sodium-thiosulfate',
    'thiosulfate: nothing of it is planned, not even over 10 mg/L; when it is, its row belongs here',
    () => {
      const { doses } = planWeek(scenarioOf({ reading: { freeChlorine: 16 } }));
      expect(doses.map(({ substance }) => substance)).not.toContain('sodium-thiosulfate');
      expect(Object.keys({ ...companionCap, ...retestHours, ...swimWaitHours })).not.toContain('sodium-thiosulfate');
    },
  ],
  [
    'cap-water',
    'water exchange: 15 cm of level a day, said where it is asked for',
    () => {
      expect(waterExchangeADay.value).toBe(0.15);
      const reason = planWeek(scenarioOf({ reading: { cyanuricAcid: 88 } })).reasons[0]!;
      expect(reason.code).toBe('replace-water-first');
      expect((reason['volume'] as number) / (reason['days'] as number)).toBeLessThanOrEqual(
        (0.15 / 1.5) * VOLUME + 1e-9,
      );
      expect(written('week: why.reason.replace-water-first')).toContain('15 cm of level a day');
    },
  ],
  [
    'cap-lower-of',
    'the projected high edge over 10 is refused, also where every cap is kept',
    () => {
      const { projection } = empty;
      const freeChlorine = { ...projection!.freeChlorine, p90: empty.hours.map(() => 10.1) };
      const high = { ...empty, projection: { ...projection!, freeChlorine } };
      const dose = { product: 'gran', substance: 'calcium-hypochlorite', form: 'granular', amount: 100 } as const;
      expect(refuses(dose)).toBe(false);
      expect(refuses(dose, scenario, high)).toBe(true);
    },
  ],
  [
    'cap-lower-of',
    'what went in on the same day counts to the cap of that evening',
    () => {
      const given: Scenario['given'] = [{ at: '2026-07-07T12:00:00-04:00', product: 'gran', amount: 300, unit: 'g' }];
      const dose = { product: 'gran', substance: 'calcium-hypochlorite', form: 'granular', amount: 300 } as const;
      expect(refuses(dose)).toBe(false);
      expect(refuses(dose, { ...scenario, given })).toBe(true);
    },
  ],
  [
    'until-the-morning',
    'one sentence covers most evenings',
    () => {
      expect(written('doses: after.morning')).toBe('Nobody in until the morning.');
      expect(codesIn(empty.reasons).length).toBeGreaterThan(0);
    },
  ],
];
