import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { expect, it } from 'vitest';
import { english } from '@/lib/messages/english';
import { root } from '../boundaries/planted-tree';
import { sourceFiles } from '../boundaries/source-files';
import { keysOf, type Words } from './keys';

/**
 * A message is used when something names it: a string in the source that is the end of its key, or a template that becomes
 * it once its gaps are filled in. That a key which is named exists is for the compiler to tell.
 */
it.each(Object.entries(english))('%s holds no message that nothing names', (namespace, words) => {
  const unused = [...keysOf(words as Words).keys()].filter((key) => !isNamed(`${namespace}.${key}`));
  expect(unused).toEqual([]);
});

it('finds a message that nothing names', () => {
  expect(isNamed('week.thisIsNamedByNothing')).toBe(false);
});

const named = new Set<string>();
const templates: RegExp[] = [];
collect();

function isNamed(path: string): boolean {
  const names = path.split('.');
  const ends = names.map((_, index) => names.slice(index).join('.'));
  return ends.some((end) => named.has(end) || templates.some((template) => template.test(end)));
}

function collect(): void {
  const written = /^(app|components|lib)\/(?!messages\/).*\.tsx?$/;
  for (const file of sourceFiles().filter((path) => written.test(path))) {
    const source = ts.createSourceFile(
      file,
      readFileSync(join(root, file), 'utf8'),
      ts.ScriptTarget.Latest,
      false,
      ts.ScriptKind.TSX,
    );
    const look = (node: ts.Node): void => {
      if (ts.isStringLiteralLike(node)) named.add(node.text);
      // A property may be a code that is looked up by its name.
      if (ts.isPropertyAssignment(node) && ts.isIdentifier(node.name)) named.add(node.name.text);
      if (ts.isTemplateExpression(node)) addTemplate(node);
      ts.forEachChild(node, look);
    };
    look(source);
  }
}

function addTemplate({ head, templateSpans }: ts.TemplateExpression): void {
  const fixed = [head.text, ...templateSpans.map(({ literal }) => literal.text)];
  // One that says nothing of the key itself would name every message.
  if (!fixed.some((text) => /\w/.test(text)) || fixed.some((text) => /[^\w.-]/.test(text))) return;
  templates.push(new RegExp(`^${fixed.map((text) => text.replaceAll('.', '\\.')).join('[\\w.-]+')}$`));
}
