import { everySentence, type Sentence } from './words';

/**
 * What is never to be said. `allowed` are the sentences that may hold the words all the same, each as it stands on the
 * screen, so that a new one fails; `planted` is a sentence that has to be found, the proof that the check can see.
 */
export type Forbidden = {
  what: string;
  pattern: RegExp;
  allowed: readonly string[];
  planted: string;
  /** Where it may be said freely, by namespace. */
  except?: readonly string[];
};

/** The single sentences of a message: tags out, cut where one ends. */
function sentencesOf({ text }: Sentence): string[] {
  return text
    .replace(/<\/?\w+>/g, '')
    .split(/(?<=[.!?;])\s+/)
    .map((sentence) => sentence.trim());
}

/** The sentences in which forbidden words stand, whether allowed or not. */
export function found({ pattern, except = [] }: Forbidden, among: readonly Sentence[] = everySentence): string[] {
  const open = among.filter(({ at }) => !except.some((namespace) => at.startsWith(`${namespace}: `)));
  return [...new Set(open.flatMap(sentencesOf))].filter((sentence) => pattern.test(sentence));
}

export function notAllowed(forbidden: Forbidden, among?: readonly Sentence[]): string[] {
  return found(forbidden, among).filter((sentence) => !forbidden.allowed.includes(sentence));
}
