import 'server-only';
import { createHmac, randomBytes } from 'node:crypto';
import { environment } from '@/lib/env';

/** Something that cannot be guessed, for a link; only its digest is stored. */
export function newInvitationToken(): string {
  return randomBytes(32).toString('base64url');
}

export function invitationDigest(token: string): string {
  return createHmac('sha256', environment().secret).update(`invitation ${token}`).digest('base64url');
}

/** The address to send to whoever is invited. */
export function invitationLink(token: string): string {
  return `${environment().origin}/invitation/${token}`;
}
