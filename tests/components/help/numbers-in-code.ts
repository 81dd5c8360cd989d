import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';

const root = join(import.meta.dirname, '../../..');

/** Whole numbers of ordinary sums: halves, squares, hours of a day, powers of ten. Inside a formula they are no constants. */
const ordinary = ['0', '1', '2', '3', '4', '5', '9', '10', '24', '60', '100', '180', '1000'];

/** A figure that the code computes with: `chemistry/file#name`, and the literals in it. */
export type NumbersInCode = { name: string; numbers: string[] };

/** Every top-level constant with a number in it, and every function with a number that is not an ordinary one. */
export function numbersInCode(folder: string): NumbersInCode[] {
  return readdirSync(join(root, 'lib', folder))
    .filter((file) => file.endsWith('.ts'))
    .flatMap((file) => {
      const text = readFileSync(join(root, 'lib', folder, file), 'utf8');
      const source = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true);
      return source.statements
        .flatMap(declared)
        .map(({ name, node, formula }) => ({
          name: `${folder}/${file.replace(/\.ts$/, '')}#${name}`,
          numbers: literalsIn(node).filter((number) => !formula || !ordinary.includes(number)),
        }))
        .filter(({ numbers }) => numbers.length > 0);
    });
}

function declared(statement: ts.Statement): { name: string; node: ts.Node; formula: boolean }[] {
  if (ts.isFunctionDeclaration(statement) && statement.name)
    return [{ name: statement.name.text, node: statement, formula: true }];
  if (!ts.isVariableStatement(statement)) return [];
  return statement.declarationList.declarations.map((node) => ({ name: node.name.getText(), node, formula: false }));
}

function literalsIn(node: ts.Node): string[] {
  if (ts.isNumericLiteral(node)) return [node.getText()];
  const found: string[] = [];
  ts.forEachChild(node, (child) => {
    found.push(...literalsIn(child));
  });
  return found;
}
