import { Worker } from 'node:worker_threads';
import { afterAll } from 'vitest';
import { Engine } from '@/lib/engine-worker/engine';

/** An engine whose thread runs the planner from its source; patient, because tests share the machine with each other. */
export function sourceEngine(): Engine {
  const startThread = () => new Worker(new URL('./engine-thread.mjs', import.meta.url));
  return new Engine({ startThread, jobLimit: 60_000, loadLimit: 60_000 });
}

/** From here on the services of this test file plan with the engine given; call it once, at the top of the file. */
export function planWith(engine: Engine = sourceEngine()): Engine {
  (globalThis as { wadewellEngine?: Engine }).wadewellEngine = engine;
  afterAll(() => engine.close());
  return engine;
}
