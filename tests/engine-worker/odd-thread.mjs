import { parentPort, threadId } from 'node:worker_threads';

// Stands in for the engine's thread: does what the question tells it to, well or badly.
const deeds = {
  answer: (id, { value }) => parentPort.postMessage({ id, answer: { value, threadId } }),
  refuse: (id) =>
    parentPort.postMessage({ id, fault: { code: 'plan-refused', message: 'No.', problems: [], stack: null } }),
  crash: () => {
    throw new Error('out of chlorine');
  },
  exit: () => process.exit(3),
  hang: () => {
    for (;;);
  },
};

parentPort.on('message', ({ id, order }) => deeds[order.deed](id, order));
parentPort.postMessage({ ready: true });
