export type WordsPlace = { x: number; anchor: 'start' | 'end'; above: boolean };

/** Between a bar and its words [px]. */
const GAP = 9;
/** Width of a figure or letter of a drawing's words, on the generous side [px]. */
const LETTER = 6.9;

export const widthOf = (words: string) => words.length * LETTER;

/**
 * Where the words of a bar stand: to its right, where that is too narrow to its left, else above it, on one side of its
 * middle because the link between two bars runs there.
 */
export function besideBar(bar: { from: number; middle: number; to: number }, words: string, width: number): WordsPlace {
  const needed = widthOf(words);
  if (bar.to + GAP + needed <= width) return { x: bar.to + GAP, anchor: 'start', above: false };
  if (bar.from - GAP - needed >= 0) return { x: bar.from - GAP, anchor: 'end', above: false };
  if (bar.middle + GAP + needed <= width) return { x: bar.middle + GAP, anchor: 'start', above: true };
  return { x: Math.max(bar.middle - GAP, needed), anchor: 'end', above: true };
}
