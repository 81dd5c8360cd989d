import { describe, expect, it } from 'vitest';
import type { Situation } from '@/lib/schemas/situation';
import { situationSchema } from '@/lib/schemas/situation';
import { type SituationRecord, wayOf } from '@/lib/situations';
import { replaceWater } from '@/lib/situations/replace-water';
import { aReading, aRecord, fine, full, HOUR, openedAt, pool, ticked } from './records';

const way = (situation: Situation, changes: Partial<SituationRecord> = {}) => wayOf(aRecord(situation, changes));
const codes = ({ steps }: ReturnType<typeof way>) => steps.map(({ code }) => code);

describe('used-up chlorine (care rules, part 7)', () => {
  const combined = (values: object, changes: Partial<SituationRecord> = {}) =>
    way({ kind: 'combined-chlorine', answers: {} }, { readings: [aReading(-2, { ...full, ...values })], ...changes });
  const dose = { at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 2.5 };

  it('raises by 5, tests on the next day, on three evenings at most', () => {
    expect(combined({ combinedChlorine: 0.8 }).lead).toMatchObject({ kind: 'treat', treatment: { aim: { by: 5 } } });
    expect(codes(combined({ combinedChlorine: 0.8 }))).toContain('open-cover-and-sun');
    expect(combined({ combinedChlorine: 0.8 }, { given: [dose] }).lead).toEqual({ kind: 'hold' });
    const given = [0, 24, 48].map((hours) => ({ ...dose, at: dose.at + hours * HOUR }));
    const readings = [aReading(-2, full), aReading(71, { ...fine, combinedChlorine: 0.6 })];
    expect(combined({}, { given, readings })).toMatchObject({
      branch: 'professional',
      lead: { kind: 'hold' },
      callNow: true,
    });
  });

  it('is over at 0.4, and asks for a test where it was never measured', () => {
    expect(combined({ combinedChlorine: 0.4 })).toMatchObject({ branch: 'not-high', done: true });
    const old = [aReading(-50, { combinedChlorine: 0.8 }), aReading(-2, fine)];
    expect(combined({}, { readings: old })).toMatchObject({ branch: 'never-measured', lead: { kind: 'follow' } });
    expect(combined({ combinedChlorine: undefined })).toMatchObject({ branch: 'never-measured', done: false });
  });
});

describe('a quick raise', () => {
  const raise = (changes: Partial<SituationRecord> = {}) => way({ kind: 'quick-raise', answers: {} }, changes);
  it('goes to the swim limit in one ordinary evening and is over with the check of the next morning', () => {
    const readings = [aReading(-2, { ...full, freeChlorine: 1.5 })];
    expect(raise({ readings }).lead).toMatchObject({
      kind: 'treat',
      treatment: { aim: { to: 4 }, evening: 'ordinary' },
    });
    const given = [{ at: openedAt + 10 * HOUR, substance: 'sodium-hypochlorite', rise: 2.5 }];
    expect(raise({ readings, given })).toMatchObject({ lead: { kind: 'hold' }, done: false });
    expect(raise({ given, readings: [...readings, aReading(11, fine)] }).done).toBe(false);
    expect(raise({ given, readings: [...readings, aReading(23, fine)] }).done).toBe(true);
  });
  it('adds nothing where there is enough, and asks for a test where the last is a day old', () => {
    expect(raise({ readings: [aReading(-2, { ...full, freeChlorine: 3.8 })] })).toMatchObject({
      branch: 'high-enough',
      done: true,
    });
    expect(raise({ readings: [aReading(-25, full)] }).lead).toEqual({ kind: 'hold' });
  });
});

describe('drain cover', () => {
  it('keeps everybody out, pump off, until it is replaced; nothing is dosed', () => {
    const loose = way({ kind: 'drain-cover', answers: {} });
    expect(loose).toMatchObject({ stayOut: true, lead: { kind: 'hold' }, done: false });
    expect(codes(loose).slice(0, 2)).toEqual(['everyone-out', 'pump-off']);
    expect(way({ kind: 'drain-cover', answers: {} }, { ticks: ticked('cover-replaced') })).toMatchObject({
      done: true,
      stayOut: false,
    });
  });
});

describe('a storm', () => {
  const dry = { kind: 'storm', answers: { pumpRoom: 'dry', shock: 'no' } } as const;
  it('doses nothing, then skims, looks at level and baskets, tests', () => {
    expect(way(dry)).toMatchObject({ lead: { kind: 'hold' }, stayOut: true });
    expect(way(dry).cautions[0]).toBe('thunder');
    const ticks = ticked('thunder-over', 'skim', 'level', 'baskets', 'earth-leakage-test');
    expect(way(dry, { ticks }).done).toBe(false);
    expect(way(dry, { ticks, readings: [aReading(2, fine)] }).done).toBe(true);
    expect(way(dry, { ticks, readings: [aReading(0.5, fine)] }).done).toBe(false);
  });
  it.each(['wet', 'tingle'])('sends for an electrician first: %s', (what) => {
    const answers =
      what === 'wet' ? ({ pumpRoom: 'wet', shock: 'no' } as const) : ({ pumpRoom: 'dry', shock: 'yes' } as const);
    const wet = way({ kind: 'storm', answers });
    expect(wet).toMatchObject({ branch: 'electrician-first', stayOut: true, callNow: true });
    expect(codes(wet)).not.toContain('earth-leakage-test');
    expect(
      way(
        { kind: 'storm', answers },
        { ticks: ticked('thunder-over', 'skim', 'level', 'baskets'), readings: [aReading(2, fine)] },
      ),
    ).toMatchObject({ done: false, stayOut: true });
  });
});

describe('a cover that comes off', () => {
  it('is aired, and tested before the first swim after a week', () => {
    const week = { kind: 'cover', answers: { covered: 'week-or-more', floaterUnder: 'yes' } } as const;
    expect(codes(way(week))).toEqual(['floater-out', 'air-cover', 'test-before-swim']);
    const ticks = ticked('floater-out', 'air-cover');
    expect(way(week, { ticks }).done).toBe(false);
    expect(way(week, { ticks, readings: [aReading(2, fine)] }).done).toBe(true);
  });
});

describe('a stain', () => {
  it('asks a professional and plans nothing', () => {
    const stained = way({ kind: 'stain', answers: {} });
    expect(stained).toMatchObject({ branch: 'professional', lead: { kind: 'follow' } });
    expect(stained.cautions).toEqual(['metals', 'nothing-of-ours']);
  });
});

describe('going away', () => {
  const answers = { leavesOn: '2026-07-10', backOn: '2026-07-17', care: 'nobody' } as const;
  it('goes up to seven days alone; longer needs a named adult or a closed pool', () => {
    const parse = (changes: object) =>
      situationSchema.safeParse({ kind: 'away', answers: { ...answers, ...changes } }).success;
    expect(parse({})).toBe(true);
    expect(parse({ backOn: '2026-07-18' })).toBe(false);
    expect(parse({ backOn: '2026-07-18', care: 'adult' })).toBe(false);
    expect(parse({ backOn: '2026-07-18', care: 'adult', name: 'Grandmother' })).toBe(true);
    expect(parse({ backOn: '2026-07-18', care: 'closed' })).toBe(true);
    expect(parse({ backOn: '2026-07-09' })).toBe(false);
  });
  it('has a named adult test every week', () => {
    const three = way({
      kind: 'away',
      answers: { leavesOn: '2026-07-10', backOn: '2026-07-31', care: 'adult', name: 'Ada' },
    });
    expect(three.steps.filter(({ code }) => code === 'adult-tests-weekly').map(({ id }) => id)).toEqual([
      'adult-tests-weekly-2026-07-17',
      'adult-tests-weekly-2026-07-24',
    ]);
  });
  it('is over with a test on return, not with one before', () => {
    const backAt = (Date.parse('2026-07-17T12:00:00-05:00') - openedAt) / HOUR;
    expect(way({ kind: 'away', answers }, { readings: [aReading(backAt - 24, fine)] }).done).toBe(false);
    expect(way({ kind: 'away', answers }, { readings: [aReading(backAt, fine)] }).done).toBe(true);
  });
});

describe('replacing water', () => {
  // c_n = f + (c_0 - f)(1 - s)^n, day by day, as one would reckon with a bucket.
  const byHand = (now: number, fill: number, share: number, days: number) => {
    let value = now;
    for (let day = 0; day < days; day++) value = value * (1 - share) + fill * share;
    return value;
  };
  it.each([
    [66, 60, 0, 60, 1.5],
    [75, 60, 0, 60, 1.5],
    [110, 45, 0, 75, 1.4],
    [520, 400, 60, 60, 1.5],
    [900, 250, 120, 38, 1.2],
  ])(
    'from %s to %s with fill water of %s, %s m3, depth %s: equals dilution within 1 %%',
    (now, target, fill, volume, depth) => {
      const plan = replaceWater(now, target, fill, { volume, depth })!;
      const share = plan.volume / volume;
      expect(plan.drop).toBeLessThanOrEqual(0.15 + 1e-9);
      expect(plan.drop * plan.days).toBeLessThanOrEqual(depth / 3 + 1e-9);
      expect(plan.drop).toBeCloseTo(share * depth, 9);
      const left = byHand(now, fill, share, plan.days);
      expect(Math.abs(plan.reached / left - 1)).toBeLessThan(0.01);
      expect(plan.reached).toBeGreaterThanOrEqual(target - 1e-9);
    },
  );
  it('asks twice the water of twice the pool', () => {
    const of = (volume: number) => replaceWater(75, 60, 0, { volume, depth: 1.5 })!.volume;
    expect(of(80) / of(40)).toBeCloseTo(2, 9);
  });
  it('has nothing to do where the value is low or the fill water no better', () => {
    expect(replaceWater(40, 45, 0, { volume: 60, depth: 1.5 })).toBeNull();
    expect(replaceWater(500, 400, 400, { volume: 60, depth: 1.5 })).toBeNull();
  });
});

describe('stabilizer or hardness too high', () => {
  const high = { readings: [aReading(-2, { ...full, cyanuricAcid: 90, calciumHardness: 600 })] };
  const ground = { ground: 'no' } as const;

  it('goes in steps with a test after them, never in one go', () => {
    const stabilizer = way({ kind: 'stabilizer-high', answers: ground }, high);
    expect(stabilizer).toMatchObject({ branch: 'replace-water', lead: { kind: 'follow' }, done: false });
    expect(codes(stabilizer)).toEqual(['replace-water', 'replace-water', 'replace-water', 'test-stabilizer']);
    expect(stabilizer.steps.slice(0, 3).every(({ figures }) => Number(figures!.drop) <= 0.15 + 1e-9)).toBe(true);
    expect(stabilizer.reasons.map(({ code }) => code)).toEqual(['water-to-replace', 'water-in-rounds']);
    const days = new Set(stabilizer.steps.map(({ at }) => new Date(at).toDateString()));
    expect(days.size).toBe(4);
  });

  it('asks a professional before the water is lowered at all: ground water, slopes, vinyl, fibreglass', () => {
    for (const situation of [
      { kind: 'stabilizer-high', answers: { ground: 'yes' } },
      { kind: 'hardness-high', answers: { ground: 'unsure' } },
    ] as const) {
      expect(codes(way(situation, high))).toEqual(['ask-before-lowering']);
      expect(way(situation, high)).toMatchObject({ branch: 'ask-before-lowering', callNow: true });
      expect(codes(way(situation, { ...high, ticks: ticked('ask-before-lowering') }))).toContain('replace-water');
    }
    for (const surface of ['vinyl', 'fibreglass'] as const)
      expect(codes(way({ kind: 'stabilizer-high', answers: ground }, { ...high, pool: { ...pool, surface } }))).toEqual(
        ['ask-before-lowering'],
      );
  });

  it('is over when the next test is back in range', () => {
    const readings = [...high.readings, aReading(100, { cyanuricAcid: 55, calciumHardness: 380 })];
    expect(way({ kind: 'stabilizer-high', answers: ground }, { readings }).done).toBe(true);
    expect(way({ kind: 'hardness-high', answers: ground }, { readings }).done).toBe(true);
  });

  it('says so where the fill water itself is too hard', () => {
    const hard = { ...pool, fillWater: { ...pool.fillWater, calciumHardness: 420 } };
    expect(way({ kind: 'hardness-high', answers: ground }, { ...high, pool: hard })).toMatchObject({
      branch: 'fill-water-hard',
      callNow: true,
    });
  });
});

describe('opening and closing', () => {
  it.each([
    ['opening', ['drain-cover-looked-at', 'electrician-tested', 'ladder', 'gate', 'kit-dates', 'old-products']],
    ['closing', ['drain-cover-looked-at', 'electrician-tested']],
  ] as const)('%s: 12 to 15 ticks over days, safety first, over with all of them and a full test', (kind, first) => {
    const situation = { kind, answers: { startsOn: '2026-07-05' } } as const;
    const list = way(situation);
    const ticks = list.steps.filter(({ kind: each }) => each === 'tick');
    expect(ticks.length).toBeGreaterThanOrEqual(12);
    expect(ticks.length).toBeLessThanOrEqual(15);
    expect(ticks.slice(0, first.length).map(({ code }) => code)).toEqual(first);
    expect(new Set(list.steps.map(({ id }) => id)).size).toBe(list.steps.length);
    const all = new Map(ticks.map(({ id }) => [id, openedAt + HOUR]));
    expect(way(situation, { ticks: all }).done).toBe(false);
    expect(way(situation, { ticks: all, readings: [aReading(5, full)] }).done).toBe(true);
  });
});
