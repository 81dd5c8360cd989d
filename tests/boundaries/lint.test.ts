import { join } from 'node:path';
import { ESLint, type Linter } from 'eslint';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exemptions, lintPlants } from './lint-plants';
import { plantTree, root } from './planted-tree';

const table = lintPlants.map((plant, index) => ({
  ...plant,
  wrongFile: `${plant.folder}/wrong-${index}.tsx`,
  rightFile: `${plant.folder}/right-${index}.tsx`,
}));

let reported: Map<string, Linter.LintMessage[]>;
let remove: () => void;

beforeAll(async () => {
  const tree = plantTree(
    'lint',
    Object.fromEntries([
      ...table.flatMap(({ wrong, right, wrongFile, rightFile }) => [
        [wrongFile, wrong],
        [rightFile, right],
      ]),
      ...exemptions.map(({ file, code }) => [file, code]),
    ]),
  );
  remove = tree.remove;
  const eslint = new ESLint({ cwd: tree.folder, overrideConfigFile: join(root, 'eslint.config.mjs') });
  const results = await eslint.lintFiles(['.']);
  reported = new Map(results.map(({ filePath, messages }) => [filePath.slice(tree.folder.length + 1), messages]));
}, 60_000);
afterAll(() => remove());

describe('lint rules', () => {
  it.each(table)('$rule in $folder reports: $wrong', ({ rule, says, wrongFile }) => {
    const messages = reported.get(wrongFile) ?? [];
    expect(messages.filter(({ ruleId }) => ruleId === rule).map(({ message }) => message)).toContainEqual(
      expect.stringContaining(says),
    );
  });

  it.each(table)('$rule in $folder permits: $right', ({ rightFile }) => {
    expect(reported.get(rightFile)).toEqual([]);
  });

  it.each(exemptions)('$file may do what others may not', ({ file }) => {
    expect(reported.get(file)).toEqual([]);
  });
});
