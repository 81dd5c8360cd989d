import { describe, expect, it } from 'vitest';
import { learnFrom, learnPool } from '@/lib/learning';
import { filterStateSchema, posteriorStepSchema, type PosteriorStep } from '@/lib/schemas/posterior';
import { HOUR, simulatedPool } from './simulated-pools';

const { history } = simulatedPool(77, 9);
const all = learnFrom(null, history);
const throughStorage = (step: PosteriorStep) => filterStateSchema.parse(JSON.parse(JSON.stringify(step.state)));

describe('learning step by step', () => {
  it('makes one step for every reading, in the order in which they were taken', () => {
    expect(all.map(({ readingAt }) => readingAt)).toEqual(history.readings.map(({ takenAt }) => takenAt));
    expect(learnFrom(null, { ...history, readings: history.readings.toReversed() })).toEqual(all);
    expect(learnPool(history)).toEqual(all.at(-1)!.posterior);
  });

  it('says the same of the same history', () => {
    expect(learnFrom(null, structuredClone(history))).toEqual(all);
  });

  it('stores plain data that its schema accepts unchanged', () => {
    for (const step of all) expect(posteriorStepSchema.parse(JSON.parse(JSON.stringify(step)))).toEqual(step);
  });

  it.each([0, 3, 7])('goes on from the state stored with reading %d as if it had never stopped', (index) => {
    const stored = throughStorage(all[index]!);
    expect(learnFrom(stored, history)).toEqual(all.slice(index + 1));
    expect(stored).toEqual(all[index]!.state);
  });

  it('takes a late reading from the state before its time, to the same end as from the beginning', () => {
    const late = history.readings[4]!;
    const early = learnFrom(null, { ...history, readings: history.readings.filter((reading) => reading !== late) });
    expect(early.at(-1)!.posterior).not.toEqual(all.at(-1)!.posterior);
    expect(learnFrom(throughStorage(early[3]!), history)).toEqual(all.slice(4));
  });

  it('takes an edited and a deleted reading from the state before its time', () => {
    const edited = history.readings.map((reading, index) => (index === 5 ? { ...reading, pH: 7.9 } : reading));
    for (const readings of [edited, history.readings.toSpliced(5, 1)])
      expect(learnFrom(throughStorage(all[4]!), { ...history, readings })).toEqual(
        learnFrom(null, { ...history, readings }).slice(5),
      );
  });
});

describe('what households send', () => {
  it('counts an exact duplicate once and says so', () => {
    const twice = learnFrom(null, { ...history, readings: [...history.readings, history.readings[3]!] });
    expect(twice).toHaveLength(all.length);
    expect(twice[3]!.log[0]).toEqual({ kind: 'left-out', reason: 'duplicate' });
    expect(twice.at(-1)!.posterior).toEqual(all.at(-1)!.posterior);
  });

  it('leaves out what no water can be and says so', () => {
    const readings = history.readings.with(2, { ...history.readings[2]!, pH: 77 });
    const steps = learnFrom(null, { ...history, readings });
    expect(steps[2]!.log[0]).toEqual({ kind: 'left-out', reason: 'out-of-range' });
    expect(steps[2]!.log.some((note) => 'quantity' in note && note.quantity === 'pH')).toBe(false);
  });

  it('keeps what the pool taught over a winter and takes the water anew', () => {
    const last = all.at(-1)!;
    const spring = new Date(last.state.at + 200 * 24 * HOUR).toISOString();
    const [step] = learnFrom(last.state, {
      ...history,
      readings: [{ takenAt: spring, method: 'drop-kit', freeChlorine: 0.5, pH: 7.9 }],
    });
    expect(step!.log).toContainEqual({ kind: 'fresh-start', reason: 'long-gap' });
    expect(step!.posterior.water.freeChlorine).toBe(0.5);
    for (const name of ['darkDemand', 'volume'] as const) {
      expect(step!.posterior.sigmas[name]).toBeGreaterThan(last.posterior.sigmas[name]);
      expect(step!.posterior.sigmas[name]).toBeLessThan(learnFrom(null, history)[0]!.posterior.sigmas[name]);
    }
  });

  it('expects less surely what lies further ahead', () => {
    const last = all.at(-1)!;
    const ahead = (days: number) => {
      const takenAt = new Date(last.state.at + days * 24 * HOUR).toISOString();
      const [step] = learnFrom(last.state, {
        ...history,
        readings: [{ takenAt, method: 'drop-kit', temperature: 25 }],
      });
      return step!.state.covariance;
    };
    const [soon, later] = [ahead(1), ahead(20)];
    soon.forEach((row, place) => {
      // Chlorine forgets where it started from; everything else becomes less sure.
      if (place !== 1 && place !== 7) expect(later[place]![place]!).toBeGreaterThan(row[place]!);
    });
  });

  it('reads a strip between two steps as its middle, as unsure as the steps are far apart', () => {
    const spread = (width: number) => {
      const [step] = learnFrom(null, {
        ...history,
        readings: [
          {
            takenAt: '2026-05-03T18:00:00-04:00',
            method: 'strip',
            freeChlorine: { low: 3 - width / 2, high: 3 + width / 2 },
          },
        ],
      });
      return { middle: step!.state.mean[1]!, sigma: Math.sqrt(step!.state.covariance[1]![1]!) };
    };
    expect(spread(3.5)).toEqual({ middle: 3, sigma: 1 });
    expect(spread(0).sigma).toBeGreaterThan(0);
  });
});
