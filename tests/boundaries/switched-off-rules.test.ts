import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './planted-tree';
import { sourceFiles } from './source-files';

/**
 * Lines that switch a check off without saying why. ESLint cannot be asked this, since such a comment silences the rule
 * that would report it.
 */
function unexplained(code: string): string[] {
  return code.split('\n').filter((line) => {
    const lint = /(?:\/\/|\/\*)\s*eslint-disable[\w-]*(.*)/.exec(line);
    if (lint) return !/\s--\s+\w{2,}/.test(lint[1] ?? '');
    return /(?:\/\/|\/\*)\s*@ts-(?:ignore|nocheck)\b/.test(line);
  });
}

describe('checks that are switched off', () => {
  it('are found when they give no reason', () => {
    const silent = [
      '// eslint-disable-next-line no-console',
      '/* eslint-disable */',
      '// @ts-ignore',
      '/* @ts-nocheck */',
    ];
    const reasoned = '// eslint-disable-next-line no-console -- the one line that people see';
    expect(unexplained([...silent, reasoned, 'const plain = 1;'].join('\n'))).toEqual(silent);
  });

  it('all give their reason in the product and its tests', () => {
    const code = sourceFiles().filter((path) => /\.(tsx?|mjs)$/.test(path) && !path.startsWith('tests/boundaries/'));
    const found = code.flatMap((path) =>
      unexplained(readFileSync(join(root, path), 'utf8')).map((line) => `${path}: ${line}`),
    );
    expect(found).toEqual([]);
  });
});
