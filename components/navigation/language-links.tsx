import { useLocale, useTranslations } from 'next-intl';
import { languages } from '@/lib/schemas/languages';

/** The other languages, each by its own name, for whoever is not signed in: links, so that they work without scripts. */
export function LanguageLinks({ className }: { className: string }) {
  const t = useTranslations('navigation.language');
  const current = useLocale();
  return languages
    .filter((language) => language !== current)
    .map((language) => (
      <a key={language} href={`?language=${language}`} hrefLang={language} lang={language} className={className}>
        {t(language)}
      </a>
    ));
}
