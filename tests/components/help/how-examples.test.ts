import { describe, expect, it } from 'vitest';
import { examples } from '@/lib/client/worked-out/examples/all-examples';
import type { Worked } from '@/lib/client/worked-out/examples/example';
import { dayApart } from '@/lib/client/worked-out/examples/free-chlorine';
import { ordinaryWater } from '@/lib/client/worked-out/examples/water';
import { howPages } from '@/lib/client/worked-out/how-page';
import { projectWeek } from '@/lib/projection';
import { poolSchema } from '@/lib/schemas/pool';

function numbersOf({ figures, comparison, curve }: Worked): number[] {
  return [
    ...figures.map(({ value }) => value),
    ...(comparison?.rows.flatMap(({ values }) => values) ?? []),
    ...(curve?.lines.flatMap(({ points }) => points.flat()) ?? []),
    ...(curve?.levels?.map(({ at }) => at) ?? []),
    ...(curve?.taken?.flatMap(({ parts }) => parts.map(({ value }) => value)) ?? []),
  ];
}

it('has an example on every page', () => {
  expect(howPages.filter((page) => examples[page] === undefined)).toEqual([]);
});

describe.each(howPages)('the example of %s', (page) => {
  const example = examples[page]!;
  const ends = example.inputs.map(({ low, high }) => [low, high] as const);
  // All sliders at their starts, all low, all high, and each alone at each end.
  const settings = [
    example.inputs.map(({ start }) => start),
    ends.map(([low]) => low),
    ends.map(([, high]) => high),
    ...example.inputs.flatMap((_, moved) =>
      ([0, 1] as const).map((end) => example.inputs.map(({ start }, at) => (at === moved ? ends[at]![end] : start))),
    ),
  ];

  it('has figures at every end of its sliders', () => {
    for (const values of settings) {
      const numbers = numbersOf(example.work(values));
      expect(numbers.length).toBeGreaterThan(1);
      expect(
        numbers.filter((value) => !Number.isFinite(value)),
        values.join(),
      ).toEqual([]);
    }
  });

  it('starts on a step inside each slider', () => {
    for (const { low, high, step, start } of example.inputs) {
      expect(start).toBeGreaterThanOrEqual(low);
      expect(start).toBeLessThanOrEqual(high);
      const steps = (start - low) / step;
      expect(steps).toBeCloseTo(Math.round(steps), 6);
    }
  });
});

const figure = (page: keyof typeof examples, name: string, values?: readonly number[]) => {
  const example = examples[page]!;
  return example.work(values ?? example.inputs.map(({ start }) => start)).figures.find((each) => each.name === name)!
    .value;
};

describe('against figures that are not ours', () => {
  it('shows the later set of stabilizer constants at about two thirds of the earlier (sources.md 1.4: 0.65)', () => {
    const { comparison } = examples['chlorine-forms']!.work([3, 7.5, 50]);
    const [earlier = NaN, later = NaN] = comparison!.rows.find(({ name }) => name === 'hypochlorousAcid')!.values;
    expect(later / earlier).toBeGreaterThan(0.6);
    expect(later / earlier).toBeLessThan(0.7);
  });

  it('leaves 0.607 of stabilizer for each mg/L from trichlor, 0.910 from dichlor (sources.md 5)', () => {
    expect(figure('stabilizer', 'stabilizerOfTrichlor')).toBeCloseTo(0.607, 3);
    expect(figure('stabilizer', 'stabilizerOfDichlor')).toBeCloseTo(0.91, 3);
  });

  it('puts both breakpoint rules side by side, half and ten times', () => {
    expect(figure('combined-chlorine', 'halfRule', [0.8])).toBeCloseTo(0.4, 9);
    expect(figure('combined-chlorine', 'tenTimesRule', [0.8])).toBeCloseTo(8, 9);
  });

  it('halves liquid of 12.5 trade % at 25 degrees C in 187 days within 12 % (sources.md 7)', () => {
    expect(figure('liquid-strength', 'halfLife', [12.5, 25, 0])).toBeGreaterThan(187 * 0.88);
    expect(figure('liquid-strength', 'halfLife', [12.5, 25, 0])).toBeLessThan(187 * 1.12);
  });

  it('holds 75 m3 in a pool of 10 x 5 x 1.5 m (sources.md 12)', () => {
    expect(figure('volume', 'rectangle', [10, 5, 1.5, 1.5])).toBeCloseTo(75, 9);
  });
});

describe('against the week', () => {
  it('takes a day apart into what the projection loses', () => {
    const { course, totals } = dayApart({ stabilizer: 44, clearSky: 0.85, swimmers: 0, temperature: 27 });
    const water = { ...ordinaryWater, cyanuricAcid: 44 };
    const pool = poolSchema.parse({ volume: 60, latitude: 38, longitude: 0, timeZone: 'UTC', pump: [] });
    const week = projectWeek(pool, { takenAt: '2026-06-21T06:00:00Z', water }, { sky: Array<number>(7).fill(0.85) });
    const end = course.at(-1)![1];
    expect(Math.abs(end - week.water[24]!.freeChlorine)).toBeLessThan(0.02);
    expect(totals.water + totals.sun + totals.swimmers).toBeCloseTo(water.freeChlorine - end, 9);
  });

  it('learns: the range after six tests is narrower, and its middle nearer to the truth', () => {
    const { comparison, figures } = examples.learning!.work([150]);
    const [before, learnt] = ['lossBefore', 'lossLearnt'].map(
      (row) => comparison!.rows.find(({ name }) => name === row)!.values,
    );
    const truth = figures.find(({ name }) => name === 'trueLoss')!.value;
    expect(learnt![2]! - learnt![0]!).toBeLessThan(before![2]! - before![0]!);
    expect(Math.abs(learnt![1]! - truth)).toBeLessThan(Math.abs(before![1]! - truth));
  });
});
