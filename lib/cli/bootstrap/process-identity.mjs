import { readFileSync } from 'node:fs';

/**
 * A process id with its start time where the system tells it: after a crash the bare id may belong to somebody else.
 * Undefined when no such process runs.
 */
export function identityOf(pid) {
  try {
    process.kill(pid, 0);
  } catch (problem) {
    if (problem.code !== 'EPERM') return undefined;
  }
  const started = startOf(pid);
  return started === 'ended' ? undefined : `${pid} ${started}`;
}

export function stillRuns(identity) {
  return identityOf(Number.parseInt(identity, 10)) === identity;
}

function startOf(pid) {
  try {
    // The program's name stands in brackets and may hold blanks; what follows are the state and 49 numbers.
    const fields = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').pop().split(' ');
    return fields[0] === 'Z' ? 'ended' : fields[19];
  } catch {
    return 'at an unknown time';
  }
}
