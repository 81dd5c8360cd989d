import { describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { scenarioOf } from './scenarios';

const stabilizers = [30, 50, 60, 80];
const limits = [4, 5, 10];
const visits = [2, 3, 5];

const rows = stabilizers.flatMap((stabilizer) =>
  limits.map((swimLimit) => ({
    stabilizer,
    swimLimit,
    plans: visits.map((each) =>
      planWeek(
        scenarioOf({ pool: { swimLimit }, reading: { cyanuricAcid: stabilizer }, preferences: { visits: each } }),
      ),
    ),
  })),
);

console.info(
  [
    `open swim hours [%] | limit | ${visits.map((each) => `${each} visits`).join(' | ')}`,
    ...rows.map(({ stabilizer, swimLimit, plans }) =>
      [
        `stabilizer ${stabilizer}`.padEnd(19),
        String(swimLimit).padStart(5),
        ...plans.map(({ openSwimShare }) => (100 * openSwimShare!).toFixed(0).padStart(8)),
      ].join(' | '),
    ),
  ].join('\n'),
);

const figures = rows.flatMap(({ stabilizer, swimLimit, plans }) =>
  plans.map((plan, index) => ({ stabilizer, swimLimit, visits: visits[index]!, plan })),
);
const totalAt = (stabilizer: number, swimLimit: number, evenings: number) =>
  figures.find((each) => each.stabilizer === stabilizer && each.swimLimit === swimLimit && each.visits === evenings)!
    .plan.cost!.total;

describe('where chlorine cannot always be both high and low enough', () => {
  it.each(rows)('more evenings never cost more: stabilizer $stabilizer, limit $swimLimit', (row) => {
    const totals = visits.map((each) => totalAt(row.stabilizer, row.swimLimit, each));
    totals.slice(1).forEach((total, index) => expect(total).toBeLessThanOrEqual(1.02 * totals[index]!));
  });

  it.each(stabilizers)('a higher limit never costs more: stabilizer %i', (stabilizer) => {
    for (const each of visits) {
      const totals = limits.map((swimLimit) => totalAt(stabilizer, swimLimit, each));
      totals.slice(1).forEach((total, index) => expect(total).toBeLessThanOrEqual(1.02 * totals[index]!));
    }
  });

  const shareAt = (stabilizer: number, swimLimit: number, evenings: number) =>
    figures.find((each) => each.stabilizer === stabilizer && each.swimLimit === swimLimit && each.visits === evenings)!
      .plan.openSwimShare!;

  // Money and effort weigh too: a plan may give an hour of 71 away for them.
  const AN_HOUR = 1 / 70;
  const neverFewer = (shares: readonly number[]) =>
    shares.slice(1).forEach((share, index) => expect(share).toBeGreaterThanOrEqual(shares[index]! - AN_HOUR));

  it('more evenings, a higher limit and less stabilizer open more of the swim hours, never fewer', () => {
    for (const stabilizer of stabilizers) {
      for (const swimLimit of limits) neverFewer(visits.map((each) => shareAt(stabilizer, swimLimit, each)));
      for (const each of visits) neverFewer(limits.map((swimLimit) => shareAt(stabilizer, swimLimit, each)));
    }
    for (const swimLimit of limits)
      for (const each of visits)
        neverFewer(stabilizers.toReversed().map((stabilizer) => shareAt(stabilizer, swimLimit, each)));
    expect(shareAt(30, 4, 3)).toBeGreaterThan(shareAt(60, 4, 3));
    expect(shareAt(60, 4, 2)).toBeGreaterThan(shareAt(80, 4, 2));
  });

  it('under 90 % the first sentence says so, or that water has to be replaced', () => {
    const few = figures.filter(({ plan }) => plan.openSwimShare! < 0.9);
    expect(few.length).toBeGreaterThan(0);
    for (const { plan } of few) expect(['few-open-hours', 'replace-water-first']).toContain(plan.reasons[0]!.code);
  });

  it('the limit is never raised', () => {
    for (const { plan, swimLimit } of figures)
      expect(new Set(plan.projection!.freeChlorine.swimLimit)).toEqual(new Set([swimLimit]));
  });
});
