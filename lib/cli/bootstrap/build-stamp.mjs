import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { serverEnvironment } from './env-files.mjs';
import { inRoot, root } from './place.mjs';

const sources = [
  'app',
  'components',
  'db',
  'drizzle',
  'lib',
  'public',
  'instrumentation-client.ts',
  'instrumentation.ts',
  'next.config.mjs',
  'package-lock.json',
  'package.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
];

/**
 * One hash over everything that a build is made from: the sources, the lock file, the public environment that is
 * written into the browser's scripts, and the folder itself, whose path a build remembers.
 */
export function buildStamp() {
  const hash = createHash('sha256').update(root);
  for (const source of sources) addToHash(hash, source);
  for (const [name, value] of publicEnvironment()) hash.update(`\0${name}=${value}`);
  return hash.digest('hex');
}

function addToHash(hash, path) {
  const found = statSync(inRoot(path), { throwIfNoEntry: false });
  if (found === undefined) return;
  if (found.isDirectory()) {
    for (const name of readdirSync(inRoot(path)).sort()) addToHash(hash, join(path, name));
  } else {
    const content = readFileSync(inRoot(path));
    hash.update(`\0${path}\0${content.length}\0`).update(content);
  }
}

function publicEnvironment() {
  return Object.entries(serverEnvironment())
    .filter(([name]) => name.startsWith('NEXT_PUBLIC_'))
    .sort(([a], [b]) => (a < b ? -1 : 1));
}
