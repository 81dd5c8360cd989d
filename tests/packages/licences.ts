import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Licences under which code may be shipped with the product, each alone or joined by AND; a choice by OR needs one. */
const allowed = [
  ...[
    'MIT',
    'MIT-0',
    'ISC',
    '0BSD',
    'BSD-2-Clause',
    'BSD-3-Clause',
    'Apache-2.0',
    'BlueOak-1.0.0',
    'CC0-1.0',
    'Unlicense',
  ],
];

type Reason = { packages: RegExp; reason: string };

/** Licences that are allowed for some packages only. */
const allowedFor: Record<string, Reason> = {
  'MPL-2.0': { packages: /^lightningcss(-|$)/, reason: 'a program of the build, unchanged; nothing of it is served' },
  'CC-BY-4.0': { packages: /^caniuse-lite$/, reason: 'data for the build, named here' },
  'LGPL-3.0-or-later': {
    packages: /^@img\/sharp-/,
    reason: 'the picture library behind sharp, unchanged, loaded at run time and replaceable',
  },
};

/** Packages that name no licence in their own description, read by a person in the file beside it. */
const read: Record<string, string> = { suncalc: 'BSD-2-Clause' };

export type Licensed = { name: string; version: string; licence: string };

type Locked = { version?: string; license?: string; dev?: boolean };

/** Everything that production installs on any machine, by the lock file; a package that is installed has to say the same. */
export function productionPackages(root: string): Licensed[] {
  const { packages } = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')) as {
    packages: Record<string, Locked>;
  };
  const found = new Map<string, Licensed>();
  for (const [path, { version = '', license, dev }] of Object.entries(packages)) {
    if (path === '' || dev === true) continue;
    const name = path.slice(path.lastIndexOf('node_modules/') + 'node_modules/'.length);
    const licence = installedLicence(join(root, path)) ?? license ?? read[name] ?? 'none';
    found.set(`${name} ${version}`, { name, version, licence });
  }
  return [...found.values()].toSorted((a, b) => (`${a.name} ${a.version}` < `${b.name} ${b.version}` ? -1 : 1));
}

function installedLicence(folder: string): string | undefined {
  const file = join(folder, 'package.json');
  if (!existsSync(file)) return undefined;
  const { license } = JSON.parse(readFileSync(file, 'utf8')) as { license?: unknown };
  return typeof license === 'string' && license !== '' ? license : undefined;
}

/** What stands in the way of shipping a package; undefined for nothing. */
export function licenceProblem({ name, version, licence }: Licensed): string | undefined {
  const choices = licence.replace(/[()]/g, '').split(/\s+OR\s+/);
  const fine = choices.some((choice) =>
    choice.split(/\s+AND\s+/).every((each) => allowed.includes(each) || allowedFor[each]?.packages.test(name) === true),
  );
  return fine ? undefined : `${name} ${version} is under ${licence}, which is not allowed for it`;
}

/** The list as it stands in docs/licences.md. */
export function licenceList(packages: readonly Licensed[]): string {
  const special = Object.entries(allowedFor).map(([licence, { reason }]) => `- ${licence}: ${reason}.`);
  const rows = packages.map(({ name, version, licence }) => `| ${name} | ${version} | ${licence} |`);
  return [
    '# Licences',
    '',
    'What production installs, on whichever machine, written by `npm run licences`. A package under any other licence than',
    `${allowed.join(', ')} turns a test red, but for these:`,
    '',
    ...special,
    '',
    'The fonts are under the SIL Open Font License 1.1 (Fraunces, Atkinson Hyperlegible Next).',
    '',
    '| package | version | licence |',
    '|---|---|---|',
    ...rows,
    '',
  ].join('\n');
}
