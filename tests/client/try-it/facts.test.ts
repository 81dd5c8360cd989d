import { describe, expect, it } from 'vitest';
import { factsOf, type SeenWeek } from '@/lib/client/try-it/facts';

const HOUR = 3_600_000;
const hours = 24;
const at = Array.from({ length: hours }, (_, hour) => hour * HOUR);
const flat = (value: number) => Array<number>(hours).fill(value);
/** Somebody may swim from hour 10 to 20. */
const pool = { swimLimit: 4, swims: at.map((_, hour) => hour >= 10 && hour < 20) };

function aWeek(overrides: Partial<SeenWeek> = {}): SeenWeek {
  return { at, middle: flat(3), lowestLevel: flat(2), pH: flat(7.5), ...overrides };
}
/** Falls under a level from an hour on. */
const from = (hour: number, after: number, before = 3) => at.map((_, each) => (each >= hour ? after : before));

describe('what is said of a tried week', () => {
  it('names the first hour at which it falls under the lowest level, and the swim hours that this closes', () => {
    expect(factsOf(aWeek(), aWeek({ middle: from(17, 1.9) }), pool)).toEqual([
      { code: 'meets', limit: 'lowest-level', at: 17 * HOUR, level: 1.9 },
      { code: 'hours-closed', hours: 3 },
    ]);
  });

  it('passes the swim limit only in swim hours', () => {
    expect(factsOf(aWeek(), aWeek({ middle: from(20, 4.5) }), pool)).toEqual([
      { code: 'moves', at: 20 * HOUR, by: 1.5 },
    ]);
    expect(factsOf(aWeek(), aWeek({ middle: from(19, 4.5) }), pool)[0]).toEqual({
      code: 'meets',
      limit: 'swim-limit',
      at: 19 * HOUR,
      level: 4.5,
    });
  });

  it('tells earlier and later from the same part of the day', () => {
    const plan = aWeek({ middle: from(12, 1.9) });
    const meeting = (hour: number) => factsOf(plan, aWeek({ middle: from(hour, 1.9) }), pool)[0];
    expect(meeting(8)).toMatchObject({ code: 'meets-earlier', at: 8 * HOUR, planAt: 12 * HOUR });
    expect(meeting(16)).toMatchObject({ code: 'meets-later', at: 16 * HOUR, planAt: 12 * HOUR });
    expect(factsOf(plan, plan, pool)).toEqual([
      { code: 'hardly-moves' },
      { code: 'still-meets', limit: 'lowest-level', at: 12 * HOUR, level: 1.9 },
    ]);
  });

  it('says that a limit is kept which the plan meets', () => {
    expect(factsOf(aWeek({ middle: from(18, 1.9) }), aWeek(), pool)).toEqual([
      { code: 'no-longer-meets', limit: 'lowest-level', planAt: 18 * HOUR },
      { code: 'hours-opened', hours: 2 },
    ]);
  });

  it('holds the low edge against what public rules ask, once it is known', () => {
    const edge = (low: number) => ({ low: from(15, low), codeMinimum: flat(1) });
    expect(factsOf(aWeek({ edge: edge(2) }), aWeek({ edge: edge(0.9) }), pool)).toEqual([
      { code: 'meets', limit: 'code-minimum', at: 15 * HOUR, level: 3 },
    ]);
    expect(factsOf(aWeek(), aWeek({ edge: edge(1.0) }), pool)).toEqual([{ code: 'hardly-moves' }]);
  });

  it('holds pH against its range', () => {
    expect(factsOf(aWeek(), aWeek({ pH: from(22, 7.9, 7.5) }), pool)).toEqual([
      { code: 'meets', limit: 'pH-high', at: 22 * HOUR, level: 7.9 },
    ]);
    expect(factsOf(aWeek(), aWeek({ pH: from(22, 7.1, 7.5) }), pool)[0]).toMatchObject({ limit: 'pH-low' });
    expect(factsOf(aWeek(), aWeek({ pH: from(22, 7.8, 7.5) }), pool)).toEqual([{ code: 'hardly-moves' }]);
  });

  it('tells how far free chlorine moves where no limit is concerned', () => {
    const lower = at.map((_, hour) => (hour === 14 ? 2.6 : 3));
    expect(factsOf(aWeek(), aWeek({ middle: lower }), pool)).toEqual([
      { code: 'moves', at: 14 * HOUR, by: expect.closeTo(-0.4, 9) },
    ]);
    const hardly = at.map((_, hour) => (hour === 14 ? 2.91 : 3));
    expect(factsOf(aWeek(), aWeek({ middle: hardly }), pool)).toEqual([{ code: 'hardly-moves' }]);
  });
});
