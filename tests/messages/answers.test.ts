import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { answerIn } from '@/lib/messages/answers';
import { spanishAnswers } from '@/lib/messages/spanish-answers';
import { root } from '../boundaries/planted-tree';
import { sourceFiles } from '../boundaries/source-files';

/** Where sentences are written that a refused request may answer. */
const saying = /^lib\/(schemas|services|auth|api|calendar|units|planner|engine-worker|errors|photos)\b.*\.ts$/;
/** Faults of the program, which nobody is told. */
const untold = [
  'The demo household has no pool.',
  'Nothing was learnt by the reading {0}.',
  'The queue is full.',
  'The engine was closed.',
  'The engine crashed.',
  'The engine ended with code {0}.',
  'The engine needed more than {0} ms.',
];

describe('answers in Spanish', () => {
  it('has every sentence that the server says, and none that it no longer says', () => {
    const said = sentences();
    expect(said.size).toBeGreaterThan(150);
    expect([...said].filter((sentence) => !(sentence in spanishAnswers) && !untold.includes(sentence))).toEqual([]);
    const whole = Object.keys(spanishAnswers).filter((key) => /^[A-Z{].* .*[.?]$/.test(key));
    expect(whole.filter((sentence) => !said.has(sentence))).toEqual([]);
  });

  it('fills each gap once', () => {
    const gaps = (text: string) => (text.match(/\{\d+\}/g) ?? []).sort().join();
    expect(Object.entries(spanishAnswers).filter(([english, spanish]) => gaps(english) !== gaps(spanish))).toEqual([]);
  });

  it('fills the gaps in their own order, with words that it knows', () => {
    expect(answerIn('es', 'Write the diameter.')).toBe('Escribe el diámetro.');
    expect(answerIn('es', 'A gauge shows 0 to 6 bar.')).toMatch(/0.*6 bar/);
    expect(answerIn('es', 'Dev has it. Ask before you add anything.')).toMatch(/^Dev /);
  });

  it('leaves English, and what nobody has translated, as it is', () => {
    expect(answerIn('en', 'Write your name.')).toBe('Write your name.');
    expect(answerIn('es', 'Nobody wrote this sentence')).toBe('Nobody wrote this sentence');
    expect(answerIn('es', 'constructor')).toBe('constructor');
  });

  it('does not look for sentences in a long text that somebody sent', () => {
    const sent = `Wadewell does not know this field: ${'a is b; '.repeat(8000)}.`;
    const began = performance.now();
    expect(answerIn('es', sent)).toBe(sent);
    expect(performance.now() - began).toBeLessThan(100);
  });
});

/** Each sentence in the source, its gaps numbered. */
function sentences(): Set<string> {
  const found = new Set<string>();
  for (const file of sourceFiles().filter((path) => saying.test(path))) {
    const text = readFileSync(join(root, file), 'utf8');
    const look = (node: ts.Node): void => {
      const said = textOf(node);
      if (said !== undefined && /^[A-Z{][^<>]*[.?]$/.test(said) && said.includes(' ')) found.add(said);
      ts.forEachChild(node, look);
    };
    look(ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true));
  }
  return found;
}

function textOf(node: ts.Node): string | undefined {
  if (ts.isStringLiteralLike(node)) return node.text;
  if (!ts.isTemplateExpression(node)) return undefined;
  return node.templateSpans.reduce((text, { literal }, gap) => `${text}{${gap}}${literal.text}`, node.head.text);
}
