import { readFileSync } from 'node:fs';
import { buildFolder, inRoot } from '../support/place';

/** Everything that the build under test answers, by its own lists. */
export type Manifest = {
  /** As addresses with their gaps: "/situations/[kind]". */
  pages: string[];
  routes: string[];
  /** Server actions, by what the build calls them. */
  actions: string[];
  /** Pages of the older router: what is drawn when all else fails, and nothing of ours. */
  staticPages: string[];
};

export function readManifest(): Manifest {
  const entries = Object.entries(inBuild<Record<string, string>>('app-path-routes-manifest.json'));
  const files = Object.keys(inBuild<Record<string, string>>('server/app-paths-manifest.json'));
  const unlisted = files.filter((file) => !entries.some(([entry]) => entry === file));
  if (unlisted.length > 0) throw new Error(`The build has entries without an address: ${unlisted.join(', ')}`);
  const { node, edge } = inBuild<Record<'node' | 'edge', Record<string, unknown>>>(
    'server/server-reference-manifest.json',
  );
  const ending = (end: string) => entries.filter(([entry]) => entry.endsWith(end)).map(([, address]) => address);
  const [pages, routes] = [ending('/page'), ending('/route')];
  if (pages.length + routes.length !== entries.length) throw new Error('The build has an entry of an unknown kind.');
  return {
    pages,
    routes,
    actions: [...Object.keys(node), ...Object.keys(edge)],
    staticPages: Object.keys(inBuild<Record<string, string>>('server/pages-manifest.json')),
  };
}

/** Which of the build have no row, and which rows the build no longer has. */
export function unmatched(
  found: readonly string[],
  rows: readonly string[],
): { withoutRow: string[]; notInBuild: string[] } {
  const [inBuild, inTable] = [new Set(found), new Set(rows)];
  return {
    withoutRow: [...inBuild].filter((entry) => !inTable.has(entry)).sort(),
    notInBuild: [...inTable].filter((entry) => !inBuild.has(entry)).sort(),
  };
}

function inBuild<Content>(file: string): Content {
  return JSON.parse(readFileSync(inRoot(buildFolder, file), 'utf8')) as Content;
}
