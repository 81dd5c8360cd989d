import { NextResponse, type NextRequest } from 'next/server';
import { apiHeaders, pageHeaders, pagePolicy, transportHeaders } from '@/lib/api/headers';
import { languageCookieOf } from '@/lib/auth/visit-language';
import { environment } from '@/lib/env';
import { type Language, languages } from '@/lib/schemas/languages';

/** The headers of every reply. A page gets a policy of its own with a fresh nonce, so every page is made per request. */
export function proxy(request: NextRequest): NextResponse {
  const surroundings = environment();
  const transport = transportHeaders(surroundings);
  const { pathname } = request.nextUrl;
  if (pathname === '/api' || pathname.startsWith('/api/'))
    return withHeaders(NextResponse.next(), { ...apiHeaders, ...transport });

  const chosen = languages.find((language) => language === request.nextUrl.searchParams.get('language'));
  if (chosen) return withHeaders(inLanguage(request, chosen, surroundings), { ...pageHeaders, ...transport });

  const policy = pagePolicy(btoa(crypto.randomUUID()), surroundings);
  const headers = new Headers(request.headers);
  // Next.js reads the nonce for its own scripts out of the policy on the request.
  headers.set('content-security-policy', policy);
  return withHeaders(NextResponse.next({ request: { headers } }), {
    ...pageHeaders,
    ...transport,
    'content-security-policy': policy,
  });
}

/** `?language=es` on any page: how somebody chooses who is not signed in, or whose browser runs no scripts. */
function inLanguage({ nextUrl }: NextRequest, language: Language, { secure }: { secure: boolean }): NextResponse {
  const address = nextUrl.clone();
  address.searchParams.delete('language');
  const response = NextResponse.redirect(address, 303);
  response.headers.append('set-cookie', languageCookieOf(language, { secure }));
  return response;
}

function withHeaders(response: NextResponse, headers: Record<string, string>): NextResponse {
  for (const [name, value] of Object.entries(headers)) response.headers.set(name, value);
  return response;
}

// Everything but what the build serves, and the service worker, whose own rules its reply would set: a file that is not
// there is answered by a page as well. No request gets by for saying that it only prefetches.
export const config = { matcher: ['/((?!_next/static/|sw\\.js$).*)'] };
