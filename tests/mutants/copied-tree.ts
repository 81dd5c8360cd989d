import { cpSync, mkdtempSync, readdirSync, rmSync, symlinkSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** What tests are run from; the rest is made by the tools or belongs to the household. */
const left = ['node_modules', 'data', 'coverage'];

/** A copy of the tree in a folder of its own, so that no fault ever stands in the working tree. Packages are linked. */
export function copyTree(root: string): { folder: string; remove: () => void } {
  const folder = mkdtempSync(join(tmpdir(), 'wadewell-mutants-'));
  for (const name of readdirSync(root)) {
    if (left.includes(name) || name.startsWith('.')) continue;
    cpSync(join(root, name), join(folder, name), {
      recursive: true,
      filter: (path) => !path.includes('/tests/.databases') && !path.endsWith('.tsbuildinfo'),
    });
  }
  symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'));
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
