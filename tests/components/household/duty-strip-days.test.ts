import { describe, expect, it } from 'vitest';
import { dutyStripDays } from '@/components/household/duty-strip-days';
import type { HandOver } from '@/lib/schemas/hand-over';

const handOver = (fromDay: string, untilDay: string): HandOver => ({
  ...{ id: crypto.randomUUID(), memberId: crypto.randomUUID(), name: 'Bram', role: 'viewer', you: false },
  ...{ fromDay, untilDay, chemicalsAllowed: false, cardRead: false, agreedAt: null, inForce: false },
});
const partsOf = (today: string, handOvers: HandOver[]) =>
  dutyStripDays(today, handOvers).segments.map(({ kind, day, days }) => [kind, day, days]);

describe('the days of the strip', () => {
  it('are four weeks from today where nobody stands in', () => {
    expect(dutyStripDays('2026-07-08', [])).toMatchObject({ first: '2026-07-08', last: '2026-08-04', days: 28 });
    expect(partsOf('2026-07-08', [])).toEqual([['usual', '2026-07-08', 28]]);
  });

  it('hold a hand-over whole, what is before it and a week after it', () => {
    expect(partsOf('2026-07-20', [handOver('2026-08-03', '2026-08-16')])).toEqual([
      ['usual', '2026-07-20', 14],
      ['standIn', '2026-08-03', 14],
      ['again', '2026-08-17', 7],
    ]);
  });

  it('begin today in the middle of one', () => {
    expect(partsOf('2026-08-10', [handOver('2026-08-03', '2026-08-16')])).toEqual([
      ['standIn', '2026-08-10', 7],
      ['again', '2026-08-17', 21],
    ]);
  });

  it('begin a week before one that is far ahead, and are as many as the longest wants', () => {
    const days = dutyStripDays('2026-07-08', [handOver('2026-10-01', '2026-11-29')]);
    expect(days).toMatchObject({ first: '2026-09-24', days: 74 });
    expect(days.segments.reduce((sum, segment) => sum + segment.days, 0)).toBe(74);
  });

  it('hold what of a second one falls into them, also one that follows at once', () => {
    const two = [handOver('2026-07-10', '2026-07-11'), handOver('2026-07-12', '2026-09-01')];
    expect(partsOf('2026-07-08', two)).toEqual([
      ['usual', '2026-07-08', 2],
      ['standIn', '2026-07-10', 2],
      ['standIn', '2026-07-12', 24],
    ]);
  });

  it('have ticks that leave each other room, those of a hand-over first', () => {
    for (const [today, from, until] of [
      ['2026-07-08', '2026-07-12', '2026-07-13'],
      ['2026-07-20', '2026-08-03', '2026-08-16'],
      ['2026-07-08', '2026-10-01', '2026-11-29'],
    ] as const) {
      const { ticks } = dutyStripDays(today, [handOver(from, until)]);
      expect(ticks.find(({ day }) => day === from)).toMatchObject({ handOver: true });
      expect(ticks.every(({ at }, index) => index === 0 || at - (ticks[index - 1]?.at ?? 0) >= 0.24)).toBe(true);
      expect(ticks.every(({ at }) => at <= 0.76)).toBe(true);
    }
  });
});
