import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './planted-tree';
import { sourceFiles } from './source-files';

/** Lines of a style sheet that use a colour instead of naming a token; a token's own value is where colours belong. */
function rawColours(css: string): string[] {
  return css
    .split('\n')
    .filter((line) => /#[0-9a-f]{3,8}\b|\b(rgba?|hsla?|hwb|lab|lch|oklab|oklch)\(/i.test(line))
    .filter((line) => !/^\s*--[\w-]+:/.test(line));
}

describe('colours in style sheets', () => {
  it('are found outside the tokens', () => {
    const token = '  --ink: #12303a;';
    const raw = ['a { color: #12303a; }', '  border: 1px solid rgb(0 0 0 / 0.2);'];
    expect(rawColours([token, ...raw, 'a { color: var(--ink); }'].join('\n'))).toEqual(raw);
  });

  it('are tokens everywhere', () => {
    const sheets = sourceFiles().filter((path) => path.endsWith('.css'));
    expect(sheets).toContain('app/globals.css');
    expect(sheets.flatMap((path) => rawColours(readFileSync(join(root, path), 'utf8')))).toEqual([]);
  });
});
