import Negotiator from 'negotiator';
import { type Language, languages } from '@/lib/schemas/languages';

/** What a device chose before anybody signed in on it. It names nobody, so it needs no protection. */
export const languageCookie = 'wadewell-language';

/** The language to speak to a device: the one it chose, else the first spoken one that its browser asks for. */
export function visitLanguage(headers: Headers): Language {
  const chosen = new RegExp(`(?:^|;\\s*)${languageCookie}=([a-z]+)`).exec(headers.get('cookie') ?? '')?.[1];
  const asked = new Negotiator({ headers: { 'accept-language': headers.get('accept-language') ?? undefined } });
  return spoken(chosen) ?? spoken(asked.language([...languages])) ?? languages[0];
}

/** The cookie that keeps a choice for a year. */
export function languageCookieOf(language: Language, { secure }: { secure: boolean }): string {
  return `${languageCookie}=${language}; Path=/; Max-Age=31536000; SameSite=Lax${secure ? '; Secure' : ''}`;
}

function spoken(language: string | undefined): Language | undefined {
  return languages.find((each) => each === language);
}
