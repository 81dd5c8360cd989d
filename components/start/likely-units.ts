import type { SignUp } from '@/lib/schemas/account';

/**
 * Which measures to offer first, from the languages a browser asks for ("en-US,en;q=0.9"): US measures where the first
 * region named is the United States, metric everywhere else. Only a first guess; the form shows it and asks.
 */
export function likelyUnits(acceptLanguage: string | null): SignUp['unitSystem'] {
  const region = /^\s*[a-z]{2,3}-([a-z]{2})\b/i.exec(acceptLanguage ?? '')?.[1];
  return region?.toUpperCase() === 'US' ? 'us' : 'metric';
}
