import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

export const root = join(import.meta.dirname, '../..');

/**
 * A small project of its own under the project's folder, so that the real rules and the real packages apply to files
 * that nobody wants in the real tree.
 */
export function plantTree(name: string, files: Record<string, string>) {
  mkdirSync(join(root, '.tmp'), { recursive: true });
  const folder = mkdtempSync(join(root, `.tmp/${name}-`));
  const paths = { '@/*': ['./*'] };
  const tsconfig = { extends: '../../tsconfig.json', compilerOptions: { paths }, include: ['**/*.ts', '**/*.tsx'] };
  symlinkSync(join(root, 'package.json'), join(folder, 'package.json'));
  for (const [path, code] of Object.entries({ ...files, 'tsconfig.json': JSON.stringify(tsconfig) })) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), code);
  }
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
