/** How often a text stands in another. */
export function occurrences(text: string, part: string): number {
  return text.split(part).length - 1;
}
