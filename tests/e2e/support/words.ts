import { AsyncLocalStorage } from 'node:async_hooks';
import { readFileSync } from 'node:fs';
import type { Language } from '@/lib/schemas/languages';
import { inRoot } from './place';

type Tree = { [name: string]: string | Tree };

const catalogues = new Map<string, Tree>();

const spoken = new AsyncLocalStorage<Language>();

/** Runs a part of a journey whose person reads this language: all words that it looks for are in it. */
export function inLanguage<Result>(language: Language, run: () => Promise<Result>): Promise<Result> {
  return spoken.run(language, run);
}

function catalogueOf(namespace: string): Tree {
  const file = `${spoken.getStore() ?? 'en'}/${namespace}.json`;
  const known = catalogues.get(file);
  if (known) return known;
  const tree = JSON.parse(readFileSync(inRoot('lib/messages', file), 'utf8')) as Tree;
  catalogues.set(file, tree);
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
