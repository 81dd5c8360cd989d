/**
 * How a stage's end becomes "so many passed, so many failed". Whatever did not clearly pass has failed: a crash, a
 * stage that was ended, a test that was skipped or left for later.
 */
export function oneCheck({ succeeded }) {
  return succeeded ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** @param readReport the JSON report that Vitest writes at the end of a run that did not crash */
export function countVitest({ succeeded }, readReport) {
  let files;
  try {
    files = readReport().testResults;
  } catch {
    return { passed: 0, failed: 1 };
  }
  const tests = files.flatMap((file) => file.assertionResults);
  const passed = tests.filter((test) => test.status === 'passed').length;
  // A file that could not be loaded has no tests to show for it.
  const broken = files.filter((file) => file.status === 'failed' && !hasFailedTest(file)).length;
  return blameTheRun(succeeded, { passed, failed: tests.length - passed + broken });
}

const hasFailedTest = (file) => file.assertionResults.some((test) => test.status === 'failed');

/** The end-to-end run says how it went in its last line. */
export const countEndToEnd = countSaid('E2E');

/** The benchmarks do the same: one for each piece. */
export const countBenchmarks = countSaid('BENCH');

/** So does the look through what browsers fetch: one for each file. */
export const countReachedBrowser = countSaid('BROWSER');

/** Reads "WORD 3 passed, 1 failed". */
function countSaid(word) {
  const summary = new RegExp(`^${word} (\\d+) passed, (\\d+) failed$`);
  return ({ succeeded, lines }) => {
    const said = lines.map((line) => summary.exec(line.trim())).findLast(Boolean);
    if (!said) return { passed: 0, failed: 1 };
    return blameTheRun(succeeded, { passed: Number(said[1]), failed: Number(said[2]) });
  };
}

/** A run that ended badly, or ran nothing, has failed even if each of its tests passed. */
function blameTheRun(succeeded, { passed, failed }) {
  const unexplained = failed === 0 && (!succeeded || passed === 0);
  return { passed, failed: unexplained ? 1 : failed };
}
