import type { Browser } from 'playwright-core';
import { type Journey, Stage, wordsOf } from './journey';

export type Tally = { passed: number; failed: number };

/** Runs the journeys, those that measure time by themselves and first, the rest side by side. */
export async function runJourneys(browser: Browser, journeys: readonly Journey[], lanes: number): Promise<Tally> {
  const tally: Tally = { passed: 0, failed: 0 };
  for (const journey of journeys.filter(({ alone }) => alone)) await runOne(browser, journey, tally);
  const waiting = journeys.filter(({ alone }) => !alone);
  const lane = async () => {
    for (let journey = waiting.shift(); journey; journey = waiting.shift()) await runOne(browser, journey, tally);
  };
  await Promise.all(Array.from({ length: lanes }, lane));
  return tally;
}

async function runOne(browser: Browser, journey: Journey, tally: Tally): Promise<void> {
  const stage = new Stage(journey.name, browser);
  const started = performance.now();
  try {
    await inTime(journey, stage);
  } catch (problem) {
    stage.check('runs to its end', false, wordsOf(problem));
    await stage.picture('end');
  }
  await stage.end().catch((problem: unknown) => stage.check('closes what it opened', false, wordsOf(problem)));
  const failed = stage.checks.filter(({ good }) => !good);
  const passed = stage.checks.length - failed.length;
  tally.passed += passed;
  tally.failed += failed.length;
  // A journey that checked nothing has shown nothing.
  if (stage.checks.length === 0) tally.failed += 1;
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  const lines = failed.map(({ what, detail }) => `  FAILED ${what}${detail === '' ? '' : `: ${detail}`}`);
  const word = failed.length === 0 ? 'ok    ' : 'FAILED';
  console.log(
    [`${word} ${journey.name}: ${passed} passed, ${failed.length} failed, ${seconds} s`, ...lines].join('\n'),
  );
}

function inTime(journey: Journey, stage: Stage): Promise<void> {
  return new Promise((resolve, reject) => {
    const alarm = setTimeout(
      () => reject(new Error(`It did not end within ${journey.seconds} seconds.`)),
      journey.seconds * 1000,
    );
    journey
      .run(stage)
      .then(resolve, reject)
      .finally(() => clearTimeout(alarm));
  });
}
