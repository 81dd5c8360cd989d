import { spawn } from 'node:child_process';
import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';

export type TestRun = { ended: 'green' | 'red' | 'nothing ran' | 'hung' };

type Report = { numTotalTests: number; numFailedTests: number; success: boolean };

const LONGEST = 180_000;

/**
 * Runs test files in a copied tree until the first failure. A fault that keeps the tests from starting has not been
 * noticed by any of them: then nothing ran.
 */
export async function runTests(folder: string, files: readonly string[]): Promise<TestRun> {
  const report = join(folder, '.mutants-report.json');
  rmSync(report, { force: true });
  const vitest = join(folder, 'node_modules/vitest/vitest.mjs');
  const child = spawn(
    process.execPath,
    [vitest, 'run', '--project', 'unit', '--bail', '1', '--reporter', 'json', '--outputFile', report, ...files],
    { cwd: folder, stdio: 'ignore', env: { ...process.env, CI: '1' } },
  );
  let hung = false;
  const patience = setTimeout(() => {
    hung = true;
    child.kill('SIGKILL');
  }, LONGEST);
  await new Promise((resolve) => child.once('exit', resolve));
  clearTimeout(patience);
  if (hung) return { ended: 'hung' };
  const { numTotalTests, numFailedTests, success } = readReport(report);
  if (numTotalTests === 0) return { ended: 'nothing ran' };
  return { ended: numFailedTests > 0 ? 'red' : success ? 'green' : 'nothing ran' };
}

function readReport(file: string): Report {
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as Report;
  } catch {
    return { numTotalTests: 0, numFailedTests: 0, success: false };
  }
}
