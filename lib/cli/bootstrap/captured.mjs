import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { root } from './place.mjs';

const secondsToStop = 5;

/**
 * Runs Node.js with its output kept instead of shown, in a process group of its own, so that whatever it started can
 * be ended with it.
 *
 * @param stop    ends the group when it aborts
 * @param minutes after which the group is ended
 * @param onLine  is told every line of output as it comes
 * @returns the exit code (null when it was ended), the lines, and why it was ended
 */
export function runCaptured(args, { env, stop, minutes, onLine }) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, { cwd: root, env, detached: true, stdio: ['ignore', 'pipe', 'pipe'] });
    const lines = [];
    const keep = (line) => {
      lines.push(line);
      onLine?.(line);
    };
    for (const stream of [child.stdout, child.stderr]) createInterface({ input: stream }).on('line', keep);

    let ended;
    const end = (reason) => {
      ended ??= reason;
      signalGroup(child, 'SIGTERM');
      setTimeout(() => signalGroup(child, 'SIGKILL'), secondsToStop * 1000).unref();
    };
    const onStop = () => end('interrupted');
    const alarm = setTimeout(() => end(`stopped after ${minutes} minutes`), minutes * 60_000);
    stop.addEventListener('abort', onStop);

    child.once('error', (problem) => keep(`It could not be started: ${problem.message}`));
    child.once('exit', () => {
      clearTimeout(alarm);
      stop.removeEventListener('abort', onStop);
      // Grandchildren that outlive it would hold the pipes open, and we would wait for them for ever.
      signalGroup(child, 'SIGKILL');
    });
    child.once('close', (code) => resolve({ code, lines, ended }));
  });
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // The group has ended already.
  }
}
