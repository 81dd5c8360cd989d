import { describe, expect, it } from 'vitest';
import { amountToReach } from '@/lib/chemistry';
import { holdWeek, treatmentWeek } from '@/lib/planner';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { limits } from '@/lib/standards/limits';

const green = (changes: { volume?: number; freeChlorine?: number; pH?: number; volumeEstimated?: boolean } = {}) =>
  scenarioSchema.parse({
    pool: {
      volume: changes.volume ?? 68,
      volumeEstimated: changes.volumeEstimated ?? false,
      latitude: 45.2,
      longitude: -93.3,
      timeZone: 'America/Chicago',
    },
    reading: {
      takenAt: '2026-07-05T09:00:00-05:00',
      method: 'drop-kit',
      freeChlorine: changes.freeChlorine ?? 0.6,
      pH: changes.pH ?? 7.3,
      totalAlkalinity: 100,
      calciumHardness: 250,
      cyanuricAcid: 34,
      temperature: 26,
    },
    shelf: [
      { id: 'liquid', form: 'liquid', substance: 'sodium-hypochlorite', strength: 12.5, stock: 20000 },
      { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 5000 },
    ],
    // Acid has gone in before, so it is not halved.
    given: [
      { at: '2026-06-20T07:00:00-05:00', product: 'acid', amount: 200, unit: 'mL' },
      { at: '2026-06-21T19:00:00-05:00', product: 'liquid', amount: 1000, unit: 'mL' },
    ],
  });
const clearing = { kind: 'clearing', aim: { to: 10 }, evening: 'treatment', pHFirst: 7.4 } as const;
const chlorineOf = (plan: ReturnType<typeof treatmentWeek>) =>
  plan.doses.find(({ substance }) => substance === 'sodium-hypochlorite');

describe('a treatment evening', () => {
  it('raises as far as the likely range stays at or under 10, and no further', () => {
    const plan = treatmentWeek(green(), clearing);
    expect(plan.doses).toHaveLength(1);
    const dose = chlorineOf(plan)!;
    const after = plan.hours.findIndex((hour) => Date.parse(hour) >= Date.parse(dose.at));
    const highest = Math.max(...plan.projection!.freeChlorine.p90);
    expect(highest).toBeLessThanOrEqual(limits.freeChlorineMaximum.value);
    expect(highest).toBeGreaterThan(9.3);
    expect(plan.projection!.freeChlorine.p50[after]).toBeGreaterThan(7);
    expect(dose.rise).toBeGreaterThan(limits.largeDose.value);
  });

  it('gives the amount that the water model itself reckons for that rise, within 1 %', () => {
    const plan = treatmentWeek(green(), clearing);
    const dose = chlorineOf(plan)!;
    const water = {
      freeChlorine: 0.2,
      pH: 7.3,
      totalAlkalinity: 100,
      calciumHardness: 250,
      cyanuricAcid: 34,
      temperature: 26,
    };
    const own = amountToReach(
      water,
      68,
      { substance: 'sodium-hypochlorite', strength: 12.5 },
      {
        quantity: 'freeChlorine',
        value: 0.2 + dose.rise,
      },
    );
    expect(Math.abs(dose.amount / own - 1)).toBeLessThan(0.01);
  });

  it('reaches a target below 10 to within 1 % of the arithmetic', () => {
    const plan = treatmentWeek(green({ freeChlorine: 1.5 }), {
      kind: 'accident',
      aim: { to: 4 },
      evening: 'treatment',
    });
    const dose = chlorineOf(plan)!;
    const at = (Date.parse(dose.at) - Date.parse(plan.takenAt)) / 3_600_000;
    const undosed = holdWeek(green({ freeChlorine: 1.5 }), 'accident').projection!.freeChlorine.p50;
    const share = at - Math.floor(at);
    const before = undosed[Math.floor(at)]! * (1 - share) + undosed[Math.floor(at) + 1]! * share;
    expect(before + dose.rise).toBeGreaterThan(4 * 0.985);
    expect(before + dose.rise).toBeLessThanOrEqual(4 * 1.001);
  });

  it('asks more of a larger pool in proportion', () => {
    const small = chlorineOf(treatmentWeek(green({ volume: 34 }), clearing))!;
    const large = chlorineOf(treatmentWeek(green({ volume: 68 }), clearing))!;
    expect(large.amount / small.amount).toBeGreaterThan(1.96);
    expect(large.amount / small.amount).toBeLessThan(2.04);
  });

  it('brings pH down first, in the morning, and chlorine waits for a test', () => {
    const plan = treatmentWeek(green({ pH: 7.7 }), clearing);
    expect(plan.doses.map(({ substance }) => substance)).toEqual(['hydrochloric-acid']);
    const [acid] = plan.doses;
    expect(acid!.effect!.change).toBeLessThan(0);
    expect(acid!.effect!.change).toBeGreaterThanOrEqual(-0.4 - 1e-9);
    // 4 h after the acid it shows: then chlorine may still go in that evening.
    expect(Date.parse(plan.checks[0]!.at) - Date.parse(acid!.at)).toBe(4 * 3_600_000);
    expect(chlorineOf(treatmentWeek(green({ pH: 7.45 }), clearing))).toBeDefined();
  });

  it('plans no chlorine on a pH too high where no acid may be planned', () => {
    const without = {
      ...green({ pH: 7.9 }),
      preferences: { ...green().preferences, avoid: ['hydrochloric-acid', 'sodium-bisulfate'] },
    };
    expect(treatmentWeek(without, clearing).doses).toEqual([]);
  });

  it('asks for a test on the morning after', () => {
    const plan = treatmentWeek(green(), clearing);
    const [check] = plan.checks;
    expect(check).toMatchObject({ kind: 'quick', reason: 'after-treatment' });
    expect(Date.parse(check!.at) - Date.parse(chlorineOf(plan)!.at)).toBeGreaterThan(8 * 3_600_000);
  });

  it('adds nothing where the level is there already', () => {
    expect(
      treatmentWeek(green({ freeChlorine: 9.9 }), { kind: 'quick-raise', aim: { to: 4 }, evening: 'ordinary' }).doses,
    ).toEqual([]);
  });

  it('keeps an ordinary evening to what one evening may add', () => {
    const plan = treatmentWeek(green({ freeChlorine: 0 }), {
      kind: 'quick-raise',
      aim: { to: 10 },
      evening: 'ordinary',
    });
    expect(chlorineOf(plan)!.rise).toBeLessThanOrEqual(4 + 1e-6);
    expect(chlorineOf(plan)!.rise).toBeGreaterThan(3.9);
  });

  it('gives half where the volume was only estimated and nothing has gone in', () => {
    const whole = { ...green(), given: [] };
    const estimated = { ...green({ volumeEstimated: true }), given: [] };
    const ratio =
      chlorineOf(treatmentWeek(estimated, clearing))!.amount / chlorineOf(treatmentWeek(whole, clearing))!.amount;
    expect(ratio).toBeCloseTo(0.5, 1);
  });
});

describe('a week on hold', () => {
  it('looks ahead, adds nothing and says why', () => {
    const plan = holdWeek(green(), 'accident');
    expect(plan.doses).toEqual([]);
    expect(plan.projection).not.toBeNull();
    expect(plan.reasons).toEqual([{ code: 'situation-holds', kind: 'accident' }]);
  });
});
