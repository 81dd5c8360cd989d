/**
 * The end-to-end tests: a real browser against production servers of the build, each with a database and a clock of its
 * own. `npm test` builds first; by hand: `node --import tsx tests/e2e/run.ts [part of a journey's name]`.
 */
import { launchBrowser } from './support/browser';
import { checkLogs } from './support/private-in-logs';
import { runJourneys } from './support/runner';
import { journeys } from './journeys';

const wanted = process.argv.slice(2);
const chosen = journeys.filter(({ name }) => wanted.length === 0 || wanted.some((part) => name.includes(part)));

const started = Date.now();
const browser = await launchBrowser();
const tally = await runJourneys(browser, chosen, 2);
await browser.close();

// Whatever happened in all of them: no log says who was there, or holds what would let somebody in.
const logs = await checkLogs(started);
for (const { name, found } of logs.filter((log) => log.found.length > 0))
  console.log(`FAILED ${name} holds what no log may:\n  ${found.slice(0, 12).join('\n  ')}`);
const indiscreet = logs.filter(({ found }) => found.length > 0).length;
if (chosen.length > 0) console.log(`logs: ${logs.length - indiscreet} hold nothing private, ${indiscreet} do`);
// A run without a log has not been looked through.
const passed = tally.passed + logs.length - indiscreet;
const failed = tally.failed + indiscreet + (logs.length === 0 ? 1 : 0);
console.log(`E2E ${passed} passed, ${failed} failed`);
// Whatever a failed journey left open must not keep the run from ending.
process.exit(failed === 0 && passed > 0 ? 0 : 1);
