import { describe, expect, it } from 'vitest';
import { dayOf } from '@/lib/calendar/household-day';
import { wallClock } from '@/lib/calendar/wall-time';
import { planWeek } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import { codesIn, fullTest, products, scenarioOf, tabletsIn, type Changes } from './scenarios';

const zone = 'America/New_York';
const hourOfDay = (iso: string) => wallClock(Date.parse(iso), zone).hourOfDay;
const base = planWeek(scenarioOf());

describe('a plan', () => {
  it('has 169 instants an hour apart from the reading on, and every series as long', () => {
    const { hours, projection } = base;
    expect(hours).toEqual(
      Array.from({ length: 169 }, (_, hour) => new Date(Date.parse(fullTest.takenAt) + hour * 3_600_000).toISOString()),
    );
    const { freeChlorine, pH, cyanuricAcid, median } = projection!;
    for (const series of [freeChlorine, pH, cyanuricAcid, median].flatMap((group) => Object.values(group)))
      expect(series).toHaveLength(169);
  });

  it('is the same for the same scenario', () => {
    expect(planWeek(scenarioOf())).toEqual(base);
  });

  it('stands in the median run at its end', () => {
    const { endOfWeek, projection } = base;
    for (const quantity of ['freeChlorine', 'pH', 'cyanuricAcid', 'calciumHardness', 'totalAlkalinity'] as const)
      expect(endOfWeek![quantity]).toBeCloseTo(projection!.median[quantity].at(-1)!, 9);
  });

  it.each([1, 2, 3, 4, 5, 6, 7])('keeps to %i evenings', (visits) => {
    const { doses } = planWeek(scenarioOf({ preferences: { visits } }));
    expect(new Set(doses.map(({ at }) => dayOf(Date.parse(at), zone))).size).toBeLessThanOrEqual(visits);
    expect(doses.length).toBeGreaterThan(0);
  });

  it('costs no more the more evenings there may be', () => {
    const costs = [1, 2, 3, 5, 7].map((visits) => planWeek(scenarioOf({ preferences: { visits } })).cost!.total);
    costs.slice(1).forEach((cost, index) => expect(cost).toBeLessThan(costs[index]! * 1.02));
  });

  it('plans nothing before now', () => {
    const now = '2026-07-08T12:00:00-04:00';
    const { doses, checks } = planWeek(scenarioOf({ now }));
    expect(doses.length).toBeGreaterThan(0);
    for (const { at } of [...doses, ...checks]) expect(Date.parse(at)).toBeGreaterThanOrEqual(Date.parse(now));
  });
});

describe('the hour of a dose', () => {
  it('is an hour before sunset to a quarter hour, where nobody swims then', () => {
    const { doses } = planWeek(scenarioOf({ pool: { swimHours: { from: '10:00', to: '17:00' } } }));
    // Sunset in central Florida on these days is at 20:21 to 20:24.
    for (const { at } of doses) expect([19.25, 19.5]).toContain(hourOfDay(at));
  });

  it('is a quarter hour after the last swim, where people swim until dusk', () => {
    for (const { at } of base.doses) expect(hourOfDay(at)).toBe(20.25);
    expect(codesIn(base.cautions)).not.toContain('dose-after-dark');
  });

  it('is after dark in December, and the plan says so', () => {
    const plan = planWeek(
      scenarioOf({ reading: { takenAt: '2026-12-20T12:00:00-05:00', temperature: 20, freeChlorine: 0.5 } }),
    );
    expect(plan.doses.some(({ form }) => form !== 'tablet')).toBe(true);
    expect(codesIn(plan.cautions)).toContain('dose-after-dark');
  });

  it('leaves four hours before people swim at night', () => {
    const pool = { swimHours: { from: '21:00', to: '23:00' } };
    for (const { at } of planWeek(scenarioOf({ pool })).doses) expect(hourOfDay(at)).toBe(23.25);
  });

  it('is never where somebody may swim at any time', () => {
    const plan = planWeek(scenarioOf({ pool: { swimHours: { from: '00:00', to: '00:00' } } }));
    expect(plan.doses).toEqual([]);
    expect(codesIn(plan.reasons)).not.toContain('nothing-fast-needed');
  });

  it('is noon where the sun does not set', () => {
    const pool = {
      latitude: 69.6,
      longitude: 18.9,
      timeZone: 'Europe/Oslo',
      swimHours: { from: '14:00', to: '16:00' },
    };
    const { doses } = planWeek(
      scenarioOf({ pool, reading: { takenAt: '2026-06-20T08:00:00+02:00', freeChlorine: 1 } }),
    );
    // Noon lies within the waiting time before swimming: after it, then.
    for (const { at } of doses) expect(wallClock(Date.parse(at), 'Europe/Oslo').hourOfDay).toBe(16.25);
  });
});

describe('too much chlorine', () => {
  const firstAt = ({ doses }: WeekPlan) => Math.min(...doses.map(({ at }) => Date.parse(at)));

  it('is waited out: nothing goes in while the likely range is over 10 mg/L', () => {
    const plan = planWeek(scenarioOf({ reading: { freeChlorine: 12, cyanuricAcid: 70 } }));
    const { p90 } = plan.projection!.freeChlorine;
    const lastOver = p90.findLastIndex((level) => level > 10);
    expect(lastOver).toBeGreaterThan(12);
    expect(firstAt(plan)).toBeGreaterThan(Date.parse(plan.hours[lastOver]!));
    expect(codesIn(plan.cautions)).toContain('free-chlorine-over-swim-limit');
    expect(plan.broken).toContainEqual(expect.objectContaining({ limit: 'free-chlorine-maximum', bound: 10 }));
  });

  it('leaves the plan empty when it lasts the week', () => {
    const plan = planWeek(scenarioOf({ reading: { freeChlorine: 60, cyanuricAcid: 150 } }));
    expect(plan.doses).toEqual([]);
    expect(plan.projection).not.toBeNull();
  });
});

describe('what a plan says of its limits', () => {
  const plans = {
    base,
    'stabilizer 88': planWeek(scenarioOf({ reading: { cyanuricAcid: 88 } })),
    'low pH': planWeek(scenarioOf({ reading: { pH: 7.1, freeChlorine: 0.5 } })),
    'no stabilizer': planWeek(
      scenarioOf({
        reading: { cyanuricAcid: 0 },
        pool: { feeder: { kind: 'none' } },
        preferences: { avoid: ['cyanuric-acid'] },
      }),
    ),
  };

  it.each(Object.entries(plans))('stands in its projection: %s', (_, { broken, projection, hours }) => {
    const { freeChlorine, pH, cyanuricAcid } = projection!;
    const hourly: Record<string, (hour: number) => [value: number, bound: number]> = {
      'code-minimum': (hour) => [freeChlorine.p10[hour]!, freeChlorine.lowestLevel[hour]! > 1 ? 2 : 1],
      'lowest-level': (hour) => [freeChlorine.p50[hour]!, freeChlorine.lowestLevel[hour]!],
      'swim-limit': (hour) => [freeChlorine.p50[hour]!, freeChlorine.swimLimit[hour]!],
      'free-chlorine-maximum': (hour) => [freeChlorine.p90[hour]!, 10],
      'pH-low': (hour) => [pH.p50[hour]!, 7.2],
      'pH-high': (hour) => [pH.p50[hour]!, 7.8],
      'stabilizer-too-high-for-swim-limit': () => [cyanuricAcid.p50[0]!, 70],
    };
    for (const { limit, at, value, bound } of broken) {
      const hour = hours.findIndex((each) => Date.parse(each) === Date.parse(at));
      const [there, then] = hourly[limit]!(hour);
      if (limit === 'stabilizer-too-high-for-swim-limit') {
        expect(value).toBe(88);
        expect(bound).toBe(then);
        continue;
      }
      expect(value).toBe(there);
      expect(bound).toBe(then);
      const by = Math.abs(value - bound);
      if (limit === 'swim-limit') expect(hourOfDay(at) >= 10 && hourOfDay(at) < 20).toBe(true);
      else
        hours.forEach((_, other) => {
          const [elsewhere, boundThere] = hourly[limit]!(other);
          const over = ['free-chlorine-maximum', 'pH-high'].includes(limit);
          expect(over ? elsewhere - boundThere : boundThere - elsewhere).toBeLessThanOrEqual(by + 1e-9);
        });
    }
  });

  it.each(Object.entries(plans))('names every limit that is broken, and no other: %s', (_, plan) => {
    const { broken, projection, hours } = plan;
    const { freeChlorine, pH } = projection!;
    const somewhere = (test: (hour: number) => boolean) => hours.some((_hour, hour) => test(hour));
    const swims = (hour: number) => hourOfDay(hours[hour]!) >= 10 && hourOfDay(hours[hour]!) < 20;
    const expected = {
      'lowest-level': somewhere((hour) => freeChlorine.p50[hour]! < freeChlorine.lowestLevel[hour]!),
      'swim-limit': somewhere((hour) => swims(hour) && freeChlorine.p50[hour]! > 4),
      'free-chlorine-maximum': somewhere((hour) => freeChlorine.p90[hour]! > 10),
      'pH-low': somewhere((hour) => pH.p50[hour]! < 7.2),
      'pH-high': somewhere((hour) => pH.p50[hour]! > 7.8),
    };
    for (const [limit, isBroken] of Object.entries(expected))
      expect([limit, broken.some((each) => each.limit === limit)]).toEqual([limit, isBroken]);
  });

  it.each(Object.entries(plans))('opens the pool for the share that an independent count finds: %s', (_, plan) => {
    const { openSwimShare, projection, hours } = plan;
    const { freeChlorine, pH } = projection!;
    let [swim, open] = [0, 0];
    hours.forEach((iso, hour) => {
      if (hourOfDay(iso) < 10 || hourOfDay(iso) >= 20) return;
      swim++;
      const level = freeChlorine.p50[hour]!;
      if (level >= freeChlorine.lowestLevel[hour]! && level <= 4 && pH.p50[hour]! >= 7.2 && pH.p50[hour]! <= 7.8)
        open++;
    });
    expect(openSwimShare).toBeCloseTo(open / swim, 12);
  });

  it('puts replacing water first where no level is both high and low enough', () => {
    const plan = plans['stabilizer 88'];
    const { volume, days, ...exchange } = plan.reasons[0] as unknown as Record<string, number>;
    expect(exchange).toEqual({
      code: 'replace-water-first',
      stabilizer: 88,
      closesAt: 70,
      swimLimit: 4,
      closed: 'yes',
      target: 45,
    });
    // A tenth of 1.5 m a day: 0.9^7 leaves 42 of 88, 0.9^6 still 47.
    expect(days).toBe(7);
    // On the last of them only as much as is left to do.
    expect(volume).toBeCloseTo(6 * 7.57 + 75.7 * (1 - 45 / (88 * 0.9 ** 6)), 2);
    expect(plan.broken[0]!.limit).toBe('stabilizer-too-high-for-swim-limit');
    expect(Math.max(...plan.projection!.freeChlorine.swimLimit)).toBe(4);
  });

  it('follows stabilizer with the lowest level: a twentieth, at least 2, at least 1 where there is none', () => {
    expect(Math.max(...base.projection!.freeChlorine.lowestLevel)).toBeGreaterThan(2.5);
    expect(new Set(plans['no stabilizer'].projection!.freeChlorine.lowestLevel)).toEqual(new Set([1]));
  });
});

describe('an estimated volume', () => {
  it('halves the first dose, and tests the morning after', () => {
    const whole = planWeek(scenarioOf({ reading: { freeChlorine: 1 } }));
    const halved = planWeek(scenarioOf({ reading: { freeChlorine: 1 }, pool: { volumeEstimated: true } }));
    const [first, half] = [whole.doses[0]!, halved.doses[0]!];
    const measures = (amount: number) => amount / (first.product === 'gran' ? 50 : 250);
    expect(half).toMatchObject({ at: first.at, product: first.product, reason: 'first-dose-halved' });
    expect(measures(half.amount)).toBe(Math.floor(measures(first.amount) / 2));
    expect(halved.doses.slice(1)).toEqual(whole.doses.slice(1));
    expect(halved.checks).toContainEqual(expect.objectContaining({ kind: 'quick', reason: 'after-halved-dose' }));
    expect(codesIn(halved.cautions)).toContain('volume-estimated');
  });

  it('halves no later one', () => {
    const given = [{ at: '2026-07-05T20:15:00-04:00', product: 'gran', amount: 100, unit: 'g' }];
    const plan = planWeek(scenarioOf({ pool: { volumeEstimated: true }, given, now: '2026-07-06T08:00:00-04:00' }));
    expect(plan.doses.map(({ reason }) => reason)).not.toContain('first-dose-halved');
  });
});

describe('tests that a plan asks for', () => {
  it('are a quick check before a swim day that lies two days off, and the full test of the next week', () => {
    const { checks } = planWeek(scenarioOf({ week: { swimmerHours: [0, 0, 0, 0, 6, 6, 0] } }));
    expect(checks).toContainEqual({
      at: '2026-07-09T10:00:00-04:00',
      kind: 'quick',
      reason: 'swim-day-after-two-days',
    });
    expect(checks.map(({ at }) => at)).not.toContain('2026-07-10T10:00:00-04:00');
    expect(checks.at(-1)).toEqual({ at: '2026-07-12T19:00:00-04:00', kind: 'full', reason: 'next-week' });
  });

  it('a full test in the middle of the week where it is worth more than it costs: little room between the limits', () => {
    const midWeek = (changes: Changes) =>
      planWeek(scenarioOf(changes)).checks.filter(({ reason }) => reason === 'mid-week-pays');
    const reading = { cyanuricAcid: 60 };
    expect(midWeek({ reading })).toEqual([{ at: '2026-07-09T10:00:00-04:00', kind: 'full', reason: 'mid-week-pays' }]);
    expect(midWeek({ reading: { cyanuricAcid: 40 } })).toEqual([]);
    expect(midWeek({ reading, pool: { swimLimit: 10 } })).toEqual([]);
    expect(midWeek({ reading, preferences: { steadiness: 0 } })).toEqual([]);
    expect(midWeek({ reading, preferences: { evenings: 3 } })).toEqual([]);
  });
});

describe('why no tablets', () => {
  const given = [{ at: '2026-07-05T18:00:00-04:00', product: 'tabs', amount: 3, unit: 'tablet' }];
  it.each([
    ['no-tablets-week-full', { given }],
    ['no-tablets-pool-small', { pool: { volume: 15 } }],
    [
      'no-tablets-feeder-full',
      { given, pool: { volume: 114, feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3 } } },
    ],
    ['no-tablets-feeder', { pool: { feeder: { kind: 'none' } } }],
    ['no-tablets-on-shelf', { shelf: [products.gran] }],
    ['no-tablets-avoided', { preferences: { avoid: ['tablet'] } }],
    ['no-tablets-stabilizer-high', { reading: { cyanuricAcid: 88 } }],
  ])('%s', (code, changes: Changes) => {
    const plan = planWeek(scenarioOf(changes));
    expect(codesIn(plan.reasons)).toContain(code);
    expect(tabletsIn(plan)).toBe(0);
  });
});

describe('the full test', () => {
  const dueIn = (changes: Parameters<typeof scenarioOf>[0], reading?: object) =>
    planWeek({ ...scenarioOf(changes), ...reading }).checks.filter(({ kind }) => kind === 'full');
  const quick = { takenAt: '2026-07-08T09:00:00-04:00', method: 'drop-kit' as const, freeChlorine: 2.8, pH: 7.5 };
  const full = [scenarioOf().reading].flat()[0]!;

  it('is due a week after the last full one, whatever was checked since', () => {
    expect(dueIn({}, { reading: [full, quick] })).toEqual([
      { at: '2026-07-12T19:00:00-04:00', kind: 'full', reason: 'next-week' },
    ]);
  });

  it('is due the next morning where everything was never measured', () => {
    expect(dueIn({}, { reading: quick })[0]).toMatchObject({ at: '2026-07-09T10:00:00-04:00' });
  });

  it('and no check comes within six hours of the test that makes the plan', () => {
    const morning = { ...full, takenAt: '2026-07-05T09:40:00-04:00', freeChlorine: 2.1 };
    const { checks } = planWeek({ ...scenarioOf(), reading: morning });
    for (const { at } of checks) expect(Date.parse(at)).toBeGreaterThan(Date.parse(morning.takenAt) + 6 * 3_600_000);
  });
});

describe('outcomes of common practice', () => {
  const fillWater = { calciumHardness: 350, totalAlkalinity: 120, pH: 7.8 };
  const forms = ({ doses }: WeekPlan) => new Set(doses.map(({ form }) => form));

  it('stabilizer below the band: tablets lead', () => {
    const plan = planWeek(scenarioOf({ reading: { cyanuricAcid: 20 } }));
    const rise = (form: string) =>
      plan.doses
        .filter((dose) => (dose.form === 'tablet') === (form === 'tablet'))
        .reduce((sum, dose) => sum + dose.rise, 0);
    expect(tabletsIn(plan)).toBe(3);
    expect(rise('tablet')).toBeGreaterThan(rise('fast'));
  });

  it('hard water from hard fill water: no calcium hypochlorite', () => {
    const plan = planWeek(scenarioOf({ pool: { fillWater }, reading: { calciumHardness: 420 } }));
    expect(forms(plan)).not.toContain('granular');
    expect(forms(plan)).toContain('liquid');
  });

  it('a quick raise: granules or liquid', () => {
    const [first] = planWeek(scenarioOf({ reading: { freeChlorine: 0.5 } })).doses;
    expect(['granular', 'liquid']).toContain(first!.form);
    expect(first!.reason).toBe('quick-raise');
  });

  it('low pH and alkalinity: fewer tablets; not more where bicarbonate raises it in the same week', () => {
    const soft = (avoid: string[]) =>
      planWeek(scenarioOf({ reading: { pH: 7.25, totalAlkalinity: 50 }, preferences: { avoid } }));
    expect(tabletsIn(soft(['sodium-bicarbonate']))).toBeLessThan(tabletsIn(base));
    expect(tabletsIn(soft([]))).toBeLessThanOrEqual(tabletsIn(base));
    expect(soft([]).doses.map(({ substance }) => substance)).toContain('sodium-bicarbonate');
  });

  it('compares with each form alone', () => {
    const { alternatives } = base;
    expect(alternatives.map(({ kind }) => kind)).toEqual(['tablets', 'granular', 'liquid']);
    const [tablets, granular, liquid] = alternatives;
    expect(tablets!.stabilizer).toBeGreaterThan(3);
    expect(granular!.hardness - liquid!.hardness).toBeGreaterThan(2);
    for (const each of alternatives) {
      expect(each.total).toBeGreaterThan(base.cost!.total);
      expect(each.kilograms).toBeGreaterThan(0);
      expect(each.visits).toBe(new Set(each.doses.map(({ at }) => at)).size);
    }
    expect(granular!.swing).toBeGreaterThan(tablets!.swing);
    expect(liquid!.kilograms).toBeGreaterThan(granular!.kilograms);
  });

  it('carries its own burdens beside them, each counted from its doses and its curve', () => {
    const { mix, doses, cost, projection, hours } = base;
    const { freeChlorine, cyanuricAcid, calciumHardness } = projection!.median;
    expect(mix!.money).toBeCloseTo(cost!.money, 9);
    expect(mix!.visits).toBe(new Set(doses.map(({ at }) => at)).size);
    expect(mix!.stabilizer).toBeCloseTo(cyanuricAcid.at(-1)! - cyanuricAcid[0]!, 9);
    expect(mix!.hardness).toBeCloseTo(calciumHardness.at(-1)! - calciumHardness[0]!, 9);
    const kilogramsPer = { tablet: products.tabs.tabletMass / 1000, g: 0.001, mL: 0.0012 };
    expect(mix!.kilograms).toBeCloseTo(
      doses.reduce((sum, { amount, unit }) => sum + amount * kilogramsPer[unit], 0),
      9,
    );
    const days = hours.map((hour) => dayOf(Date.parse(hour), zone));
    const swings = [...new Set(days)].map((day) => {
      const levels = freeChlorine.filter((_, hour) => days[hour] === day);
      return Math.max(...levels) - Math.min(...levels);
    });
    expect(mix!.swing).toBeCloseTo(swings.reduce((sum, swing) => sum + swing, 0) / swings.length, 9);
  });

  it('says that a form is not feasible when there is none', () => {
    const { alternatives } = planWeek(scenarioOf({ shelf: [products.liq] }));
    expect(alternatives.find(({ kind }) => kind === 'granular')).toMatchObject({
      feasible: false,
      doses: [],
      money: 0,
    });
  });
});
