import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './planted-tree';

const places = ['app', 'components', 'db', 'lib', 'tests'];

/** Every file of the project's own folders, as a path from its root. */
export function sourceFiles(): string[] {
  return places.flatMap((place) =>
    readdirSync(join(root, place), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath, entry.name).slice(root.length + 1))
      .filter((path) => !path.startsWith('tests/.databases/')),
  );
}
