import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { basename } from 'node:path';
import { runStep } from './child.mjs';
import { withLock } from './lock.mjs';
import { inRoot, say } from './place.mjs';

const stamp = inRoot('node_modules/.wadewell-lock');

/** Installs exactly what the lock file names, unless that is what stands there already. */
export async function ensureDependencies() {
  if (areInstalled()) return;
  await withLock('install', async () => {
    if (areInstalled()) return;
    say('Installing packages: this is the first run, or the lock file has changed.');
    const wanted = lockFileHash();
    const [program, ...before] = npmCommand();
    // npm writes what it did to standard output, and `npm run -s` would hide its errors.
    const args = [...before, 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    await runStep(program, args, 'npm ci did not succeed; what npm says about it stands above.', {
      stdio: ['ignore', process.stderr, process.stderr],
    });
    writeFileSync(stamp, wanted);
  });
}

export function lockFileHash() {
  return createHash('sha256')
    .update(readFileSync(inRoot('package-lock.json')))
    .digest('hex');
}

function areInstalled() {
  try {
    return readFileSync(stamp, 'utf8') === lockFileHash();
  } catch {
    return false;
  }
}

/** The npm that called us, else the one on the PATH. */
function npmCommand() {
  const caller = process.env.npm_execpath ?? '';
  return basename(caller) === 'npm-cli.js' ? [process.execPath, caller] : ['npm'];
}
