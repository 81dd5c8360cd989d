type Part = string | false | null | undefined;

/** Joins class names and leaves out those that do not apply. */
export function classNames(...parts: Part[]): string {
  return parts.filter(Boolean).join(' ');
}
