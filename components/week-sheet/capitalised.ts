/** The first letter large: for words that begin a sentence in one place and stand inside one in another. */
export function capitalised(words: string): string {
  return words.charAt(0).toLocaleUpperCase() + words.slice(1);
}
