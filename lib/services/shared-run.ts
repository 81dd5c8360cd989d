import 'server-only';

type Runs = Map<string, { running: Promise<unknown>; next?: Promise<unknown> }>;

// Each route is a bundle of its own: what all of them share hangs on the process.
const shared = globalThis as { wadewellRuns?: Runs };

/**
 * Runs work that reads everything anew, one at a time for each key: whoever asks while it runs gets the run after it, and
 * all of them the same one, because it begins after what each of them has saved.
 */
export function sharedRun<T>(key: string, work: () => Promise<T>): Promise<T> {
  const runs = (shared.wadewellRuns ??= new Map());
  const known = runs.get(key);
  if (known) {
    // The run that is waited for was started with the same work, so its result is of the same kind.
    known.next ??= known.running.then(
      () => start(runs, key, work),
      () => start(runs, key, work),
    );
    return known.next as Promise<T>;
  }
  return start(runs, key, work);
}

function start<T>(runs: Runs, key: string, work: () => Promise<T>): Promise<T> {
  const running = work();
  const entry = { running };
  runs.set(key, entry);
  const end = () => {
    if (runs.get(key) === entry && !('next' in entry)) runs.delete(key);
  };
  running.then(end, end);
  return running;
}
