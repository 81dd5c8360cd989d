// Loads the engine's thread from its source, as the bundler does for the product.
import { register } from 'tsx/esm/api';

register({ tsconfig: new URL('../../tsconfig.json', import.meta.url).pathname });
await import('../../lib/engine-worker/worker.ts');
