/**
 * Looks through everything that a build lets browsers fetch for what only the server may have. By hand:
 * `NEXT_DIST_DIR=.next-test node --import tsx tests/packages/browser-run.ts`.
 */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { serverSecret } from '../e2e/support/server-secret';
import { filesBelow, markers, reachedBrowser } from './reached-browser';

const root = join(import.meta.dirname, '../..');
const built = join(root, process.env.NEXT_DIST_DIR || '.next', 'static');
const files = existsSync(built) ? filesBelow(built) : [];
const sought = markers(root, [serverSecret]);
const found = reachedBrowser(files, sought);
for (const line of found) console.log(line);
// A build without scripts was none, and then nothing is shown.
const failed = found.length + (files.length < 20 ? 1 : 0);
console.log(`${sought.length} markers, ${files.length} files of ${built}`);
console.log(`BROWSER ${failed === 0 ? files.length : files.length - found.length} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
