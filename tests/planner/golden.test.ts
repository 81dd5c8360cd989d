import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { ENGINE_VERSION, planWeek } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import { type Changes, scenarioOf } from './scenarios';

/** A scenario, the version that planned it, and what came out: doses, and figures to three digits. */
type Golden = { about: string; changes: Changes; engineVersion: string; plan: ReturnType<typeof outcomeOf> };

const folder = join(import.meta.dirname, 'golden');
const files = readdirSync(folder).filter((file) => file.endsWith('.json'));

function outcomeOf({ doses, checks, cost, openSwimShare, endOfWeek, projection, broken, reasons, cautions }: WeekPlan) {
  const at = (series: readonly number[]) => [0, 56, 112, 168].map((hour) => threeDigits(series[hour]!));
  const { freeChlorine, pH } = projection!;
  return {
    doses: doses.map((dose) => `${dose.at} ${dose.amount} ${dose.unit} of ${dose.product ?? dose.substance}`),
    checks: checks.map(({ at: when, kind, reason }) => `${when} ${kind} ${reason}`),
    cost: Object.fromEntries(Object.entries(cost!).map(([part, value]) => [part, threeDigits(value)])),
    openSwimShare: threeDigits(openSwimShare!),
    freeChlorine: { p10: at(freeChlorine.p10), p50: at(freeChlorine.p50), p90: at(freeChlorine.p90) },
    pH: at(pH.p50),
    endOfWeek: {
      cyanuricAcid: threeDigits(endOfWeek!.cyanuricAcid),
      calciumHardness: threeDigits(endOfWeek!.calciumHardness),
    },
    broken: broken.map(({ limit }) => limit),
    reasons: reasons.map(({ code }) => code),
    cautions: cautions.map(({ code }) => code),
  };
}

function threeDigits(value: number): number {
  return Number(value.toPrecision(3));
}

describe('golden scenarios', () => {
  it('are there', () => expect(files.length).toBeGreaterThanOrEqual(8));

  it.each(files)('%s comes out as before, or the engine has a new version', (file) => {
    const path = join(folder, file);
    const golden = JSON.parse(readFileSync(path, 'utf8')) as Golden;
    const plan = outcomeOf(planWeek(scenarioOf(golden.changes)));
    if (process.env.UPDATE_GOLDEN === '1') {
      writeFileSync(path, `${JSON.stringify({ ...golden, engineVersion: ENGINE_VERSION, plan }, null, 2)}\n`);
      return;
    }
    const again = 'UPDATE_GOLDEN=1 npx vitest run --project unit tests/planner/golden.test.ts';
    expect(
      golden.engineVersion,
      `The engine has a new version. If its plans are meant to be these, keep them with ${again}`,
    ).toBe(ENGINE_VERSION);
    expect(
      plan,
      'A plan comes out otherwise than under the same engine version. If that is meant, raise ENGINE_VERSION in ' +
        `lib/planner/version.ts: stored plans of the old version are then made anew. Keep the new figures with ${again}`,
    ).toEqual(golden.plan);
  });
});
