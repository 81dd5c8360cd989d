/** Something before and after an @, and a dot behind it: enough to catch a slip, never enough to refuse a real address. */
export function looksLikeEmail(text: string): boolean {
  return /^\S+@\S+\.\S+$/.test(text.trim());
}
