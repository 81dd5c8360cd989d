import { type ChildProcess, spawn, spawnSync } from 'node:child_process';
import { cpSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { inRoot } from '../e2e/support/place';
import { until } from '../e2e/support/waiting';

const next = inRoot('node_modules/next/dist/bin/next');
const folder = inRoot('.tmp', 'audit', 'empty-page');

/** A production server of a page with nothing on it but Next.js and React: what every bar is measured against. */
export async function startEmptyPage(port: number): Promise<{ address: string; stop: () => void }> {
  build();
  const env = { ...process.env, NODE_ENV: 'production', NEXT_DIST_DIR: '', NEXT_TELEMETRY_DISABLED: '1' } as const;
  const child = spawn(process.execPath, [next, 'start', '-H', '127.0.0.1', '-p', `${port}`], {
    cwd: folder,
    env,
    stdio: 'ignore',
  });
  const address = `http://127.0.0.1:${port}/`;
  const up = await until(() => child.exitCode !== null || answers(address), { seconds: 60 });
  if (!up || child.exitCode !== null) throw new Error('The empty page did not start.');
  return { address, stop: () => end(child) };
}

function build(): void {
  rmSync(folder, { recursive: true, force: true });
  cpSync(join(import.meta.dirname, 'empty-page'), folder, { recursive: true });
  const { status, stderr } = spawnSync(process.execPath, [next, 'build'], {
    cwd: folder,
    env: { ...process.env, NODE_ENV: 'production', NEXT_DIST_DIR: '', NEXT_TELEMETRY_DISABLED: '1' },
    encoding: 'utf8',
  });
  if (status !== 0) throw new Error(`The empty page could not be built:\n${stderr}`);
}

async function answers(address: string): Promise<boolean> {
  return fetch(address, { signal: AbortSignal.timeout(2000) }).then(
    ({ ok }) => ok,
    () => false,
  );
}

function end(child: ChildProcess): void {
  if (child.exitCode === null) child.kill('SIGTERM');
}
