import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { pathToFileURL } from 'node:url';
import { inRoot, root } from './place.mjs';
import { Interruption, Refusal } from './refusal.mjs';

const forwarded = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/**
 * Runs a program to its end and passes on the signals we get meanwhile.
 *
 * @returns code (as a shell would give it) and, when we were asked to stop, the signal that asked
 */
export function runProgram(
  program,
  args,
  { env = process.env, cwd = root, stdio = 'inherit', onStart, onSignal } = {},
) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { cwd, env, stdio });
    let stoppedBy;
    const pass = (signal) => {
      stoppedBy = signal;
      child.kill(signal);
      onSignal?.(child);
    };
    for (const signal of forwarded) process.on(signal, pass);
    const settle = (finish) => {
      for (const signal of forwarded) process.off(signal, pass);
      finish();
    };
    child.once('error', (problem) =>
      settle(() => reject(new Refusal(`${program} could not be started: ${problem.message}`))),
    );
    child.once('exit', (code, signal) =>
      settle(() => resolve({ code: code ?? 128 + constants.signals[signal], stoppedBy })),
    );
    onStart?.(child);
  });
}

/** Runs Node.js itself, without npm or a shell between us and it. */
export const runNode = (args, options) => runProgram(process.execPath, args, options);

/** As runProgram, for a step that others build on: it succeeds, or the reason stops us. */
export async function runStep(program, args, reason, options) {
  const { code, stoppedBy } = await runProgram(program, args, options);
  if (stoppedBy !== undefined) throw new Interruption(stoppedBy);
  if (code !== 0) throw new Refusal(reason);
}

/** Lets Node.js read TypeScript, from whatever folder the command was given. */
export const typescriptLoader = ['--import', pathToFileURL(inRoot('node_modules/tsx/dist/loader.mjs')).href];

/** As much room for what a plan leaves behind as the engine's thread has (lib/engine-worker/shared-engine.ts). */
export const roomOfTheEngine = ['--max-semi-space-size=32'];

export const typescriptEnvironment = { TSX_TSCONFIG_PATH: inRoot('tsconfig.json') };
