import { describe, expect, it } from 'vitest';
import { countBenchmarks, countEndToEnd, countVitest, oneCheck } from '@/lib/cli/bootstrap/counting.mjs';

const file = (statuses: string[], status = 'passed') => ({
  status,
  assertionResults: statuses.map((each) => ({ status: each })),
});
const report = (...testResults: object[]) => ({ testResults });
const vitest = (read: object, succeeded = true) => countVitest({ succeeded }, () => read);

describe('a stage of one check', () => {
  it('passes or fails as its program does', () => {
    expect(oneCheck({ succeeded: true })).toEqual({ passed: 1, failed: 0 });
    expect(oneCheck({ succeeded: false })).toEqual({ passed: 0, failed: 1 });
  });
});

describe('a stage of tests', () => {
  it('counts those that passed', () => {
    expect(vitest(report(file(['passed', 'passed']), file(['passed'])))).toEqual({ passed: 3, failed: 0 });
  });

  it('counts as failed what was skipped or left for later', () => {
    const counts = vitest(report(file(['passed', 'pending', 'skipped', 'todo', 'failed'], 'failed')), false);
    expect(counts).toEqual({ passed: 1, failed: 4 });
  });

  it('counts a file that could not be loaded', () => {
    expect(vitest(report(file(['passed']), file([], 'failed')), false)).toEqual({ passed: 1, failed: 1 });
  });

  it('counts a bad end that no test explains', () => {
    expect(vitest(report(file(['passed'])), false)).toEqual({ passed: 1, failed: 1 });
  });

  it('counts a run without a test', () => {
    expect(vitest(report())).toEqual({ passed: 0, failed: 1 });
  });

  it('counts a crash before there was a report', () => {
    const missing = () => JSON.parse('');
    expect(countVitest({ succeeded: false }, missing)).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the run in the browser', () => {
  const run = (lines: string[], succeeded = true) => countEndToEnd({ succeeded, lines });

  it('is counted by its last summary', () => {
    expect(run(['E2E 1 passed, 0 failed', 'E2E 9 passed, 0 failed', 'goodbye'])).toEqual({ passed: 9, failed: 0 });
    expect(run(['E2E 8 passed, 1 failed'], false)).toEqual({ passed: 8, failed: 1 });
  });

  it('counts a run without a summary, and a bad end that no failure explains', () => {
    expect(run(['ready', '12 passed, 0 failed'])).toEqual({ passed: 0, failed: 1 });
    expect(run(['E2E 9 passed, 0 failed'], false)).toEqual({ passed: 9, failed: 1 });
    expect(run(['E2E 0 passed, 0 failed'])).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the benchmarks', () => {
  const run = (lines: string[], succeeded = true) => countBenchmarks({ succeeded, lines });

  it('are counted piece by piece, by their own summary alone', () => {
    expect(run(['E2E 1 passed, 0 failed', 'BENCH 8 passed, 1 failed'], false)).toEqual({ passed: 8, failed: 1 });
    expect(run(['E2E 9 passed, 0 failed'])).toEqual({ passed: 0, failed: 1 });
  });
});
