import { spawn } from 'node:child_process';
import { accessSync, constants, openSync, readFileSync, statSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { withLock } from './lock.mjs';
import { say, workFolder } from './place.mjs';
import { Refusal } from './refusal.mjs';

const help = 'Install it (on Debian, as root: apt-get install chromium) or name its program in CHROMIUM_PATH.';

/** The browser for the end-to-end tests; on a bare Debian machine it is installed first. */
export async function ensureChromium() {
  return findChromium() ?? (await withLock('chromium', async () => findChromium() ?? (await installChromium())));
}

function findChromium() {
  const named = process.env.CHROMIUM_PATH;
  if (named) {
    if (canRun(named)) return named;
    throw new Refusal(`CHROMIUM_PATH names ${named}, which is not a program that can be run. ${help}`);
  }
  return findOnPath('chromium') ?? findOnPath('google-chrome');
}

async function installChromium() {
  if (process.getuid?.() !== 0 || findOnPath('apt-get') === undefined) {
    throw new Refusal(`The end-to-end tests need Chromium, and there is none here. ${help}`);
  }
  say("Installing Chromium from Debian's packages for the end-to-end tests.");
  const log = join(workFolder, 'chromium-install.log');
  await aptGet(log, ['update']);
  await aptGet(log, ['install', '--yes', '--no-install-recommends', 'chromium']);
  const found = findChromium();
  if (found !== undefined) return found;
  say(readFileSync(log, 'utf8').split('\n').slice(-20).join('\n'));
  throw new Refusal(`Chromium could not be installed from Debian's packages. ${help}`);
}

/**
 * Runs apt-get to its end, come what may: cut off in the middle it would leave the machine's packages half configured.
 * Its exit code is not asked for; whether Chromium is there afterwards is what counts.
 */
function aptGet(log, args) {
  const output = openSync(log, 'a');
  const apt = spawn('apt-get', ['-o', 'DPkg::Lock::Timeout=300', '-q', ...args], {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    stdio: ['ignore', output, output],
    detached: true,
  });
  return new Promise((resolve) => apt.once('exit', resolve).once('error', resolve));
}

function findOnPath(name) {
  const folders = (process.env.PATH ?? '').split(delimiter).filter((folder) => folder !== '');
  return folders.map((folder) => join(folder, name)).find(canRun);
}

function canRun(file) {
  try {
    accessSync(file, constants.X_OK);
    return statSync(file).isFile();
  } catch {
    return false;
  }
}
