import { describe, expect, it } from 'vitest';
import { describeLearnt, learnFrom } from '@/lib/learning';
import { learnableParameters, type Posterior, type PosteriorStep } from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { type SimulatedPool, simulatedPool } from './simulated-pools';

const WILD = 7;
const read = (pool: SimulatedPool, index: number) => pool.history.readings[index] as Reading & { freeChlorine: number };

/** Pools whose eighth reading finds chlorine enough that four times as much, or none, is out of the question. */
const pools = Array.from({ length: 60 }, (_, seed) => simulatedPool(4000 + seed, 10))
  .filter((pool) => read(pool, WILD).freeChlorine > 1.8)
  .slice(0, 8);

const states = new Map(
  pools.map((pool) => {
    const readings = pool.history.readings.slice(0, WILD);
    return [pool, learnFrom(null, { ...pool.history, readings })];
  }),
);

/** What is learnt when readings from `WILD` on are changed; the steps before are the same in every case. */
function learnt(
  pool: SimulatedPool,
  changes: Record<number, (reading: Reading) => Reading>,
  upTo = 10,
): PosteriorStep[] {
  const before = states.get(pool)!;
  const readings = pool.history.readings.slice(0, upTo).map((reading, index) => changes[index]?.(reading) ?? reading);
  return [...before, ...learnFrom(before.at(-1)!.state, { ...pool.history, readings })];
}

/** How far the medians lie apart, in sigmas. */
function distance(a: Posterior, b: Posterior): number {
  return Math.max(
    ...learnableParameters.map((name) => Math.abs(Math.log(a.medians[name] / b.medians[name])) / b.sigmas[name]),
  );
}

const withoutChlorine = ({ freeChlorine: _, ...rest }: Reading): Reading => rest;
const noteOf = (step: PosteriorStep, quantity = 'freeChlorine') =>
  step.log.find((note) => 'quantity' in note && note.quantity === quantity);

describe('one wild reading', () => {
  it.each([
    [
      'four times what it was',
      (reading: Reading) => ({ ...reading, freeChlorine: 4 * (reading.freeChlorine as number) }),
    ],
    ['nothing at all', (reading: Reading) => ({ ...reading, freeChlorine: 0 })],
  ])('of %s is questioned, written down, and moves what was learnt little', (_, wild) => {
    expect(pools).toHaveLength(8);
    let worst = 0;
    for (const pool of pools) {
      const step = learnt(pool, { [WILD]: wild }, WILD + 1)[WILD]!;
      const without = learnt(pool, { [WILD]: withoutChlorine }, WILD + 1)[WILD]!;
      const note = noteOf(step);
      expect(note).toMatchObject({ kind: 'questioned' });
      if (note?.kind !== 'questioned') continue;
      expect(note.weight).toBeLessThan(0.8);
      worst = Math.max(worst, distance(step.posterior, without.posterior));
      expect(worst).toBeLessThan(0.1);
      expect(step.posterior.questioned).toContain('freeChlorine');
    }
  });

  it('does not spoil what comes after: the next reading counts in full', () => {
    for (const pool of pools) {
      const steps = learnt(pool, {
        [WILD]: (reading) => ({ ...reading, freeChlorine: 4 * (reading.freeChlorine as number) }),
      });
      const untouched = learnt(pool, {});
      expect(steps[WILD + 1]!.posterior.questioned).toEqual([]);
      expect(distance(steps[WILD + 1]!.posterior, untouched[WILD + 1]!.posterior)).toBeLessThan(1);
    }
  });

  it('stands on the sheet as it was read, as sure as the test is', () => {
    const pool = pools[0]!;
    const { posterior, state } = learnt(pool, { [WILD]: (reading) => ({ ...reading, freeChlorine: 14 }) })[WILD]!;
    expect(posterior.water.freeChlorine).toBe(14);
    expect(Math.sqrt(posterior.covariance[1]![1]!)).toBeCloseTo(1.4, 12);
    expect(posterior.covariance[1]!.filter((value) => value !== 0)).toHaveLength(1);
    expect(state.mean[1]!).toBeLessThan(8);
  });
});

describe('a change that is real', () => {
  it('of the stabilizer is questioned once and believed by the second reading', () => {
    for (const pool of pools) {
      const more = (reading: Reading) => ({ ...reading, cyanuricAcid: (reading.cyanuricAcid as number) + 120 });
      const steps = learnt(pool, { 7: more, 8: more, 9: more });
      expect(noteOf(steps[7]!, 'cyanuricAcid')).toMatchObject({ kind: 'questioned' });
      expect(noteOf(steps[8]!, 'cyanuricAcid')).toMatchObject({ kind: 'believed', weight: 1 });
      expect(noteOf(steps[9]!, 'cyanuricAcid')).toMatchObject({ kind: 'counted' });
      const read = steps[8]!.posterior.water.cyanuricAcid - (pool.history.readings[8]!.cyanuricAcid as number);
      expect(Math.abs(read - 120)).toBeLessThan(60);
    }
  });

  it('that only chlorine from elsewhere can have made moves the water, not what the pool uses up', () => {
    for (const pool of pools.slice(0, 4)) {
      // Three weeks with more than was ever added.
      const high = (reading: Reading) => ({ ...reading, freeChlorine: 14 });
      const steps = learnt(pool, { 7: high, 8: high, 9: high });
      expect(noteOf(steps[7]!)).toMatchObject({ kind: 'questioned' });
      expect(noteOf(steps[8]!)).toMatchObject({ kind: 'unrecorded-dose' });
      expect(Math.abs(steps[8]!.posterior.water.freeChlorine - 14)).toBeLessThan(3);
      expect(distance(steps[9]!.posterior, steps[6]!.posterior)).toBeLessThan(1);
    }
  });

  it('of what the water uses up is learnt when it uses up more: none is left where some was expected', () => {
    const lossIn = (pool: SimulatedPool, { posterior }: PosteriorStep) =>
      describeLearnt(posterior, pool.history.pool).dailyLoss.learnt.p50;
    // Under a dark cover nothing is lost, and nothing can be learnt of losing it.
    const open = pools.filter((pool) => lossIn(pool, states.get(pool)!.at(-1)!) > 0.3);
    expect(open.length).toBeGreaterThan(3);
    const grown = open.map((pool) => {
      const none = (reading: Reading) => ({ ...reading, freeChlorine: 0.1 });
      const steps = learnt(pool, { 7: none, 8: none });
      return lossIn(pool, steps[8]!) / lossIn(pool, steps[6]!);
    });
    // Here and there little was expected, and little can be learnt of finding none.
    expect(Math.min(...grown)).toBeGreaterThan(0.8);
    expect(grown.reduce((sum, each) => sum + each, 0) / grown.length).toBeGreaterThan(1.02);
  });
});
