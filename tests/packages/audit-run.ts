/** `npm run audit:packages`: known faults of what production installs. Ends with 0 only when it was looked, and nothing found. */
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { readAudit } from './npm-audit';

const { stdout } = spawnSync('npm', ['audit', '--omit=dev', '--json'], {
  cwd: join(import.meta.dirname, '../..'),
  encoding: 'utf8',
  timeout: 120_000,
  maxBuffer: 64 * 1024 ** 2,
});
const { verdict, lines } = readAudit(stdout ?? '');
for (const line of lines) console.log(line);
const counts = {
  passed: '1 passed, 0 failed',
  failed: `0 passed, ${lines.length} failed`,
  'not run': '0 passed, 0 failed',
};
console.log(`npm audit: ${verdict}`);
console.log(`AUDIT ${counts[verdict]}`);
process.exitCode = { passed: 0, failed: 1, 'not run': 2 }[verdict];
