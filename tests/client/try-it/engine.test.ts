import { describe, expect, it } from 'vitest';
import { TryItEngine } from '@/lib/client/try-it/engine';
import { planWeek, projectScenario } from '@/lib/planner';
import { tried } from '@/lib/planner/wishes-of';
import { type TryOutStart, tryOutChangesSchema } from '@/lib/schemas/try-out';
import { scenarioOf } from '../../planner/scenarios';

const scenario = scenarioOf({ now: '2026-07-06T12:00:00-04:00' });
const plan = planWeek(scenario);
const doses = plan.doses.map((dose, index) => ({ ...dose, id: `00000000-0000-4000-8000-00000000000${index}` }));
const days = ['06', '07', '08', '09', '10', '11'].map((day) => `2026-07-${day}`);
const start: TryOutStart = {
  planId: '7b0f5c9e-5f0a-4f4e-9a67-0d5c1b1f3a10',
  scenario,
  doses,
  evenings: days.map((day) => ({ day, at: `${day}T20:15:00-04:00` })),
  mostTablets: 3,
};
const engine = new TryItEngine(start);
const changes = (given: Record<string, unknown>) => tryOutChangesSchema.parse(given);
const party = changes({ swimmers: [{ day: '2026-07-09', swimmerHours: 60 }] });
const never = () => Promise.resolve(false);

const furthest = (one: readonly number[], other: readonly number[]) =>
  Math.max(...one.map((value, index) => Math.abs(value - other[index]!)));

describe('the engine behind Try it', () => {
  it("draws the plan's own week as the plan promised it", () => {
    const { plan: line } = engine.course(1, party);
    expect(furthest(line.levels, plan.projection!.freeChlorine.p50)).toBeLessThan(1e-9);
    expect(line.at).toEqual(plan.hours.map((hour) => Date.parse(hour)));
  });

  it('says of what changes nothing that hardly anything changes', () => {
    const { facts, tried: line, plan: own } = engine.course(2, changes({}));
    expect(facts[0]).toEqual({ code: 'hardly-moves' });
    expect(furthest(line.levels, own.levels)).toBeLessThan(1e-9);
  });

  it('answers with the likely range of the projection of the same week', async () => {
    const answer = await engine.likely(3, party, never);
    const projected = projectScenario(tried(scenario, party, start)).projection!;
    expect(answer?.likely).toBe(true);
    expect(furthest(answer!.tried.levels, projected.freeChlorine.p50)).toBeLessThan(1e-9);
  });

  it('answers at once within 0.2 mg/L of that', async () => {
    const likely = await engine.likely(4, party, never);
    expect(furthest(engine.course(4, party).tried.levels, likely!.tried.levels)).toBeLessThan(0.2);
  });

  it('leaves the hours before the party as they are, and lowers those after it', () => {
    const { tried: line, plan: own } = engine.course(5, party);
    const morning = Date.parse('2026-07-09T09:00:00-04:00');
    const evening = Date.parse('2026-07-09T20:00:00-04:00');
    const moved = line.at.map((at, hour) => ({ at, by: line.levels[hour]! - own.levels[hour]! }));
    expect(Math.max(...moved.filter(({ at }) => at <= morning).map(({ by }) => Math.abs(by)))).toBeLessThan(1e-9);
    expect(moved.find(({ at }) => at === evening)!.by).toBeLessThan(-0.3);
  });

  it('gives an answer up when a newer question has come', async () => {
    expect(await engine.likely(6, party, () => Promise.resolve(true))).toBeUndefined();
  });

  it('plans more chlorine for a party', () => {
    const advice = engine.advice(party);
    if (advice.code !== 'planned') throw new Error('The plan was refused.');
    const more = advice.changed.reduce(
      (sum, { before, after, unit }) => sum + (unit === 'tablet' ? 0 : (after ?? 0) - (before ?? 0)),
      0,
    );
    expect(more).toBeGreaterThan(0);
  });

  it('moves a dose where it was put, and the jump with it', () => {
    const dose = doses.find(({ unit }) => unit === 'g')!;
    const free = start.evenings.find(({ day }) => doses.every(({ at }) => at.slice(0, 10) !== day))!;
    const moved = engine.course(7, changes({ moves: [{ doseId: dose.id, toDay: free.day }] }));
    expect(moved.plan.jumps).toContain(Date.parse(dose.at));
    expect(moved.tried.jumps).not.toContain(Date.parse(dose.at));
    expect(moved.tried.jumps).toContain(Date.parse(free.at));
  });

  it('takes no plan that the safety net refuses', () => {
    expect(engine.advice(changes({ tablets: 30 }))).toEqual({ code: 'refused' });
  });
});
