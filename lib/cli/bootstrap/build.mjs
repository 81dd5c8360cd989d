import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildStamp } from './build-stamp.mjs';
import { runStep } from './child.mjs';
import { inRoot, say } from './place.mjs';
import { Refusal } from './refusal.mjs';
import { serverOf } from './serving.mjs';

export const nextProgram = inRoot('node_modules/next/dist/bin/next');

/** Builds the production server unless the build that stands there is of these very sources. Call it under the lock. */
export async function buildIfStale(folder, { force = false } = {}) {
  const wanted = buildStamp();
  const stamp = inRoot(folder, 'wadewell-stamp');
  if (!force && isBuilt(folder) && readOrNothing(stamp) === wanted) return;
  const server = serverOf(folder);
  if (server !== undefined) {
    throw new Refusal(
      `A new build is due, and process ${server} still serves the one that stands there: stop it first.`,
    );
  }
  say('Building, which takes about half a minute.');
  await runStep(process.execPath, [nextProgram, 'build'], 'The build did not succeed; the reason stands above.', {
    env: { ...process.env, NODE_ENV: 'production', NEXT_DIST_DIR: folder, NEXT_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', process.stderr, process.stderr],
  });
  leaveOutSources(folder);
  // Next.js empties the folder before it builds, so a stamp stands only beside a build that was finished.
  writeFileSync(stamp, wanted);
}

/** Of each thread's first file the bundler also lays the source, which nothing fetches, among what browsers may. */
function leaveOutSources(folder) {
  const media = inRoot(folder, 'static', 'media');
  if (!existsSync(media)) return;
  for (const name of readdirSync(media)) if (name.endsWith('.ts')) rmSync(join(media, name));
}

const isBuilt = (folder) => readOrNothing(join(inRoot(folder), 'BUILD_ID')) !== undefined;

function readOrNothing(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}
