import { mkdirSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { buildIfStale, nextProgram } from './build.mjs';
import { runNode } from './child.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { withLock } from './lock.mjs';
import { inRoot, productFolder, say } from './place.mjs';
import { ensurePortIsFree, host, wantedPort } from './port.mjs';
import { ensureSecrets } from './secrets.mjs';
import { noteServing } from './serving.mjs';

const secondsToStop = 10;

/** `npm start`: everything from a fresh clone to pages that answer. */
export async function start() {
  const port = await prepare();
  const folder = productFolder();
  await withLock('build', async () => {
    await buildIfStale(folder);
    noteServing(folder);
  });
  return serve(['start'], port, { NODE_ENV: 'production', NEXT_DIST_DIR: folder });
}

/** `npm run dev`: the same server, rebuilt while one types. */
export async function dev() {
  const port = await prepare();
  return serve(['dev'], port, { NODE_ENV: 'development' });
}

async function prepare() {
  const port = wantedPort();
  await ensurePortIsFree(port);
  await ensureDependencies();
  await ensureSecrets();
  mkdirSync(inRoot('data'), { recursive: true });
  return port;
}

async function serve(command, port, variables) {
  const address = `http://${host}:${port}`;
  // Asked again: installing and building may have taken minutes.
  await ensurePortIsFree(port);
  let running = true;
  const { code, stoppedBy } = await runNode([nextProgram, ...command, '-H', host, '-p', String(port)], {
    env: { ...process.env, ...variables, PORT: String(port), NEXT_TELEMETRY_DISABLED: '1' },
    onStart: (server) => {
      server.once('exit', () => (running = false));
      announce(address, () => running);
    },
    onSignal: endIfItLingers,
  });
  return stoppedBy === undefined ? code : 0;
}

/** Says where to look once the server answers, and not before. */
async function announce(address, isRunning) {
  while (isRunning()) {
    if (await answers(`${address}/api/health`)) {
      console.log(`\nWadewell is at ${address}/`);
      console.log(`Look round without an account: ${address}/ and press 'Look round'. Ctrl-C stops the server.`);
      return;
    }
    await wait(100);
  }
}

async function answers(url) {
  try {
    const reply = await fetch(url, { signal: AbortSignal.timeout(2000) });
    return reply.ok;
  } catch {
    return false;
  }
}

/** An open connection can keep a server from ending. What people confirmed is on disk by then. */
function endIfItLingers(server) {
  setTimeout(() => {
    say(`The server did not end within ${secondsToStop} seconds and is ended now.`);
    server.kill('SIGKILL');
  }, secondsToStop * 1000).unref();
}
