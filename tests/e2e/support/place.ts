import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';

/** The project's folder. */
export const root = resolve(import.meta.dirname, '../../..');
export const inRoot = (...parts: string[]): string => join(root, ...parts);

/** The production build that is tested; `npm test` has a folder of its own for it. */
export const buildFolder = process.env.NEXT_DIST_DIR || '.next-test';

/** Databases and server logs of a run. */
export const runFolder = inRoot('.tmp', 'e2e');
/** Pictures of pages, and of what went wrong. */
export const shotsFolder = inRoot('.tmp', 'shots');

for (const folder of [runFolder, shotsFolder]) mkdirSync(folder, { recursive: true });
