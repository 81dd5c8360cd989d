/**
 * The end-to-end tests: a real browser against production servers of the build, each with a database and a clock of its
 * own. `npm test` builds first; by hand: `node --import tsx tests/e2e/run.ts [part of a journey's name]`.
 */
import { launchBrowser } from './support/browser';
import { runJourneys } from './support/runner';
import { journeys } from './journeys';

const wanted = process.argv.slice(2);
const chosen = journeys.filter(({ name }) => wanted.length === 0 || wanted.some((part) => name.includes(part)));

const browser = await launchBrowser();
const { passed, failed } = await runJourneys(browser, chosen, 2);
await browser.close();
console.log(`E2E ${passed} passed, ${failed} failed`);
// Whatever a failed journey left open must not keep the run from ending.
process.exit(failed === 0 && passed > 0 ? 0 : 1);
