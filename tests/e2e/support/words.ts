import { readFileSync } from 'node:fs';
import { inRoot } from './place';

type Tree = { [name: string]: string | Tree };

const catalogues = new Map<string, Tree>();

function catalogueOf(namespace: string): Tree {
  const known = catalogues.get(namespace);
  if (known) return known;
  const tree = JSON.parse(readFileSync(inRoot('lib/messages/en', `${namespace}.json`), 'utf8')) as Tree;
  catalogues.set(namespace, tree);
  return tree;
}

/** A message as it stands in the catalogue: `words('pool.size.next')`. Care texts are written out in the tests instead. */
export function words(path: string): string {
  const [namespace = '', ...names] = path.split('.');
  const found = names.reduce<string | Tree | undefined>(
    (tree, name) => (typeof tree === 'object' ? tree[name] : undefined),
    catalogueOf(namespace),
  );
  if (typeof found !== 'string') throw new Error(`There is no message ${path}.`);
  return found;
}

/** A message with its gaps open and its tags gone, to find it whatever stands in them. */
export function pattern(path: string): RegExp {
  const pieces = words(path)
    .replace(/<\/?\w+>/g, '')
    .split(/\{[^{}]*(?:\{[^{}]*\}[^{}]*)*\}/);
  return new RegExp(pieces.map((piece) => piece.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')).join('.*?'), 's');
}
