import { writeSync } from 'node:fs';

const signals = { SIGHUP: 129, SIGINT: 130, SIGTERM: 143 };
const secondsToStop = 7;

/**
 * From here on the process ends with the line "N passed, N failed", however it ends: a stage without a result counts
 * as failed, and the exit code is 0 only when something passed and nothing failed.
 *
 * @param results filled in by the caller: stage name to { passed, failed }
 * @returns aborts when we are asked to stop
 */
export function promiseClosingLine(stages, results) {
  process.once('exit', (code) => {
    const counts = stages.map(({ name }) => results.get(name) ?? { passed: 0, failed: 1 });
    const passed = counts.reduce((sum, count) => sum + count.passed, 0);
    const failed = counts.reduce((sum, count) => sum + count.failed, 0);
    const good = failed === 0 && passed > 0;
    process.exitCode = good ? code : code || 1;
    writeWhole(`${passed} passed, ${failed} failed\n`);
  });
  const stop = new AbortController();
  for (const [signal, code] of Object.entries(signals)) {
    process.on(signal, () => {
      process.exitCode = code;
      stop.abort();
      // The stages end within that time; what else we may be waiting for is not worth any more of it.
      setTimeout(() => process.exit(code), secondsToStop * 1000).unref();
    });
  }
  return stop.signal;
}

/** A pipe that is full says so; one that nobody reads any more needs no line. */
function writeWhole(line) {
  for (;;) {
    try {
      writeSync(1, line);
      return;
    } catch (problem) {
      if (problem.code !== 'EAGAIN') return;
    }
  }
}
