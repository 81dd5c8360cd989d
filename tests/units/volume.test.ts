import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { AppError } from '@/lib/errors';
import { fromInside, toInside } from '@/lib/units/unit';
import { likelyUnitMistake, type VolumeUnit } from '@/lib/units/unit-mistake';
import { type PoolFloor, type PoolOutline, poolSize } from '@/lib/units/volume';

const feet = (value: number) => toInside(value, 'ft');
const rows = readFileSync('tests/reference/published-values.csv', 'utf8').split('\n');

/** Expected value and tolerance of a row: they follow the quoted description and inputs. */
function published(id: string): { expected: number; tolerance: number } {
  const row = rows.find((line) => line.startsWith(`${id},`));
  const found = /,([\d.]+),(?:gal|L),([\d.]+),/.exec(row ?? '');
  if (!found) throw new Error(`No row ${id}.`);
  return { expected: Number(found[1]), tolerance: Number(found[2]) };
}

describe('pool volume', () => {
  // tests/reference/published-values.csv, geometry rows (US gal = ft3 x 7.48).
  it.each<[string, PoolOutline, PoolFloor, 'us-gal' | 'L']>([
    [
      'VOL-RECT',
      { shape: 'rectangle', length: feet(32), width: feet(16) },
      { floor: 'slope', shallow: feet(3), deep: feet(8) },
      'us-gal',
    ],
    ['VOL-ROUND', { shape: 'round', diameter: feet(24) }, { floor: 'flat', depth: feet(4) }, 'us-gal'],
    ['VOL-OVAL', { shape: 'oval', length: feet(30), width: feet(15) }, { floor: 'flat', depth: feet(4.5) }, 'us-gal'],
    ['VOL-METRIC', { shape: 'rectangle', length: 10, width: 5 }, { floor: 'flat', depth: 1.5 }, 'L'],
  ])('%s', (id, outline, floor, unit) => {
    const { expected, tolerance } = published(id);
    expect(Math.abs(fromInside(poolSize(outline, floor).volume, unit) - expected)).toBeLessThanOrEqual(tolerance);
  });

  it('gives the kidney of sources.md section 12: A 16, B 14, L 32, 5 ft, 16,158 gal', () => {
    const kidney = { shape: 'freeform', length: feet(32), widthA: feet(16), widthB: feet(14) } as const;
    const { volume } = poolSize(kidney, { floor: 'flat', depth: feet(5) });
    expect(Math.abs(fromInside(volume, 'us-gal') - 16158)).toBeLessThanOrEqual(1);
  });

  it('gives a drop-off a mean depth nearer to the shelf than an even slope has', () => {
    const outline = { shape: 'rectangle', length: 10, width: 5 } as const;
    // Shelf 5 m at 1, ramp 2.5 m from 1 to 3, deep 2.5 m at 3: 5 + 5 + 7.5 = 17.5 m2 in section.
    const size = poolSize(outline, { floor: 'drop-off', shallow: 1, deep: 3 });
    expect(size.meanDepth).toBeCloseTo(1.75, 12);
    expect(size.volume).toBeCloseTo(87.5, 12);
    expect(size.area).toBe(50);
    expect(poolSize(outline, { floor: 'slope', shallow: 1, deep: 3 }).meanDepth).toBe(2);
  });

  it('keeps to the laws of size', () => {
    const measure = fc.double({ min: 0.3, max: 30, noNaN: true });
    fc.assert(
      fc.property(measure, measure, measure, measure, measure, (length, width, other, one, two) => {
        const [shallow, deep] = one < two ? [one, two] : [two, one];
        for (const floor of ['slope', 'drop-off'] as const) {
          const { volume, meanDepth, area } = poolSize(
            { shape: 'freeform', length, widthA: width, widthB: other },
            { floor, shallow, deep },
          );
          expect(volume).toBeCloseTo(area * meanDepth, 9);
          expect(meanDepth).toBeGreaterThanOrEqual(shallow * (1 - 1e-12));
          expect(meanDepth).toBeLessThanOrEqual(deep * (1 + 1e-12));
          // Twice as long, twice the water.
          const twice = poolSize(
            { shape: 'freeform', length: 2 * length, widthA: width, widthB: other },
            { floor, shallow, deep },
          );
          expect(twice.volume / volume).toBeCloseTo(2, 9);
        }
        const oval = poolSize({ shape: 'oval', length, width }, { floor: 'flat', depth: deep });
        const rectangle = poolSize({ shape: 'rectangle', length, width }, { floor: 'flat', depth: deep });
        expect(oval.volume / rectangle.volume).toBeCloseTo(Math.PI / 4, 12);
      }),
    );
  });

  it('names every measure that cannot be', () => {
    const attempt = () =>
      poolSize({ shape: 'rectangle', length: 0, width: Number.NaN }, { floor: 'slope', shallow: 2, deep: 1 });
    expect(attempt).toThrow(AppError);
    try {
      attempt();
    } catch (error) {
      expect((error as AppError).problems.map(({ path }) => path)).toEqual(['length', 'width', 'deep']);
    }
  });
});

describe('a volume meant in another unit', () => {
  it.each<[number, VolumeUnit, number | undefined, { possible: boolean; likelier?: VolumeUnit } | undefined]>([
    // 18,000 US gallons are an everyday pool; the same number entered as m3 or litres is asked about.
    [18000, 'us-gal', undefined, undefined],
    [18000, 'm3', undefined, { possible: false, likelier: 'us-gal' }],
    [18000, 'L', undefined, { possible: true, likelier: 'us-gal' }],
    [68, 'm3', undefined, undefined],
    [68, 'us-gal', undefined, { possible: false, likelier: 'm3' }],
    [68, 'L', undefined, { possible: false, likelier: 'm3' }],
    [68000, 'L', undefined, undefined],
    // 68,000 m3 cannot be; 68,000 litres is the everyday reading of it.
    [68000, 'm3', undefined, { possible: false, likelier: 'L' }],
    // Rare sizes without a likelier reading are left alone.
    [20, 'm3', undefined, undefined],
    [200, 'm3', undefined, undefined],
    [5000, 'us-gal', undefined, undefined],
    // No reading helps: still a question, without an offer.
    [1_000_000, 'm3', undefined, { possible: false }],
    [0.5, 'm3', undefined, { possible: false }],
    // Ends of the ranges belong to them.
    [30, 'm3', undefined, undefined],
    [120, 'm3', undefined, undefined],
    [400, 'm3', undefined, undefined],
    [2, 'm3', undefined, undefined],
    // With shape and depths known, those decide.
    [18000, 'L', 18, undefined],
    [18000, 'L', 68, { possible: true, likelier: 'us-gal' }],
    [68000, 'us-gal', 68, { possible: true, likelier: 'L' }],
    [40, 'm3', 90, { possible: true }],
    [46, 'm3', 90, undefined],
    [18000, 'us-gal', 68, undefined],
  ])('%d %s, expected %s', (value, unit, expected, answer) => {
    const question = likelyUnitMistake(value, unit, expected);
    expect(
      question && { possible: question.possible, ...(question.likelier && { likelier: question.likelier.unit }) },
    ).toEqual(answer);
  });

  it('offers only what it would itself accept', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 1e7, noNaN: true }),
        fc.constantFrom<VolumeUnit>('m3', 'L', 'us-gal'),
        fc.option(fc.double({ min: 5, max: 300, noNaN: true }), { nil: undefined }),
        (value, unit, expected) => {
          const likelier = likelyUnitMistake(value, unit, expected)?.likelier;
          if (!likelier) return;
          expect(likelier.volume).toBeCloseTo(toInside(value, likelier.unit), 9);
          expect(likelyUnitMistake(value, likelier.unit, expected)?.possible ?? true).toBe(true);
        },
      ),
    );
  });

  it.each([0, -5, Number.NaN, Infinity])('refuses %d', (value) => {
    expect(() => likelyUnitMistake(value, 'm3')).toThrow('is not a volume');
  });
});
