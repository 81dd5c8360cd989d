import { expect } from 'vitest';
import { dayOf } from '@/lib/calendar/household-day';
import { wallClock, wallToInstant } from '@/lib/calendar/wall-time';
import { assertSafePlan, planWeek } from '@/lib/planner';
import { companionNeeds } from '@/lib/planner/companions/need';
import { VOLUME_REACH } from '@/lib/learning/posterior-of';
import { projectWeek } from '@/lib/projection';
import { pumpUntil, weekDose } from '@/lib/projection/events';
import { poolSchema } from '@/lib/schemas/pool';
import type { WeekPlan } from '@/lib/schemas/plan';
import { daylightOf } from '@/lib/sun/daylight';
import { swimVerdict } from '@/lib/verdict';
import { type Changes, codesIn, fullTest, products, scenarioOf, tabletsIn } from '@/tests/planner/scenarios';
import { good as goodInput } from '@/tests/verdict/inputs';
import type { Row } from '../row';

const HOUR = 3_600_000;
const zone = 'America/New_York';
const plan = (changes: Changes = {}) => planWeek(scenarioOf(changes));
const substances = ({ doses }: WeekPlan) => doses.map(({ substance }) => substance);
const instant = ({ at }: { at: string }) => Date.parse(at);
const dayIn = (dose: { at: string }) => dayOf(instant(dose), zone);
const chlorines: readonly string[] = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];
const companionsOf = ({ doses }: WeekPlan) => doses.filter(({ substance }) => !chlorines.includes(substance));
const noTablets = { shelf: [products.gran, products.liq] } as const satisfies Changes;
const acid = { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 9000 };

/** Weeks of different kinds of water; what has to hold for every plan is looked for in each. */
const manyWeeks: readonly Changes[] = [
  {},
  noTablets,
  { reading: { pH: 8, totalAlkalinity: 100 }, preferences: { visits: 7 } },
  { reading: { totalAlkalinity: 50 }, preferences: { visits: 7 } },
  { reading: { cyanuricAcid: 75 } },
  { pool: { volumeEstimated: true }, reading: { freeChlorine: 1 } },
];

/** What part 2 asks of the planner and part 4 of a week's doses. */
export const weekPlanRows: readonly Row[] = [
  [
    'planner-limits',
    'in every hour in which a plan keeps its three limits, the verdict has nothing against chlorine',
    () => {
      const scenario = scenarioOf({ preferences: { visits: 7 } });
      const { projection, hours } = planWeek(scenario);
      if (!projection) throw new Error('The plan has no projection.');
      const { freeChlorine } = projection;
      const kept = hours.flatMap((hour, index) => {
        const inside =
          freeChlorine.p10[index]! >= 2 &&
          freeChlorine.p50[index]! >= freeChlorine.lowestLevel[index]! &&
          freeChlorine.p50[index]! <= freeChlorine.swimLimit[index]! &&
          freeChlorine.p90[index]! <= 10;
        return inside && index > 1 ? [{ now: Date.parse(hour), lowestLevel: freeChlorine.lowestLevel[index]! }] : [];
      });
      expect(kept.length).toBeGreaterThan(60);
      const outlook = { ...projection, hours: hours.map((hour) => Date.parse(hour)) };
      for (const { now, lowestLevel } of kept) {
        const at = outlook.hours[0]!;
        const { reasons } = swimVerdict({
          ...goodInput,
          now,
          projection: outlook,
          limits: { codeMinimum: 2, lowestLevel, swimLimit: 4 },
          readings: { freeChlorine: { value: 3, takenAt: at }, pH: { value: 7.5, takenAt: at } },
        });
        const ofLevel = codesIn(reasons).filter((code) => /^chlorine-(?!reading)|edge/.test(code));
        expect(ofLevel).toEqual([]);
      }
    },
  ],
  [
    'two-tests',
    'the week ends with the full test that makes the next plan; in between stand quick checks',
    () => {
      const { checks } = plan();
      expect(checks.at(-1)).toMatchObject({ kind: 'full', reason: 'next-week' });
      expect(checks.filter(({ reason }) => reason === 'swim-day-after-two-days').map(({ kind }) => kind)).toEqual([
        'quick',
      ]);
    },
  ],
  [
    'check-before-swim',
    'a swim day that the last test does not reach has a quick check before its first swim hour',
    () => {
      const { checks } = plan({ week: { swimmerHours: [0, 0, 0, 0, 0, 0, 8] } });
      const saturday = checks.find((check) => dayIn(check) === '2026-07-11');
      expect(saturday).toMatchObject({ kind: 'quick', reason: 'swim-day-after-two-days' });
      expect(instant(saturday!)).toBeLessThanOrEqual(wallToInstant('2026-07-11', '10:00', zone).instant);
    },
  ],
  [
    'monthly-tests',
    'stabilizer and hardness that were last read six weeks ago are asked for',
    () => {
      const { checks, needs } = plan({
        reading: [
          { ...fullTest, takenAt: '2026-05-24T19:00:00-04:00', method: 'drop-kit' },
          { takenAt: fullTest.takenAt, method: 'drop-kit', freeChlorine: 3, pH: 7.5, totalAlkalinity: 80 },
        ],
      });
      const asked = [...checks.map(({ reason }) => reason), ...needs.map(({ quantity }) => quantity)].join(' ');
      expect(asked).toMatch(/stabilizer|cyanuricAcid|hardness/i);
    },
  ],
  [
    'strip-no-tablets',
    'no tablets where stabilizer was read on a strip alone',
    () => {
      expect(tabletsIn(plan({ reading: { method: 'drop-kit' } }))).toBeGreaterThan(0);
      expect(tabletsIn(plan({ reading: { method: 'strip' } }))).toBe(0);
    },
  ],
  [
    'strip-no-tablets',
    'no tablets where stabilizer was never measured',
    () => {
      const base = scenarioOf();
      const { cyanuricAcid: _, ...reading } = [base.reading].flat()[0]!;
      const { doses, needs } = planWeek({ ...base, reading });
      expect(tabletsIn({ doses })).toBe(0);
      expect(needs).toContainEqual({ code: 'never-measured', quantity: 'cyanuricAcid', since: null });
    },
  ],
  [
    'bleached-pH',
    'no acid on a high pH, and no soda on a low one, that was read with free chlorine of 12',
    () => {
      for (const pH of [8.3, 6.6])
        expect(companionsOf(plan({ reading: { freeChlorine: 12, pH, totalAlkalinity: 100 } }))).toEqual([]);
    },
  ],
  [
    'no-room',
    'at a swim limit of 4 from stabilizer 70 on: replace some water, first of all',
    () => {
      const replace = 'replace-water-first';
      expect(codesIn(plan({ reading: { cyanuricAcid: 70 } }).reasons)[0]).toBe(replace);
      expect(codesIn(plan({ reading: { cyanuricAcid: 69 } }).reasons)).not.toContain(replace);
    },
  ],
  [
    'no-room',
    'at a swim limit of 10 that sentence is not said: between 4.5 and 10 there is room',
    () =>
      expect(plan({ pool: { swimLimit: 10 }, reading: { cyanuricAcid: 90 } }).reasons[0]).toMatchObject({
        code: 'replace-water-first',
        closed: 'no',
      }),
  ],
  [
    'open-hours',
    'under 90 % open swim hours the first reason says so',
    () => {
      const few = plan({ ...noTablets, preferences: { visits: 1 } });
      expect(few.openSwimShare).toBeLessThan(0.9);
      expect(codesIn(few.reasons)[0]).toBe('few-open-hours');
      const many = plan();
      expect(many.openSwimShare).toBeGreaterThanOrEqual(0.9);
      expect(codesIn(many.reasons)).not.toContain('few-open-hours');
    },
  ],
  [
    'tablets-band',
    'no tablets at a stabilizer above the band, while anything else may be had',
    () => {
      expect(tabletsIn(plan({ reading: { cyanuricAcid: 60 } }))).toBeGreaterThan(0);
      expect(tabletsIn(plan({ reading: { cyanuricAcid: 61 } }))).toBe(0);
    },
  ],
  [
    'tablets-band',
    'no tablets from a stabilizer of 70 on, also where the household would rather have nothing else',
    () => {
      const avoid = ['granular', 'liquid'];
      expect(tabletsIn(plan({ reading: { cyanuricAcid: 95 }, preferences: { avoid } }))).toBe(0);
    },
  ],
  [
    'low-pH-no-tablets',
    'the net refuses tablets at a pH of 6.5',
    () => {
      const scenario = scenarioOf();
      const week = planWeek(scenario);
      const doses = week.doses.filter(({ form }) => form === 'tablet');
      const sour = { ...scenario, reading: { ...[scenario.reading].flat()[0]!, pH: 6.5 } };
      expect(doses.length).toBeGreaterThan(0);
      expect(() => assertSafePlan(scenario, { ...week, doses, alternatives: [] })).not.toThrow();
      expect(() => assertSafePlan(sour, { ...week, doses, alternatives: [] })).toThrow();
    },
  ],
  [
    'blends-never',
    'of a blend, or anything else, nothing is planned in any form',
    () => {
      const blends = ['tablet', 'granular', 'liquid', 'other'].map((form) => ({
        ...{ id: `blend-${form}`, form, substance: 'other', strength: 90, labelWay: 'dissolve', stock: 9000 },
        ...(form === 'tablet' ? { tabletMass: 227 } : {}),
      }));
      const { doses } = plan({ shelf: blends });
      expect(doses.length).toBeGreaterThan(0);
      expect(doses.filter(({ product }) => product?.startsWith('blend'))).toEqual([]);
    },
  ],
  [
    'by-ingredient',
    'a tablet of calcium hypochlorite is not taken for a slow tablet: its shape does not tell',
    () => {
      const shaped = { ...products.tabs, id: 'shaped', substance: 'calcium-hypochlorite', strength: 65 };
      expect(plan({ shelf: [shaped, products.gran] }).doses.filter(({ product }) => product === 'shaped')).toEqual([]);
    },
  ],
  [
    'feeder-match',
    'no tablets without a feeder, and none in a feeder of another ingredient',
    () => {
      const feeders = [
        { kind: 'none' },
        { kind: 'inline', ingredient: 'calcium-hypochlorite', capacity: 8 },
        { kind: 'inline', ingredient: 'dichlor', capacity: 8 },
        { kind: 'floating', ingredient: 'other', capacity: 8 },
        { kind: 'inline', capacity: 8 },
      ];
      for (const feeder of feeders) expect(tabletsIn(plan({ pool: { feeder } }))).toBe(0);
    },
  ],
  [
    'label-way',
    'granules whose label’s way nobody found are not planned; a caution says why',
    () => {
      const { doses, cautions } = plan({ shelf: [{ ...products.gran, labelWay: 'unknown' }, products.liq] });
      expect(doses.filter(({ product }) => product === 'gran')).toEqual([]);
      expect(cautions).toContainEqual({ code: 'label-way-unknown', product: 'gran' });
    },
  ],
  [
    'label-way',
    'granules that the label lets only through a feeder are not poured; straight in not onto a liner, a shell or paint',
    () => {
      const shelf = (labelWay: string) => [{ ...products.gran, labelWay }, products.liq];
      const ofGranules = (changes: Changes) => plan(changes).doses.filter(({ product }) => product === 'gran');
      expect(ofGranules({ shelf: shelf('feeder-only') })).toEqual([]);
      for (const surface of ['vinyl', 'fibreglass', 'painted'])
        expect(ofGranules({ shelf: shelf('broadcast'), pool: { surface } })).toEqual([]);
    },
  ],
  [
    'last-light',
    'a fast dose stands in the hour before sunset, or half an hour more, after the last swim hour',
    () => {
      const { doses } = plan({ ...noTablets, pool: { swimHours: { from: '10:00', to: '18:00' } } });
      expect(doses.length).toBeGreaterThan(1);
      for (const dose of doses) {
        const noon = wallToInstant(dayIn(dose), '12:00', zone).instant;
        const { sunset } = daylightOf(noon, 28, -81.5);
        expect((sunset! - instant(dose)) / HOUR).toBeGreaterThan(0);
        expect((sunset! - instant(dose)) / HOUR).toBeLessThanOrEqual(1 + 1 / 8);
        expect(wallClock(instant(dose), zone).hourOfDay).toBeGreaterThanOrEqual(18);
      }
    },
  ],
  [
    'last-light',
    'nothing goes in during swim hours, whatever the sun does',
    () => {
      for (const changes of manyWeeks)
        for (const dose of plan(changes).doses) {
          const { hourOfDay } = wallClock(instant(dose), zone);
          expect(hourOfDay < 10 || hourOfDay >= 20).toBe(true);
        }
    },
  ],
  [
    'another-hour',
    'the profile has no hour of the household’s own yet; when it has, its rule belongs here',
    () => expect(Object.keys(poolSchema.shape).filter((key) => /dose/i.test(key))).toEqual([]),
  ],
  [
    'pump-4',
    'the pump runs 4 h after a fast dose, 8 h where it adds more than 5 mg/L',
    () => {
      expect([4, 5, 5.01, 8].map((rise) => pumpUntil(0, rise) / HOUR)).toEqual([4, 4, 8, 8]);
      const dose = (amount: number) => weekDose(0, { substance: 'sodium-hypochlorite', amount, strength: 12.5 }, 50);
      const hours = (amount: number) => {
        const given = dose(amount);
        return given.kind === 'dose' ? given.pumpUntil / HOUR : undefined;
      };
      // 2000 mL of 12.5 % are 250 g of chlorine in 50 m3.
      expect([hours(2000), hours(2001)]).toEqual([4, 8]);
    },
  ],
  [
    'pump-4',
    'those hours enter the outlook: tablets wear on while the pump is kept running',
    () => {
      const pool = poolSchema.parse({ volume: 60, latitude: 28, longitude: -81.5, timeZone: zone, pump: [] });
      const at = fullTest.takenAt;
      const tablets = { at, tablets: 3, tabletMass: 227, strength: 90 };
      const dose = { at, substance: 'sodium-hypochlorite', amount: 10, strength: 12.5 } as const;
      const stabilizerAfter = (hours: number, doses: Parameters<typeof projectWeek>[3]) =>
        projectWeek(pool, { takenAt: at, water: fullTest }, {}, doses).water[hours]!.cyanuricAcid - 50;
      expect(stabilizerAfter(4, [tablets])).toBeLessThan(0.01);
      expect(stabilizerAfter(4, [tablets, dose])).toBeGreaterThan(0.2);
      expect(stabilizerAfter(8, [tablets, dose])).toBeCloseTo(stabilizerAfter(4, [tablets, dose]), 1);
    },
  ],
  [
    'one-product',
    'every visit is of one product, on a day of its own or hours apart',
    () => {
      for (const changes of manyWeeks) {
        const doses = plan(changes).doses.toSorted((a, b) => instant(a) - instant(b));
        const gaps = doses.slice(1).map((dose, index) => (instant(dose) - instant(doses[index]!)) / HOUR);
        expect(Math.min(24, ...gaps)).toBeGreaterThanOrEqual(4);
      }
    },
  ],
  [
    'order-of-companions',
    'alkalinity before pH before hardness before stabilizer',
    () => {
      const { pool } = scenarioOf({ pool: { feeder: { kind: 'none' } } });
      const water = {
        ...fullTest,
        freeChlorine: 3,
        pH: 6.9,
        totalAlkalinity: 40,
        calciumHardness: 80,
        cyanuricAcid: 10,
      };
      const needs = companionNeeds({
        pool,
        water,
        pH: Array.from({ length: 169 }, () => 6.9),
        pHRead: true,
        measured: () => true,
        tabletsLead: false,
        tabletsPossible: false,
      });
      expect(needs.map(({ reason }) => reason)).toEqual([
        'raises-alkalinity',
        'raises-pH',
        'raises-hardness',
        'raises-stabilizer',
      ]);
    },
  ],
  [
    'order-of-companions',
    'chlorine under the code minimum goes in before anything else',
    () => {
      const low = plan({ reading: { freeChlorine: 0.8, totalAlkalinity: 40 }, preferences: { visits: 7 } });
      expect(companionsOf(low).length).toBe(1);
      expect(chlorines).toContain(low.doses[0]!.substance);
    },
  ],
  [
    'order-of-companions',
    'one of them at a time, with a test before the next',
    () => {
      const week = plan({ reading: { totalAlkalinity: 50, calciumHardness: 100, pH: 7.3 } });
      expect(companionsOf(week).map(({ substance }) => substance)).toEqual(['sodium-bicarbonate']);
      const retest = week.checks.find(({ reason }) => reason === 'after-companion');
      expect((instant(retest!) - instant(companionsOf(week)[0]!)) / HOUR).toBeGreaterThanOrEqual(24);
      const shelf = [products.gran, { id: 'soda', form: 'other', substance: 'sodium-bicarbonate', stock: 5000 }];
      const given = [{ at: '2026-07-05T18:00:00-04:00', product: 'soda', amount: 1000, unit: 'g' }];
      expect(companionsOf(plan({ shelf, given, reading: { totalAlkalinity: 50, calciumHardness: 100 } }))).toEqual([]);
    },
  ],
  [
    'low-pH-no-tablets',
    'at a pH of 6.9 soda is planned and no tablets',
    () => {
      const low = plan({ reading: { pH: 6.9 } });
      expect(tabletsIn(low)).toBe(0);
      expect(substances(low)).toContain('sodium-carbonate');
      expect(codesIn(low.reasons)).toContain('no-tablets-pH-low');
      expect(tabletsIn(plan({ reading: { pH: 7.15 } }))).toBe(0);
    },
  ],
  [
    'acid-morning',
    'acid goes in on a morning, chlorine on evenings, 4 h or more apart',
    () => {
      const { doses } = plan({ reading: { pH: 8, totalAlkalinity: 100 }, preferences: { visits: 7 } });
      const sour = doses.filter(({ substance }) => substance === 'hydrochloric-acid');
      expect(sour).toHaveLength(1);
      expect(wallClock(instant(sour[0]!), zone).hourOfDay).toBeLessThan(10);
      for (const dose of doses.filter((each) => each !== sour[0])) {
        expect(wallClock(instant(dose), zone).hourOfDay).toBeGreaterThan(16);
        expect(Math.abs(instant(dose) - instant(sour[0]!)) / HOUR).toBeGreaterThanOrEqual(4);
      }
    },
  ],
  [
    'first-half',
    'half of the first dose where the volume was only estimated, and a check on the next morning',
    () => {
      const water = { ...noTablets, reading: { freeChlorine: 2.2 } } as const;
      const whole = plan(water).doses[0]!;
      const { doses, checks } = plan({ ...water, pool: { volumeEstimated: true } });
      const first = doses[0]!;
      expect(first.reason).toBe('first-dose-halved');
      if (first.at === whole.at && first.product === whole.product)
        expect(first.amount).toBeLessThanOrEqual(whole.amount / 2 + 50);
      const retest = checks.find(({ reason }) => reason === 'after-halved-dose');
      expect((instant(retest!) - instant(first)) / HOUR).toBeLessThan(24);
      const measured = { ...water, pool: { volumeEstimated: true } } as const;
      const given = [{ at: '2026-07-05T18:00:00-04:00', product: 'gran', amount: 100, unit: 'g' }];
      expect(plan({ ...measured, given }).doses.map(({ reason }) => reason)).not.toContain('first-dose-halved');
    },
  ],
  [
    'learnt-volume',
    'a learnt volume changes the amount of chlorine and of nothing else, and reaches 15 % at most',
    () => {
      expect(VOLUME_REACH).toBe(0.15);
      const week = (volume: number) =>
        planWeek({
          ...scenarioOf({
            shelf: [products.gran, acid],
            reading: { pH: 8.1, totalAlkalinity: 120, freeChlorine: 2.2 },
          }),
          parameters: { volume },
        });
      const amounts = (of: WeekPlan) =>
        of.doses.filter(({ substance }) => substance === 'hydrochloric-acid').map(({ amount }) => amount);
      const [entered, learnt] = [week(75.7), week(85)];
      expect(amounts(entered)).toHaveLength(1);
      expect(amounts(learnt)).toEqual(amounts(entered));
      const riseForEach = ({ doses }: WeekPlan) => {
        const { rise, amount } = doses.find(({ product }) => product === 'gran')!;
        return rise / amount;
      };
      expect(riseForEach(learnt) / riseForEach(entered)).toBeCloseTo(75.7 / 85, 6);
    },
  ],
  [
    'probe',
    'a reading comes from a strip, a drop kit or a shop slip; a probe is none of them',
    () => {
      expect(() => scenarioOf({ reading: { method: 'probe' } })).toThrow();
      expect(() => scenarioOf({ reading: { method: 'strip' } })).not.toThrow();
    },
  ],
];
