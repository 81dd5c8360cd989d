import { describe, expect, it } from 'vitest';
import { learnFrom, type TabletsLeft } from '@/lib/learning';
import { massLeft } from '@/lib/projection/tablets';
import { simulatedPool } from './simulated-pools';

/** Three tablets of 227 g, the pump running 8 h a day: half a week later 27 of their 48 running hours are behind them. */
const base = simulatedPool(5, 2).history;
const [first, second] = base.readings;
const firstAt = Date.parse(first!.takenAt);
const history = {
  ...base,
  doses: [{ at: firstAt, kind: 'tablets' as const, load: { count: 3, tabletMass: 227, strength: 90, erodedShare: 0 } }],
};
const found = (tablets: number): TabletsLeft => ({ at: '2026-05-07T09:00:00-04:00', tablets });
const learnt = (tabletsLeft: TabletsLeft[]) =>
  learnFrom(null, { ...history, tabletsLeft, readings: [first!, second!] })[1]!;

describe('tablets found in the feeder', () => {
  const unseen = learnt([]);
  // Three evenings and mornings of pump: 3 days of 8 h and one hour of the fourth.
  const expected = 3 * massLeft(25 / 48);

  it.each([
    ['more than expected', 2.2, 1],
    ['fewer than expected', 0.1, -1],
  ])('%s move the life the right way and narrow it', (_, tablets, side) => {
    const { posterior, log } = learnt([found(tablets)]);
    expect(Math.sign(posterior.medians.tabletLife - unseen.posterior.medians.tabletLife)).toBe(side);
    expect(posterior.sigmas.tabletLife).toBeLessThan(0.85 * unseen.posterior.sigmas.tabletLife);
    expect(log[0]).toMatchObject({ kind: 'counted', quantity: 'tabletsLeft', measured: tablets, weight: 1 });
  });

  it('are expected as the erosion of their running hours says', () => {
    const note = learnt([found(1)]).log[0]!;
    if (!('expected' in note)) throw new Error('no expectation in the log');
    expect(Math.abs(note.expected.p50 - expected)).toBeLessThan(0.15);
  });

  it('count with the reading after them and with no other', () => {
    const late = { at: '2026-06-20T09:00:00-04:00', tablets: 1 };
    const early = { at: '2026-04-01T09:00:00-04:00', tablets: 1 };
    expect(learnt([late, early])).toEqual(unseen);
    expect(learnt([found(1), late, early])).toEqual(learnt([found(1)]));
  });

  it('that cannot be are questioned', () => {
    expect(learnt([found(9)]).log[0]).toMatchObject({ kind: 'questioned', weight: 0 });
    expect(learnt([found(9)]).posterior.medians.tabletLife).toBeCloseTo(unseen.posterior.medians.tabletLife, 9);
    expect(learnt([{ at: 'yesterday', tablets: 1 }, found(Number.NaN)])).toEqual(unseen);
  });
});
