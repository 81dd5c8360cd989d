import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { inRoot } from './place';

export type Route = {
  /** As the folder has it: "/api/readings/[id]". */
  pattern: string;
  methods: string[];
  /** Whether it reads JSON, or the query of a GET; what takes files has tests of its own. */
  takesInput: (method: string) => boolean;
};

const verbs = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];

/** Every route there is, read from the folders: a new one is asked by itself. */
export function allRoutes(): Route[] {
  return readdirSync(inRoot('app/api'), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('route.ts') && !file.includes('[...'))
    .map((file) => {
      const source = readFileSync(join(inRoot('app/api'), file), 'utf8');
      const blockOf = (verb: string) => new RegExp(`\\b${verb}: \\w+Route\\(\\{[\\s\\S]*?\\}\\),`).exec(source)?.[0];
      return {
        pattern: `/api/${file.replace(/\/?route\.ts$/, '')}`,
        methods: verbs.filter((verb) => blockOf(verb) !== undefined),
        takesInput: (verb: string) => /: (?!upload)\w+Route[\s\S]*\binput[:,]/.test(blockOf(verb) ?? ''),
      };
    })
    .sort((a, b) => a.pattern.localeCompare(b.pattern));
}

export const filled = (pattern: string, id: string): string => pattern.replace(/\[\w+\]/g, id);
