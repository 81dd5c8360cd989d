export const emergencyCard = '/help/emergency';

/** Is this address, or one below it, where we are? The emergency card has a name of its own beside Help. */
export function isCurrent(href: string, path: string): boolean {
  if (href === '/help' && path.startsWith(emergencyCard)) return false;
  return path === href || path.startsWith(`${href}/`);
}
