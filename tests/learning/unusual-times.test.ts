import { describe, expect, it } from 'vitest';
import { learnFrom } from '@/lib/learning';
import { learnableParameters } from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { simulatedPool } from './simulated-pools';

/** The seventh reading finds hardly any chlorine: something in the water has used it up. */
const GREEN = 6;
const pool = simulatedPool(4321, 9);
const readings = pool.history.readings.map((reading, index): Reading =>
  index === GREEN ? { ...reading, freeChlorine: 0.2 } : reading,
);
const at = Date.parse(readings[GREEN]!.takenAt);
const learnt = (unusual?: { from: number; until: number }[]) =>
  learnFrom(null, { ...pool.history, readings, ...(unusual ? { unusual } : {}) });

describe('a reading while something else uses up chlorine', () => {
  it('tells how the water is and teaches nothing of the pool', () => {
    const before = learnt()[GREEN - 1]!;
    const after = learnt([{ from: at, until: at }])[GREEN]!;
    const taught = learnt()[GREEN]!;
    // Days pass, so what is known fades a little; the reading adds nothing to it.
    for (const name of learnableParameters) {
      expect(Math.abs(Math.log(after.posterior.medians[name] / before.posterior.medians[name]))).toBeLessThan(0.02);
      expect(after.posterior.sigmas[name]).toBeGreaterThanOrEqual(before.posterior.sigmas[name] - 1e-9);
      expect(after.state.readingsThatCounted[name]).toBe(before.state.readingsThatCounted[name]);
    }
    const loss = (step: typeof after) =>
      Math.log(step.posterior.medians.darkDemand / before.posterior.medians.darkDemand);
    expect(Math.abs(loss(taught))).toBeGreaterThan(Math.abs(loss(after)));
    expect(after.posterior.water.freeChlorine).toBeLessThan(0.3);
  });

  it('asks no second reading before it is believed, and the next ones teach again', () => {
    const steps = learnt([{ from: at - 1, until: at + 1 }]);
    expect(steps[GREEN]!.log.some((note) => note.kind === 'questioned')).toBe(false);
    const last = steps.at(-1)!;
    expect(learnableParameters.some((name) => last.posterior.sigmas[name] < steps[GREEN]!.posterior.sigmas[name])).toBe(
      true,
    );
  });
});
