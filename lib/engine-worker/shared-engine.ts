import { Worker } from 'node:worker_threads';
import { Engine } from './engine';

// Each route is a bundle of its own with its own modules: what all of them share hangs here.
const shared = globalThis as { wadewellEngine?: Engine };

/** Room for what a plan leaves behind [MB]: with the default it is swept eight times in each plan, which costs a sixth of it. */
const resourceLimits = { maxYoungGenerationSizeMb: 96 };

/** The one engine of this process; its thread starts with the first job. */
export function sharedEngine(): Engine {
  // The bundler finds the thread's file by this very expression.
  shared.wadewellEngine ??= new Engine({
    startThread: () => new Worker(new URL('./worker.ts', import.meta.url), { resourceLimits }),
  });
  return shared.wadewellEngine;
}
