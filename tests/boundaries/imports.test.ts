import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { purePackages } from '@/tests/support/pure-packages';
import rules from '@/.dependency-cruiser.mjs';
import { importPlants } from './import-plants';
import { plantTree, root } from './planted-tree';

/** What each pure folder may import of the others, written out folder by folder as the house has it. */
const mayImport: Record<string, string[]> = {
  units: [],
  calendar: [],
  standards: [],
  schemas: ['units', 'calendar', 'standards'],
  chemistry: ['units', 'calendar', 'standards', 'schemas'],
  sun: ['units', 'calendar', 'standards', 'schemas'],
  // How fast liquid chlorine weakens is a law of chemistry, what that does to a bottle is storage.
  storage: ['units', 'calendar', 'standards', 'schemas', 'chemistry'],
  projection: ['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage'],
  learning: ['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection'],
  planner: ['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection'],
  verdict: ['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection'],
  situations: ['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection'],
  season: [
    ...['units', 'calendar', 'standards', 'schemas', 'chemistry', 'sun', 'storage', 'projection'],
    ...['learning', 'planner', 'verdict', 'situations'],
  ],
};
const pureFolders = Object.keys(mayImport);
const otherFolders = ['lib/services', 'lib/auth', 'lib/api', 'lib/client', 'lib/messages', 'lib/mail', 'lib/cli'];
const places = [
  ...pureFolders.map((folder) => `lib/${folder}`),
  ...[...otherFolders, 'lib/engine-worker', 'db', 'app', 'tests', 'components/ui', 'components/readings'],
];

const targets = places.map((place) => [`${place}/target.ts`, 'export type Target = number;\nexport const target = 1;']);
const fromPure = pureFolders.flatMap((folder) =>
  places
    .filter((place) => place !== `lib/${folder}`)
    .map((place) => ({
      file: `lib/${folder}/from-${place.replaceAll('/', '-')}.ts`,
      code: `import '@/${place}/target';`,
      folder,
      allowed: mayImport[folder]?.some((below) => place === `lib/${below}`),
    })),
);
const packagePlants = pureFolders.flatMap((folder) => [
  { file: `lib/${folder}/a-package.ts`, code: "import 'pino';", rule: `pure-${folder}-packages` },
]);

let reported: Map<string, string[]>;
let remove: () => void;

beforeAll(() => {
  const plants = [...importPlants.flatMap(({ wrong, right }) => [wrong, right]), ...fromPure, ...packagePlants];
  const files = Object.fromEntries([
    ...targets,
    ...plants.map(({ file, code }) => [file, code]),
    ['lib/services/hen.ts', "import './egg';"],
    ['lib/calendar/zone.ts', "import 'temporal-polyfill/fns/ZonedDateTime';"],
  ]);
  const tree = plantTree('imports', files);
  remove = tree.remove;
  reported = cruise(tree.folder);
}, 60_000);
afterAll(() => remove());

/** Runs the checker as `npm test` does, and returns the names of the broken rules by file. */
function cruise(folder: string) {
  const run = spawnSync(
    process.execPath,
    [
      ...['--import', 'tsx', join(root, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs')],
      ...['--config', join(root, '.dependency-cruiser.mjs'), '--output-type', 'json'],
      ...['app', 'components', 'db', 'lib', 'tests', 'proxy.ts', 'instrumentation.ts', 'instrumentation-client.ts'],
    ],
    { cwd: folder, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 },
  );
  const { summary } = JSON.parse(run.stdout) as { summary: { violations: { from: string; rule: { name: string } }[] } };
  const byFile = new Map<string, string[]>();
  for (const { from, rule } of summary.violations) byFile.set(from, [...(byFile.get(from) ?? []), rule.name]);
  return byFile;
}

const brokenBy = (file: string) => reported.get(file) ?? [];

describe('import rules', () => {
  it.each(importPlants)('$rule reports $wrong.file', ({ rule, wrong }) => {
    expect(brokenBy(wrong.file)).toContain(rule);
  });

  it.each(importPlants)('$rule leaves $right.file alone', ({ right }) => {
    expect(brokenBy(right.file)).toEqual([]);
  });

  it.each(pureFolders)('lib/%s imports only pure folders below it', (folder) => {
    const plants = fromPure.filter((plant) => plant.folder === folder);
    const wrong = plants.filter(({ file }) => brokenBy(file).includes(`pure-${folder}-downward`));
    expect(wrong.map(({ file }) => file)).toEqual(plants.filter(({ allowed }) => !allowed).map(({ file }) => file));
    expect(plants.filter(({ allowed }) => allowed).flatMap(({ file }) => brokenBy(file))).toEqual([]);
  });

  it.each(packagePlants)('$rule reports a package that is not on the list', ({ file, rule }) => {
    expect(brokenBy(file)).toContain(rule);
  });

  it('permits a listed package in its own folder', () => {
    expect(brokenBy('lib/calendar/zone.ts')).toEqual([]);
    for (const { reason } of purePackages) expect(reason.length).toBeGreaterThan(40);
  });

  it('has a planted violation for every rule', () => {
    const planted = new Set([...reported.values()].flat());
    expect((rules.forbidden ?? []).filter(({ name = '' }) => !planted.has(name))).toEqual([]);
  });
});
