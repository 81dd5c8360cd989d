import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { expect, it } from 'vitest';
import { english } from '@/lib/messages/english';
import { spanish } from '@/lib/messages/spanish';
import { auditActions } from '@/lib/schemas/audit-entry';
import { root } from '../boundaries/planted-tree';
import { sourceFiles } from '../boundaries/source-files';

/** The actions that the source writes into the record: whatever a file that writes audit entries calls an `action`. */
const written = sourceFiles()
  .filter((path) => /^lib\/.*\.ts$/.test(path))
  .flatMap((path) => actionsIn(path, readFileSync(join(root, path), 'utf8')));

it('finds what the services write, also where it hangs on something', () => {
  expect(written).toEqual(expect.arrayContaining(['record-reading', 'leave', 'remove-member', 'decline-hand-over']));
  const planted = `await writeAudit(tx, { action: sure ? 'plant' : 'uproot' });`;
  expect(actionsIn('lib/services/planted.ts', planted)).toEqual(['plant', 'uproot']);
});

it.each([
  ['English', english.household.audit.actions],
  ['Spanish', spanish.household.audit.actions],
] as const)('has words for each of them in %s', (_, words) => {
  expect([...new Set(written)].filter((action) => !Object.hasOwn(words, action))).toEqual([]);
  expect(Object.keys(words).sort()).toEqual([...auditActions].sort());
});

function actionsIn(path: string, text: string): string[] {
  if (!text.includes('writeAudit(')) return [];
  const source = ts.createSourceFile(path, text, ts.ScriptTarget.Latest, false, ts.ScriptKind.TS);
  const found: string[] = [];
  const look = (node: ts.Node): void => {
    const named = ts.isPropertyAssignment(node) || ts.isVariableDeclaration(node);
    if (named && ts.isIdentifier(node.name) && node.name.text === 'action' && node.initializer)
      found.push(...literalsOf(node.initializer));
    ts.forEachChild(node, look);
  };
  look(source);
  return found;
}

/** The strings that an expression can be; nothing for one that is worked out elsewhere. */
function literalsOf(expression: ts.Expression): string[] {
  if (ts.isStringLiteralLike(expression)) return [expression.text];
  if (ts.isAsExpression(expression) || ts.isParenthesizedExpression(expression))
    return literalsOf(expression.expression);
  if (ts.isConditionalExpression(expression))
    return [...literalsOf(expression.whenTrue), ...literalsOf(expression.whenFalse)];
  return [];
}
