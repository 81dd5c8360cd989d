import type { Environment } from '@/lib/env';

/** On every reply of /api: nothing in it is a page, nothing of it is kept. */
export const apiHeaders: Readonly<Record<string, string>> = {
  'content-security-policy': "default-src 'none'; frame-ancestors 'none'",
  'x-content-type-options': 'nosniff',
  'cache-control': 'no-store',
  'referrer-policy': 'no-referrer',
  'cross-origin-resource-policy': 'same-origin',
};

/** Only an origin that speaks https may promise it: over plain http the promise would lock people out. */
export function transportHeaders({ secure }: Pick<Environment, 'secure'>): Record<string, string> {
  return secure ? { 'strict-transport-security': 'max-age=31536000; includeSubDomains' } : {};
}

/** The policy of one page: its own scripts and styles run by the nonce, everything else comes from here or not at all. */
export function pagePolicy(
  nonce: string,
  { secure, development }: Pick<Environment, 'secure' | 'development'>,
): string {
  return [
    `default-src 'self'`,
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? ` 'unsafe-eval'` : ''}`,
    development ? `style-src 'self' 'unsafe-inline'` : `style-src 'self' 'nonce-${nonce}'`,
    // The container of a chart writes its size into the attribute.
    `style-src-attr 'unsafe-inline'`,
    `img-src 'self' blob: data:`,
    `font-src 'self'`,
    `connect-src 'self'`,
    `worker-src 'self'`,
    `manifest-src 'self'`,
    `object-src 'none'`,
    `base-uri 'self'`,
    `form-action 'self'`,
    `frame-ancestors 'none'`,
    ...(secure ? ['upgrade-insecure-requests'] : []),
  ].join('; ');
}

/** The nonce that a policy asks scripts to carry. */
export function nonceOf(policy: string | null): string | undefined {
  return /'nonce-([^']+)'/.exec(policy ?? '')?.[1];
}

/** On every page beside its policy. */
export const pageHeaders: Readonly<Record<string, string>> = {
  'x-content-type-options': 'nosniff',
  'x-frame-options': 'DENY',
  'referrer-policy': 'same-origin',
  'cross-origin-opener-policy': 'same-origin',
  'permissions-policy':
    'accelerometer=(), camera=(), display-capture=(), geolocation=(self), gyroscope=(), magnetometer=(), microphone=(), payment=(), usb=()',
};
