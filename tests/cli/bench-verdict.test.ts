import { describe, expect, it } from 'vitest';
import ratios from '@/tests/bench/ratios.json';
import { chemistryPieces } from '@/tests/bench/chemistry';
import { learningPieces } from '@/tests/bench/learning';
import { costOf, median } from '@/tests/bench/stopwatch';
import { verdictsOn } from '@/tests/bench/verdict';
import { weekPieces } from '@/tests/bench/week';

const passed = (measured: Record<string, number>, committed: Record<string, number>) =>
  verdictsOn(measured, committed).map((verdict) => verdict.passed);

describe('the check of benchmarks', () => {
  it('lets a piece cost one and a half times its committed ratio, and no more', () => {
    expect(passed({ solve: 1.5, project: 1.51 }, { solve: 1, project: 1 })).toEqual([true, false]);
    expect(passed({ solve: 0.2 }, { solve: 1 })).toEqual([true]);
  });

  it('fails a piece without a committed ratio, and a ratio without its piece', () => {
    expect(passed({ solve: 1, fresh: 1 }, { solve: 1, gone: 1 })).toEqual([true, false, false]);
  });

  it('fails what is no number', () => {
    expect(passed({ solve: Number.NaN }, { solve: 1 })).toEqual([false]);
  });

  it('has a ratio for every piece, and no other', () => {
    const names = [...chemistryPieces, ...weekPieces, ...learningPieces].map(({ name }) => name);
    expect(Object.keys(ratios)).toEqual(names);
  });
});

describe('the stopwatch', () => {
  it('takes the middle of an odd and of an even number of runs', () => {
    expect(median([9, 1, 5])).toBe(5);
    expect(median([4, 1, 3, 100])).toBe(3.5);
  });

  it('tells twice the work from the work', () => {
    const work = (rounds: number) => (n: number) => {
      let sum = 0;
      for (let index = 0; index < n * rounds * 1e5; index++) sum += Math.sqrt(index);
      return sum;
    };
    const [once, twice] = [work(1), work(2)].map((run) => costOf({ name: 'roots', run }).multiple) as [number, number];
    expect(twice / once).toBeGreaterThan(1.5);
    expect(twice / once).toBeLessThan(2.7);
  });
});
