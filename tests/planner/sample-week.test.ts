import { describe, expect, it } from 'vitest';
import { sampleDaylight, sampleScenario, sampleSun } from '@/lib/planner/sample-scenario';
import { sampleWeek } from '@/lib/planner/sample-week';
import { planWeek } from '@/lib/planner';
import { type SampleWater, sampleWaters, startingSample } from '@/lib/schemas/sample-water';

describe('the day of the sample', () => {
  it('lies over a day of early July at 40 degrees north', () => {
    // Tables of sunrise and sunset for that latitude: 15 h less a few minutes (from memory).
    expect(sampleDaylight.length).toBeCloseTo(15, 0);
    const byHour = sampleSun(sampleDaylight.length);
    expect(byHour.indexOf(Math.max(...byHour))).toBeGreaterThanOrEqual(12);
    expect(byHour[3]).toBe(0);
  });
});

const corners: SampleWater[] = (['least', 'most'] as const).flatMap((volume) =>
  (['least', 'most'] as const).flatMap((sunshine) =>
    (['least', 'most'] as const).map((stabilizer) => ({
      volume: sampleWaters.volume[volume],
      sunshine: sampleWaters.sunshine[sunshine],
      stabilizer: sampleWaters.stabilizer[stabilizer],
    })),
  ),
);

it.each([startingSample, ...corners])(
  'plans a week that can be drawn for $volume m3, $sunshine h, $stabilizer mg/L',
  (water) => {
    const { course, doses, swims, quickChecks } = sampleWeek(water);
    // From Monday's midnight to the hour of next Sunday's test.
    for (const line of Object.values(course)) expect(line).toHaveLength(164);
    course.middle.forEach((middle, hour) => {
      expect(course.low[hour]).toBeLessThanOrEqual(middle);
      expect(middle).toBeLessThanOrEqual(course.high[hour]!);
    });
    expect(Math.max(...course.high)).toBeLessThanOrEqual(10);
    expect(Math.min(...course.lowest)).toBeGreaterThanOrEqual(1);
    for (const { hour } of doses) expect(hour % 24).toBeGreaterThanOrEqual(swims.to);
    for (const hour of [...doses.map((dose) => dose.hour), ...quickChecks]) {
      expect(hour).toBeGreaterThanOrEqual(0);
      expect(hour).toBeLessThan(168);
    }
  },
);

it('draws what the planner planned and nothing else', () => {
  const plan = planWeek(sampleScenario(startingSample));
  const week = sampleWeek(startingSample);
  expect(week.doses.map(({ amount, unit }) => [amount, unit])).toEqual(
    plan.doses.map(({ amount, unit }) => [amount, unit]),
  );
  const last = plan.projection!.freeChlorine.p50.at(-1)!;
  expect(week.course.middle.at(-1)).toBeCloseTo(last, 2);
});

it('begins with a week that is open and led by tablets', () => {
  const { standing, doses } = sampleWeek(startingSample);
  expect(standing).toEqual({ code: 'planned' });
  expect(doses[0]?.form).toBe('tablet');
});

it('asks for other water where stabilizer leaves no room, and for no tablets then', () => {
  const { standing, doses } = sampleWeek({ ...startingSample, stabilizer: 100 });
  expect(standing).toMatchObject({ code: 'replace-water', target: 45 });
  expect(doses.filter(({ form }) => form === 'tablet')).toEqual([]);
});

it('says so where few swim hours stay open', () => {
  const { standing } = sampleWeek({ volume: 20, sunshine: 14, stabilizer: 10 });
  expect(standing).toMatchObject({ code: 'few-open-hours', visits: 4 });
});

it('takes more tablets in a larger pool (common practice)', () => {
  const tabletsIn = (volume: number) =>
    sampleWeek({ ...startingSample, volume })
      .doses.filter(({ form }) => form === 'tablet')
      .reduce((sum, { amount }) => sum + amount, 0);
  expect(tabletsIn(75)).toBe(3);
  expect(tabletsIn(40)).toBeLessThan(3);
  expect(tabletsIn(120)).toBe(4);
});
