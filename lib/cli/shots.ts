import { spawn } from 'node:child_process';
import { join } from 'node:path';

/**
 * `npm run shots`: pictures of every page at three widths, light and dark, in .tmp/shots. The end-to-end tests take them
 * while they measure how the pages look, so this runs that part of them and nothing else.
 */
const run = join(import.meta.dirname, '../../tests/e2e/run.ts');
const asked = process.argv.slice(2);
const child = spawn(process.execPath, [...process.execArgv, run, ...(asked.length > 0 ? asked : ['looks:'])], {
  stdio: 'inherit',
});
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => child.kill(signal));
child.once('exit', (code) => (process.exitCode = code ?? 1));
