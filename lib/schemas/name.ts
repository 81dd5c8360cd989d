import { z } from 'zod';

/** Line breaks and whatever turns the direction of writing: names stand in mail, where they could pass for other words. */
const unseen = /[\p{Cc}\u200e\u200f\u202a-\u202e\u2066-\u2069\ufeff]/u;

/** What somebody or something is called, in a line of its own; `missing` says what to write. */
export function nameSchemaOf(missing: string) {
  return z
    .string({ error: missing })
    .trim()
    .min(1, missing)
    .max(80, 'Keep the name under 80 characters.')
    .refine((name) => !unseen.test(name), 'The name has characters that cannot be seen. Write it again by hand.');
}
