/** The languages that the product speaks; the first is spoken to whoever asks for none of them. */
export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

/** The spoken language of a BCP 47 tag: 'es' for 'es-MX'; the first one for a tag of a language that is not spoken. */
export function languageOf(locale: string): Language {
  const asked = locale.split('-')[0]?.toLowerCase();
  return languages.find((language) => language === asked) ?? languages[0];
}

/**
 * A household's locale in the language of one person: days and numbers are written as that language writes them where the
 * household is at home. 'es-US' for Spanish in 'en-US'.
 */
export function localeIn(language: Language, locale: string): string {
  if (locale.split('-')[0]?.toLowerCase() === language) return locale;
  const region = /^[a-z]{2,3}(?:-[a-z]{4})?-([a-z]{2})\b/i.exec(locale)?.[1];
  return region === undefined ? language : `${language}-${region.toUpperCase()}`;
}
