import type { Language } from '@/lib/schemas/languages';
import { spanishAnswers } from './spanish-answers';

const answers: Record<Exclude<Language, 'en'>, Readonly<Record<string, string>>> = { es: spanishAnswers };

/** Characters; what is longer repeats what somebody sent, and looking for gaps in it would keep the server busy. */
const LONGEST = 500;

type Frame = { reads: RegExp; says: string };
const frames = new Map<string, readonly Frame[]>();

/**
 * What the server says to a request that it refuses, in another language. Services say it in English, beside its code; the
 * sentence itself is the key, and what fills its gaps is translated where it is known. A sentence that is not known stays.
 */
export function answerIn(language: Language, sentence: string): string {
  if (language === 'en' || sentence.length > LONGEST) return sentence;
  if (Object.hasOwn(answers[language], sentence)) return answers[language][sentence] ?? sentence;
  for (const { reads, says } of framesOf(language)) {
    const found = reads.exec(sentence);
    if (found) return says.replace(/\{(\d+)\}/g, (_, gap) => answerIn(language, found.groups?.[`gap${gap}`] ?? ''));
  }
  return sentence;
}

/** The sentences with gaps; those that say most of themselves first, so that the nearest one is found. */
function framesOf(language: Exclude<Language, 'en'>): readonly Frame[] {
  const made = frames.get(language);
  if (made) return made;
  const fixed = (english: string) => english.replace(/\{\d+\}/g, '');
  const all = Object.entries(answers[language])
    .filter(([english]) => /\{\d+\}/.test(english))
    .sort(([one], [other]) => fixed(other).length - fixed(one).length)
    .map(([english, says]) => ({ reads: frameOf(english), says }));
  frames.set(language, all);
  return all;
}

function frameOf(english: string): RegExp {
  const safe = english.replace(/[.*+?^$()|[\]\\]/g, '\\$&');
  return new RegExp(`^${safe.replace(/\{(\d+)\}/g, '(?<gap$1>.+?)')}$`, 's');
}
