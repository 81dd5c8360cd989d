import { existsSync } from 'node:fs';
import { constants } from 'node:os';
import { buildIfStale } from './build.mjs';
import { roomOfTheEngine, runNode, typescriptEnvironment, typescriptLoader } from './child.mjs';
import { ensureChromium } from './chromium.mjs';
import { ensureDependencies } from './dependencies.mjs';
import { withLock } from './lock.mjs';
import { inRoot, productFolder, say, testFolder } from './place.mjs';
import { Interruption, Refusal } from './refusal.mjs';
import { dev, start } from './serve.mjs';
import { test, verify } from './suite.mjs';

const commands = {
  ...{ start, dev, build, test, verify, plan, bench, mutants, shots, audit, licences },
  'audit:packages': auditPackages,
};

/** Runs one command; its exit code becomes ours. */
export async function run(name, args) {
  const command = Object.hasOwn(commands, name ?? '') ? commands[name] : undefined;
  if (command === undefined) {
    say(`There is no command "${name ?? ''}". There are: ${Object.keys(commands).join(', ')}.`);
    process.exitCode = 2;
    return;
  }
  try {
    const code = await command(args);
    if (code !== undefined) process.exitCode = code;
  } catch (problem) {
    process.exitCode = exitCodeFor(problem);
  }
}

function exitCodeFor(problem) {
  if (problem instanceof Interruption) return 128 + constants.signals[problem.signal];
  say(problem instanceof Refusal ? problem.message : problem.stack);
  return 1;
}

async function build(args) {
  await ensureDependencies();
  await withLock('build', () => buildIfStale(productFolder(), { force: args.includes('--force') }));
}

async function plan(args) {
  await ensureDependencies();
  // npm moves to the project's folder; a scenario is named from where the person stands.
  const cwd = process.env.npm_lifecycle_event === 'plan' ? process.env.INIT_CWD : process.cwd();
  return runTypescript('lib/cli/plan.ts', args, { cwd });
}

async function bench(args) {
  await ensureDependencies();
  return runTypescript('tests/bench/run.ts', args, { node: roomOfTheEngine });
}

/** Plants faults in copies of the tree: each has to turn a test red. */
async function mutants(args) {
  await ensureDependencies();
  return runTypescript('tests/mutants/run.ts', args);
}

/** Pictures of every page, from the build that the end-to-end tests use. */
async function shots(args) {
  await ensureDependencies();
  const CHROMIUM_PATH = await ensureChromium();
  await withLock('build', () => buildIfStale(testFolder));
  return runTypescript('lib/cli/shots.ts', args, { env: { CHROMIUM_PATH, NEXT_DIST_DIR: testFolder } });
}

/** How quick and how open to everybody the pages are, beside an empty one; from the build that the end-to-end tests use. */
async function audit(args) {
  await ensureDependencies();
  const CHROMIUM_PATH = await ensureChromium();
  await withLock('build', () => buildIfStale(testFolder));
  return runTypescript('tests/audit/run.ts', args, { env: { CHROMIUM_PATH, NEXT_DIST_DIR: testFolder } });
}

/** Known faults of the packages that production installs, where the registry answers. */
async function auditPackages(args) {
  await ensureDependencies();
  return runTypescript('tests/packages/audit-run.ts', args);
}

/** Writes the list of licences anew. */
async function licences(args) {
  await ensureDependencies();
  return runTypescript('tests/packages/licences-run.ts', args);
}

async function runTypescript(file, args, { cwd, env, node = [] } = {}) {
  if (!existsSync(inRoot(file))) throw new Refusal(`${file} is missing from this copy of the project.`);
  const { code } = await runNode([...node, ...typescriptLoader, inRoot(file), ...args], {
    cwd,
    env: { ...process.env, ...typescriptEnvironment, ...env },
  });
  return code;
}
