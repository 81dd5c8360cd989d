import { spawn } from 'node:child_process';
import { join } from 'node:path';

/**
 * `npm run shots`: pictures of every page at three widths, light and dark, in .tmp/shots. It runs the end-to-end tests
 * that measure how the pages look, and lets them take a picture of what they look at.
 */
const run = join(import.meta.dirname, '../../tests/e2e/run.ts');
const asked = process.argv.slice(2);
const child = spawn(process.execPath, [...process.execArgv, run, ...(asked.length > 0 ? asked : ['looks:'])], {
  stdio: 'inherit',
  env: { ...process.env, SHOTS: '1' },
});
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => child.kill(signal));
child.once('exit', (code) => (process.exitCode = code ?? 1));
