import 'server-only';
import { createHmac, randomBytes } from 'node:crypto';
import { environment } from '@/lib/env';

/** The pages that a link with a token opens. */
type LinkPage = 'invitation' | 'confirm' | 'reset';

/** Something that cannot be guessed, for a link; only its digest is stored. */
export function newLinkToken(): string {
  return randomBytes(32).toString('base64url');
}

/** What is stored of a token: of another page it is another one, so that no link opens what it was not sent for. */
export function linkDigest(page: LinkPage, token: string): string {
  return createHmac('sha256', environment().secret).update(`${page} ${token}`).digest('base64url');
}

/** The address to send. */
export function linkTo(page: LinkPage, token: string): string {
  return `${environment().origin}/${page}/${token}`;
}
