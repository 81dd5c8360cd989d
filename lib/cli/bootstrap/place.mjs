import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder, wherever the command was given. */
export const root = fileURLToPath(new URL('../../..', import.meta.url)).replace(/[\\/]$/, '');

export const inRoot = (...parts) => join(root, ...parts);

/** Locks, reports and half-written files: git-ignored, and on the same file system as what they become. */
export const workFolder = inRoot('.tmp');

/** Where `next build` writes. The test suite has its own, so that it never rebuilds under a running server. */
export const productFolder = () => process.env.NEXT_DIST_DIR || '.next';
export const testFolder = '.next-test';

/** Said beside the work and never on standard output, which belongs to the command's own answer. */
export const say = (line) => process.stderr.write(`${line}\n`);
