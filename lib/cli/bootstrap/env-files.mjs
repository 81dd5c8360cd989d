import { readFileSync } from 'node:fs';
import { parseEnv } from 'node:util';
import { inRoot } from './place.mjs';

// In the order in which Next.js lets one overrule another in production.
const names = ['.env', '.env.production', '.env.local', '.env.production.local'];

/** What the server will find in its environment: the files, overruled by the process's own variables. */
export function serverEnvironment() {
  return Object.assign({}, ...names.map((name) => variablesOf(name)), process.env);
}

export function variablesOf(name) {
  return parseEnv(textOf(name));
}

export function textOf(name) {
  try {
    return readFileSync(inRoot(name), 'utf8');
  } catch (problem) {
    if (problem.code === 'ENOENT') return '';
    throw problem;
  }
}
