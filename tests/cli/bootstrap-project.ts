import { type ChildProcess, spawn } from 'node:child_process';
import { chmodSync, cpSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';

const root = join(import.meta.dirname, '../..');

/** Stands in for an installed package: says what it was asked, and does as the test wants. */
const programs = {
  // A server that answers on the port it was given, and a build that leaves what a build leaves.
  'node_modules/next/dist/bin/next': `
    const fs = require('node:fs');
    const [command, ...rest] = process.argv.slice(2);
    fs.appendFileSync('calls.log', 'next ' + command + '\\n');
    const folder = process.env.NEXT_DIST_DIR;
    if (command === 'build') {
      fs.rmSync(folder, { recursive: true, force: true });
      const until = Date.now() + Number(process.env.BUILD_MILLISECONDS || 0);
      while (Date.now() < until);
      if (fs.existsSync('break-the-build')) process.exit(1);
      fs.mkdirSync(folder);
      fs.writeFileSync(folder + '/BUILD_ID', '1');
    }
    if (command === 'start') {
      const server = require('node:http').createServer((request, reply) => reply.end(process.env.NODE_ENV + ' ' + process.env.PORT));
      server.listen(Number(rest[rest.indexOf('-p') + 1]), rest[rest.indexOf('-H') + 1]);
      process.on('SIGTERM', () => process.exit(143));
      process.on('SIGINT', () => process.exit(130));
    }`,
  'node_modules/vitest/vitest.mjs': `
    import { readFileSync, writeFileSync } from 'node:fs';
    const project = process.argv[process.argv.indexOf('--project') + 1];
    const wanted = JSON.parse(readFileSync('vitest-results.json', 'utf8'))[project];
    const report = process.argv.find((word) => word.startsWith('--outputFile.json=')).split('=')[1];
    console.log('reference: a table of ' + project);
    if (wanted.statuses) {
      const assertionResults = wanted.statuses.map((status) => ({ status }));
      writeFileSync(report, JSON.stringify({ testResults: [{ status: wanted.file ?? 'passed', assertionResults }] }));
    }
    process.exitCode = wanted.exit ?? 0;`,
  'node_modules/eslint/bin/eslint.js':
    "if (require('node:fs').existsSync('lint-for-ever')) setInterval(() => {}, 1000);",
  'node_modules/prettier/bin/prettier.cjs': '',
  'node_modules/typescript/bin/tsc': '',
  'node_modules/dependency-cruiser/bin/dependency-cruise.mjs': '',
  // Lighter than the real one, which the plan does not need: it is JavaScript under another name.
  'node_modules/tsx/dist/loader.mjs': `
    import { register } from 'node:module';
    const load = "export const load = (url, context, next) => " +
      "next(url, url.endsWith('.ts') ? { ...context, format: 'module' } : context);";
    register('data:text/javascript,' + encodeURIComponent(load));`,
};

const npm = `#!${process.execPath}
  const fs = require('node:fs');
  fs.appendFileSync('calls.log', 'npm ' + process.argv.slice(2).join(' ') + '\\n');
  console.log('npm: added 1 package');
  for (const [path, code] of Object.entries(JSON.parse(fs.readFileSync('packages.json', 'utf8')))) {
    fs.mkdirSync(require('node:path').dirname(path), { recursive: true });
    fs.writeFileSync(path, code);
  }`;

const plan = `
  import { readFileSync } from 'node:fs';
  const [scenario] = process.argv.slice(2);
  if (scenario === 'wait') {
    process.on('SIGTERM', () => process.exit(7));
    process.on('SIGINT', () => process.exit(8));
    console.log('waiting');
    setInterval(() => {}, 1000);
  } else console.log(JSON.stringify({ scenario, text: readFileSync(scenario, 'utf8') }));`;

/** A project that has our bootstrap and nothing installed, with an npm of its own; each test gets a fresh one. */
export function makeProject() {
  const folder = mkdtempSync(join(tmpdir(), 'wadewell-bootstrap-'));
  cpSync(join(root, 'lib/cli/bootstrap.mjs'), join(folder, 'lib/cli/bootstrap.mjs'));
  cpSync(join(root, 'lib/cli/bootstrap'), join(folder, 'lib/cli/bootstrap'), { recursive: true });
  const write = (path: string, text: string) => {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), text);
  };
  const read = (path: string) => readFileSync(join(folder, path), 'utf8');
  write('package.json', '{ "type": "module" }');
  write('tsconfig.json', '{}');
  write('package-lock.json', '{ "lockfileVersion": 3 }');
  write('packages.json', JSON.stringify({ ...programs, ...commonJs }));
  write('bin/package.json', '{ "type": "commonjs" }');
  write('bin/npm', npm);
  chmodSync(join(folder, 'bin/npm'), 0o755);
  write('lib/cli/plan.ts', plan);
  write('app/page.tsx', 'export default function Page() {}');
  write(
    'vitest-results.json',
    JSON.stringify({ unit: { statuses: ['passed', 'passed'] }, component: { statuses: ['passed'] } }),
  );
  write('tests/e2e/run.ts', "console.log('E2E 3 passed, 0 failed');");
  write('tests/packages/browser-run.ts', "console.log('BROWSER 2 passed, 0 failed');");
  write('tests/bench/run.ts', "console.log('BENCH 2 passed, 0 failed');");
  write('scenario.json', 'a pool');

  const start = (args: string[], { env = {}, node = [] }: RunOptions = {}): ChildProcess =>
    spawn(process.execPath, [...node, join(folder, 'lib/cli/bootstrap.mjs'), ...args], {
      cwd: folder,
      env: { NODE_ENV: 'test', PATH: join(folder, 'bin'), ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
  return {
    folder,
    write,
    read,
    start,
    run: (args: string[], options?: RunOptions) => finish(start(args, options)),
    has: (path: string) => existsSync(join(folder, path)),
    path: (path: string) => join(folder, path),
    /** What npm and Next.js were asked so far. */
    calls: () => (existsSync(join(folder, 'calls.log')) ? read('calls.log').trim().split('\n') : []),
    /** A browser that nobody will start. */
    addChromium: () => {
      write('bin/chromium', '#!/bin/sh\n');
      chmodSync(join(folder, 'bin/chromium'), 0o755);
    },
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}

export type Project = ReturnType<typeof makeProject>;
type RunOptions = { env?: Record<string, string>; node?: string[] };

/** Packages whose programs are not modules. */
const commonJs = Object.fromEntries(
  ['next', 'eslint', 'prettier', 'typescript'].map((name) => [
    `node_modules/${name}/package.json`,
    '{ "type": "commonjs" }',
  ]),
);

export type Finished = { code: number | null; out: string; err: string };

export function finish(child: ChildProcess): Promise<Finished> {
  let out = '';
  let err = '';
  child.stdout?.on('data', (data) => (out += data));
  child.stderr?.on('data', (data) => (err += data));
  return new Promise((resolve) => child.once('close', (code) => resolve({ code, out, err })));
}

/** Waits until the program has written a text, as a person at the keyboard would. */
export function waitFor(child: ChildProcess, text: string): Promise<void> {
  let seen = '';
  return new Promise((resolve, reject) => {
    child.stdout?.on('data', (data) => {
      seen += data;
      if (seen.includes(text)) resolve();
    });
    child.once('close', () => reject(new Error(`It ended before it said "${text}": ${seen}`)));
  });
}
