import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { nextProgram } from './build.mjs';
import { roomOfTheEngine, typescriptEnvironment, typescriptLoader } from './child.mjs';
import { countBenchmarks, countEndToEnd, countReachedBrowser, countVitest, oneCheck } from './counting.mjs';
import { inRoot, testFolder, workFolder } from './place.mjs';

/**
 * The stages of a test run.
 *
 * @typedef {object} Stage
 * @property {string} name
 * @property {number} minutes after which each of its programs is ended
 * @property {() => void} [prepare] runs first
 * @property {string[][]} programs arguments for Node.js; they run one after the other until one fails
 * @property {Record<string, string>} [env] added to the environment of its programs
 * @property {boolean} [needsChromium]
 * @property {boolean} [live] its output is shown as it comes
 * @property {(line: string) => boolean} [shows] lines worth reading even when all went well
 * @property {(outcome: { succeeded: boolean, lines: string[] }) => { passed: number, failed: number }} count
 */

const program = (path) => inRoot('node_modules', path);

export const lint = {
  name: 'lint',
  minutes: 10,
  programs: [[program('eslint/bin/eslint.js'), '.', '--max-warnings', '0']],
  count: oneCheck,
};

export const formatting = {
  name: 'formatting',
  minutes: 5,
  programs: [[program('prettier/bin/prettier.cjs'), '--check', '--log-level', 'warn', '.']],
  count: oneCheck,
};

const typesConfig = join(workFolder, 'tsconfig.types.json');
const typesSettings = {
  extends: '../tsconfig.json',
  include: ['../next-env.d.ts', '../**/*.ts', '../**/*.tsx', `../${testFolder}/types/**/*.ts`],
  exclude: ['../node_modules', '../data'],
  compilerOptions: { tsBuildInfoFile: './types.tsbuildinfo' },
};

/** Checked with the routes' own types, which Next.js writes; tsconfig.json leaves them out, for they go stale. */
export const types = {
  name: 'types',
  minutes: 10,
  prepare: () => writeFileSync(typesConfig, JSON.stringify(typesSettings)),
  programs: [
    [nextProgram, 'typegen'],
    [program('typescript/bin/tsc'), '--noEmit', '--project', typesConfig],
  ],
  env: { NEXT_DIST_DIR: testFolder },
  count: oneCheck,
};

const cruised = [
  'app',
  'components',
  'db',
  'lib',
  'tests',
  'proxy.ts',
  'instrumentation.ts',
  'instrumentation-client.ts',
].filter((path) => existsSync(inRoot(path)));

export const boundaries = {
  name: 'boundaries',
  minutes: 5,
  programs: [
    // The rules read their list of packages from a TypeScript file.
    [
      ...typescriptLoader,
      program('dependency-cruiser/bin/dependency-cruise.mjs'),
      ...['--config', inRoot('.dependency-cruiser.mjs'), '--output-type', 'err-long'],
      ...cruised,
    ],
  ],
  env: typescriptEnvironment,
  count: oneCheck,
};

export const unit = vitestProjects('unit', ['unit', 'routes']);
export const component = vitestProjects('component', ['component', 'stand-ins']);

function vitestProjects(name, projects) {
  const report = join(workFolder, `vitest-${name}.json`);
  return {
    name,
    minutes: 15,
    prepare: () => rmSync(report, { force: true }),
    programs: [
      [
        program('vitest/vitest.mjs'),
        'run',
        ...projects.flatMap((project) => ['--project', project]),
        ...['--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
      ],
    ],
    shows: (line) => /^\s*(reference|seed):|^\s+(Test Files|Tests) /.test(line),
    count: (outcome) => countVitest(outcome, () => JSON.parse(readFileSync(report, 'utf8'))),
  };
}

export const build = {
  name: 'build',
  minutes: 10,
  programs: [[inRoot('lib/cli/bootstrap.mjs'), 'build']],
  env: { NEXT_DIST_DIR: testFolder },
  count: oneCheck,
};

/** Whether server code or a secret stands in a file that browsers fetch; one check for each file. */
export const reachedBrowser = {
  name: 'browser code',
  minutes: 2,
  programs: [[...typescriptLoader, inRoot('tests/packages/browser-run.ts')]],
  env: { NEXT_DIST_DIR: testFolder, ...typescriptEnvironment },
  count: countReachedBrowser,
};

/** Whether any piece of the engine has become slower than its committed ratio allows; one check for each piece. */
export const benchmarks = {
  name: 'benchmarks',
  minutes: 5,
  programs: [[...roomOfTheEngine, ...typescriptLoader, inRoot('tests/bench/run.ts'), '--check']],
  env: typescriptEnvironment,
  count: countBenchmarks,
};

export const endToEnd = {
  name: 'end to end',
  minutes: 40,
  needsChromium: true,
  live: true,
  programs: [[...typescriptLoader, inRoot('tests/e2e/run.ts')]],
  env: { NEXT_DIST_DIR: testFolder, ...typescriptEnvironment },
  count: countEndToEnd,
};
