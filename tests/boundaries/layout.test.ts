import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './planted-tree';
import { sourceFiles } from './source-files';

const topLevel = [
  ...[
    'app',
    'components',
    'db',
    'docs',
    'drizzle',
    'lib',
    'public',
    'tests',
    'README.md',
    'DEVELOPERS.md',
    'package.json',
  ],
  ...['drizzle.config.ts', 'next.config.mjs', 'postcss.config.mjs', 'tailwind.config.ts'],
  // What the tools require.
  ...[
    'proxy.ts',
    'instrumentation.ts',
    'instrumentation-client.ts',
    'tsconfig.json',
    'vitest.config.ts',
    'eslint.config.mjs',
    'package-lock.json',
  ],
];
/** Made by the tools and ignored by git. */
const made = ['node_modules', 'data', 'coverage', 'next-env.d.ts'];

const lib = [
  ...[
    'errors.ts',
    'env.ts',
    'log.ts',
    'units',
    'calendar',
    'standards',
    'schemas',
    'chemistry',
    'sun',
    'storage',
    'projection',
  ],
  ...[
    'learning',
    'planner',
    'situations',
    'season',
    'verdict',
    'services',
    'engine-worker',
    'auth',
    'mail',
    'photos',
    'push',
  ],
  ...['weather', 'api', 'client', 'messages', 'cli', 'docs'],
];
const indexes = ['db/schema', 'lib/chemistry', 'lib/projection', 'lib/planner'].map((folder) => `${folder}/index.ts`);

const listed = (folder: string) => readdirSync(join(root, folder)).filter((name) => !name.startsWith('.'));

describe('layout of the house', () => {
  it('has nothing at the top that the house does not name', () => {
    const known = [...topLevel, ...made];
    expect(listed('.').filter((name) => !known.includes(name) && !name.endsWith('.tsbuildinfo'))).toEqual([]);
  });

  it('has no room in lib that the house does not name', () => {
    expect(listed('lib').filter((name) => !lib.includes(name))).toEqual([]);
  });

  it('has no file or folder for whatever fits nowhere', () => {
    const nowhere = /(^|\/)(utils?|helpers?|misc|common|shared|stuff)(\.[^/]+)?(\/|$)/;
    expect('lib/utils.ts lib/helpers/a.ts lib/common/b.ts'.split(' ').filter((path) => !nowhere.test(path))).toEqual(
      [],
    );
    const code = sourceFiles().filter((path) => /\.(tsx?|mjs)$/.test(path));
    expect(code.filter((path) => nowhere.test(path))).toEqual([]);
  });

  it('has files that only pass on others where the house names them, and nowhere else', () => {
    const found = sourceFiles().filter(
      (path) => /\.tsx?$/.test(path) && onlyPassesOn(readFileSync(join(root, path), 'utf8')),
    );
    expect(found.filter((path) => !indexes.includes(path))).toEqual([]);
  });

  it('knows a file that only passes on others', () => {
    expect(onlyPassesOn("/** All. */\nexport * from './a';\nexport {\n  b,\n  type C,\n} from './b';\n")).toBe(true);
    expect(onlyPassesOn("import { a } from './a';\nexport { b } from './b';\nexport const c = a;\n")).toBe(false);
  });
});

function onlyPassesOn(code: string): boolean {
  const statements = code.replace(/\/\*[\s\S]*?\*\/|\/\/.*/g, '');
  const rest = statements.replace(/export\s+(type\s+)?(\*(\s+as\s+\w+)?|\{[^}]*\})\s+from\s+['"][^'"]+['"];?/g, '');
  return rest !== statements && rest.trim() === '';
}
