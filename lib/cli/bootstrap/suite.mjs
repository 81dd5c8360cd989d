import { runCaptured } from './captured.mjs';
import { ensureChromium } from './chromium.mjs';
import { promiseClosingLine } from './closing-line.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { withLock } from './lock.mjs';
import * as stage from './stages.mjs';

/**
 * `npm test`. Two cores: the stages of one lane run one after the other, the two lanes side by side; the benchmarks and
 * the browser have the machine to themselves.
 */
export function test() {
  return runSuite([
    [
      [stage.build, stage.reachedBrowser, stage.component, stage.lint],
      // The types of the routes are written into the folder of the build, which is long done after the units.
      [stage.unit, stage.types, stage.formatting, stage.boundaries],
    ],
    [[stage.benchmarks]],
    [[stage.endToEnd]],
  ]);
}

/** `npm run verify`: what can be told without a build and a browser. */
export function verify() {
  return runSuite([
    [
      [stage.lint, stage.formatting, stage.component],
      [stage.types, stage.boundaries, stage.unit],
    ],
  ]);
}

/** @param rounds each a list of lanes, each a list of stages */
async function runSuite(rounds) {
  const stages = rounds.flat(2);
  const results = new Map();
  const stop = promiseClosingLine(stages, results);
  await ensureDependencies();
  await withLock('suite', async () => {
    const chromium = stages.some(({ needsChromium }) => needsChromium) ? findBrowser() : undefined;
    for (const lanes of rounds) {
      await Promise.all(lanes.map((lane) => runLane(lane, { results, stop, chromium })));
    }
  });
  printTimes(stages, results);
}

async function runLane(lane, context) {
  for (const each of lane) {
    if (context.stop.aborted) return;
    context.results.set(each.name, await runStage(each, context));
  }
}

async function runStage(each, context) {
  console.log(`start   ${each.name}`);
  const started = performance.now();
  const outcome = await outcomeOf(each, context).catch(crash);
  const result = { ...each.count(outcome), seconds: (performance.now() - started) / 1000 };
  report(each, outcome, result);
  return result;
}

const crash = (problem) => ({ succeeded: false, lines: [], notes: [problem.stack] });

async function outcomeOf(each, { stop, chromium }) {
  const lines = [];
  const browser = each.needsChromium ? await chromium : {};
  if (browser.missing) return { succeeded: false, lines, notes: [browser.missing] };
  each.prepare?.();
  const env = { ...cleanEnvironment(), ...each.env, ...browser.env };
  const onLine = each.live ? (line) => console.log(line) : undefined;
  for (const args of each.programs) {
    const end = await runCaptured(args, { env, stop, minutes: each.minutes, onLine });
    lines.push(...end.lines);
    if (end.ended) return { succeeded: false, lines, notes: [`The stage was ${end.ended}.`] };
    if (end.code !== 0) return { succeeded: false, lines, notes: [] };
  }
  return { succeeded: true, lines, notes: [] };
}

/** A browser that is missing fails its stage and lets the others run. */
async function findBrowser() {
  try {
    return { env: { CHROMIUM_PATH: await ensureChromium() } };
  } catch (problem) {
    return { missing: problem.message };
  }
}

/** The tests bring their own database, address and clock; those of the person who runs them stay out. */
function cleanEnvironment() {
  const env = { ...process.env, NEXT_TELEMETRY_DISABLED: '1', NO_COLOR: '1' };
  for (const name of ['NODE_ENV', 'DATABASE_URL', 'APP_ORIGIN', 'PORT', 'TEST_CLOCK', 'FORCE_COLOR']) delete env[name];
  return env;
}

function report(each, { lines, notes, succeeded }, { passed, failed, seconds }) {
  const good = succeeded && failed === 0;
  const shown = each.live ? [] : good ? lines.filter((line) => each.shows?.(line)) : lines;
  for (const line of [...shown, ...notes]) console.log(line);
  const word = good ? 'ok     ' : 'FAILED ';
  console.log(`${word} ${each.name}: ${passed} passed, ${failed} failed in ${seconds.toFixed(1)} s`);
}

function printTimes(stages, results) {
  console.log('');
  for (const { name } of stages) {
    const { passed, failed, seconds } = results.get(name) ?? { passed: 0, failed: 1, seconds: 0 };
    const figures = [seconds.toFixed(1).padStart(7), `${passed}`.padStart(6), `${failed}`.padStart(5)];
    console.log(`${name.padEnd(12)}${figures[0]} s ${figures[1]} passed ${figures[2]} failed`);
  }
  console.log(`${'altogether'.padEnd(12)}${process.uptime().toFixed(1).padStart(7)} s`);
}
