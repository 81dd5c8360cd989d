export type Words = { [name: string]: string | Words };

/** Every message of a namespace by its key, in the order of the file. */
export function keysOf(words: Words, before = ''): Map<string, string> {
  return new Map(
    Object.entries(words).flatMap(([name, value]) =>
      typeof value === 'string' ? [[before + name, value] as const] : [...keysOf(value, `${before}${name}.`)],
    ),
  );
}
