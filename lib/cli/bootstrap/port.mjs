import { createServer } from 'node:net';
import { Refusal } from './refusal.mjs';

export const host = '127.0.0.1';

export function wantedPort() {
  const text = process.env.PORT || '3000';
  const port = /^\d+$/.test(text) ? Number(text) : 0;
  if (port < 1 || port > 65535) throw new Refusal(`PORT must be a number from 1 to 65535; it is "${text}".`);
  return port;
}

/** Asks by listening for a moment, which also finds a server that answers nobody. */
export function ensurePortIsFree(port) {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', (problem) => reject(new Refusal(explain(port, problem))));
    probe.listen(port, host, () => probe.close(() => resolve()));
  });
}

function explain(port, problem) {
  if (problem.code === 'EADDRINUSE') {
    return `Port ${port} is in use. Stop the program that listens there, or choose another: PORT=${port === 3000 ? 3001 : 3000} npm start`;
  }
  return `Port ${port} cannot be used: ${problem.message}`;
}
