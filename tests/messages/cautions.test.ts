import { describe, expect, it } from 'vitest';
import { english } from '@/lib/messages/english';
import { spanish } from '@/lib/messages/spanish';
import { keysOf, type Words } from './keys';

/** Where chemicals are handled and people may come to harm. */
const careful = ['help', 'doses', 'situations', 'verdict', 'rounds', 'house'] as const;

/** Names, marks and heads are no sentences. */
const isSentence = (message: string) => /[.!?}]$/.test(message);

const wordsOf = (message: string) => message.replace(/<\/?\w+>/g, '');

const sentences = (message: string) =>
  wordsOf(message)
    .split(/[.!?…](?=\s|$)/)
    .filter((sentence) => /\p{L}/u.test(sentence)).length;

/** Figures in their order, with a decimal point in either language; those of names ("H2O", "{0}") are left out. */
const figures = (message: string) =>
  [...wordsOf(message).matchAll(/(?<![\p{L}\d{=])\d+(?:[.,]\d+)?(?![\p{L}\d}])/gu)].map(([figure]) =>
    figure.replace(',', '.'),
  );

describe.each(careful)('%s in Spanish', (namespace) => {
  const sources = [...keysOf(english[namespace] as Words)].filter(([, message]) => isSentence(message));
  const translated = keysOf(spanish[namespace] as Words);

  it('says as many sentences in each caution, in the same places', () => {
    const different = sources
      .filter(([key, message]) => sentences(message) !== sentences(translated.get(key) ?? ''))
      .map(([key, message]) => [key, message, translated.get(key)]);
    expect(different).toEqual([]);
  });

  it('has the same figures in the same order', () => {
    const different = sources
      .filter(([key, message]) => String(figures(message)) !== String(figures(translated.get(key) ?? '')))
      .map(([key, message]) => [key, message, translated.get(key)]);
    expect(different).toEqual([]);
  });
});
