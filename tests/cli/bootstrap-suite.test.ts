import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { type Finished, finish, makeProject, type Project, waitFor } from './bootstrap-project';

// Each test starts several processes, on a machine that may be busy with the other stages.
vi.setConfig({ testTimeout: 60_000 });

let project: Project;
beforeEach(() => {
  project = makeProject();
  project.addChromium();
});
afterEach(() => project.remove());

const closing = /^\d+ passed, \d+ failed$/;

/** The last line, which is the only one of its kind. */
function closingLine({ out }: Finished): string {
  const lines = out.trimEnd().split('\n');
  expect(lines.filter((line) => closing.test(line))).toHaveLength(1);
  return lines.at(-1) ?? '';
}

describe('a test run', () => {
  it('adds up what passed: five checks, three tests, two files for browsers, two benchmarks, three runs in the browser', async () => {
    const run = await project.run(['test']);
    expect(closingLine(run)).toBe('15 passed, 0 failed');
    expect(run.code).toBe(0);
    expect(run.out).toContain('reference: a table of unit');
  });

  it('leaves build and browser out of verify', async () => {
    const run = await project.run(['verify']);
    expect(closingLine(run)).toBe('7 passed, 0 failed');
    expect(project.calls()).not.toContain('next build');
  });

  it('goes on after a build that fails, a test program that crashes and a browser that is missing', async () => {
    project.write('break-the-build', '');
    project.write('vitest-results.json', JSON.stringify({ unit: { exit: 134 }, component: { statuses: ['passed'] } }));
    const run = await project.run(['test'], { env: { CHROMIUM_PATH: '/nowhere/chromium' } });
    expect(closingLine(run)).toBe('9 passed, 3 failed');
    expect(run.code).toBe(1);
    expect(run.out).toContain('The build did not succeed');
    expect(run.out).toContain(
      'CHROMIUM_PATH names /nowhere/chromium, which is not a program that can be run. Install it',
    );
  });

  it('counts every stage when nothing could be installed', async () => {
    project.write('packages.json', 'no json');
    const run = await project.run(['test']);
    expect(closingLine(run)).toBe('0 passed, 10 failed');
    expect(run.code).toBe(1);
  });

  it('counts what did not run when it is interrupted', async () => {
    project.write('lint-for-ever', '');
    const child = project.start(['test']);
    const ended = finish(child);
    await Promise.all([waitFor(child, 'ok      component'), waitFor(child, 'ok      boundaries')]);
    child.kill('SIGINT');
    const run = await ended;
    // All but lint had passed, which was cut off; benchmarks and browser never began.
    expect(closingLine(run)).toBe('9 passed, 3 failed');
    expect(run.code).toBe(130);
  });
});
