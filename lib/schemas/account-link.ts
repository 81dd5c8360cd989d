import { z } from 'zod';

/** What a link in a mail to one person can be for. */
export const accountLinkPurposes = ['confirm-email', 'change-email', 'reset-password'] as const;
export type AccountLinkPurpose = (typeof accountLinkPurposes)[number];

/** What somebody is told who opens such a link. */
export type OpenedAccountLink =
  { state: 'open'; email: string } | { state: 'used' | 'expired' | 'unknown' | 'too-often' };

/** 32 random bytes in base64url. */
export const linkTokenSchema = z.string().regex(/^[\w-]{43}$/, 'This link is not whole. Copy all of it.');
export const openedLinkSchema = z.strictObject({ token: linkTokenSchema });
