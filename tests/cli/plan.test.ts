import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { weekPlanSchema } from '@/lib/schemas/plan';
import { designScenario } from './plan-scenario';

const root = join(import.meta.dirname, '..', '..');
const loader = pathToFileURL(join(root, 'node_modules', 'tsx', 'dist', 'loader.mjs')).href;
let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'wadewell-plan-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** As the bootstrap runs it: from another folder, with TypeScript loaded on the way. */
function plan(args: string[], input = '') {
  const { stdout, stderr, status } = spawnSync(
    process.execPath,
    ['--import', loader, join(root, 'lib', 'cli', 'plan.ts'), ...args],
    { cwd: folder, input, encoding: 'utf8', env: { ...process.env, TSX_TSCONFIG_PATH: join(root, 'tsconfig.json') } },
  );
  return { stdout, lines: stderr.split('\n').filter((line) => line !== ''), status };
}

const withChange = (change: (scenario: typeof designScenario) => unknown) =>
  JSON.stringify(change(structuredClone(designScenario)));

describe('the plan command', { timeout: 60_000 }, () => {
  it('prints the plan of a file as JSON and nothing else', () => {
    writeFileSync(join(folder, 'scenario.json'), JSON.stringify(designScenario));
    const { stdout, lines, status } = plan(['scenario.json']);
    expect({ lines, status }).toEqual({ lines: [], status: 0 });
    const made = weekPlanSchema.parse(JSON.parse(stdout));
    expect(made.hours).toHaveLength(169);
    expect(made.hours[0]).toBe('2026-07-05T23:00:00.000Z');
    expect(made.projection?.freeChlorine.p50).toHaveLength(169);
    expect(made.doses.length).toBeGreaterThan(0);
  });

  it('projects the given doses and plans none', () => {
    const dose = { at: '2026-07-06T19:30:00-04:00', product: 'gran', amount: 200, unit: 'g' };
    const { stdout, status } = plan(['--project', '-'], JSON.stringify({ ...designScenario, doses: [dose] }));
    expect(status).toBe(0);
    const projected = weekPlanSchema.parse(JSON.parse(stdout));
    expect(projected.doses).toEqual([]);
    const { freeChlorine } = projected.projection?.median ?? { freeChlorine: [] };
    // 200 g of 65 % in 75.7 m3 is 1.72 mg/L, less half an hour's use: the hour before it has none of it.
    expect((freeChlorine[25] ?? 0) - (freeChlorine[24] ?? 0)).toBeCloseTo(1.7, 1);
  });

  it('names every problem with its JSON path, one a line, and exits with 2', () => {
    const bad = withChange((scenario) => ({
      ...scenario,
      pool: { ...scenario.pool, volume: 0, volum: 75 },
      reading: { ...scenario.reading, takenAt: 'yesterday' },
      shelf: [{ ...scenario.shelf[0], strength: 120 }],
    }));
    const { stdout, lines, status } = plan(['-'], bad);
    expect({ stdout, status }).toEqual({ stdout: '', status: 2 });
    expect(lines.map((line) => line.slice(0, line.indexOf(': ')))).toEqual([
      '$.pool.volume',
      '$.pool.volum',
      '$.reading.takenAt',
      '$.shelf[0].strength',
    ]);
  });

  it('refuses in one line what only the planner sees, and says how it is used', () => {
    const unknown = { at: designScenario.reading.takenAt, product: 'gone', amount: 1, unit: 'g' };
    const refused = plan(['-'], JSON.stringify({ ...designScenario, given: [unknown] }));
    expect(refused).toEqual({ stdout: '', status: 2, lines: [expect.stringMatching(/^\$\.given\[0\]\.product: /)] });
    const { lines, ...rest } = plan([]);
    expect(rest).toEqual({ stdout: '', status: 2 });
    expect(lines[0]).toContain('npm run -s plan');
  });

  it('prints the schema of what it takes', () => {
    const { stdout, status } = plan(['--schema']);
    const schema = JSON.parse(stdout) as { required: string[]; properties: Record<string, unknown> };
    expect(status).toBe(0);
    expect(schema.required).toEqual(['pool', 'reading']);
    expect(Object.keys(schema.properties)).toContain('preferences');
  });

  it('explains itself in plain text', () => {
    const { stdout, status } = plan(['--explain', '-'], JSON.stringify(designScenario));
    expect(status).toBe(0);
    expect(stdout).toContain('Plan from the reading of Sunday 5 July, 19:00 (America/New_York)');
    expect(stdout).toMatch(/\n {2}\w+ \d+ July, \d\d:\d\d: .+ of (trichlor|calcium hypochlorite|sodium hypochlorite)/);
    expect(stdout).not.toMatch(/NaN|undefined|\[object/);
  });
});
