import { createTranslator } from 'next-intl';
import { english } from '@/lib/messages/english';

type Words = { [name: string]: string | Words };

/** One message with the place where it stands, such as `doses: steps.acid.1`. */
export type Sentence = { at: string; text: string };

function sentencesIn(words: Words, before: string): Sentence[] {
  return Object.entries(words).flatMap(([name, value]) =>
    typeof value === 'string' ? [{ at: before + name, text: value }] : sentencesIn(value, `${before}${name}.`),
  );
}

/** Every message that can stand on a screen. */
export const everySentence: readonly Sentence[] = Object.entries(english).flatMap(([namespace, words]) =>
  sentencesIn(words, `${namespace}: `),
);

/** The message at a place, as it is written. */
export function written(at: string): string {
  const found = everySentence.find((sentence) => sentence.at === at);
  if (!found) throw new Error(`There are no words at ${at}.`);
  return found.text;
}

const translator = createTranslator({ locale: 'en', messages: english as Words, onError: fail });

/** The message at a place with its figures filled in and its tags taken out. */
export function said(at: string, figures: Record<string, string | number> = {}): string {
  const plain = (inner: string) => inner;
  const tags = { b: plain, stop: plain, link: plain };
  return translator.markup(at.replace(': ', '.') as never, { ...figures, ...tags } as never);
}

function fail(error: Error): never {
  throw error;
}
